import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { outlineArea, outlineExtent, outlinePerimeter, type OutlineCorner } from '../../outlines/outline.ts';
import { CUSHION_SETTINGS } from '../cushion-settings.ts';
import type { CushionShape } from '../cushion-shape.ts';
import { PLAIN_MAKE, type CushionMake } from './cushion-make.ts';
import { makeCushion } from './make-cushion.ts';

const inch = (value: number): number => value * 25.4;

function made(
  [widthMm, depthMm, thicknessMm]: readonly [number, number, number],
  make: Partial<CushionMake> = {},
  shape?: CushionShape,
) {
  const cushion = makeCushion({
    finishedMm: { widthMm, depthMm, thicknessMm },
    make: { ...PLAIN_MAKE, ...make },
    ...(shape && { shape }),
  });
  if (!cushion.ok) throw new Error(cushion.fault);
  const { panels } = cushion.made;
  return { ...cushion.made, panel: (name: string) => panels.find((panel) => panel.name === name)! };
}

function extent(outline: readonly OutlineCorner[]): [number, number] {
  const { widthMm, depthMm } = outlineExtent(outline);
  return [widthMm, depthMm];
}
const inInches = (outline: readonly OutlineCorner[]) =>
  extent(outline).map((mm) => Number((mm / 25.4).toFixed(4)));

const sizes = fc.record({
  widthMm: fc.integer({ min: 400, max: 2400 }),
  depthMm: fc.integer({ min: 350, max: 700 }),
  thicknessMm: fc.integer({ min: 25, max: 150 }),
});
const shapes = fc.oneof(
  fc.constant<CushionShape>({}),
  fc
    .record({ left: fc.integer({ min: -60, max: 120 }), right: fc.integer({ min: -60, max: 120 }) })
    .map((frontInMm): CushionShape => ({ frontInMm })),
  fc
    .record({
      edge: fc.constantFrom('back' as const, 'front' as const),
      fromMm: fc.integer({ min: 0, max: 100 }),
      widthMm: fc.integer({ min: 180, max: 240 }),
      depthMm: fc.integer({ min: 30, max: 150 }),
    })
    .map((notch): CushionShape => ({ notches: [notch] })),
  fc.integer({ min: 1, max: 150 }).map((r): CushionShape => ({
    cornerRadiusMm: { backLeft: r, backRight: r, frontLeft: r, frontRight: r },
  })),
);

describe('a boxed cushion', () => {
  // Worked by hand from the trade's rules (seam 1/2, zip 3 in round each corner, join 3 in a seam).
  it('is cut as worked by hand when it is a rectangle', () => {
    const one = made([inch(72), inch(20), inch(4)]);
    expect(inInches(one.panel('plate').cut)).toEqual([73, 21]);
    expect(inInches(one.panel('boxing').cut)).toEqual([107, 5]);
    expect(inInches(one.foam.outline)).toEqual([72.5, 20.5]);
    expect(one.closure.lengthMm).toBeCloseTo(inch(78), 9);
    expect(one.welt.lengthMm).toBeCloseTo(inch(374), 9);
    expect(extent(one.panel('zip half').cut)[1]).toBeCloseTo(inch(3.25), 9);
    expect(extent(one.panel('zip half').cut)[0]).toBeCloseTo(inch(79), 9);
    // The strip starts 3 in round the back corner: 17 in to the front corner, 72 in along the front.
    expect(one.panel('boxing').marksMm.map((mm) => mm / 25.4)).toEqual(
      [17, 89].map((v) => expect.closeTo(v, 6)),
    );
  });

  it('closes round any plan: boxing and closing strip are the perimeter', () => {
    fc.assert(
      fc.property(
        sizes,
        shapes,
        fc.constantFrom('back' as const, 'left' as const),
        (size, shape, closureEdge) => {
          const one = made(
            [size.widthMm, size.depthMm, size.thicknessMm],
            { closureEdge, closure: 'hand-sewn' },
            shape,
          );
          const [boxing] = extent(one.panel('boxing').finished);
          const [closing] = extent(one.panel('closing strip').finished);
          expect(boxing + closing).toBeCloseTo(one.perimeterMm, 6);
          expect(closing).toBeCloseTo(one.closure.lengthMm, 6);
          expect(one.perimeterMm).toBeCloseTo(outlinePerimeter(one.panel('plate').finished), 6);
          expect(one.welt.alongSeamsMm).toBeCloseTo(2 * one.perimeterMm, 6);
        },
      ),
    );
  });

  it('is never cut smaller than it is finished', () => {
    fc.assert(
      fc.property(
        sizes,
        shapes,
        fc.constantFrom('boxed' as const, 'knife-edge' as const, 'plywood-backed' as const),
        (size, shape, construction) => {
          const one = made([size.widthMm, size.depthMm, size.thicknessMm], { construction }, shape);
          for (const panel of one.panels) {
            expect(outlineArea(panel.cut)).toBeGreaterThan(outlineArea(panel.finished));
          }
        },
      ),
    );
  });

  it('takes the closure over a notch in its edge', () => {
    const one = made(
      [1000, 500, 100],
      {},
      { notches: [{ edge: 'back', fromMm: 400, widthMm: 200, depthMm: 80 }] },
    );
    expect(one.closure.edgeMm).toBeCloseTo(1000 + 160, 6);
  });
});

describe('other makes', () => {
  // upholsteryresource.com node 56: 4 in foam, strip cut 4 1/4, about 3 1/4 finished.
  it('boxes tightly with a strip 1/4 in higher than the foam', () => {
    const one = made([inch(40), inch(20), inch(4)], { construction: 'tight-boxed' });
    expect(inInches(one.panel('boxing').cut)[1]).toBe(4.25);
    expect(one.edgeHeightMm).toBeCloseTo(inch(3.25), 6);
  });

  it('gives a knife edge its seam and half the thickness for the crown', () => {
    const one = made([inch(20), inch(20), inch(4)], { construction: 'knife-edge' });
    expect(one.panels).toHaveLength(1);
    expect(inInches(one.panel('plate').cut)).toEqual([25, 25]);
    expect(one.welt.seams).toBe(1);
    expect(one.closure.lengthMm).toBeCloseTo(inch(20), 6);
    const flatter = {
      ...CUSHION_SETTINGS,
      knifeCrown: { ...CUSHION_SETTINGS.knifeCrown, valueMm: inch(1 / 4) },
    };
    const asked = {
      finishedMm: { widthMm: inch(20), depthMm: inch(20), thicknessMm: inch(4) },
      make: { ...PLAIN_MAKE, construction: 'knife-edge' as const },
    };
    const own = makeCushion(asked, flatter);
    expect(own.ok && inInches(own.made.panels[0]!.cut)).toEqual([23, 23]);
  });

  // Published course: top + front + bottom + 1 by width + 1; sides + 1.
  it('wraps a waterfall in one piece, and covers the whole cushion', () => {
    const one = made([inch(30), inch(22), inch(4)], { construction: 'waterfall', closure: 'hand-sewn' });
    expect(inInches(one.panel('top, front and bottom').cut)).toEqual([31, 22 + 4 + 22 + 1]);
    expect(inInches(one.panel('side').cut)).toEqual([23, 5]);
    expect(inInches(one.panel('closing strip').cut)).toEqual([31, 5]);
    const covered = one.panels.reduce((sum, { count, finished }) => sum + count * outlineArea(finished), 0);
    expect(covered).toBeCloseTo(2 * inch(30) * inch(22) + 2 * inch(4) * (inch(30) + inch(22)), 3);
  });

  it('ends the sides of a bullnose in a half circle that the wrapping piece goes round', () => {
    const one = made([inch(30), inch(22), inch(4)], { construction: 'bullnose', closure: 'hand-sewn' });
    const side = one.panel('side').finished;
    const roundTheSide = outlinePerimeter(side) - inch(4);
    expect(extent(one.panel('top, front and bottom').finished)[1]).toBeCloseTo(roundTheSide, 6);
    expect(outlineArea(side)).toBeCloseTo(inch(20) * inch(4) + (Math.PI * inch(2) ** 2) / 2, 4);
    expect(one.panel('top, front and bottom').marksMm).toHaveLength(3);
    // Welt goes round the half circle: two depths less the radius, the back and half a circle, twice.
    expect(one.welt.alongSeamsMm).toBeCloseTo(2 * (2 * inch(20) + inch(4) + Math.PI * inch(2)), 6);
  });

  it('pulls the cover of a board round foam that stands over it, and staples it', () => {
    const one = made([inch(40), inch(20), inch(2)], { construction: 'plywood-backed', closure: 'stapled' });
    expect(inInches(one.board!.outline)).toEqual([39.5, 19.5]);
    expect(one.board!.thicknessMm).toBeCloseTo(inch(3 / 8), 9);
    expect(inInches(one.foam.outline)).toEqual([40.25, 20.25]);
    expect(inInches(one.panel('cover').cut)).toEqual([40.25 + 2 * (2 + 2.5), 20.25 + 2 * (2 + 2.5)]);
    expect(one.welt.lengthMm).toBe(0);
  });

  it('says which plans a make does not go with', () => {
    const notch: CushionShape = { notches: [{ edge: 'front', fromMm: 100, widthMm: 100, depthMm: 60 }] };
    const asked = (make: Partial<CushionMake>, shape: CushionShape) =>
      makeCushion({
        finishedMm: { widthMm: 1000, depthMm: 500, thicknessMm: 100 },
        make: { ...PLAIN_MAKE, ...make },
        shape,
      });
    expect(asked({ construction: 'waterfall' }, notch)).toEqual({
      ok: false,
      fault: 'a waterfall front wraps a plain rectangle only',
    });
    expect(asked({ construction: 'bullnose', closureEdge: 'left' }, {})).toMatchObject({ ok: false });
    expect(asked({}, { notches: [{ edge: 'front', fromMm: 100, widthMm: 20, depthMm: 60 }] })).toMatchObject({
      ok: false,
      fault: 'plate: the notch edge is too narrow for its allowance',
    });
  });
});
