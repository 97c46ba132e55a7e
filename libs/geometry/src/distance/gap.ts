import { along } from '../mannequin/vector.ts';
import type { Vec3 } from '../parts/part.ts';
import { coreDistance } from './core-distance.ts';
import { depthOf } from './depth.ts';
import { boundsGap, type Shape } from './shape.ts';

/** How near two solids come to each other, and where. */
export interface Gap {
  /** Below 0 where they reach into each other: the shortest way that would part them. */
  distanceMm: number;
  /** Nearest point of the one, or its deepest in the other; room frame. */
  fromMm: Vec3;
  /** The same of the other. */
  toMm: Vec3;
  /** Unit vector from the one to the other; where they meet, the way the other would have to go. */
  direction: Vec3;
}

/**
 * Exact distance of two convex solids.
 *
 * @param one - a solid
 * @param other - another solid
 * @param atMostMm - larger distances are of no matter; below 0 only overlaps deeper than that are
 * @returns the gap within 0.01 mm, overlaps within 0.1 mm (0.5 mm deep inside of round solids); `undefined` beyond the
 * limit
 */
export function gapBetween(one: Shape, other: Shape, atMostMm = Infinity): Gap | undefined {
  const apart = gapApart(one, other, atMostMm);
  if (apart !== MEET) return apart;
  const { depthMm, direction, from, to } = depthOf(one, other);
  return -depthMm > atMostMm ? undefined : { distanceMm: -depthMm, fromMm: from, toMm: to, direction };
}

/** Solids that reach into each other; how deep was not asked. */
export const MEET = 'meet';

/**
 * The same where it is enough to know of solids whose cores meet that they do.
 *
 * @param one - a solid
 * @param other - another solid
 * @param atMostMm - larger distances are of no matter
 */
export function gapApart(one: Shape, other: Shape, atMostMm: number): Gap | typeof MEET | undefined {
  // A limit below 0 asks for overlaps alone: boxes and cores that meet say nothing of how deep.
  if (boundsGap(one, other) > Math.max(0, atMostMm)) return undefined;
  const margins = one.marginMm + other.marginMm;
  const cores = coreDistance(one, other, Math.max(0, atMostMm + margins));
  if (!cores) return undefined;
  const { distanceMm, from, to } = cores;
  if (distanceMm === 0) return MEET;
  if (distanceMm - margins > atMostMm) return undefined;
  const direction: Vec3 = [
    (to[0] - from[0]) / distanceMm,
    (to[1] - from[1]) / distanceMm,
    (to[2] - from[2]) / distanceMm,
  ];
  return {
    distanceMm: distanceMm - margins,
    fromMm: along(from, direction, one.marginMm),
    toMm: along(to, direction, -other.marginMm),
    direction,
  };
}
