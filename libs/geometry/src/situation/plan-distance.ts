import type { PlanOutline, PlanPoint } from './plan.ts';

/** Where two outlines come nearest to each other. */
export interface Nearest {
  from: PlanPoint;
  to: PlanPoint;
  distanceMm: number;
}

/**
 * The shortest way between two convex outlines that do not overlap, by corners against sides.
 *
 * @param one - convex, at least one point
 * @param other - convex, in the same two axes
 * @returns a point of each and the distance between them, millimetres; of outlines that cross, corners against sides
 */
export function nearestBetween(one: PlanOutline, other: PlanOutline): Nearest {
  const there = fromCorners(one, other);
  const back = fromCorners(other, one);
  return there.distanceMm <= back.distanceMm
    ? there
    : { from: back.to, to: back.from, distanceMm: back.distanceMm };
}

function fromCorners(corners: PlanOutline, outline: PlanOutline): Nearest {
  let nearest: Nearest = { from: [0, 0], to: [0, 0], distanceMm: Infinity };
  for (const from of corners) {
    outline.forEach((start, i) => {
      const to = nearestOnSide(from, start, outline[(i + 1) % outline.length] ?? start);
      const distanceMm = Math.hypot(to[0] - from[0], to[1] - from[1]);
      if (distanceMm < nearest.distanceMm) nearest = { from, to, distanceMm };
    });
  }
  return nearest;
}

/**
 * The point of a side that lies nearest to a point.
 *
 * @param point - any point
 * @param start - one end of the side
 * @param end - its other end; may be the same
 * @returns a point of the side
 */
export function nearestOnSide(point: PlanPoint, start: PlanPoint, end: PlanPoint): PlanPoint {
  const [dx, dz] = [end[0] - start[0], end[1] - start[1]];
  const length2 = dx * dx + dz * dz;
  const along = length2 === 0 ? 0 : ((point[0] - start[0]) * dx + (point[1] - start[1]) * dz) / length2;
  const t = Math.min(1, Math.max(0, along));
  return [start[0] + t * dx, start[1] + t * dz];
}
