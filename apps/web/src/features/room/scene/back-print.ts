import type { MannequinPose, Vec3 } from '@settlewright/geometry';
import { partAxes } from './vectors.ts';

/** A rounded part of a trunk that leans on a back, room frame, mm. */
export interface BackPrint {
  centre: Vec3;
  axes: readonly [Vec3, Vec3, Vec3];
  radii: Vec3;
}

/** A pad goes in by half of this where a back just touches it, and is level again a few times as far away, mm. */
const SOFT_MM = 9;

/** Pelvis, belly and chest of a pose. */
export const backPrintsOf = (pose: MannequinPose): BackPrint[] =>
  pose.segments.flatMap((segment): BackPrint[] =>
    segment.kind === 'ellipsoid' && segment.tag === 'suit'
      ? [
          {
            centre: segment.centreMm,
            axes: partAxes([segment.leanRad, segment.facingRad, 0]),
            radii: segment.radiiMm,
          },
        ]
      : [],
  );

/** How far a body reaches beyond a point, in a direction; less than 0 where it ends before it. */
function reachBeyond({ centre, axes, radii }: BackPrint, point: Vec3, direction: Vec3): number {
  const [gx, gy, gz] = [point[0] - centre[0], point[1] - centre[1], point[2] - centre[2]];
  let [a, b, c] = [0, 0, -1];
  for (let n = 0; n < 3; n++) {
    const [axis, radius] = [axes[n]!, radii[n]!];
    const along = (axis[0] * direction[0] + axis[1] * direction[1] + axis[2] * direction[2]) / radius;
    const at = (axis[0] * gx + axis[1] * gy + axis[2] * gz) / radius;
    a += along * along;
    b += along * at;
    c += at * at;
  }
  return (Math.sqrt(Math.max(0, b * b - a * c)) - b) / a;
}

/** How far the face of a pad at a point goes in under those who lean on it, mm; `inward` is a unit vector. */
export function leanedInBy(prints: readonly BackPrint[], point: Vec3, inward: Vec3): number {
  const reach = prints.reduce(
    (furthest, print) => Math.max(furthest, reachBeyond(print, point, inward)),
    -Infinity,
  );
  return reach === -Infinity ? 0 : (reach + Math.hypot(reach, SOFT_MM)) / 2;
}
