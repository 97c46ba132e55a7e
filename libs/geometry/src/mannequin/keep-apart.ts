import type { Vec3 } from '../parts/part.ts';
import type { Figure } from './figure.ts';
import { legCores, mirrored, nearestCore } from './leg-cores.ts';
import { TOUCH, type SkinLevel } from './skin.ts';
import { kneesCross, type Stance } from './stance.ts';
import { clamp, mix, mixPoints } from './vector.ts';

/** Skins of two legs that lie on each other stay this far off the place where both are pressed alike. By eye. */
const AIR_MM = 5;
/** Skin further than this share of the other leg's radius off its middle is not looked at. By eye. */
const NEAR_SHARE = 1.7;
const HALVINGS = 10;

/**
 * Presses legs that cross against each other: skin that would run into the other leg goes back towards the middle of its
 * own, to where both are pressed by the same share of their thickness.
 *
 * @param points - skin points of `at` in the body frame, changed in place
 */
export function keepLegsApart(points: Float64Array, at: SkinLevel, figure: Figure, stance: Stance): void {
  if (!kneesCross(stance)) return;
  const coresOf = legCores(figure, stance);
  const left = coresOf(stance.legs[0]);
  const right = mirrored(coresOf(stance.legs[1]));
  for (let v = 0; v < at.level.pointCount; v++) {
    const side = at.legSide[v]!;
    if (side === 0 || !(at.touch[v]! & TOUCH.otherLeg)) continue;
    const [own, other] = side === 1 ? [left, right] : [right, left];
    const p: Vec3 = [points[v * 3]!, points[v * 3 + 1]!, points[v * 3 + 2]!];
    const theirs = nearestCore(other, p);
    if (theirs.distanceMm > NEAR_SHARE * theirs.radiusMm) continue;
    const middle = nearestCore(own, p);
    // Near the crotch skin goes aside and no more, so that it does not fold.
    const firmness = clamp(middle.section, 0.1, 1);
    const towards: Vec3 = [
      middle.at[0],
      mix(p[1], middle.at[1], firmness),
      mix(p[2], middle.at[2], firmness),
    ];
    const clear = (t: number): boolean => {
      const q = mixPoints(towards, p, t);
      const [mine, its] = [nearestCore(own, q), nearestCore(other, q)];
      return (mine.distanceMm + AIR_MM * firmness) / mine.radiusMm <= its.distanceMm / its.radiusMm;
    };
    if (clear(1)) continue;
    let [low, high] = [0, 1];
    for (let i = 0; i < HALVINGS; i++) {
      const half = (low + high) / 2;
      if (clear(half)) low = half;
      else high = half;
    }
    points.set(mixPoints(towards, p, low), v * 3);
  }
}
