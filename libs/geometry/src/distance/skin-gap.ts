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
      const triangle = hull([0, 1, 2].map((i) => corner(mesh, mesh.indices[t + i]!)));
      const limit = best ? Math.max(0, best.distanceMm) : atMostMm;
      if (boundsGap(triangle, solid) > limit) continue;
      const gap = gapBetween(triangle, solid, limit);
      if (gap && (!best || gap.distanceMm < best.distanceMm)) best = gap;
    }
  }
  return best;
}
