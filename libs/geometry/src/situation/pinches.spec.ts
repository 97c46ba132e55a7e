import { describe, expect, it } from 'vitest';
import type { Spot } from './clear-floor.ts';
import { legsOf, pinchesOf } from './pinches.ts';
import { nearestBetween } from './plan-distance.ts';
import type { PlanOutline, PlanSolid } from './plan.ts';

const WIDEST_MM = 3000;

/** A rectangle along the room's axes as something that stands in the way. */
function block(x0: number, x1: number, z0: number, z1: number): PlanSolid {
  const outline: PlanOutline = [
    [x0, z0],
    [x1, z0],
    [x1, z1],
    [x0, z1],
  ];
  const circle = [(x0 + x1) / 2, (z0 + z1) / 2, Math.hypot(x1 - x0, z1 - z0) / 2] as const;
  return { pieceId: 'p', role: 'end-wall', bottomMm: 0, topMm: 1000, outline, circle };
}

const spots = (...list: [number, number][]): Spot[] => list.map(([xMm, zMm]) => ({ xMm, zMm }));
const STRAIGHT = spots([0, -2000], [0, 2000]);

const narrowest = (route: Spot[], ...solids: PlanSolid[]): number =>
  Math.min(Infinity, ...pinchesOf(legsOf(route), solids, WIDEST_MM).map(({ widthMm }) => widthMm));

describe('between two things', () => {
  it.each([
    [0, 900],
    [300, 800],
    [600, 500],
    [1200, 50],
  ])('staggered by %d along and %d across, a disc of √(s² + w²) gets through', (s, w) => {
    const left = block(w / 2, w / 2 + 100, -100, 0);
    const right = block(-w / 2 - 100, -w / 2, s, s + 100);
    expect(narrowest(STRAIGHT, left, right)).toBeCloseTo(Math.hypot(s, w), 9);
    const [pinch] = pinchesOf(legsOf(STRAIGHT), [left, right], WIDEST_MM);
    expect(pinch).toMatchObject({ leg: 0, fromMm: 2000, toMm: 2000 + s });
  });

  it('on one hand there is no pinch, nor before the route begins', () => {
    expect(narrowest(STRAIGHT, block(300, 400, 0, 100), block(300, 400, 500, 600))).toBe(Infinity);
    expect(narrowest(STRAIGHT, block(300, 400, -3000, -2900), block(-400, -300, -2800, -2700))).toBe(
      Infinity,
    );
  });

  it('that the route leads round there is no pinch', () => {
    const round = spots([0, 0], [600, 0], [600, 1000], [0, 1000]);
    expect(narrowest(round, block(100, 200, 400, 600), block(900, 1000, 400, 600))).toBeCloseTo(700, 9);
    // Both inside the bend, one before the other.
    expect(narrowest(round, block(100, 200, 400, 600), block(300, 400, 400, 600))).toBe(Infinity);
  });
});

describe('corridors', () => {
  it('are as wide as from wall to wall, whichever way they run', () => {
    expect(narrowest(STRAIGHT, block(450, 500, -3000, 3000), block(-500, -450, -3000, 3000))).toBeCloseTo(
      900,
      9,
    );
    const slanting = (offset: number): PlanSolid => {
      const at = (t: number, n: number) => [t * 0.6 - n * 0.8, t * 0.8 + n * 0.6] as const;
      const outline = [at(-3000, offset), at(3000, offset), at(3000, offset + 20), at(-3000, offset + 20)];
      return { ...block(0, 0, 0, 0), outline, circle: [0, 0, 4000] };
    };
    const route = spots([-1200, -1600], [1200, 1600]);
    expect(narrowest(route, slanting(400), slanting(-420))).toBeCloseTo(800, 9);
  });

  /**
   * Corridors a and b that meet square: a body no longer than the one and no wider than the other slides round without
   * turning, so a round one gets through up to the lesser of the two.
   */
  it.each([
    [900, 900],
    [900, 1200],
    [1500, 850],
  ])('of %d and %d that meet square let a round body of the lesser through', (a, b) => {
    const walls = [
      block(-a - 20, -a, -4000, b + 20), // outer, along the first
      block(0, 4000, -4000, 0), // the block inside the corner
      block(-a, 4000, b, b + 20), // outer, along the second
    ];
    const route = spots([-a / 2, -3000], [-a / 2, b / 2], [3000, b / 2]);
    expect(narrowest(route, ...walls)).toBeCloseTo(Math.min(a, b), 9);
  });
});

/** The widest disc that gets from one end of a walled strip to the other, by trying every spot of a fine grid. */
function widestDisc(solids: readonly PlanSolid[], half: number, length: number, stepMm: number): number {
  const [columns, rows] = [Math.round((2 * half) / stepMm) + 1, Math.round(length / stepMm) + 1];
  const room = Array.from({ length: columns * rows }, (_, i) => {
    const [x, z] = [-half + (i % columns) * stepMm, Math.floor(i / columns) * stepMm];
    return Math.min(
      ...solids.map(({ outline }) => {
        const [x0, x1] = [outline[0]![0], outline[2]![0]];
        const [z0, z1] = [outline[0]![1], outline[2]![1]];
        return Math.hypot(Math.max(x0 - x, 0, x - x1), Math.max(z0 - z, 0, z - z1));
      }),
    );
  });
  const passes = (radius: number): boolean => {
    const seen = new Set<number>();
    const open = Array.from({ length: columns }, (_, i) => i).filter((i) => room[i]! >= radius);
    for (let at = open.pop(); at !== undefined; at = open.pop()) {
      if (seen.has(at)) continue;
      seen.add(at);
      if (at >= columns * (rows - 1)) return true;
      const column = at % columns;
      const next = [at - columns, at + columns, ...(column > 0 ? [at - 1] : [])];
      if (column < columns - 1) next.push(at + 1);
      open.push(...next.filter((i) => i >= 0 && i < room.length && room[i]! >= radius));
    }
    return false;
  };
  let [low, high] = [0, half];
  while (high - low > 0.5) {
    const middle = (low + high) / 2;
    if (passes(middle)) low = middle;
    else high = middle;
  }
  return 2 * low;
}

describe('the narrowest of many', () => {
  it.each([1, 2, 3])('is what a search over a fine grid finds, case %d', (seed) => {
    let state = seed * 7919;
    const next = (from: number, to: number) => {
      state = (state * 48271) % 2147483647;
      return Math.round(from + ((to - from) * state) / 2147483647);
    };
    const half = 700;
    const walls = [block(half, half + 50, -500, 3500), block(-half - 50, -half, -500, 3500)];
    // Teeth from either wall that do not reach the middle line.
    const teeth = [400, 900, 1400, 1900, 2400].map((z, i) => {
      const tip = next(30, 500);
      const [z0, z1] = [z + next(0, 150), z + next(200, 350)];
      return i % 2 === 0 ? block(tip, half, z0, z1) : block(-half, -tip, z0, z1);
    });
    const solids = [...walls, ...teeth];
    const found = narrowest(spots([0, 0], [0, 3000]), ...solids);
    const tried = widestDisc(solids, half, 3000, 20);
    // A path along the grid keeps off by at most a step more than it must.
    expect(tried).toBeLessThanOrEqual(found + 1);
    expect(tried).toBeGreaterThan(found - 40);
  });
});

describe('the shortest way between two outlines', () => {
  const square = block(0, 10, 0, 10).outline;

  it('goes from side to side, from corner to side or from corner to corner', () => {
    expect(nearestBetween(square, block(14, 20, 2, 8).outline).distanceMm).toBe(4);
    expect(nearestBetween(square, block(13, 20, 14, 20).outline)).toEqual({
      from: [10, 10],
      to: [13, 14],
      distanceMm: 5,
    });
    const tip: PlanOutline = [
      [5, 12],
      [9, 30],
      [1, 30],
    ];
    expect(nearestBetween(square, tip)).toEqual({ from: [5, 10], to: [5, 12], distanceMm: 2 });
    expect(nearestBetween(tip, square)).toEqual({ from: [5, 12], to: [5, 10], distanceMm: 2 });
  });
});
