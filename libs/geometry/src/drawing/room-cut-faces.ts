import { add, cross, dot, scale, unit } from '../mannequin/vector.ts';
import type { Part, Vec3 } from '../parts/part.ts';
import { cutFaces } from './cut-faces.ts';
import type { PageFrame } from './set-view.ts';
import { viewSolid } from './view-solid.ts';

/** A face that a plane cuts through a part, where it lies in the room. */
export interface RoomCutFace {
  part: Part;
  /** In turning order, millimetres. */
  corners: Vec3[];
}

function frameFacing(toward: Vec3): PageFrame {
  if (Math.abs(toward[1]) > 0.999) return { right: [1, 0, 0], down: [0, 0, Math.sign(toward[1])], toward };
  const right = unit(cross([0, 1, 0], toward));
  return { right, down: scale(cross(toward, right), -1), toward };
}

/**
 * The faces a plane cuts through parts.
 *
 * @param parts - placed in the room
 * @param pointMm - in the plane, millimetres
 * @param toward - unit vector across the plane
 * @returns outlines in the plane; none of a part that it misses or only touches
 */
export function roomCutFaces(parts: readonly Part[], pointMm: Vec3, toward: Vec3): RoomCutFace[] {
  const frame = frameFacing(toward);
  const depth = dot(pointMm, toward);
  return parts.flatMap((part) =>
    cutFaces(viewSolid(part, frame), depth).map((outline) => ({
      part,
      corners: outline.map(([x, y]): Vec3 =>
        add(add(scale(frame.right, x), scale(frame.down, y)), scale(toward, depth)),
      ),
    })),
  );
}
