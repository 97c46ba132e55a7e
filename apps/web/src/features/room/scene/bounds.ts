import type { MannequinPose, Part, Vec3 } from '@settlewright/geometry';
import { partAxes } from './vectors';

export interface Bounds {
  min: Vec3;
  max: Vec3;
}

/** Half extents of a part in its own frame, with the offset of their middle from the part's origin. */
export function halfExtents(part: Part): { half: Vec3; offset: Vec3 } {
  const { solid } = part;
  if (solid.shape === 'box') {
    return { half: [solid.sizeMm[0] / 2, solid.sizeMm[1] / 2, solid.sizeMm[2] / 2], offset: [0, 0, 0] };
  }
  if (solid.shape === 'cylinder') {
    return { half: [solid.radiusMm, solid.heightMm / 2, solid.radiusMm], offset: [0, 0, 0] };
  }
  const xs = solid.outlineMm.map(([x]) => x);
  const ys = solid.outlineMm.map(([, y]) => y);
  const [x0, x1, y0, y1] = [Math.min(...xs), Math.max(...xs), Math.min(...ys), Math.max(...ys)];
  return {
    half: [(x1 - x0) / 2, (y1 - y0) / 2, solid.depthMm / 2],
    offset: [(x0 + x1) / 2, (y0 + y1) / 2, 0],
  };
}

/** Box around parts, axes of the room; `undefined` for no parts. */
export function boundsOf(parts: readonly Part[]): Bounds | undefined {
  if (parts.length === 0) return undefined;
  const min: [number, number, number] = [Infinity, Infinity, Infinity];
  const max: [number, number, number] = [-Infinity, -Infinity, -Infinity];
  for (const part of parts) {
    const axes = partAxes(part.rotationRad);
    const { half, offset } = halfExtents(part);
    for (const axis of [0, 1, 2] as const) {
      const middle =
        part.positionMm[axis] +
        axes[0][axis] * offset[0] +
        axes[1][axis] * offset[1] +
        axes[2][axis] * offset[2];
      const reach =
        Math.abs(axes[0][axis]) * half[0] +
        Math.abs(axes[1][axis]) * half[1] +
        Math.abs(axes[2][axis]) * half[2];
      min[axis] = Math.min(min[axis], middle - reach);
      max[axis] = Math.max(max[axis], middle + reach);
    }
  }
  return { min, max };
}

/** Box around a body, clothes left out. */
export function boundsOfBody({ segments }: MannequinPose): Bounds {
  const spots = segments.flatMap((segment): { at: Vec3; reach: number }[] =>
    segment.kind === 'ellipsoid'
      ? [{ at: segment.centreMm, reach: Math.max(...segment.radiiMm) }]
      : [
          { at: segment.fromMm, reach: segment.fromRadiusMm },
          { at: segment.toMm, reach: segment.toRadiusMm },
        ],
  );
  const side = (axis: 0 | 1 | 2, sign: 1 | -1) =>
    sign * Math.max(...spots.map(({ at, reach }) => sign * at[axis] + reach));
  return { min: [side(0, -1), side(1, -1), side(2, -1)], max: [side(0, 1), side(1, 1), side(2, 1)] };
}

export function union(a: Bounds, b: Bounds): Bounds {
  return {
    min: [Math.min(a.min[0], b.min[0]), Math.min(a.min[1], b.min[1]), Math.min(a.min[2], b.min[2])],
    max: [Math.max(a.max[0], b.max[0]), Math.max(a.max[1], b.max[1]), Math.max(a.max[2], b.max[2])],
  };
}

export function cornersOf({ min, max }: Bounds): Vec3[] {
  return [0, 1, 2, 3, 4, 5, 6, 7].map((n): Vec3 => [
    n & 1 ? max[0] : min[0],
    n & 2 ? max[1] : min[1],
    n & 4 ? max[2] : min[2],
  ]);
}
