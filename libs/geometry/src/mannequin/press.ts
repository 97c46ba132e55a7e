import type { Figure } from './figure.ts';
import { legLine, turnFoot } from './leg-line.ts';
import { TOUCH, type SkinLevel } from './skin.ts';
import { kneesCross, type Stance } from './stance.ts';
import { dot, sub } from './vector.ts';

/** Softly keeps a height above zero: far above it changes nothing, far below it gives nearly 0. */
const soft = (height: number): number => (height + Math.sqrt(height * height + 9)) / 2;

/**
 * Flattens the skin where it rests: thighs and buttocks on the seat, soles on their plane, and keeps the
 * thighs off each other.
 *
 * @param points - skin points of `at` in the body frame, changed in place
 */
export function press(points: Float64Array, at: SkinLevel, figure: Figure, stance: Stance): void {
  const soles = ([0, 1] as const).map((n) => {
    const leg = stance.legs[n];
    return {
      ankle: legLine(figure, leg).ankle,
      up: turnFoot(leg, [0, 1, 0]),
      depth: -figure.MH - stance.shoeMm,
    };
  });
  const crossed = kneesCross(stance);
  for (let v = 0; v < at.level.pointCount; v++) {
    const flags = at.touch[v]!;
    if (flags === TOUCH.none) continue;
    const side = at.legSide[v]!;
    const x = points[v * 3]!;
    const y = points[v * 3 + 1]!;
    const z = points[v * 3 + 2]!;
    if (flags & TOUCH.seat) points[v * 3 + 1] = soft(y);
    if (!crossed && flags & TOUCH.midline && side !== 0) points[v * 3] = side * soft(side * x);
    if (flags & TOUCH.sole) {
      const { ankle, up, depth } = soles[side === -1 ? 1 : 0]!;
      const height = dot(sub([side * x, y, z], ankle), up) - depth;
      const lift = soft(height) - height;
      points[v * 3] = x + side * up[0] * lift;
      points[v * 3 + 1] = y + up[1] * lift;
      points[v * 3 + 2] = z + up[2] * lift;
    }
  }
}
