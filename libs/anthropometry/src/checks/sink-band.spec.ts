import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { seatSinkMm } from './seat-sink.ts';
import { calibrateSink, sinkBand, UNCALIBRATED } from './sink-band.ts';

const FOAM = { thicknessMm: 101.6, ifd25N: 36 * 4.4482216152605, supportFactor: 2 };
const sits = (...ratios: number[]) =>
  ratios.map((ratio) => ({ foam: FOAM, weightKg: 77, measuredMm: ratio * seatSinkMm(FOAM, 77).sinkMm }));

describe('the band of a drop', () => {
  it('is 30 in 100 each way without a sit', () => {
    const band = sinkBand(FOAM, 77);
    const { sinkMm } = seatSinkMm(FOAM, 77);
    expect(band.bestMm).toBe(sinkMm);
    expect(band.lowMm).toBeCloseTo(0.7 * sinkMm, 9);
    expect(band.highMm).toBeCloseTo(1.3 * sinkMm, 9);
    expect(band.bottomsOut).toBe('no');
    expect(calibrateSink([])).toEqual(UNCALIBRATED);
  });

  it('never passes the 65 in 100 of the foam, and says whether it may come to them', () => {
    fc.assert(
      fc.property(fc.integer({ min: 20, max: 300 }), (weightKg) => {
        const band = sinkBand(FOAM, weightKg);
        expect(band.lowMm).toBeLessThanOrEqual(band.bestMm);
        expect(band.bestMm).toBeLessThanOrEqual(band.highMm);
        expect(band.highMm).toBeLessThanOrEqual(0.65 * 101.6 + 1e-9);
        expect(band.bottomsOut !== 'no').toBe(band.highMm > 0.65 * 101.6 - 1e-9);
      }),
    );
    expect(sinkBand(FOAM, 130).bottomsOut).toBe('perhaps');
    expect(sinkBand({ ...FOAM, ifd25N: FOAM.ifd25N / 3 }, 200).bottomsOut).toBe('perhaps');
    expect(
      sinkBand({ ...FOAM, ifd25N: FOAM.ifd25N / 3, tested: { factor: 1.6, error: 0.1, sits: 3 } }, 200)
        .bottomsOut,
    ).toBe('yes');
  });

  it('is drawn toward what sits say, the more the more there are, and narrows to the grade’s own spread', () => {
    const [one, four, many] = [sits(1.2), sits(1.2, 1.2, 1.2, 1.2), sits(...Array<number>(60).fill(1.2))].map(
      (list) => calibrateSink(list),
    );
    expect(one!.factor).toBeGreaterThan(1.15);
    expect(one!.factor).toBeLessThan(four!.factor);
    expect(four!.factor).toBeLessThan(many!.factor);
    expect(many!.factor).toBeCloseTo(1.2, 2);
    expect(one!.error).toBeLessThan(0.15);
    expect(four!.error).toBeLessThan(one!.error);
    expect(many!.error).toBeGreaterThan(0.1);
    expect(many!.error).toBeLessThan(0.102);
    expect(calibrateSink(sits(1.2, 1 / 1.2)).factor).toBeCloseTo(1, 9);
  });

  it('refuses a sit without a drop', () => {
    expect(() => calibrateSink(sits(1.1, 0))).toThrow('Test sit 2 has no drop.');
  });
});
