import type { Part, Vec3 } from '@settlewright/geometry';
import { halfExtents } from './bounds';
import { add, dot, partAxes, scale, subtract } from './vectors';
import type { Cut } from './views';

export interface Ray {
  origin: Vec3;
  direction: Vec3;
}

/** The stretch of a ray along which nothing is cut away; all of it without a cut. */
function leftOf(ray: Ray, cut: Cut | undefined): [from: number, to: number] {
  if (!cut) return [0, Infinity];
  const steep = dot(ray.direction, cut.toward);
  const before = dot(subtract(ray.origin, cut.pointMm), cut.toward);
  if (Math.abs(steep) < 1e-9) return before > 0 ? [Infinity, -Infinity] : [0, Infinity];
  const at = -before / steep;
  return steep < 0 ? [Math.max(0, at), Infinity] : [0, at];
}

/** Distance along the ray to what is left of a part's box, or `undefined` when it passes by. */
function distanceTo(part: Part, ray: Ray, [from, to]: readonly [number, number]): number | undefined {
  const axes = partAxes(part.rotationRad);
  const { half, offset } = halfExtents(part);
  const middle = add(
    part.positionMm,
    add(add(scale(axes[0], offset[0]), scale(axes[1], offset[1])), scale(axes[2], offset[2])),
  );
  const toMiddle = subtract(middle, ray.origin);
  let [near, far] = [from, to];
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
  return near <= far && far > 0 ? near : undefined;
}

/** The piece whose part the ray meets first behind the cut, and how far away that is. */
export function firstUnder(
  parts: readonly Part[],
  ray: Ray,
  cut?: Cut,
): { pieceId: string; distanceMm: number } | undefined {
  const left = leftOf(ray, cut);
  let best = Infinity;
  let pieceId: string | undefined;
  for (const part of parts) {
    const distance = distanceTo(part, ray, left);
    if (distance !== undefined && distance < best) {
      best = distance;
      pieceId = part.pieceId;
    }
  }
  return pieceId === undefined ? undefined : { pieceId, distanceMm: best };
}

/** The piece whose part the ray meets first behind the cut. */
export const pieceUnder = (parts: readonly Part[], ray: Ray, cut?: Cut): string | undefined =>
  firstUnder(parts, ray, cut)?.pieceId;

/** Where a ray meets a level plane; `undefined` when it runs level or away from it. */
export function onLevel(ray: Ray, heightMm: number): { xMm: number; zMm: number } | undefined {
  if (Math.abs(ray.direction[1]) < 1e-4) return undefined;
  const t = (heightMm - ray.origin[1]) / ray.direction[1];
  if (t <= 0) return undefined;
  return { xMm: ray.origin[0] + ray.direction[0] * t, zMm: ray.origin[2] + ray.direction[2] * t };
}
