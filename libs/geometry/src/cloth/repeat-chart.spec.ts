import { describe, expect, it } from 'vitest';
import { quickClothMm, repeatChartPercent } from './repeat-chart.ts';

const inch = (value: number): number => value * 25.4;
const percent = (along: number, across: number, width = 54) =>
  repeatChartPercent({ alongMm: inch(along), acrossMm: inch(across) }, inch(width));

describe('the chart for repeats', () => {
  // carrscorner: 8 yd plain, 17 + 10 in of repeat: 20 %, 9.6 yd.
  it('turns 8 yd of plain cloth into 9.6 yd at 17 + 10 in', () => {
    expect(8 * (1 + percent(17, 10)! / 100)).toBeCloseTo(9.6, 9);
  });

  // throwmeapillow: 7 yd plain, 18 + 13.5 in: 25 %, 8.75 yd.
  it('turns 7 yd into 8.75 yd at 18 + 13 1/2 in', () => {
    expect(7 * (1 + percent(18, 13.5)! / 100)).toBeCloseTo(8.75, 9);
  });

  it('takes the higher band between two printed ones, plain only at none, and adds ten points to narrow cloth', () => {
    expect(percent(0, 0)).toBe(0);
    expect(percent(1, 1)).toBe(10);
    expect(percent(14.5, 0)).toBe(15);
    expect(percent(27.5, 0)).toBe(25);
    expect(percent(17, 10, 52)).toBe(30);
    expect(percent(0, 0, 50)).toBe(0);
    expect(percent(30, 30)).toBeUndefined();
  });
});

describe('the quick rule for one cushion', () => {
  // Published guide: 22 x 22 x 4 with ties, repeat 5 + 9: 32, doubled, and a tenth more is 70.40 in.
  it('takes 70.40 in of cloth for 22 x 22 x 4 with ties at 5 + 9 in of repeat', () => {
    const size = { widthMm: inch(22), depthMm: inch(22), thicknessMm: inch(4) };
    const plain = quickClothMm(size, { ties: true });
    expect(plain).toBeCloseTo(inch(64), 9);
    expect((plain * (1 + percent(5, 9)! / 100)) / 25.4).toBeCloseTo(70.4, 9);
    expect((plain * (1 + percent(5, 9)! / 100)) / 25.4 / 36).toBeCloseTo(1.956, 3);
  });

  // The same guide's other sum: 74 in, a tenth more, three cushions: 6.78 yd.
  it('takes 6.78 yd for three of 74 in', () => {
    const one = 74 * (1 + percent(5, 9)! / 100);
    expect(one).toBeCloseTo(81.4, 9);
    expect((3 * Math.round((one / 36) * 100)) / 100).toBe(6.78);
  });

  it('takes 2.6 times the length when a cushion is wider than the cloth', () => {
    expect(quickClothMm({ widthMm: inch(70), depthMm: inch(50), thicknessMm: inch(4) })).toBeCloseTo(
      inch(78 * 2.6),
      6,
    );
    expect(
      quickClothMm({ widthMm: inch(70), depthMm: inch(20), thicknessMm: inch(4) }, { folds: 1 }),
    ).toBeCloseTo(inch(70 + 16), 6);
  });
});
