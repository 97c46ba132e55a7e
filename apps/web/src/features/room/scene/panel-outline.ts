import { halfOutline } from '@settlewright/geometry';

/** Across and down from the middle of the cushion, mm. */
export type Point = readonly [number, number];

/** A sharp corner runs in no further than this many times the width of the edge. */
const LONGEST_MITRE = 2;

export const between = (a: Point, b: Point, t: number): Point => [
  a[0] + (b[0] - a[0]) * t,
  a[1] + (b[1] - a[1]) * t,
];

/** Corners of an outline moved inwards, in the same order; the outline runs clockwise as one looks at it. */
export function inset(outline: readonly Point[], mm: number): Point[] {
  const normals = outline.map(([u, v], n): Point => {
    const [u2, v2] = outline[(n + 1) % outline.length]!;
    const length = Math.hypot(u2 - u, v2 - v) || 1;
    return [-(v2 - v) / length, (u2 - u) / length];
  });
  return outline.map(([u, v], n) => {
    const [before, after] = [normals.at(n - 1)!, normals[n]!];
    const share = 1 / Math.max(0.5, 1 + before[0] * after[0] + before[1] * after[1]);
    const [mu, mv] = [(before[0] + after[0]) * share, (before[1] + after[1]) * share];
    const long = Math.max(1, Math.hypot(mu, mv) / LONGEST_MITRE);
    return [u + (mu * mm) / long, v + (mv * mm) / long];
  });
}

/** Whether each side of an outline still runs its way after it was moved in. */
export const holds = (outline: readonly Point[], inner: readonly Point[]): boolean =>
  outline.every(([u, v], n) => {
    const next = (n + 1) % outline.length;
    const [u2, v2] = outline[next]!;
    const [iu, iv] = inner[n]!;
    const [iu2, iv2] = inner[next]!;
    return (u2 - u) * (iu2 - iu) + (v2 - v) * (iv2 - iv) > 0;
  });

/** How far a point lies from the nearest side of an outline, mm. */
export function withinMm(outline: readonly Point[], u: number, v: number): number {
  let nearest = Infinity;
  for (let n = 0; n < outline.length; n++) {
    const [a, b] = [outline[n]!, outline[(n + 1) % outline.length]!];
    const [du, dv] = [b[0] - a[0], b[1] - a[1]];
    const square = du * du + dv * dv;
    const along = square > 0 ? ((u - a[0]) * du + (v - a[1]) * dv) / square : 0;
    const t = Math.min(1, Math.max(0, along));
    nearest = Math.min(nearest, Math.hypot(u - a[0] - du * t, v - a[1] - dv * t));
  }
  return nearest;
}

/** Lines of the squares that cross a stretch. */
function linesWithin(low: number, high: number, step: number): number[] {
  const first = Math.floor(low / step) + 1;
  return Array.from({ length: Math.max(0, Math.ceil(high / step) - first) }, (_, n) => (first + n) * step);
}

/** An outline in strips along one axis. */
export function strips(outline: readonly Point[], axis: 0 | 1, step: number): Point[][] {
  const values = outline.map((point) => point[axis]);
  const lines = linesWithin(Math.min(...values), Math.max(...values), step);
  const pieces: Point[][] = [];
  let rest: Point[] = [...outline];
  for (const at of lines) {
    pieces.push(halfOutline(rest, axis, at, -1));
    rest = halfOutline(rest, axis, at, 1);
  }
  return [...pieces, rest].filter(({ length }) => length > 2);
}

/** Where the lines of the squares cross a side, from 0 at its start to 1, with its start. */
export function crossings(a: Point, b: Point, step: number): number[] {
  const shares = ([0, 1] as const).flatMap((axis) => {
    const [from, to] = [a[axis], b[axis]];
    return linesWithin(Math.min(from, to), Math.max(from, to), step).map((at) => (at - from) / (to - from));
  });
  return [0, ...shares.filter((t) => t > 1e-6 && t < 1 - 1e-6).sort((x, y) => x - y)];
}
