import type { Vec3 } from '../parts/part.ts';
import { union, type Interval } from './intervals.ts';
import type { ConvexSolid } from './view-solid.ts';

/** A solid hides only what lies deeper than this behind or inside its faces: what touches a face is seen. */
export const TOUCHING_MM = 0.01;
/** Stretches shorter than this are nothing that could be drawn. */
export const SHORTEST_MM = 0.1;

type Corner = readonly [along: number, toward: number];

/** Keeps the part of a convex figure where `a · along + b · toward` is at most `limit`. */
function clip(figure: readonly Corner[], a: number, b: number, limit: number): Corner[] {
  const kept: Corner[] = [];
  figure.forEach((from, i) => {
    const to = figure[(i + 1) % figure.length]!;
    const [over0, over1] = [a * from[0] + b * from[1] - limit, a * to[0] + b * to[1] - limit];
    if (over0 <= 0) kept.push(from);
    if (over0 > 0 !== over1 > 0) {
      const t = over0 / (over0 - over1);
      kept.push([from[0] + (to[0] - from[0]) * t, from[1] + (to[1] - from[1]) * t]);
    }
  });
  return kept;
}

function hiddenBy(solid: ConvexSolid, from: Vec3, direction: Vec3, length: number): Interval | undefined {
  const reach = solid.max[2] - Math.min(from[2], from[2] + direction[2] * length) + 1;
  if (reach <= 1) return undefined;
  // Points of the edge by how far along it, and from each a line toward the eye by how far along that.
  let figure: Corner[] = [
    [0, 0],
    [length, 0],
    [length, reach],
    [0, reach],
  ];
  for (const { normal, limit } of solid.sides) {
    const along = normal[0] * direction[0] + normal[1] * direction[1] + normal[2] * direction[2];
    const start = normal[0] * from[0] + normal[1] * from[1] + normal[2] * from[2];
    figure = clip(figure, along, normal[2], limit - TOUCHING_MM - start);
    if (figure.length < 2) return undefined;
  }
  const places = figure.map(([place]) => place);
  return [Math.min(...places), Math.max(...places)];
}

/**
 * Where an edge cannot be seen: exact for solids with flat sides.
 *
 * @param from - one end in the frame of a view: right, down, toward the eye; millimetres
 * @param to - the other end
 * @param solids - everything that may stand before it, the edge's own solid too
 * @returns stretches along the edge from `from`, millimetres in space, rising
 */
export function hiddenStretches(from: Vec3, to: Vec3, solids: readonly ConvexSolid[]): Interval[] {
  const way: Vec3 = [to[0] - from[0], to[1] - from[1], to[2] - from[2]];
  const length = Math.hypot(...way);
  if (length < SHORTEST_MM) return [];
  const direction: Vec3 = [way[0] / length, way[1] / length, way[2] / length];
  const found: Interval[] = [];
  for (const solid of solids) {
    const hidden = hiddenBy(solid, from, direction, length);
    if (!hidden) continue;
    // Nothing is left to hide: what one solid covers whole needs no other.
    if (hidden[0] <= 0 && hidden[1] >= length) return [hidden];
    found.push(hidden);
  }
  return union(found, SHORTEST_MM);
}
