import { add } from '../mannequin/vector.ts';
import type { Vec3 } from '../parts/part.ts';
import type { ViewSolid } from './view-solid.ts';

/** A straight edge in the frame of a view. */
export type ViewEdge = readonly [Vec3, Vec3];

const END_ON_MM = 1e-6;

/**
 * The edges of a solid that a view may draw: its corners' edges, and where a smooth side turns away from the eye.
 *
 * @param solid - in the frame of the view; of a round part seen along its axis none, its circles say all
 * @returns edges in no order, those seen end-on left out
 */
export function viewEdges({ base, axis, smooth, circles }: ViewSolid): ViewEdge[] {
  if (circles.length > 0) return [];
  const n = base.length;
  // A side shows itself when its normal leans toward the eye; which way round the outline runs does not matter.
  const shows = base.map((a, i) => {
    const b = base[(i + 1) % n]!;
    return (b[0] - a[0]) * axis[1] - (b[1] - a[1]) * axis[0] > 0;
  });
  const edges: ViewEdge[] = [];
  for (let i = 0; i < n; i += 1) {
    const [a, b] = [base[i]!, base[(i + 1) % n]!];
    edges.push([a, b], [add(a, axis), add(b, axis)]);
    if (!smooth[i] || shows[i] !== shows[(i + n - 1) % n]) edges.push([a, add(a, axis)]);
  }
  return edges.filter(([a, b]) => Math.hypot(b[0] - a[0], b[1] - a[1]) > END_ON_MM);
}

/**
 * What is left of an edge when a section takes away all that stands before it.
 *
 * @param edge - in the frame of the view
 * @param depth - of the plane, toward the eye; infinite for no section
 * @returns nothing when all of it is taken
 */
export function behindSection([a, b]: ViewEdge, depth: number): ViewEdge | undefined {
  if (a[2] <= depth && b[2] <= depth) return [a, b];
  if (a[2] >= depth && b[2] >= depth) return undefined;
  const t = (depth - a[2]) / (b[2] - a[2]);
  const at: Vec3 = [a[0] + (b[0] - a[0]) * t, a[1] + (b[1] - a[1]) * t, depth];
  return a[2] < depth ? [a, at] : [at, b];
}
