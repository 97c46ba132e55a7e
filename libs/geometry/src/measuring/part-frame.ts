import { add, dot, scale, sub } from '../mannequin/vector.ts';
import type { Part, Vec3 } from '../parts/part.ts';

/** The axes of a part's own frame, and ways into it and out. */
export interface PartFrame {
  axes: readonly [Vec3, Vec3, Vec3];
  /** A direction of the room in the part's frame. */
  turned: (direction: Vec3) => Vec3;
  /** A point of the room in the part's frame. */
  toPart: (point: Vec3) => Vec3;
  toRoom: (point: Vec3) => Vec3;
}

/**
 * The frame a part was made in.
 *
 * @param part - placed in the room
 * @returns unit axes in the room and the two ways between the frames, millimetres
 */
export function partFrame({ positionMm, rotationRad }: Part): PartFrame {
  const [pitch, yaw, roll] = rotationRad;
  const [cp, sp] = [Math.cos(pitch), Math.sin(pitch)];
  const [cy, sy] = [Math.cos(yaw), Math.sin(yaw)];
  const [cr, sr] = [Math.cos(roll), Math.sin(roll)];
  const axes: PartFrame['axes'] = [
    [cr * cy + sr * sp * sy, sr * cp, -cr * sy + sr * sp * cy],
    [-sr * cy + cr * sp * sy, cr * cp, sr * sy + cr * sp * cy],
    [cp * sy, -sp, cp * cy],
  ];
  const turned = (v: Vec3): Vec3 => [dot(v, axes[0]), dot(v, axes[1]), dot(v, axes[2])];
  return {
    axes,
    turned,
    toPart: (point) => turned(sub(point, positionMm)),
    toRoom: ([x, y, z]) => add(positionMm, add(add(scale(axes[0], x), scale(axes[1], y)), scale(axes[2], z))),
  };
}
