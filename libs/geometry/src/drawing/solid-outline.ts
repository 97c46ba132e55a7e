import type { Part, Solid, Vec3 } from '../parts/part.ts';
import type { PagePoint } from './drawing.ts';

const CIRCLE_SIDES = 24;

function ownCorners(solid: Solid): { corners: Vec3[]; edges: [number, number][] } {
  const loops = (bottom: Vec3[], top: Vec3[]) => {
    const n = bottom.length;
    const edges: [number, number][] = [];
    for (let i = 0; i < n; i += 1) edges.push([i, (i + 1) % n], [n + i, n + ((i + 1) % n)], [i, n + i]);
    return { corners: [...bottom, ...top], edges };
  };
  if (solid.shape === 'box') {
    const [w, h, d] = solid.sizeMm;
    const ring = (y: number): Vec3[] => [
      [-w / 2, y, -d / 2],
      [w / 2, y, -d / 2],
      [w / 2, y, d / 2],
      [-w / 2, y, d / 2],
    ];
    return loops(ring(-h / 2), ring(h / 2));
  }
  if (solid.shape === 'cylinder') {
    const ring = (y: number): Vec3[] =>
      Array.from({ length: CIRCLE_SIDES }, (_, i): Vec3 => {
        const angle = (2 * Math.PI * i) / CIRCLE_SIDES;
        return [solid.radiusMm * Math.cos(angle), y, solid.radiusMm * Math.sin(angle)];
      });
    return loops(ring(-solid.heightMm / 2), ring(solid.heightMm / 2));
  }
  const ring = (z: number): Vec3[] => solid.outlineMm.map(([x, y]): Vec3 => [x, y, z]);
  return loops(ring(-solid.depthMm / 2), ring(solid.depthMm / 2));
}

/** Corners of a part in the room, and its edges as pairs of corners. */
export function partEdges(part: Part): { corners: Vec3[]; edges: [number, number][] } {
  const { corners, edges } = ownCorners(part.solid);
  const [pitch, yaw, roll] = part.rotationRad;
  const [cp, sp] = [Math.cos(pitch), Math.sin(pitch)];
  const [cy, sy] = [Math.cos(yaw), Math.sin(yaw)];
  const [cr, sr] = [Math.cos(roll), Math.sin(roll)];
  const [px, py, pz] = part.positionMm;
  const placed = corners.map(([x0, y0, z0]): Vec3 => {
    const [x1, y1] = [x0 * cr - y0 * sr, x0 * sr + y0 * cr];
    const [y2, z2] = [y1 * cp - z0 * sp, y1 * sp + z0 * cp];
    return [px + x1 * cy + z2 * sy, py + y2, pz - x1 * sy + z2 * cy];
  });
  return { corners: placed, edges };
}

/** Smallest convex outline around points, in turning order; fewer than three corners when they lie on a line. */
export function convexOutline(points: readonly PagePoint[]): PagePoint[] {
  const sorted = [...points].sort((a, b) => a[0] - b[0] || a[1] - b[1]);
  const turn = (o: PagePoint, a: PagePoint, b: PagePoint): number =>
    (a[0] - o[0]) * (b[1] - o[1]) - (a[1] - o[1]) * (b[0] - o[0]);
  const half = (list: readonly PagePoint[]): PagePoint[] => {
    const kept: PagePoint[] = [];
    for (const p of list) {
      while (kept.length >= 2 && turn(kept[kept.length - 2]!, kept[kept.length - 1]!, p) <= 1e-9) kept.pop();
      kept.push(p);
    }
    kept.pop();
    return kept;
  };
  return [...half(sorted), ...half([...sorted].reverse())];
}
