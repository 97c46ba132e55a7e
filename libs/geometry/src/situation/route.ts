import type { RouteStretch } from '@settlewright/anthropometry';
import { inTheWay, type Spot } from './clear-floor.ts';
import type { Limits } from './limits.ts';
import { legsOf, pinchesOf, type Pinch } from './pinches.ts';
import { clipped, extent, type PlanFrame, type PlanSolid } from './plan.ts';
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
/** Of a step: what is nearer to its end than this is at its end. */
const TOUCHING = 1e-6;
const ROOM: PlanFrame = { xMm: 0, zMm: 0, facingRad: 0 };

/**
 * Clear width along a route: at each step what is free to the left and to the right of its line, and no more than the
 * least distance between two things that it leads between.
 *
 * @param found - the survey
 * @param corners - corners of the route's line, at least two
 * @param limits - of the rules
 * @returns stretches of one width, from the start to the end; width held to 3 m, 0 where something stands on the line
 */
export function routeStretches(found: Survey, corners: readonly Spot[], limits: Limits): RouteStretch[] {
  const stretches: RouteStretch[] = [];
  const legs = legsOf(corners);
  const isObstacle = inTheWay(limits);
  const pinches = pinchesOf(
    legs,
    solidsNear(found, ROOM, Infinity, () => true, isObstacle),
    2 * WIDEST_HALF_MM,
  );
  legs.forEach(({ plan, lengthMm }, leg) => {
    const before = legs[leg - 1];
    if (before !== undefined) {
      const widthMm = turnWidth(found, isObstacle, plan, before.plan.facingRad, plan.facingRad);
      add(stretches, { widthMm, lengthMm: STEP_MM });
    }
    const near = solidsNear(found, plan, lengthMm + WIDEST_HALF_MM, () => true, isObstacle);
    const steps = Math.max(1, Math.ceil(lengthMm / STEP_MM));
    const widths = Array.from({ length: steps }, (_, n) =>
      clearWidth(near, [(n * lengthMm) / steps, ((n + 1) * lengthMm) / steps]),
    );
    for (const pinch of pinches) if (pinch.leg === leg) narrow(widths, pinch, lengthMm / steps);
    for (const widthMm of widths) add(stretches, { widthMm, lengthMm: lengthMm / steps });
  });
  return stretches;
}

/** Narrows the steps between the two sides of a pinch; of two steps that meet where it is, the narrower. */
function narrow(widths: number[], { fromMm, toMm, widthMm }: Pinch, stepMm: number): void {
  const first = Math.min(widths.length - 1, Math.floor(fromMm / stepMm + TOUCHING));
  const last = Math.max(0, Math.ceil(toMm / stepMm - TOUCHING) - 1);
  const covered =
    first <= last
      ? widths.slice(first, last + 1).map((_, n) => first + n)
      : [(widths[last] ?? Infinity) <= (widths[first] ?? Infinity) ? last : first];
  for (const n of covered) widths[n] = Math.min(widths[n] ?? Infinity, widthMm);
}

/** Least width across a turn about a corner, from one heading to the next. */
function turnWidth(
  found: Survey,
  isObstacle: (solid: PlanSolid) => boolean,
  corner: Spot,
  from: number,
  to: number,
): number {
  const turn = Math.atan2(Math.sin(to - from), Math.cos(to - from));
  const steps = Math.max(1, Math.ceil(Math.abs(turn) / TURN_STEP_RAD));
  const widths = Array.from({ length: steps - 1 }, (_, n) => {
    const plan = { ...corner, facingRad: from + ((n + 1) * turn) / steps };
    const near = solidsNear(found, plan, WIDEST_HALF_MM, () => true, isObstacle);
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
