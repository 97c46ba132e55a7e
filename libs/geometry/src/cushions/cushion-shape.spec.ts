import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { outlineArea, outlinePerimeter } from '../outlines/outline.ts';
import { shapedOutline, type CushionShape } from './cushion-shape.ts';

const SIZE = { widthMm: 1800, depthMm: 500 };

function outline(shape: CushionShape) {
  const made = shapedOutline(SIZE, shape);
  if (!made.ok) throw new Error(made.fault);
  return made.corners;
}
const fault = (shape: CushionShape) => {
  const made = shapedOutline(SIZE, shape);
  return made.ok ? undefined : made.fault;
};

describe('the plan of a cushion', () => {
  it('is the rectangle of its finished size where nothing else is said', () => {
    expect(outline({}).map(({ at, edge }) => [...at, edge])).toEqual([
      [0, 0, 'front'],
      [1800, 0, 'left'],
      [1800, 500, 'back'],
      [0, 500, 'right'],
    ]);
  });

  it('loses its notches’ area and gains twice the depth of those between the ends of an edge', () => {
    fc.assert(
      fc.property(
        fc.constantFrom('back' as const, 'front' as const),
        fc.integer({ min: 10, max: 600 }),
        fc.integer({ min: 20, max: 400 }),
        fc.integer({ min: 20, max: 200 }),
        (edge, fromMm, widthMm, depthMm) => {
          const corners = outline({
            notches: [
              { edge, fromMm, widthMm, depthMm },
              { edge, fromMm: 1200, widthMm: 100, depthMm: 50 },
            ],
          });
          expect(outlineArea(corners)).toBeCloseTo(1800 * 500 - widthMm * depthMm - 5000, 4);
          expect(outlinePerimeter(corners)).toBeCloseTo(4600 + 2 * depthMm + 100, 6);
        },
      ),
    );
  });

  it('measures a notch of the front from the sitter’s left, which is at the right of the page', () => {
    const xs = outline({ notches: [{ edge: 'front', fromMm: 200, widthMm: 300, depthMm: 80 }] })
      .filter(({ at }) => at[1] === 80)
      .map(({ at }) => at[0]);
    expect(xs).toEqual([1300, 1600]);
    const back = outline({ notches: [{ edge: 'back', fromMm: 200, widthMm: 300, depthMm: 80 }] })
      .filter(({ at }) => at[1] === 420)
      .map(({ at }) => at[0]);
    expect(back).toEqual([1600, 1300]);
  });

  it('becomes an L where a notch takes a corner, whichever edge the notch is said of', () => {
    for (const shape of [
      { notches: [{ edge: 'front', fromMm: 0, widthMm: 1300, depthMm: 200 }] },
      { notches: [{ edge: 'left', fromMm: 300, widthMm: 200, depthMm: 1300 }] },
    ] satisfies CushionShape[]) {
      const corners = outline(shape);
      expect(corners).toHaveLength(6);
      expect(outlinePerimeter(corners)).toBeCloseTo(4600, 6);
      expect(outlineArea(corners)).toBeCloseTo(1800 * 500 - 1300 * 200, 4);
    }
    for (const edge of ['front', 'back', 'left', 'right'] as const) {
      const corners = outline({ notches: [{ edge, fromMm: 0, widthMm: 60, depthMm: 70 }] });
      expect(corners).toHaveLength(6);
      expect(outlineArea(corners)).toBeCloseTo(1800 * 500 - 4200, 4);
      expect(outlinePerimeter(corners)).toBeCloseTo(4600, 6);
    }
  });

  it('tapers, and mitres where the front stands in by its depth', () => {
    const mitred = outline({ frontInMm: { left: 500, right: 0 } });
    expect(outlineArea(mitred)).toBeCloseTo(1800 * 500 - (500 * 500) / 2, 4);
    expect(outlinePerimeter(mitred)).toBeCloseTo(1800 + 1300 + 500 + 500 * Math.SQRT2, 6);
  });

  it('is drawn freely, corner by corner', () => {
    const corners = outline({
      drawn: [
        { xMm: 0, yMm: 0, radiusMm: 0, edge: 'front' },
        { xMm: 400, yMm: 0, radiusMm: 0, edge: 'left' },
        { xMm: 0, yMm: 300, radiusMm: 0, edge: 'right' },
      ],
    });
    expect(outlinePerimeter(corners)).toBeCloseTo(300 + 400 + 500, 6);
  });

  it('says in words what cannot be cut', () => {
    expect(fault({ notches: [{ edge: 'back', fromMm: 1700, widthMm: 200, depthMm: 50 }] })).toBe(
      'a notch does not lie on the back edge, or lies over another',
    );
    expect(
      fault({
        notches: [
          { edge: 'front', fromMm: 100, widthMm: 300, depthMm: 50 },
          { edge: 'front', fromMm: 300, widthMm: 300, depthMm: 50 },
        ],
      }),
    ).toContain('over another');
    expect(fault({ cornerRadiusMm: { backLeft: 300, frontLeft: 300, backRight: 0, frontRight: 0 } })).toBe(
      'the corners of the left edge are rounded by more than it is long',
    );
  });
});
