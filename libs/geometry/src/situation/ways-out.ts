import { toPiece } from '../parts/placement.ts';
import { benchLayout } from '../pieces/bench-layout.ts';
import type { PieceKind, PieceOf } from '../room/document.ts';
import { clipped, extent, type PlanSolid } from './plan.ts';
import { planOfPiece, solidsNear, type Survey } from './survey.ts';

type Bench = PieceOf<'bench'>;

/** Floor before the seat that somebody needs to step out over, millimetres: shop rule. */
const STEP_OUT_MM = 600;
/** Nobody leaves through less than this: shop rule, a large man's depth and a little more. */
const NARROWEST_MM = 300;
const TOUCHING_MM = 1e-6;
/** What ends lower or begins higher than this is stepped over or leaned under: shop rule. */
const BODY_MM = [200, 1200] as const;
/** Kinds that stand still; chairs are moved aside. */
const STANDING: readonly PieceKind[] = ['bench', 'table', 'bulkhead', 'sill'];

const standing = ({ bottomMm, topMm }: PlanSolid): boolean => topMm > BODY_MM[0] && bottomMm < BODY_MM[1];

type Stretch = readonly [from: number, to: number];

/**
 * Ways off a bench, along its x axis: stretches of its front with nothing before them, and its open ends.
 *
 * @param found - the survey
 * @param bench - the bench
 * @returns stretches along the bench's first plan axis, and which ends are open, first axis low and high
 */
export function waysOff(
  found: Survey,
  bench: Bench,
): { fronts: Stretch[]; ends: { low: boolean; high: boolean } } {
  const front = benchLayout(bench).frontZMm;
  const half = bench.lengthMm / 2;
  const near = solidsNear(
    found,
    planOfPiece(bench),
    half + front + STEP_OUT_MM + NARROWEST_MM,
    (piece) => piece.id !== bench.id && STANDING.includes(piece.kind),
    standing,
  );
  const ahead = [front, front + STEP_OUT_MM] as const;
  const blocked = near
    .map(({ outline }) => clipped(outline, { left: [-half, half], ahead }))
    .filter((outline) => outline.length > 0)
    .map((outline) => extent(outline, 0))
    .sort((a, b) => a[0] - b[0]);
  const fronts: Stretch[] = [];
  let from = -half;
  for (const [low, high] of [...blocked, [half, half]] as Stretch[]) {
    if (low - from >= NARROWEST_MM - TOUCHING_MM) fronts.push([from, low]);
    from = Math.max(from, high);
  }
  const isOpen = (left: Stretch) =>
    !near.some(({ outline }) => clipped(outline, { left, ahead: [front, front + NARROWEST_MM] }).length > 0);
  return {
    fronts,
    ends: { low: isOpen([-half - NARROWEST_MM, -half]), high: isOpen([half, half + NARROWEST_MM]) },
  };
}

/**
 * Most people that somebody on a bench slides past to get out, by the way that passes fewest.
 *
 * @param found - the survey
 * @param bench - the bench
 * @returns whole people; undefined when nothing leads off the bench
 */
export function peopleToSlidePast(found: Survey, bench: Bench): number | undefined {
  const { fronts, ends } = waysOff(found, bench);
  const half = bench.lengthMm / 2;
  const ways: Stretch[] = [
    ...fronts,
    ...(ends.low ? [[-half, -half] as const] : []),
    ...(ends.high ? [[half, half] as const] : []),
  ];
  if (ways.length === 0) return undefined;
  const centres = found.places
    .filter(({ piece }) => piece.id === bench.id)
    .map(({ frame }) => toPiece(bench.at, frame.hipMm)[0]);
  const past = (x: number, [from, to]: Stretch) => {
    if (x >= from - TOUCHING_MM && x <= to + TOUCHING_MM) return 0;
    const [low, high] = x < from ? [x, from] : [to, x];
    return centres.filter((other) => other !== x && other >= low && other <= high).length;
  };
  return Math.max(0, ...centres.map((x) => Math.min(...ways.map((way) => past(x, way)))));
}
