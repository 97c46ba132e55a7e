import type { FacingSituation } from '@settlewright/anthropometry';
import { normalTurnDeg, toPiece } from '../parts/placement.ts';
import { benchLayout } from '../pieces/bench-layout.ts';
import type { PieceOf } from '../room/document.ts';
import { clipped, clippedLine, extent, inFrame } from './plan.ts';
import {
  benchesOf,
  placesOf,
  planOfPiece,
  rectangleOf,
  solidsNear,
  type Survey,
  type SurveyedPlace,
} from './survey.ts';

type Bench = PieceOf<'bench'>;

/** Benches this near to looking straight at each other face each other, degrees. */
const OPPOSED_WITHIN_DEG = 15;
/** Benches further apart share no knee space, millimetres. */
const FACING_GAP_MM = 2500;
/** Strips that share less than this do not overlap, millimetres. */
const SHARED_MM = 1;

/**
 * Benches that face each other with nothing between them.
 *
 * @param found - the survey
 * @returns one entry a pair of benches
 */
export function facingSituations(found: Survey): FacingSituation[] {
  const benches = benchesOf(found);
  return benches.flatMap((bench, i) =>
    benches.slice(i + 1).flatMap((other) => facing(found, bench, other) ?? []),
  );
}

function facing(found: Survey, bench: Bench, other: Bench): FacingSituation | undefined {
  const turn = Math.abs(normalTurnDeg(other.at.turnDeg - bench.at.turnDeg));
  if (turn < 180 - OPPOSED_WITHIN_DEG) return undefined;
  const front = benchLayout(bench).frontZMm;
  const otherFront = benchLayout(other).frontZMm;
  const half = other.lengthMm / 2;
  const own = planOfPiece(bench);
  const line = inFrame(rectangleOf(other, [-half, half], [otherFront, otherFront]), own);
  const shared = clippedLine(line, { left: [-bench.lengthMm / 2, bench.lengthMm / 2] });
  if (shared.length === 0) return undefined;
  const [left, right] = extent(shared, 0);
  const gapMm = extent(shared, 1)[0] - front;
  if (right - left < SHARED_MM || gapMm <= 0 || gapMm > FACING_GAP_MM) return undefined;
  const between = { left: [left, right] as const, ahead: [front + 1, front + gapMm - 1] as const };
  const blocking = solidsNear(
    found,
    own,
    FACING_GAP_MM + bench.lengthMm,
    (piece) =>
      (piece.kind === 'bench' || piece.kind === 'bulkhead') && piece.id !== bench.id && piece.id !== other.id,
  );
  // What only reaches in from the side, such as the third leg of a U, does not part the two.
  const parts = blocking.some(({ outline }) => {
    const inside = clipped(outline, between);
    if (inside.length === 0) return false;
    const [from, to] = extent(inside, 0);
    return to - from > (right - left) / 2;
  });
  if (parts) return undefined;
  return {
    pieceIds: [bench.id, other.id],
    marks: [bench.mark, other.mark],
    gapMm,
    pairs: oppositePlaces(bench, placesOf(found, bench), placesOf(found, other)),
  };
}

/** Each place with the one most nearly opposite, when their centres lie within half a place of each other. */
function oppositePlaces(bench: Bench, own: SurveyedPlace[], others: SurveyedPlace[]): [string, string][] {
  const x = (place: SurveyedPlace) => toPiece(bench.at, place.frame.hipMm)[0];
  const nearest = (place: SurveyedPlace, candidates: SurveyedPlace[]) =>
    candidates
      .map((other) => ({ other, aside: Math.abs(x(other) - x(place)) }))
      .filter(({ other, aside }) => aside <= Math.max(place.frame.widthMm, other.frame.widthMm) / 2)
      .sort((a, b) => a.aside - b.aside)[0]?.other.frame.placeId;
  const pairs = own.flatMap((place): [string, string][] => {
    const opposite = nearest(place, others);
    return opposite === undefined ? [] : [[place.frame.placeId, opposite]];
  });
  const met = new Set(pairs.map(([, opposite]) => opposite));
  const rest = others.flatMap((place): [string, string][] => {
    const opposite = met.has(place.frame.placeId) ? undefined : nearest(place, own);
    return opposite === undefined ? [] : [[opposite, place.frame.placeId]];
  });
  return [...pairs, ...rest];
}
