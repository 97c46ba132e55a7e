import { toPiece } from '../parts/placement.ts';
import { benchLayout } from '../pieces/bench-layout.ts';
import type { PieceKind, PieceOf } from '../room/document.ts';
import type { Limits } from './limits.ts';
import { clipped, extent } from './plan.ts';
import { planOfPiece, solidsNear, type Survey } from './survey.ts';

type Bench = PieceOf<'bench'>;

const TOUCHING_MM = 1e-6;
/** Kinds that stand still; chairs are moved aside. */
const STANDING: readonly PieceKind[] = ['bench', 'table', 'bulkhead', 'sill'];

type Stretch = readonly [from: number, to: number];

/**
 * Ways off a bench, along its x axis: stretches of its front with nothing before them, and its open ends.
 *
 * @param found - the survey
 * @param bench - the bench
 * @param limits - of rule EGRESS-08
 * @returns stretches along the bench's first plan axis, and which ends are open, first axis low and high
 */
export function waysOff(
  found: Survey,
  bench: Bench,
  { slidePast: { stepOutMm, narrowestMm, bodyMm } }: Limits,
): { fronts: Stretch[]; ends: { low: boolean; high: boolean } } {
  const front = benchLayout(bench).frontZMm;
  const half = bench.lengthMm / 2;
  const near = solidsNear(
    found,
    planOfPiece(bench),
    half + front + stepOutMm + narrowestMm,
    (piece) => piece.id !== bench.id && STANDING.includes(piece.kind),
    ({ bottomMm, topMm }) => topMm > bodyMm[0] && bottomMm < bodyMm[1],
  );
  const ahead = [front, front + stepOutMm] as const;
  const blocked = near
    .map(({ outline }) => clipped(outline, { left: [-half, half], ahead }))
    .filter((outline) => outline.length > 0)
    .map((outline) => extent(outline, 0))
    .sort((a, b) => a[0] - b[0]);
  const fronts: Stretch[] = [];
  let from = -half;
  for (const [low, high] of [...blocked, [half, half]] as Stretch[]) {
    if (low - from >= narrowestMm - TOUCHING_MM) fronts.push([from, low]);
    from = Math.max(from, high);
  }
  const isOpen = (left: Stretch) =>
    !near.some(({ outline }) => clipped(outline, { left, ahead: [front, front + narrowestMm] }).length > 0);
  return {
    fronts,
    ends: { low: isOpen([-half - narrowestMm, -half]), high: isOpen([half, half + narrowestMm]) },
  };
}

/**
 * Most people that somebody on a bench slides past to get out, by the way that passes fewest.
 *
 * @param found - the survey
 * @param bench - the bench
 * @param limits - of rule EGRESS-08
 * @returns whole people; undefined when nothing leads off the bench
 */
export function peopleToSlidePast(found: Survey, bench: Bench, limits: Limits): number | undefined {
  const { fronts, ends } = waysOff(found, bench, limits);
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
