import type { RouteStretch } from '@settlewright/anthropometry';
import { isInTheWay, type Spot } from './clear-floor.ts';
import { clipped, extent, type PlanSolid } from './plan.ts';
import { solidsNear, type Survey } from './survey.ts';

/** Widths are taken this often along a route, millimetres. */
const STEP_MM = 25;
/** A route wider than this to either side is wide enough for anybody. */
const WIDEST_HALF_MM = 1500;
/** Widths this close are one stretch. */
const SAME_MM = 0.5;

/**
 * Clear width along a route: at each step what is free to the left and to the right of its line.
 *
 * @param found - the survey
 * @param corners - corners of the route's line, at least two
 * @returns stretches of one width, from the start to the end; width held to 3 m, 0 where something stands on the line
 */
export function routeStretches(found: Survey, corners: readonly Spot[]): RouteStretch[] {
  const stretches: RouteStretch[] = [];
  corners.slice(1).forEach((to, i) => {
    const from = corners[i] ?? to;
    const length = Math.hypot(to.xMm - from.xMm, to.zMm - from.zMm);
    if (length === 0) return;
    const plan = { ...from, facingRad: Math.atan2(to.xMm - from.xMm, to.zMm - from.zMm) };
    const near = solidsNear(found, plan, length + WIDEST_HALF_MM, () => true, isInTheWay);
    const steps = Math.max(1, Math.ceil(length / STEP_MM));
    for (let n = 0; n < steps; n += 1) {
      const ahead = [(n * length) / steps, ((n + 1) * length) / steps] as const;
      add(stretches, { widthMm: clearWidth(near, ahead), lengthMm: length / steps });
    }
  });
  return stretches;
}

function add(stretches: RouteStretch[], next: RouteStretch): void {
  const last = stretches.at(-1);
  if (last === undefined || Math.abs(last.widthMm - next.widthMm) > SAME_MM) stretches.push(next);
  else last.lengthMm += next.lengthMm;
}

/** Free width across a short piece of the line. */
function clearWidth(solids: readonly PlanSolid[], ahead: readonly [number, number]): number {
  let [left, right] = [WIDEST_HALF_MM, WIDEST_HALF_MM];
  for (const { outline } of solids) {
    const beside = clipped(outline, { left: [-WIDEST_HALF_MM, WIDEST_HALF_MM], ahead });
    if (beside.length === 0) continue;
    const [low, high] = extent(beside, 0);
    if (low >= 0) left = Math.min(left, low);
    else if (high <= 0) right = Math.min(right, -high);
    else return 0;
  }
  return left + right;
}
