import { add } from '../mannequin/vector.ts';
import type { Vec3 } from '../parts/part.ts';
import type { PagePoint } from './drawing.ts';
import type { ViewSolid } from './view-solid.ts';

/** A corner of the outline, and how far along the axis (0 to 1) the plane meets the line that starts there. */
type Met = readonly [corner: Vec3, along: number];

/** Keeps the corners with `sign · along <= limit`; sides that leave are cut where they do. */
function clip(ring: readonly Met[], sign: 1 | -1, limit: number): Met[] {
  const kept: Met[] = [];
  ring.forEach((from, i) => {
    const to = ring[(i + 1) % ring.length]!;
    const [over0, over1] = [sign * from[1] - limit, sign * to[1] - limit];
    if (over0 <= 0) kept.push(from);
    if (over0 > 0 !== over1 > 0) {
      const t = over0 / (over0 - over1);
      const at = ([0, 1, 2] as const).map((n) => from[0][n] + (to[0][n] - from[0][n]) * t);
      kept.push([[at[0]!, at[1]!, at[2]!], from[1] + (to[1] - from[1]) * t]);
    }
  });
  return kept;
}

/** The plane runs along the axis: it meets the outline in pairs of points, hollow or not. */
function alongAxis({ base, axis }: ViewSolid, depth: number): PagePoint[][] {
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
export function cutFaces(solid: ViewSolid, depth: number): PagePoint[][] {
  const near = (d: Vec3) => d[2] + Math.max(0, solid.axis[2]);
  const far = (d: Vec3) => d[2] + Math.min(0, solid.axis[2]);
  if (!solid.base.some((c) => near(c) > depth) || !solid.base.some((c) => far(c) < depth)) return [];
  if (Math.abs(solid.axis[2]) < 1e-9) return alongAxis(solid, depth);
  const met = solid.base.map((corner): Met => [corner, (depth - corner[2]) / solid.axis[2]]);
  const face = clip(clip(met, 1, 1), -1, 0);
  if (face.length < 3) return [];
  return [face.map(([[x, y], t]): PagePoint => [x + solid.axis[0] * t, y + solid.axis[1] * t])];
}
