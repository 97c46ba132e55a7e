import type { Vec3 } from '../parts/part.ts';
import { union, type Interval } from './intervals.ts';
import type { ConvexSolid } from './view-solid.ts';

/** A solid hides only what lies deeper than this behind or inside its faces: what touches a face is seen. */
export const TOUCHING_MM = 0.01;
/** Stretches shorter than this are nothing that could be drawn. */
export const SHORTEST_MM = 0.1;

/** Corners of a convex figure, along and toward by turns. Each side adds one at most to the four it starts from. */
const MOST_CORNERS = 512;
let figure = new Float64Array(2 * MOST_CORNERS);
let clipped = new Float64Array(2 * MOST_CORNERS);

/**
 * Keeps the part of the figure of `count` corners where `a · along + b · toward` is at most `limit`. The two buffers
 * take turns: hundreds of thousands of figures are clipped for a drawing, and none is kept.
 */
function clip(count: number, a: number, b: number, limit: number): number {
  let outside = 0;
  for (let i = 0; i < count; i += 1)
    if (a * figure[2 * i]! + b * figure[2 * i + 1]! - limit > 0) outside += 1;
  if (outside === 0) return count;
  if (outside === count) return 0;
  let kept = 0;
  for (let i = 0; i < count; i += 1) {
    const next = i + 1 === count ? 0 : i + 1;
    const x0 = figure[2 * i]!;
    const y0 = figure[2 * i + 1]!;
    const x1 = figure[2 * next]!;
    const y1 = figure[2 * next + 1]!;
    const over0 = a * x0 + b * y0 - limit;
    const over1 = a * x1 + b * y1 - limit;
    if (over0 <= 0) {
      clipped[2 * kept] = x0;
      clipped[2 * kept + 1] = y0;
      kept += 1;
    }
    if (over0 > 0 !== over1 > 0) {
      const t = over0 / (over0 - over1);
      clipped[2 * kept] = x0 + (x1 - x0) * t;
      clipped[2 * kept + 1] = y0 + (y1 - y0) * t;
      kept += 1;
    }
  }
  const emptied = figure;
  figure = clipped;
  clipped = emptied;
  return kept;
}

function hiddenBy(solid: ConvexSolid, from: Vec3, direction: Vec3, length: number): Interval | undefined {
  const reach = solid.max[2] - Math.min(from[2], from[2] + direction[2] * length) + 1;
  if (reach <= 1) return undefined;
  if (solid.sides.length + 4 > MOST_CORNERS) throw new Error('A solid has too many sides to be drawn.');
  // Points of the edge by how far along it, and from each a line toward the eye by how far along that.
  figure.fill(0, 0, 8);
  figure[2] = figure[4] = length;
  figure[5] = figure[7] = reach;
  let count = 4;
  for (const { normal, limit } of solid.sides) {
    const along = normal[0] * direction[0] + normal[1] * direction[1] + normal[2] * direction[2];
    const start = normal[0] * from[0] + normal[1] * from[1] + normal[2] * from[2];
    count = clip(count, along, normal[2], limit - TOUCHING_MM - start);
    if (count < 2) return undefined;
  }
  let low = Infinity;
  let high = -Infinity;
  for (let i = 0; i < count; i += 1) {
    low = Math.min(low, figure[2 * i]!);
    high = Math.max(high, figure[2 * i]!);
  }
  return [low, high];
}

/**
 * Where an edge cannot be seen: exact for solids with flat sides.
 *
 * @param from - one end in the frame of a view: right, down, toward the eye; millimetres
 * @param to - the other end
 * @param solids - everything that may stand before it, the edge's own solid too; read until one hides all of it
 * @returns stretches along the edge from `from`, millimetres in space, rising
 */
export function hiddenStretches(from: Vec3, to: Vec3, solids: Iterable<ConvexSolid>): Interval[] {
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
