import type { Spot } from './clear-floor.ts';
import {
  clipped,
  extent,
  inFrame,
  outOfFrame,
  type PlanFrame,
  type PlanOutline,
  type PlanPoint,
  type PlanSolid,
} from './plan.ts';
import { nearestBetween, nearestOnSide, type Nearest } from './plan-distance.ts';

/** What crosses a leg this near to its end crosses the next one at its start. */
const EDGE_MM = 1e-6;

/** Where a route leads between two things, however far along it one stands after the other. */
export interface Pinch {
  /** Which leg of the route it crosses, from 0. */
  leg: number;
  /** The part of that leg between the two, from its start, millimetres. */
  fromMm: number;
  toMm: number;
  widthMm: number;
}

/** One straight piece of a route. */
interface Leg {
  plan: PlanFrame;
  lengthMm: number;
}

/**
 * The straight pieces of a route, each with a frame that looks along it.
 *
 * @param corners - corners of the route's line, at least two
 * @returns one leg from each corner to the next; two corners on one spot make none
 */
export function legsOf(corners: readonly Spot[]): Leg[] {
  return corners.slice(1).flatMap((to, i) => {
    const from = corners[i] ?? to;
    const [dx, dz] = [to.xMm - from.xMm, to.zMm - from.zMm];
    const lengthMm = Math.hypot(dx, dz);
    return lengthMm === 0 ? [] : [{ plan: { ...from, facingRad: Math.atan2(dx, dz) }, lengthMm }];
  });
}

/**
 * Everywhere that a route leads between two things with one on either hand.
 *
 * What is round and stays on the route's side of everything gets through exactly where no two things on opposite hands
 * are nearer than its breadth: widening both by half of that must not make them meet. So the clear width between two
 * things is the least distance between them, along and across the route together, and the narrowest on the whole route
 * is the breadth of the widest round body that can follow it.
 *
 * @param legs - the route
 * @param solids - what stands in the way, outlines in the room; what lies on the line itself makes no pinch
 * @param widestMm - distances from here on are of no matter
 * @returns one entry for each two things on opposite hands, and for what of them lies beside one leg; millimetres
 * @source plane geometry
 */
export function pinchesOf(legs: readonly Leg[], solids: readonly PlanSolid[], widestMm: number): Pinch[] {
  const near = solids
    .filter(({ circle: [x, z, radius] }) => legs.some((leg) => distanceTo(leg, [x, z]) - radius < widestMm))
    .map((solid) => ({ ...solid, beside: legs.map((leg) => besideOf(solid, leg)) }));
  return near.flatMap((one, i) =>
    near.slice(i + 1).flatMap((other): Pinch[] => {
      const [ax, az, ar] = one.circle;
      const [bx, bz, br] = other.circle;
      if (Math.hypot(ax - bx, az - bz) - ar - br >= widestMm) return [];
      const isApart = one.beside.map(({ hand }, leg) => hand === 0 || hand !== other.beside[leg]?.hand);
      if (!isApart.includes(true)) return [];
      return [
        nearestBetween(one.outline, other.outline),
        // The nearest may lie before the route or behind it: then what lies beside each leg is looked at by itself.
        ...isApart.flatMap((apart, leg) => {
          const [ours = [], theirs = []] = [one.beside[leg]?.strip, other.beside[leg]?.strip];
          return apart && ours.length > 0 && theirs.length > 0 ? [nearestBetween(ours, theirs)] : [];
        }),
      ].flatMap((nearest) => (nearest.distanceMm < widestMm ? crossedBy(nearest, legs) : []));
    }),
  );
}

/** What a solid is to a leg: 1 to the left of its line, -1 to the right, 0 across it; and the part of it beside the leg. */
function besideOf({ outline }: PlanSolid, { plan, lengthMm }: Leg): { hand: 1 | 0 | -1; strip: PlanOutline } {
  const framed = inFrame(outline, plan);
  const [low, high] = extent(framed, 0);
  const strip = clipped(framed, { ahead: [0, lengthMm] });
  return { hand: low >= 0 ? 1 : high <= 0 ? -1 : 0, strip: outOfFrame(strip, plan) };
}

/** The legs that a line between two things crosses; crossed twice, the route leads round both of them. */
function crossedBy({ from, to, distanceMm }: Nearest, legs: readonly Leg[]): Pinch[] {
  const crossed = legs.flatMap((leg, n) => crossing(leg, n, from, to, n === legs.length - 1));
  return crossed.length % 2 === 0 ? [] : crossed.map((at) => ({ ...at, widthMm: distanceMm }));
}

function distanceTo({ plan, lengthMm }: Leg, point: PlanPoint): number {
  const [[x, z] = [0, 0]] = inFrame([point], plan);
  const [nx, nz] = nearestOnSide([x, z], [0, 0], [0, lengthMm]);
  return Math.hypot(x - nx, z - nz);
}

/** The part of a leg beside a line across it; none where the line passes before or behind the leg. */
function crossing(
  { plan, lengthMm }: Leg,
  leg: number,
  from: PlanPoint,
  to: PlanPoint,
  isLast: boolean,
): Omit<Pinch, 'widthMm'>[] {
  const [a, b] = inFrame([from, to], plan);
  if (a === undefined || b === undefined || a[0] > 0 === b[0] > 0) return [];
  const at = a[1] + ((b[1] - a[1]) * a[0]) / (a[0] - b[0]);
  if (at < -EDGE_MM || at >= lengthMm + (isLast ? EDGE_MM : -EDGE_MM)) return [];
  return [{ leg, fromMm: Math.max(0, Math.min(a[1], b[1])), toMm: Math.min(lengthMm, Math.max(a[1], b[1])) }];
}
