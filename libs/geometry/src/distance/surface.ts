import { add, along, cross, dot, scale, turnAbout, unit } from '../mannequin/vector.ts';
import type { Vec3 } from '../parts/part.ts';
import { depthOf } from './depth.ts';
import { gapApart, gapBetween, MEET, type Gap } from './gap.ts';
import { boundsGap, moved, type Bounds, type Shape } from './shape.ts';

/** Shapes that lie close together and are looked at together. */
export interface Run extends Bounds {
  shapes: () => readonly Shape[];
}

/** What distances are measured to: one solid, the pieces of a hollow one, or the triangles of a stretch of skin. */
export interface Surface extends Bounds {
  runs: readonly Run[];
  /** The convex solid around all of it. */
  around: () => Shape;
  /** It is that solid. */
  convex: boolean;
}

/**
 * A convex solid as a surface of one shape.
 *
 * @param shape - the solid
 */
export const solidSurface = (shape: Shape): Surface => {
  const { minMm, maxMm } = shape;
  return { minMm, maxMm, runs: [{ minMm, maxMm, shapes: () => [shape] }], around: () => shape, convex: true };
};

const STILL: Vec3 = [0, 0, 0];
const boundsMoved = ({ minMm, maxMm }: Bounds, by: Vec3): Bounds => ({
  minMm: add(minMm, by),
  maxMm: add(maxMm, by),
});

/** Nearest of two surfaces, the other one moved; `MEET` where they do. */
function nearest(one: Surface, other: Surface, atMostMm: number, by = STILL): Gap | typeof MEET | undefined {
  const still = by === STILL;
  const whole = still ? other : boundsMoved(other, by);
  const ours = one.runs.filter((run) => boundsGap(run, whole) <= atMostMm);
  const theirs = other.runs
    .map((run) => ({ run, bounds: still ? run : boundsMoved(run, by) }))
    .filter(({ bounds }) => boundsGap(one, bounds) <= atMostMm);
  const pairs = ours
    .flatMap((run) => theirs.map((their) => ({ run, their, atLeast: boundsGap(run, their.bounds) })))
    .filter(({ atLeast }) => atLeast <= atMostMm)
    .sort((a, b) => a.atLeast - b.atLeast);
  let best: Gap | undefined;
  let limit = atMostMm;
  for (const { run, their, atLeast } of pairs) {
    if (atLeast > limit) break;
    const facing = their.run
      .shapes()
      .map((shape) => (still ? shape : moved(shape, by)))
      .filter((shape) => boundsGap(run, shape) <= limit);
    for (const shape of run.shapes()) {
      if (boundsGap(shape, their.bounds) > limit) continue;
      for (const faced of facing) {
        const gap = gapApart(shape, faced, limit);
        if (gap === undefined) continue;
        if (gap === MEET || gap.distanceMm <= 0) return MEET;
        if (gap.distanceMm < limit) [best, limit] = [gap, gap.distanceMm];
      }
    }
  }
  return best;
}

/** Parted by so little, two surfaces touch. */
const TOUCH_MM = 0.02;
const MOST_STEPS = 60;
const MOST_WAYS = 4;

/** How far the other goes along a unit vector until it is clear for good: from where it surely is, back to where it touches. */
function clearAfter(one: Surface, other: Surface, way: Vec3): Gap {
  const reach = new Float64Array(3);
  const furthest = (shape: Shape, d: Vec3): number => {
    shape.support(d[0], d[1], d[2], reach);
    return reach[0]! * d[0] + reach[1]! * d[1] + reach[2]! * d[2] + shape.marginMm;
  };
  let shift = furthest(one.around(), way) + furthest(other.around(), scale(way, -1)) + TOUCH_MM;
  let touching: Gap | undefined;
  for (let step = 0; step < MOST_STEPS && shift > 0; step++) {
    const gap = nearest(one, other, shift, scale(way, shift));
    if (gap === undefined) return { distanceMm: 0, fromMm: STILL, toMm: STILL, direction: way };
    if (gap === MEET) break;
    touching = gap;
    if (gap.distanceMm < TOUCH_MM) break;
    shift -= gap.distanceMm;
  }
  const { fromMm, toMm, direction } = touching ?? { fromMm: STILL, toMm: STILL, direction: way };
  return { distanceMm: -shift, fromMm, toMm: add(toMm, scale(way, -shift)), direction };
}

/** A gain smaller than this is not worth another way. */
const WORTH_MM = 1;
/** Ways about the best one so far: by how much they lean off it, and how many there are around. */
const LEANS = [0.45, 0.2];
const WAYS_AROUND = 6;

/** How deep two surfaces that meet reach into each other: the shortest way found that parts them. */
function depthBetween(one: Surface, other: Surface): Gap {
  let way = depthOf(one.around(), other.around()).direction;
  let best = clearAfter(one, other, way);
  let touching = best.direction;
  const take = (towards: Vec3): boolean => {
    const less = -best.distanceMm - WORTH_MM;
    if (less <= 0 || nearest(one, other, 0, scale(towards, less)) === MEET) return false;
    const parted = clearAfter(one, other, towards);
    if (parted.distanceMm <= best.distanceMm) return false;
    [best, way, touching] = [parted, towards, parted.direction];
    return true;
  };
  // Where they touch last they face another way: going along that may be shorter.
  for (let n = 0; n < MOST_WAYS && dot(touching, way) < 0.9999 && take(touching); n++);
  for (const lean of LEANS) {
    const aside = unit(cross(way, Math.abs(way[1]) < 0.9 ? [0, 1, 0] : [0, 0, 1]));
    for (let n = 0; n < WAYS_AROUND; n++) {
      take(unit(along(way, turnAbout(aside, way, (2 * Math.PI * n) / WAYS_AROUND), lean)));
    }
  }
  return { ...best, direction: way };
}

/**
 * Distance of two surfaces.
 *
 * @param one - a surface
 * @param other - another surface
 * @param atMostMm - larger distances are of no matter
 * @returns the gap, exact within 0.05 mm; below 0 how far one of them would have to go, the shortest way found, to part
 * them; `undefined` beyond the limit
 * @source conservative advancement, B. Mirtich 1996, run backwards from where the surfaces are apart
 */
export function surfaceGap(one: Surface, other: Surface, atMostMm = Infinity): Gap | undefined {
  if (one.convex && other.convex) return gapBetween(one.around(), other.around(), atMostMm);
  if (boundsGap(one, other) > Math.max(0, atMostMm)) return undefined;
  const gap = nearest(one, other, Math.max(0, atMostMm));
  return gap === MEET ? depthBetween(one, other) : gap;
}
