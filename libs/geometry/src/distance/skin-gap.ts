import type { MannequinMesh } from '../mannequin/mesh.ts';
import type { Vec3 } from '../parts/part.ts';
import { gapBetween, type Gap } from './gap.ts';
import { boundsAround, boundsGap, hull, type Bounds, type Shape } from './shape.ts';

/** Triangles that are looked at together. */
const RUN = 32;

interface Run extends Bounds {
  from: number;
  to: number;
}

const runs = new WeakMap<object, Run[]>();

const corner = ({ positions }: Pick<MannequinMesh, 'positions'>, v: number): Vec3 => [
  positions[v * 3]!,
  positions[v * 3 + 1]!,
  positions[v * 3 + 2]!,
];

/** Neighbouring triangles stand next to each other in a mesh: stretches of them have small bounds. */
function runsOf(mesh: Pick<MannequinMesh, 'positions' | 'indices'>): Run[] {
  const known = runs.get(mesh);
  if (known) return known;
  const made: Run[] = [];
  for (let from = 0; from < mesh.indices.length; from += 3 * RUN) {
    const to = Math.min(mesh.indices.length, from + 3 * RUN);
    const points = [...mesh.indices.subarray(from, to)].map((v) => {
      const at = corner(mesh, v);
      return { minMm: at, maxMm: at };
    });
    made.push({ ...boundsAround(points), from, to });
  }
  runs.set(mesh, made);
  return made;
}

const triangleAt = (mesh: Pick<MannequinMesh, 'positions' | 'indices'>, t: number): Shape =>
  hull([0, 1, 2].map((i) => corner(mesh, mesh.indices[t + i]!)));

/**
 * Exact distance of a body's skin from a convex solid, on the triangles of its mesh.
 *
 * @param mesh - a near mesh, room frame; must not be changed afterwards
 * @param solid - a part, a stretch of a neighbour
 * @param atMostMm - larger distances are of no matter
 * @returns the gap; below 0 how far the deepest triangle would have to move out of the solid; `undefined` beyond the
 * limit
 */
export function skinGap(
  mesh: Pick<MannequinMesh, 'positions' | 'indices'>,
  solid: Shape,
  atMostMm = Infinity,
): Gap | undefined {
  const near = runsOf(mesh)
    .map((run) => ({ run, atLeast: boundsGap(run, solid) }))
    .filter(({ atLeast }) => atLeast <= atMostMm)
    .sort((a, b) => a.atLeast - b.atLeast);
  let best: Gap | undefined;
  for (const { run, atLeast } of near) {
    if (best && atLeast > Math.max(0, best.distanceMm)) break;
    for (let t = run.from; t < run.to; t += 3) {
      const triangle = triangleAt(mesh, t);
      const limit = best ? Math.max(0, best.distanceMm) : atMostMm;
      if (boundsGap(triangle, solid) > limit) continue;
      const gap = gapBetween(triangle, solid, limit);
      if (gap && (!best || gap.distanceMm < best.distanceMm)) best = gap;
    }
  }
  return best;
}

/**
 * Exact distance of two bodies' skins that do not meet, on the triangles of their meshes.
 *
 * @param one - a near mesh, room frame; must not be changed afterwards
 * @param other - another one
 * @param atMostMm - larger distances are of no matter
 * @returns the gap; `undefined` beyond the limit, and where the skins meet: triangles do not say how deep
 */
export function skinsGap(
  one: Pick<MannequinMesh, 'positions' | 'indices'>,
  other: Pick<MannequinMesh, 'positions' | 'indices'>,
  atMostMm: number,
): Gap | undefined {
  const theirs = runsOf(other);
  const near = runsOf(one)
    .flatMap((run) => theirs.map((their) => ({ run, their, atLeast: boundsGap(run, their) })))
    .filter(({ atLeast }) => atLeast <= atMostMm)
    .sort((a, b) => a.atLeast - b.atLeast);
  let best: Gap | undefined;
  let limit = atMostMm;
  for (const { run, their, atLeast } of near) {
    if (atLeast > limit) break;
    const facing: Shape[] = [];
    for (let t = their.from; t < their.to; t += 3) {
      const triangle = triangleAt(other, t);
      if (boundsGap(run, triangle) <= limit) facing.push(triangle);
    }
    if (facing.length === 0) continue;
    for (let t = run.from; t < run.to; t += 3) {
      const triangle = triangleAt(one, t);
      for (const their of facing) {
        const gap = gapBetween(triangle, their, limit);
        if (!gap || gap.distanceMm >= limit) continue;
        if (gap.distanceMm <= 0) return undefined;
        best = gap;
        limit = gap.distanceMm;
      }
    }
  }
  return best;
}
