import { add, dot, length, sub } from '../mannequin/vector.ts';
import type { Vec3 } from '../parts/part.ts';
import type { PagePoint } from './drawing.ts';
import type { ViewSolid } from './view-solid.ts';

/** An outline drawn out along an axis. */
type Drawn = Pick<ViewSolid, 'base' | 'axis'>;

/** A corner of the outline, and how far along the axis (0 to 1) the plane meets the line that starts there. */
type Met = readonly [corner: Vec3, along: number];

/** A stretch of an outline that is kept: it begins where the outline comes in and ends where it leaves. */
type Run = Met[];

function crossing(from: Met, to: Met, over0: number, over1: number): Met {
  const t = over0 / (over0 - over1);
  const at = (n: 0 | 1 | 2): number => from[0][n] + (to[0][n] - from[0][n]) * t;
  return [[at(0), at(1), at(2)], from[1] + (to[1] - from[1]) * t];
}

/** The stretches of an outline with `sign · along <= limit`, both ends on the limit. */
function runsOf(ring: readonly Met[], over: readonly number[]): Run[] {
  const n = ring.length;
  const runs: Run[] = [];
  const enters = ring.findIndex((_, i) => over[i]! > 0 && over[(i + 1) % n]! <= 0);
  for (let k = 0; k < n; k += 1) {
    const [i, j] = [(enters + k) % n, (enters + k + 1) % n];
    const [over0, over1] = [over[i]!, over[j]!];
    if (over0 > 0 && over1 <= 0) runs.push([crossing(ring[i]!, ring[j]!, over0, over1)]);
    const run = runs.at(-1)!;
    if (over1 <= 0) run.push(ring[j]!);
    else if (over0 <= 0) run.push(crossing(ring[i]!, ring[j]!, over0, over1));
  }
  return runs;
}

/**
 * Keeps what of an outline has `sign · along <= limit`: one outline, several where a hollow one is cut apart. Where it is
 * cut, places come in pairs along the limit with the outline's inside between them.
 */
function clip(ring: readonly Met[], sign: 1 | -1, limit: number): Met[][] {
  const over = ring.map(([, along]) => sign * along - limit);
  if (over.every((by) => by <= 0)) return [[...ring]];
  if (over.every((by) => by > 0)) return [];
  const runs = runsOf(ring, over);
  const [first] = runs;
  if (!first || runs.length === 1) return runs;
  const origin = first[0]![0];
  const ends = runs.flatMap((run, n) => [
    { run: n, at: sub(run[0]![0], origin) },
    { run: n, at: sub(run.at(-1)![0], origin) },
  ]);
  const furthest = ends.reduce((a, b) => (length(b.at) > length(a.at) ? b : a)).at;
  // Ends of a run are numbered 2n and 2n + 1; sorted along the limit, an end belongs with the one it is paired with.
  const order = ends.map((_, e) => e).sort((a, b) => dot(ends[a]!.at, furthest) - dot(ends[b]!.at, furthest));
  const partner = new Map(order.map((e, k) => [e, order[k ^ 1]!]));
  const rings: Met[][] = [];
  const left = new Set(runs.keys());
  for (const start of left) {
    const joined: Met[] = [];
    for (let n = start; left.delete(n); n = ends[partner.get(2 * n + 1)!]!.run) joined.push(...runs[n]!);
    rings.push(joined);
  }
  return rings;
}

/** The plane runs along the axis: it meets the outline in pairs of points, hollow or not. */
function alongAxis({ base, axis }: Drawn, depth: number): PagePoint[][] {
  const met: Vec3[] = [];
  base.forEach((a, i) => {
    const b = base[(i + 1) % base.length]!;
    if (a[2] > depth === b[2] > depth) return;
    const t = (depth - a[2]) / (b[2] - a[2]);
    met.push([a[0] + (b[0] - a[0]) * t, a[1] + (b[1] - a[1]) * t, depth]);
  });
  // They lie on one line across the axis. By x and y they would not come in its order where rounding alone parts the x.
  const across = ([x, y]: Vec3): number => axis[0] * y - axis[1] * x;
  met.sort((a, b) => across(a) - across(b));
  const faces: PagePoint[][] = [];
  for (let i = 0; i + 1 < met.length; i += 2) {
    const [p, q] = [met[i]!, met[i + 1]!];
    const [r, s] = [add(q, axis), add(p, axis)];
    faces.push([p, q, r, s].map(([x, y]): PagePoint => [x, y]));
  }
  return faces;
}

/**
 * The faces a section cuts through a solid.
 *
 * @param solid - in the frame of the view
 * @param depth - of the plane, toward the eye, millimetres
 * @returns outlines on the page; none where the plane misses the solid or only touches it
 */
export function cutFaces(solid: Drawn, depth: number): PagePoint[][] {
  const near = (d: Vec3) => d[2] + Math.max(0, solid.axis[2]);
  const far = (d: Vec3) => d[2] + Math.min(0, solid.axis[2]);
  if (!solid.base.some((c) => near(c) > depth) || !solid.base.some((c) => far(c) < depth)) return [];
  if (Math.abs(solid.axis[2]) < 1e-9) return alongAxis(solid, depth);
  const met = solid.base.map((corner): Met => [corner, (depth - corner[2]) / solid.axis[2]]);
  return clip(met, 1, 1)
    .flatMap((ring) => clip(ring, -1, 0))
    .filter((face) => face.length >= 3)
    .map((face) => face.map(([[x, y], t]): PagePoint => [x + solid.axis[0] * t, y + solid.axis[1] * t]));
}
