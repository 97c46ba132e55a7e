import type { RowSituation } from '@settlewright/anthropometry';
import { normalTurnDeg } from '../parts/placement.ts';
import { benchLayout } from '../pieces/bench-layout.ts';
import type { PieceOf } from '../room/document.ts';
import { radians } from '../units/angle.ts';
import type { Limits } from './limits.ts';
import { clipped, clippedLine, extent, inFrame } from './plan.ts';
import { planOfPiece, rectangleOf, solidsNear, type Survey } from './survey.ts';
import { waysOff } from './ways-out.ts';

type Bench = PieceOf<'bench'>;

/** Benches further apart share no lane, millimetres. */
const LANE_MM = 2500;

/**
 * Rows of seats: each bench with the bench right ahead of it that looks the same way.
 *
 * @param found - the survey
 * @param limits - of the rules
 * @returns one entry a lane, the row that is left by it first
 */
export function rowSituations(found: Survey, limits: Limits): RowSituation[] {
  const benches = found.document.pieces.filter((piece): piece is Bench => piece.kind === 'bench');
  return benches.flatMap((bench) => {
    const seats = found.places.filter(({ piece }) => piece.id === bench.id).length;
    const [ahead] = benches
      .flatMap((other) => {
        const clearMm = laneTo(bench, other, limits);
        return clearMm === undefined ? [] : [{ other, clearMm }];
      })
      .sort((a, b) => a.clearMm - b.clearMm);
    if (ahead === undefined || seats === 0 || isParted(found, bench, ahead.other, ahead.clearMm)) return [];
    const { low, high } = waysOff(found, bench, limits).ends;
    return [
      {
        pieceIds: [bench.id, ahead.other.id] as [string, string],
        marks: [bench.mark, ahead.other.mark] as [string, string],
        clearMm: ahead.clearMm,
        seats,
        openEnds: (Number(low) + Number(high)) as 0 | 1 | 2,
      },
    ];
  });
}

/** Seat front to the rear of the row ahead; undefined where the other is no row ahead. */
function laneTo(bench: Bench, other: Bench, { sameWayRad }: Limits): number | undefined {
  if (other.id === bench.id) return undefined;
  if (Math.abs(radians(normalTurnDeg(other.at.turnDeg - bench.at.turnDeg))) > sameWayRad) return undefined;
  const half = other.lengthMm / 2;
  const rear = inFrame(rectangleOf(other, [-half, half], [0, 0]), planOfPiece(bench));
  const shared = clippedLine(rear, { left: [-bench.lengthMm / 2, bench.lengthMm / 2] });
  if (shared.length === 0) return undefined;
  const [left, right] = extent(shared, 0);
  const clearMm = extent(shared, 1)[0] - benchLayout(bench).frontZMm;
  return right - left > 1 && clearMm > 0 && clearMm <= LANE_MM ? clearMm : undefined;
}

/** A wall, a table or a bench that looks another way between two rows makes them no rows. */
function isParted(found: Survey, bench: Bench, other: Bench, clearMm: number): boolean {
  const front = benchLayout(bench).frontZMm;
  const half = bench.lengthMm / 2;
  const between = { left: [-half, half] as const, ahead: [front + 1, front + clearMm - 1] as const };
  return solidsNear(
    found,
    planOfPiece(bench),
    half + front + LANE_MM,
    ({ id, kind }) =>
      id !== bench.id && id !== other.id && (kind === 'bulkhead' || kind === 'table' || kind === 'bench'),
  ).some(({ outline }) => {
    const inside = clipped(outline, between);
    if (inside.length === 0) return false;
    const [from, to] = extent(inside, 0);
    return to - from > half / 2;
  });
}
