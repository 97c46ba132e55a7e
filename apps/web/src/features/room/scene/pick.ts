import type { Part, Vec3 } from '@settlewright/geometry';
import { halfExtents } from './bounds';
import { add, dot, partAxes, scale, subtract } from './vectors';

export interface Ray {
  origin: Vec3;
  direction: Vec3;
}

/** Distance along the ray to a part's box, or `undefined` when it passes by. */
function distanceTo(part: Part, ray: Ray): number | undefined {
  const axes = partAxes(part.rotationRad);
  const { half, offset } = halfExtents(part);
  const middle = add(
    part.positionMm,
    add(add(scale(axes[0], offset[0]), scale(axes[1], offset[1])), scale(axes[2], offset[2])),
  );
  const toMiddle = subtract(middle, ray.origin);
  let near = -Infinity;
  let far = Infinity;
  for (const n of [0, 1, 2] as const) {
    const along = dot(axes[n], ray.direction);
    const gap = dot(axes[n], toMiddle);
    if (Math.abs(along) < 1e-9) {
      if (Math.abs(gap) > half[n]) return undefined;
      continue;
    }
    const [a, b] = [(gap - half[n]) / along, (gap + half[n]) / along];
    near = Math.max(near, Math.min(a, b));
    far = Math.min(far, Math.max(a, b));
  }
  return near <= far && far > 0 ? Math.max(near, 0) : undefined;
}

/** The piece whose part the ray meets first, and how far away that is. */
export function firstUnder(
  parts: readonly Part[],
  ray: Ray,
): { pieceId: string; distanceMm: number } | undefined {
  let best = Infinity;
  let pieceId: string | undefined;
  for (const part of parts) {
    const distance = distanceTo(part, ray);
    if (distance !== undefined && distance < best) {
      best = distance;
      pieceId = part.pieceId;
    }
  }
  return pieceId === undefined ? undefined : { pieceId, distanceMm: best };
}

/** The piece whose part the ray meets first. */
export const pieceUnder = (parts: readonly Part[], ray: Ray): string | undefined =>
  firstUnder(parts, ray)?.pieceId;

/** Where a ray meets a level plane; `undefined` when it runs level or away from it. */
export function onLevel(ray: Ray, heightMm: number): { xMm: number; zMm: number } | undefined {
  if (Math.abs(ray.direction[1]) < 1e-4) return undefined;
  const t = (heightMm - ray.origin[1]) / ray.direction[1];
  if (t <= 0) return undefined;
  return { xMm: ray.origin[0] + ray.direction[0] * t, zMm: ray.origin[2] + ray.direction[2] * t };
}
