import { describe, expect, it } from 'vitest';
import { PLAIN_MAKE, type CushionMake } from '../cushions/making/cushion-make.ts';
import { makeCushion } from '../cushions/making/make-cushion.ts';
import { clothToBuy, type ClothOrder } from './cloth-to-buy.ts';
import { coverPanels } from './cover-panels.ts';

const inch = (value: number): number => value * 25.4;
const YARD = inch(36);
const PLAIN: ClothOrder = {
  widthMm: inch(54),
  selvedgeMm: 0,
  lies: 'either',
  repeatMm: { acrossMm: 0, alongMm: 0 },
  startMm: 0,
  stepMm: YARD / 4,
};

function cushion(
  mark: string,
  [width, depth, thickness]: [number, number, number],
  make: Partial<CushionMake> = {},
) {
  const finishedMm = { widthMm: inch(width), depthMm: inch(depth), thicknessMm: inch(thickness) };
  const whole = { ...PLAIN_MAKE, ...make };
  const made = makeCushion({ finishedMm, make: whole });
  if (!made.ok) throw new Error(made.fault);
  return { mark, finishedMm, make: whole, made: made.made };
}

describe('panels of a cover', () => {
  it('railroad a plate that is longer than the roll is wide, and refuse it by name when they may not', () => {
    const bench = [cushion('C1', [72, 20, 4])];
    const bought = clothToBuy(bench, PLAIN, { tries: 50 });
    expect(bought.layout.placed.find(({ id }) => id === 'C1 plate 1')?.railroaded).toBe(true);
    expect(() => clothToBuy(bench, { ...PLAIN, lies: 'up-roll' }, { tries: 1 })).toThrow(
      'C1 plate 1 is wider than the cloth in every way it may lie',
    );
  });

  it('piece strips that have to lie across, with a seam at every joint', () => {
    const pieces = coverPanels([cushion('C1', [50, 20, 4])], { ...PLAIN, lies: 'up-roll' }).filter(({ id }) =>
      id.startsWith('C1 boxing'),
    );
    // Boxing of 140 - 56 = 84 in, cut 85 in: two pieces of 42 in and their seams.
    expect(pieces.map(({ widthMm }) => widthMm / 25.4)).toEqual([43, 43].map((v) => expect.closeTo(v, 6)));
  });

  it('cut welt across the roll in one block, or on the bias from a square', () => {
    const straight = coverPanels([cushion('C1', [72, 20, 4])], PLAIN).find(({ id }) => id === 'welt strips');
    expect([straight!.widthMm / 25.4, straight!.lengthMm / 25.4]).toEqual(
      [54, 12].map((v) => expect.closeTo(v, 6)),
    );
    const bias = coverPanels([cushion('C1', [72, 20, 4], { welt: 'bias' })], PLAIN).find(
      ({ id }) => id === 'bias square 1',
    );
    expect(bias!.widthMm / 25.4).toBeCloseTo(Math.sqrt(374 * 1.5), 6);
  });
});

describe('cloth to buy', () => {
  it('covers the panels, is bought in whole steps, and keeps its waste between none and all', () => {
    const order = ['C1', 'C2', 'C3', 'C4'].map((mark) => cushion(mark, [42.75, 17.25, 4]));
    const bought = clothToBuy(order, { ...PLAIN, startMm: inch(9) }, { tries: 400 });
    expect(bought.layout.lengthMm).toBeGreaterThanOrEqual(bought.layout.boundMm - 1e-6);
    expect((bought.buyMm / PLAIN.stepMm) % 1).toBeCloseTo(0, 9);
    expect(bought.buyMm).toBeGreaterThanOrEqual(bought.layout.lengthMm + inch(9));
    expect(bought.buyMm).toBeLessThan(bought.layout.lengthMm + inch(9) + PLAIN.stepMm);
    expect(bought.waste).toBeGreaterThan(0);
    expect(bought.waste).toBeLessThan(0.35);
  });

  it('says when the chart of the trade is far from the layout', () => {
    const order = [cushion('C1', [72, 20, 4])];
    const bought = clothToBuy(order, PLAIN, { tries: 200 });
    expect(bought.chartMm).toBeCloseTo(inch(80), 6);
    expect(bought.differs).toBe(Math.abs(bought.chartMm! / bought.layout.lengthMm - 1) > 0.15);
    expect(
      clothToBuy(
        order,
        { ...PLAIN, repeatMm: { acrossMm: inch(30), alongMm: inch(30) }, lies: 'railroad' },
        { tries: 20 },
      ).chartMm,
    ).toBeUndefined();
  });

  it('takes no less for a patterned cloth than for a plain one', () => {
    const order = ['C1', 'C2', 'C3'].map((mark) => cushion(mark, [24, 20, 4]));
    const plain = clothToBuy(order, { ...PLAIN, lies: 'up-roll' }, { tries: 300 });
    const patterned = clothToBuy(
      order,
      { ...PLAIN, lies: 'up-roll', repeatMm: { acrossMm: inch(13.5), alongMm: inch(18) } },
      { tries: 300 },
    );
    expect(patterned.layout.lengthMm).toBeGreaterThanOrEqual(plain.layout.boundMm);
    expect(patterned.layout.lengthMm).toBeGreaterThanOrEqual(plain.layout.lengthMm);
    expect(patterned.chartMm! / plain.chartMm!).toBeCloseTo(1.25, 9);
  });
});
