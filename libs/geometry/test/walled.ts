import type { PieceOf } from '../src/room/document.ts';
import type { PlanPoint } from '../src/situation/plan.ts';
import { degrees } from '../src/units/angle.ts';
import { piece } from './measured.ts';

/**
 * Walls along a line of corners, their faces on the line, to the right of whoever walks along it with the room on the
 * left (seen from above, z down).
 */
export function wallsAlong(corners: readonly PlanPoint[], mark = 'W'): PieceOf<'bulkhead'>[] {
  return corners.slice(1).map(([x, z], i) => {
    const [fx, fz] = corners[i] ?? [x, z];
    const [dx, dz] = [x - fx, z - fz];
    return piece('bulkhead', `${mark}${i + 1}`, [(fx + x) / 2, (fz + z) / 2, degrees(Math.atan2(-dz, dx))], {
      lengthMm: Math.hypot(dx, dz),
      heightMm: 2400,
      thicknessMm: 50,
    });
  });
}
