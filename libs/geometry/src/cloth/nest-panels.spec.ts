import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import strips from '../../test/strip-instances.json' with { type: 'json' };
import type { ClothLayout, ClothPanel, ClothRoll } from './cloth.ts';
import { nestPanels } from './nest-panels.ts';

const PLAIN = { acrossMm: 0, alongMm: 0 };

const panel = fc.record({
  widthMm: fc.integer({ min: 40, max: 1200 }),
  lengthMm: fc.integer({ min: 40, max: 1200 }),
  lies: fc.constantFrom('up-roll' as const, 'railroad' as const, 'either' as const),
});
const panels = fc
  .array(panel, { minLength: 1, maxLength: 14 })
  .map((list): ClothPanel[] => list.map((one, i) => ({ id: `p${i}`, ...one })));

function expectLaid(asked: readonly ClothPanel[], layout: ClothLayout, roll: ClothRoll): void {
  expect(layout.placed.map(({ id }) => id).sort()).toEqual(asked.map(({ id }) => id).sort());
  for (const placed of layout.placed) {
    const one = asked.find(({ id }) => id === placed.id)!;
    const asItIs = [one.widthMm, one.lengthMm];
    expect([placed.widthMm, placed.lengthMm]).toEqual(placed.railroaded ? asItIs.reverse() : asItIs);
    if (one.lies !== 'either' && one.widthMm !== one.lengthMm) {
      expect(placed.railroaded).toBe(one.lies === 'railroad');
    }
    expect(placed.xMm).toBeGreaterThanOrEqual(-1e-6);
    expect(placed.xMm + placed.widthMm).toBeLessThanOrEqual(roll.usableWidthMm + 1e-6);
    expect(placed.yMm).toBeGreaterThanOrEqual(-1e-6);
    expect(placed.yMm + placed.lengthMm).toBeLessThanOrEqual(layout.lengthMm + 1e-6);
  }
  layout.placed.forEach((a, i) => {
    for (const b of layout.placed.slice(i + 1)) {
      const apart =
        a.xMm + a.widthMm <= b.xMm + 1e-6 ||
        b.xMm + b.widthMm <= a.xMm + 1e-6 ||
        a.yMm + a.lengthMm <= b.yMm + 1e-6 ||
        b.yMm + b.lengthMm <= a.yMm + 1e-6;
      expect(apart, `${a.id} over ${b.id}`).toBe(true);
    }
  });
}

describe('panels on a roll', () => {
  it('lie inside it, as they may, none over another, and never shorter than area over width', () => {
    const roll = { usableWidthMm: 1350, repeatMm: PLAIN };
    fc.assert(
      fc.property(panels, (asked) => {
        const layout = nestPanels(asked, roll, { tries: 10 });
        expectLaid(asked, layout, roll);
        const area = asked.reduce((sum, { widthMm, lengthMm }) => sum + widthMm * lengthMm, 0);
        expect(layout.boundMm).toBeGreaterThanOrEqual(area / roll.usableWidthMm - 1e-6);
        expect(layout.lengthMm).toBeGreaterThanOrEqual(layout.boundMm - 1e-6);
      }),
      { numRuns: 60 },
    );
  });

  it('fall with their control points on the repeats of a patterned cloth', () => {
    const roll = { usableWidthMm: 1350, repeatMm: { acrossMm: 340, alongMm: 610 } };
    fc.assert(
      fc.property(panels, (list) => {
        const asked = list.map((one) => ({
          ...one,
          widthMm: Math.min(one.widthMm, 700),
          lengthMm: Math.min(one.lengthMm, 700),
          controlMm: { acrossMm: one.widthMm / 2, alongMm: 20 },
        }));
        const layout = nestPanels(asked, roll, { tries: 5 });
        expectLaid(asked, layout, roll);
        for (const placed of layout.placed) {
          const { controlMm } = asked.find(({ id }) => id === placed.id)!;
          const [own, up] = [controlMm.acrossMm, controlMm.alongMm];
          const across = (placed.xMm + (placed.railroaded ? up : own)) / roll.repeatMm.acrossMm;
          const along = (placed.yMm + (placed.railroaded ? own : up)) / roll.repeatMm.alongMm;
          expect(across).toBeCloseTo(Math.round(across), 6);
          expect(along).toBeCloseTo(Math.round(along), 6);
        }
      }),
      { numRuns: 60 },
    );
  });

  it('are refused by name when the cloth is too narrow for them', () => {
    const roll = { usableWidthMm: 1350, repeatMm: PLAIN };
    const wide: ClothPanel = { id: 'C3 top', widthMm: 1400, lengthMm: 500, lies: 'up-roll' };
    expect(() => nestPanels([wide], roll, { tries: 1 })).toThrow('C3 top is wider than the cloth');
    expect(nestPanels([{ ...wide, lies: 'either' }], roll, { tries: 1 }).placed[0]?.railroaded).toBe(true);
  });

  it('are laid alike every time', () => {
    const asked = strips.instances[4]!.pieces.map(([widthMm, lengthMm], i): ClothPanel => ({
      id: `${i}`,
      widthMm: widthMm!,
      lengthMm: lengthMm!,
      lies: 'either',
    }));
    const roll = { usableWidthMm: 100, repeatMm: PLAIN };
    expect(nestPanels(asked, roll, { tries: 50 })).toEqual(nestPanels(asked, roll, { tries: 50 }));
  });
});

describe('published strips of known length', () => {
  const gaps: number[] = [];

  it.each(strips.instances)('$id: within 4 in 100 of its optimum, and no bound above it', (instance) => {
    const { width, optimum, pieces } = instance;
    const asked = pieces.flatMap(([widthMm, lengthMm, count], i) =>
      Array.from({ length: count! }, (_, n): ClothPanel => ({
        id: `${i}/${n}`,
        widthMm: widthMm!,
        lengthMm: lengthMm!,
        lies: 'up-roll',
      })),
    );
    const roll = { usableWidthMm: width, repeatMm: PLAIN };
    const layout = nestPanels(asked, roll, { tries: 1500 });
    expectLaid(asked, layout, roll);
    expect(layout.boundMm).toBeLessThanOrEqual(optimum + 1e-6);
    expect(layout.lengthMm / optimum).toBeLessThanOrEqual(1.04);
    gaps.push(layout.lengthMm / optimum - 1);
  });

  it('are 1.5 in 100 too long on the mean at most', () => {
    expect(gaps).toHaveLength(strips.instances.length);
    expect(gaps.reduce((a, b) => a + b, 0) / gaps.length).toBeLessThan(0.015);
  });
});
