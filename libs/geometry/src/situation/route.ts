import type { RouteStretch } from '@settlewright/anthropometry';
import { isInTheWay, type Spot } from './clear-floor.ts';
import { clipped, extent, type PlanSolid } from './plan.ts';
import { solidsNear, type Survey } from './survey.ts';

/** Widths are taken this often along a route, millimetres. */
const STEP_MM = 25;
/** A route wider than this to either side is wide enough for anybody. */
const WIDEST_HALF_MM = 1500;
/** In a turn widths are taken at least this often, and over this much of the way to either side of each line across. */
const TURN_STEP_RAD = Math.PI / 18;
const TURN_HALF_MM = 50;
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
    const facingRad = headingOf(from, to);
    const before = corners[i - 1];
    if (before !== undefined) {
      const widthMm = turnWidth(found, from, headingOf(before, from), facingRad);
      add(stretches, { widthMm, lengthMm: STEP_MM });
    }
    const plan = { ...from, facingRad };
    const near = solidsNear(found, plan, length + WIDEST_HALF_MM, () => true, isInTheWay);
    const steps = Math.max(1, Math.ceil(length / STEP_MM));
    for (let n = 0; n < steps; n += 1) {
      const ahead = [(n * length) / steps, ((n + 1) * length) / steps] as const;
      add(stretches, { widthMm: clearWidth(near, ahead), lengthMm: length / steps });
    }
  });
  return stretches;
}

const headingOf = (from: Spot, to: Spot): number => Math.atan2(to.xMm - from.xMm, to.zMm - from.zMm);

/** Least width across a turn about a corner, from one heading to the next. */
function turnWidth(found: Survey, corner: Spot, from: number, to: number): number {
  const turn = Math.atan2(Math.sin(to - from), Math.cos(to - from));
  const steps = Math.max(1, Math.ceil(Math.abs(turn) / TURN_STEP_RAD));
  const widths = Array.from({ length: steps - 1 }, (_, n) => {
    const plan = { ...corner, facingRad: from + ((n + 1) * turn) / steps };
    const near = solidsNear(found, plan, WIDEST_HALF_MM, () => true, isInTheWay);
    return clearWidth(near, [-TURN_HALF_MM, TURN_HALF_MM]);
  });
  return Math.min(2 * WIDEST_HALF_MM, ...widths);
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
