import type { Point2 } from './outline.ts';

/**
 * The part of an outline on one side of a line along an axis. A convex outline stays one; of another the parts may hang
 * together along the line.
 *
 * @param outline - corners in turn, millimetres; two of them for a line
 * @param axis - 0 for a limit of the first number, 1 for one of the second
 * @param limit - where the line lies, millimetres; infinite cuts nothing off
 * @param side - 1 keeps what lies beyond the limit, -1 what lies before it
 * @returns corners in the same turn, those on the line once; empty where nothing is left
 */
export function halfOutline(outline: readonly Point2[], axis: 0 | 1, limit: number, side: 1 | -1): Point2[] {
  const kept: Point2[] = [];
  outline.forEach((point, n) => {
    const next = outline[(n + 1) % outline.length] ?? point;
    const here = side * (point[axis] - limit);
    const there = side * (next[axis] - limit);
    if (here >= 0) kept.push(point);
    if (here * there >= 0) return;
    const t = here / (here - there);
    kept.push([point[0] + (next[0] - point[0]) * t, point[1] + (next[1] - point[1]) * t]);
  });
  return kept;
}
