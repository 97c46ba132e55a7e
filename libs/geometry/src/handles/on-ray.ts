import { add, cross, dot, length, scale, sub } from '../mannequin/vector.ts';
import type { Vec3 } from '../parts/part.ts';
import { degrees } from '../units/angle.ts';
import type { Handle } from './handle.ts';

/** A line of sight: unit direction. */
export interface Sight {
  origin: Vec3;
  direction: Vec3;
}

/** Seen this flat, the plane of an arc tells nothing: its tangent is followed. */
const FLAT = 0.15;

/**
 * The value a handle would have if its point lay where a line of sight comes nearest to its line or arc.
 *
 * @param handle - the handle as it stood when it was taken hold of
 * @param sight - the line of sight through the pointer
 * @returns millimetres or degrees, not limited; undefined where the line runs straight at the eye
 */
export function valueUnder(handle: Handle, sight: Sight): number | undefined {
  if (handle.pivotMm) return angleUnder(handle, handle.pivotMm, sight);
  const way = wayAlong(handle, sight);
  return way === undefined ? undefined : handle.value + way * handle.perMm;
}

/** How far along the line through the handle the sight passes nearest. */
function wayAlong({ atMm, along }: Handle, { origin, direction }: Sight): number | undefined {
  const cosine = dot(along, direction);
  const away = 1 - cosine * cosine;
  if (away < 1e-3) return undefined;
  const between = sub(atMm, origin);
  return (cosine * dot(between, direction) - dot(between, along)) / away;
}

function angleUnder(handle: Handle, pivot: Vec3, sight: Sight): number | undefined {
  const arm = sub(handle.atMm, pivot);
  const radius = length(arm);
  if (radius < 1) return undefined;
  const axis = cross(scale(arm, 1 / radius), handle.along);
  const slope = dot(axis, sight.direction);
  if (Math.abs(slope) < FLAT) {
    const way = wayAlong(handle, sight);
    return way === undefined ? undefined : handle.value + degrees(way / radius);
  }
  const reach = dot(axis, sub(pivot, sight.origin)) / slope;
  const hit = sub(add(sight.origin, scale(sight.direction, reach)), pivot);
  const turned = Math.atan2(dot(hit, handle.along), dot(hit, scale(arm, 1 / radius)));
  return handle.value + degrees(turned);
}
