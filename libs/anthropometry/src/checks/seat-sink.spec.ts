import { describe, expect, it } from 'vitest';
import { outsideCheck } from '../../test/outside-check.ts';
import { seatSinkMm } from './seat-sink.ts';

const IN = 25.4;
const LB = 0.45359237;
const LBF = 4.4482216152605;
const foam = (ifdPounds: number, supportFactor: number, thicknessIn = 4) => ({
  thicknessMm: thicknessIn * IN,
  ifd25N: ifdPounds * LBF,
  supportFactor,
});

describe('seatSinkMm', () => {
  // Worked by hand in pounds and inches from the stress-strain line, foam 4 in thick.
  it.each([
    [170, 36, 2.0, 0.319, 1.28],
    [140, 36, 2.0, 0.241, 0.97],
    [110, 36, 2.0, 0.19, 0.76],
    [200, 36, 2.0, 0.402, 1.61],
    [250, 36, 2.4, 0.457, 1.83],
    [170, 50, 2.2, 0.211, 0.84],
    [200, 30, 2.0, 0.512, 2.05],
  ])('%d lb on IFD %d, support factor %f', (pounds, ifd, factor, strain, sinkIn) => {
    const sink = seatSinkMm(foam(ifd, factor), pounds * LB);
    expect(sink.strain).toBeCloseTo(strain, 2);
    outsideCheck({
      source: 'foam trade vectors, worked in pounds and inches',
      what: `${pounds} lb on 4 in foam of IFD ${ifd}, support factor ${factor}`,
      expected: Number((sinkIn * IN).toFixed(2)),
      ours: sink.sinkMm,
      tolerance: 0.15,
      unit: 'mm',
    });
    expect(sink.bottomsOut).toBe(false);
  });

  it('grows with the thickness', () => {
    const four = seatSinkMm(foam(36, 2), 77).sinkMm;
    expect(seatSinkMm(foam(36, 2, 5), 77).sinkMm).toBeCloseTo(1.25 * four, 9);
  });

  it('stops at 65 in 100 and says so when the foam bottoms out', () => {
    const sink = seatSinkMm(foam(20, 1.5), 160);
    expect(sink.bottomsOut).toBe(true);
    expect(sink.strain).toBe(0.65);
  });

  describe('of several layers', () => {
    const inches = (pounds: number, change: object) =>
      seatSinkMm({ ...foam(36, 2), ...change }, pounds * LB).sinkMm / IN;
    const layer = (share: number, pounds: number) => ({ share, ifd25N: pounds * LBF });

    it('is as of one where the layers are of one firmness', () => {
      expect(inches(170, { layers: [layer(0.25, 36), layer(0.75, 36)] })).toBeCloseTo(1.28, 2);
    });

    // Two of the vectors above, half of each: springs one on another bear the same load.
    it.each([
      [200, 36, 30, (1.61 + 2.05) / 2],
      [200, 30, 36, (1.61 + 2.05) / 2],
    ])('%d lb on IFD %d over %d adds up half of each', (pounds, top, bottom, sinkIn) => {
      expect(inches(pounds, { layers: [layer(0.5, top), layer(0.5, bottom)] })).toBeCloseTo(sinkIn, 2);
    });

    it('bottoms out with the softest', () => {
      const layers = [layer(0.25, 10), layer(0.75, 60)];
      expect(seatSinkMm({ ...foam(36, 2), layers }, 170 * LB).bottomsOut).toBe(true);
      expect(seatSinkMm({ ...foam(36, 2), layers: layers.slice(1) }, 170 * LB).bottomsOut).toBe(false);
    });
  });

  it('loses half of a wrap, and the foam is thinner by the wrap', () => {
    // 4 in of foam under 1 in of wrap, by the vector of 170 lb.
    const wrapped = { ...foam(36, 2, 5), wrap: { share: 0.2, lost: 0.5 } };
    expect(seatSinkMm(wrapped, 170 * LB).sinkMm / IN).toBeCloseTo(1.28 + 0.5, 2);
  });
});
