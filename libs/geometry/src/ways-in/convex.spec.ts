import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { convexOf, lineDistance } from './convex.ts';

const box = convexOf([
  [0, 0],
  [100, 0],
  [100, 40],
  [0, 40],
]);
const at = fc.integer({ min: -300, max: 400 });

/** Distance of a point to the box, negative inside. */
const toBox = (x: number, z: number) => {
  const [dx, dz] = [Math.max(-x, x - 100), Math.max(-z, z - 40)];
  return Math.max(dx, dz) <= 0 ? Math.max(dx, dz) : Math.hypot(Math.max(dx, 0), Math.max(dz, 0));
};

describe('the distance from a line to an outline', () => {
  it('is exact beside a face, off a corner, across and inside', () => {
    expect(lineDistance(box, 20, 70, 80, 70, Infinity)).toBeCloseTo(30, 9);
    expect(lineDistance(box, 103, 44, 203, 44, Infinity)).toBeCloseTo(5, 9);
    expect(lineDistance(box, 50, -10, 50, 90, Infinity)).toBeCloseTo(-50, 9);
    expect(lineDistance(box, 50, 15, 50, 15, Infinity)).toBeCloseTo(-15, 9);
  });

  it('is that of its nearest point, however it lies', () => {
    fc.assert(
      fc.property(at, at, at, at, (ax, az, bx, bz) => {
        const found = lineDistance(box, ax, az, bx, bz, Infinity);
        const tried = Array.from({ length: 401 }, (_, n) =>
          toBox(ax + ((bx - ax) * n) / 400, az + ((bz - az) * n) / 400),
        );
        const least = Math.min(...tried);
        if (least > 0) expect(Math.abs(found - least)).toBeLessThan(1.5);
        else expect(found).toBeLessThanOrEqual(1e-9);
      }),
    );
  });

  it('is the same whichever way round the outline runs', () => {
    const back = convexOf([
      [0, 40],
      [100, 40],
      [100, 0],
      [0, 0],
    ]);
    expect(lineDistance(back, 103, 44, 203, 44, Infinity)).toBeCloseTo(5, 9);
  });
});
