import { describe, expect, it } from 'vitest';
import { randomOf, randomSolid, spreadDirections, type KnownSolid } from '../../test/random-solids.ts';
import type { Vec3 } from '../parts/part.ts';
import { gapBetween, type Gap } from './gap.ts';
import { cylinder, ellipsoid, hull, roundedCone, type Shape } from './shape.ts';

const minus = (v: Vec3): Vec3 => [-v[0], -v[1], -v[2]];
const boxShape = ([w, h, d]: Vec3, [x, y, z]: Vec3 = [0, 0, 0]): Shape =>
  hull(
    [-1, 1].flatMap((i) =>
      [-1, 1].flatMap((j) => [-1, 1].map((k): Vec3 => [x + (i * w) / 2, y + (j * h) / 2, z + (k * d) / 2])),
    ),
  );
const ball = (at: Vec3, r: number): Shape => roundedCone(at, r, at, r);
const near = (gap: Gap | undefined, mm: number, within = 0.01): void =>
  expect(Math.abs(gap!.distanceMm - mm)).toBeLessThan(within);

describe('distances that have a formula', () => {
  it('of balls: centres less radii, apart and into each other', () => {
    near(gapBetween(ball([0, 0, 0], 30), ball([30, 40, 120], 20)), 130 - 50);
    near(gapBetween(ball([0, 0, 0], 30), ball([0, 40, 0], 20)), -10);
  });

  it('of capsules: the lines less the radii, where they cross and where they end', () => {
    const level = roundedCone([-200, 0, 0], 40, [200, 0, 0], 40);
    near(gapBetween(level, roundedCone([10, 150, -300], 30, [10, 150, 300], 30)), 80);
    near(gapBetween(level, roundedCone([230, 40, 0], 5, [300, 400, 0], 5)), 50 - 45);
  });

  it('of a ball and a box: from a face, an edge and a corner', () => {
    const box = boxShape([200, 100, 60]);
    near(gapBetween(ball([0, 150, 0], 20), box), 80);
    near(gapBetween(ball([130, 90, 0], 20), box), 30);
    near(gapBetween(ball([112, 54, 33], 6), box), Math.hypot(12, 4, 3) - 6);
    near(gapBetween(ball([0, 0, 0], 20), box), -50, 0.1);
  });

  it('of a rounded cone over a board: the lower of its two balls, and the slant where a corner meets it', () => {
    const board = boxShape([1000, 20, 1000]);
    near(gapBetween(roundedCone([0, 110, 0], 60, [300, 90, 0], 20), board), 40);
    const [r0, r1, long] = [60, 20, 300];
    const slant = Math.asin((r0 - r1) / long);
    const corner: Vec3 = [150, 200, 0];
    const expected = 150 * Math.sin(slant) + 200 * Math.cos(slant) - r0;
    near(gapBetween(roundedCone([0, 0, 0], r0, [long, 0, 0], r1), hull([corner])), expected);
  });

  it('of an ellipsoid: along an axis, and over a slanted plane', () => {
    const body = ellipsoid(
      [0, 0, 0],
      [
        [170, 0, 0],
        [0, 90, 0],
        [0, 0, 128],
      ],
    );
    near(gapBetween(body, hull([[0, 100, 0]])), 10);
    near(gapBetween(body, ball([250, 0, 0], 30)), 50);
    near(gapBetween(body, boxShape([900, 20, 900], [0, 80, 0])), -20, 0.1);
  });

  it('of a round leg: from its side and from its rim', () => {
    const leg = cylinder([0, 350, 0], [0, 350, 0], 30);
    near(gapBetween(leg, ball([100, 300, 0], 10)), 60);
    near(gapBetween(leg, ball([33, 704, 0], 1)), 4);
  });

  it('gives nothing beyond the limit and the same within it', () => {
    const [a, b] = [ball([0, 0, 0], 30), boxShape([50, 50, 50], [300, 0, 0])];
    expect(gapBetween(a, b, 244)).toBeUndefined();
    near(gapBetween(a, b, 246), 245);
  });
});

/** What the formulas say of a gap: no greater than between its points, no less than along its direction. */
function bounds(one: KnownSolid, other: KnownSolid, { direction, fromMm, toMm }: Gap) {
  return {
    atLeast: -one.reach(direction) - other.reach(minus(direction)),
    atMost: Math.hypot(fromMm[0] - toMm[0], fromMm[1] - toMm[1], fromMm[2] - toMm[2]),
    outside: Math.max(one.outside(fromMm), other.outside(toMm)),
  };
}

const WITHIN_MM = 0.5;

describe('10,000 random pairs', () => {
  const random = randomOf(20);
  const pairs = Array.from(
    { length: 10_000 },
    () => [randomSolid(random, 330), randomSolid(random, 330)] as const,
  );
  const found = pairs.map(([one, other]) => ({ one, other, gap: gapBetween(one.shape, other.shape)! }));
  const apart = found.filter(({ gap }) => gap.distanceMm > 0);
  const meeting = found.filter(({ gap }) => gap.distanceMm <= 0);

  it('hold many of both', () => {
    expect(apart.length).toBeGreaterThan(2500);
    expect(meeting.length).toBeGreaterThan(1500);
  });

  it('apart: both points lie on their solids, and a slab as thick as the gap fits between them', () => {
    const wrong = apart.filter(({ one, other, gap }) => {
      const { atLeast, atMost, outside } = bounds(one, other, gap);
      return !(gap.distanceMm - atLeast < 0.02 && Math.abs(atMost - gap.distanceMm) < 0.02 && outside < 0.02);
    });
    expect(wrong.map(({ one, other, gap }) => `${one.kind}, ${other.kind}: ${gap.distanceMm}`)).toEqual([]);
  });

  it('meeting: moving the one by the depth parts them', () => {
    const wrong = meeting.filter(({ one, other, gap }) => {
      const { atLeast, outside } = bounds(one, other, gap);
      return !(Math.abs(gap.distanceMm - atLeast) < 0.02 && outside < WITHIN_MM);
    });
    expect(wrong.map(({ one, other, gap }) => `${one.kind}, ${other.kind}: ${gap.distanceMm}`)).toEqual([]);
  });

  it('meeting: no direction of 2,000, nor near the best of them, parts them by less', () => {
    const directions = spreadDirections(2000);
    const wrong = meeting.slice(0, 400).flatMap(({ one, other, gap }) => {
      const way = (n: Vec3): number => one.reach(n) + other.reach(minus(n));
      let best = directions.reduce((least, n) => (way(n) < way(least) ? n : least));
      for (let step = 0.05; step > 1e-4; step *= 0.7) {
        for (const turn of directions.slice(0, 2000).filter((_, i) => i % 50 === 0)) {
          const moved = best.map((x, i) => x + step * turn[i]!);
          const size = Math.hypot(...moved);
          const n = moved.map((x) => x / size) as unknown as Vec3;
          if (way(n) < way(best)) best = n;
        }
      }
      return way(best) < -gap.distanceMm - WITHIN_MM
        ? [`${one.kind}, ${other.kind}: ${-gap.distanceMm} against ${way(best)}`]
        : [];
    });
    expect(wrong).toEqual([]);
  });
});
