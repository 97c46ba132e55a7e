import type { PieceOf } from '../room/document.ts';
import { benchLayout } from '../pieces/bench-layout.ts';
import type { Limits } from './limits.ts';
import { clipped, extent, type PlanOutline, type PlanSolid } from './plan.ts';
import { nearestOnSide } from './plan-distance.ts';
import { planOfPiece, solidsNear, type Survey } from './survey.ts';

/** Clear floor is measured up to here; more asks nobody. */
const FAR_MM = 2000;
const NUDGE_MM = 0.01;

/** A spot on the floor. */
export interface Spot {
  xMm: number;
  zMm: number;
}

/** Tells whether a solid stands where people go. */
export const inTheWay =
  ({ overHeadsMm }: Limits) =>
  ({ bottomMm, topMm }: PlanSolid): boolean =>
    bottomMm < overHeadsMm && topMm > 0;

/**
 * The largest circle around a spot that nothing stands in. Knee and toe space under tables is not counted.
 *
 * @param found - the survey
 * @param spot - middle of the circle
 * @param limits - of the rules
 * @returns its diameter, millimetres; 0 when something stands on the spot
 */
export function clearCircle(found: Survey, spot: Spot, limits: Limits): number {
  const plan = { ...spot, facingRad: 0 };
  const distances = solidsNear(found, plan, FAR_MM, () => true, inTheWay(limits)).map(({ outline }) =>
    distanceToOrigin(outline),
  );
  return 2 * Math.min(FAR_MM, ...distances);
}

/**
 * From the origin of a frame to a convex outline.
 *
 * @param outline - in the frame
 * @returns millimetres; 0 inside it
 */
export function distanceToOrigin(outline: PlanOutline): number {
  let nearest = Infinity;
  let [left, right] = [false, false];
  outline.forEach(([x, z], i) => {
    const [nx, nz] = outline[(i + 1) % outline.length] ?? [x, z];
    const cross = (nx - x) * z - (nz - z) * x;
    if (cross > 0) left = true;
    if (cross < 0) right = true;
    nearest = Math.min(nearest, Math.hypot(...nearestOnSide([0, 0], [x, z], [nx, nz])));
  });
  return left && right ? nearest : 0;
}

/**
 * The widest T around a spot, arms and base of one width, in any of four directions along the room's axes.
 *
 * @param found - the survey
 * @param spot - middle of the square that the T lies in
 * @param limits - of the rules
 * @returns width of its arms, millimetres; 0 where the bar of the T is not clear
 * @source square of rule ACC-08
 */
export function clearTeeArm(found: Survey, spot: Spot, limits: Limits): number {
  const squareMm = limits.teeSquareMm;
  const half = squareMm / 2;
  return Math.max(
    ...[0, 1, 2, 3].map((quarter) => {
      const plan = { ...spot, facingRad: (quarter * Math.PI) / 2 };
      const near = solidsNear(found, plan, squareMm, () => true, inTheWay(limits));
      // The bar grows from one side of the square, the base from its middle line: the lesser of the two counts.
      const bar = depthOf(near, half);
      const base = stemWidth(near, -half + bar, half);
      return Math.min(bar, base);
    }),
  );
}

/** How far a square is clear from one side of it on, all across. */
function depthOf(solids: readonly PlanSolid[], half: number): number {
  const inside = solids.map(({ outline }) => clipped(outline, { left: [-half, half], ahead: [-half, half] }));
  return Math.min(
    2 * half,
    ...inside.filter((outline) => outline.length > 0).map((outline) => extent(outline, 1)[0] + half),
  );
}

/** Clear width to both sides of the middle line from a depth to the far side; the whole square where none is left. */
function stemWidth(solids: readonly PlanSolid[], from: number, half: number): number {
  if (half - from < NUDGE_MM) return 2 * half;
  const halves = solids
    .map(({ outline }) => clipped(outline, { ahead: [from, half] }))
    .filter((outline) => outline.length > 0)
    .map((outline) => {
      const [low, high] = extent(outline, 0);
      return low > 0 ? low : high < 0 ? -high : 0;
    });
  return 2 * Math.min(half, ...halves);
}

/**
 * Clear floor beside the end of a bench, at the end that has more: along the end in a strip as wide as a wheelchair,
 * and away from the end over the length of one.
 *
 * @param found - the survey
 * @param bench - the bench
 * @param limits - of the rules
 * @returns across, away from the end, and along the end; millimetres, held to 2 m
 * @source rule ACC-04: at the end of the seat, parallel to its short axis
 */
export function endSpace(
  found: Survey,
  bench: PieceOf<'bench'>,
  limits: Limits,
): { widthMm: number; lengthMm: number } {
  const [strip, run] = limits.floorMm;
  const plan = planOfPiece(bench);
  const front = benchLayout(bench).frontZMm;
  const near = solidsNear(
    found,
    plan,
    bench.lengthMm / 2 + FAR_MM + front,
    (piece) => piece.id !== bench.id,
    inTheWay(limits),
  );
  const ends = ([1, -1] as const).map((sign) => {
    const beside = (across: number): [number, number] => {
      const [near0, far] = [bench.lengthMm / 2 + NUDGE_MM, bench.lengthMm / 2 + across - NUDGE_MM];
      return sign > 0 ? [near0, far] : [-far, -near0];
    };
    const lengthMm = stretchAround(near, beside(strip), front / 2);
    // Slid along the end, rear lines in line or front lines in line, whichever leaves more.
    const widthMm = Math.max(
      ...[0, front - run].map((from) => clearAcross(near, beside(FAR_MM), [from, from + run])),
    );
    return { widthMm: Math.max(widthMm, lengthMm >= run ? strip : 0), lengthMm };
  });
  return ends.reduce((a, b) =>
    Math.min(b.widthMm / strip, b.lengthMm / run) > Math.min(a.widthMm / strip, a.lengthMm / run) ? b : a,
  );
}

/** Clear stretch along a strip around a depth. */
function stretchAround(solids: readonly PlanSolid[], left: readonly [number, number], at: number): number {
  let [low, high] = [at - FAR_MM, at + FAR_MM];
  for (const { outline } of solids) {
    const inside = clipped(outline, { left });
    if (inside.length === 0) continue;
    const [from, to] = extent(inside, 1);
    if (from > at) high = Math.min(high, from);
    else if (to < at) low = Math.max(low, to);
    else return 0;
  }
  return Math.min(FAR_MM, high - low);
}

/** Clear width away from an end over a stretch. */
function clearAcross(
  solids: readonly PlanSolid[],
  left: readonly [number, number],
  ahead: readonly [number, number],
): number {
  const edge = Math.min(Math.abs(left[0]), Math.abs(left[1]));
  const inside = solids
    .map(({ outline }) => clipped(outline, { left, ahead: [ahead[0] + NUDGE_MM, ahead[1] - NUDGE_MM] }))
    .filter((outline) => outline.length > 0)
    .map((outline) => Math.min(...extent(outline, 0).map(Math.abs)) - edge);
  return Math.min(FAR_MM, ...inside);
}
