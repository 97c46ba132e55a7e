import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  offsetOutline,
  outlineArea,
  outlineFault,
  outlinePerimeter,
  outlinePoints,
  outlineStretches,
  type OutlineCorner,
  type Point2,
} from './outline.ts';

const corners = (points: readonly Point2[], radiusMm = 0): OutlineCorner[] =>
  points.map((at, i) => ({ at, radiusMm, edge: `edge ${i + 1}` }));
const box = (width: number, depth: number, radiusMm = 0) =>
  corners(
    [
      [0, 0],
      [width, 0],
      [width, depth],
      [0, depth],
    ],
    radiusMm,
  );
const ELL: Point2[] = [
  [0, 0],
  [600, 0],
  [600, 300],
  [250, 300],
  [250, 900],
  [0, 900],
];

describe('an outline', () => {
  it('has the perimeter and area of its rectangle less what rounding takes', () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 300, max: 2000 }),
        fc.integer({ min: 300, max: 900 }),
        fc.integer({ min: 0, max: 150 }),
        (w, d, r) => {
          expect(outlinePerimeter(box(w, d, r))).toBeCloseTo(2 * (w + d) - (8 - 2 * Math.PI) * r, 6);
          expect(outlineArea(box(w, d, r))).toBeCloseTo(w * d - (4 - Math.PI) * r * r, 4);
        },
      ),
    );
  });

  it('keeps an L’s perimeter that of the box round it, and adds and takes one quarter circle at an inside corner', () => {
    expect(outlinePerimeter(corners(ELL))).toBeCloseTo(2 * (600 + 900), 6);
    expect(outlineArea(corners(ELL))).toBeCloseTo(600 * 300 + 250 * 600, 6);
    const rounded = corners(ELL, 40);
    expect(outlinePerimeter(rounded)).toBeCloseTo(3000 - 6 * (2 - Math.PI / 2) * 40, 6);
    expect(outlineArea(rounded)).toBeCloseTo(330000 - 4 * (1 - Math.PI / 4) * 1600, 6);
  });

  it('grows as Steiner’s formula says where every corner is round', () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 300, max: 900 }),
        fc.integer({ min: 60, max: 140 }),
        fc.integer({ min: 5, max: 60 }),
        (w, r, by) => {
          const plain = box(w, 320, r);
          const grown = offsetOutline(plain, by);
          expect(outlinePerimeter(grown)).toBeCloseTo(outlinePerimeter(plain) + 2 * Math.PI * by, 6);
          expect(outlineArea(grown)).toBeCloseTo(
            outlineArea(plain) + outlinePerimeter(plain) * by + Math.PI * by * by,
            3,
          );
        },
      ),
    );
  });

  it('gets a seam all round with sharp corners sharp, an inside corner too', () => {
    const grown = offsetOutline(corners(ELL), 12.7);
    expect(grown.map(({ at }) => at.map((value) => Number(value.toFixed(6))))).toEqual([
      [-12.7, -12.7],
      [612.7, -12.7],
      [612.7, 312.7],
      [262.7, 312.7],
      [262.7, 912.7],
      [-12.7, 912.7],
    ]);
    expect(
      offsetOutline(grown, -12.7).map(({ at }) => at.map((value) => Math.round(value * 1e6) / 1e6 + 0)),
    ).toEqual(ELL);
  });

  it('runs end to end, and its points stand on it within the sag asked', () => {
    const rounded = corners(ELL, 60);
    const stretches = outlineStretches(rounded);
    stretches.forEach((stretch, i) => {
      const next = stretches[(i + 1) % stretches.length]!;
      expect(Math.hypot(stretch.to[0] - next.from[0], stretch.to[1] - next.from[1])).toBeLessThan(1e-6);
    });
    const points = outlinePoints(rounded, 0.2);
    const area = points.reduce((sum, [x, y], i) => {
      const [nx, ny] = points[(i + 1) % points.length]!;
      return sum + (x * ny - nx * y) / 2;
    }, 0);
    expect(Math.abs(area - outlineArea(rounded))).toBeLessThan(0.2 * 6 * 60 * 1.6);
    for (const stretch of stretches) {
      if (stretch.kind === 'line') continue;
      for (const end of [stretch.from, stretch.to]) {
        expect(Math.hypot(end[0] - stretch.centre[0], end[1] - stretch.centre[1])).toBeCloseTo(
          stretch.radiusMm,
          6,
        );
      }
    }
  });

  it('says what is wrong with it', () => {
    expect(
      outlineFault(
        corners([
          [0, 0],
          [10, 0],
        ]),
      ),
    ).toBe('an outline needs three corners at least');
    expect(
      outlineFault(
        corners([
          [0, 0],
          [0, 10],
          [10, 10],
        ]),
      ),
    ).toBe('the outline is turned inside out');
    expect(
      outlineFault(
        corners([
          [0, 0],
          [10, 0],
          [10, 0],
          [0, 10],
        ]),
      ),
    ).toBe('the edge 2 edge has no length');
    expect(outlineFault(box(300, 100, 60))).toBe(
      'the corners of the edge 2 edge are rounded by more than it is long',
    );
    expect(
      outlineFault(
        corners([
          [0, 0],
          [100, 0],
          [100, 100],
          [60, -40],
          [0, 100],
        ]),
      ),
    ).toContain('crosses');
    expect(outlineFault(corners(ELL, 40))).toBeUndefined();
  });
});
