import type { BenchSituation, CornerSituation, FacingSituation } from '@settlewright/anthropometry';
import { normalTurnDeg, toPiece } from '../parts/placement.ts';
import { benchLayout } from '../pieces/bench-layout.ts';
import { insideCorners } from '../pieces/corners.ts';
import type { PieceOf } from '../room/document.ts';
import { clipped, clippedLine, extent, inFrame, type PlanOutline } from './plan.ts';
import { endSpace } from './clear-floor.ts';
import { peopleToSlidePast } from './ways-out.ts';
import { planOfPiece, rectangleOf, solidsNear, type Survey, type SurveyedPlace } from './survey.ts';

type Bench = PieceOf<'bench'>;

/** Benches this near to looking straight at each other face each other, degrees. */
const OPPOSED_WITHIN_DEG = 15;
/** Benches further apart share no knee space, millimetres. */
const FACING_GAP_MM = 2500;
/** Strips that share less than this do not overlap, millimetres. */
const SHARED_MM = 1;
const TO_WALL_MM = 30;
const PARALLEL_WITHIN_DEG = 3;

const benchesOf = (found: Survey) =>
  found.document.pieces.filter((piece): piece is Bench => piece.kind === 'bench');

const placesOf = (found: Survey, bench: Bench) => found.places.filter((place) => place.piece.id === bench.id);

/**
 * Every bench as a whole.
 *
 * @param found - the survey
 * @returns one entry a bench
 */
export function benchSituations(found: Survey): BenchSituation[] {
  return benchesOf(found).map((bench) => {
    const layout = benchLayout(bench);
    const seatTop = layout.seatTopFrontMm;
    const wall = wallBehind(found, bench);
    const inner = layout.innerRightMm - layout.innerLeftMm;
    const own = {
      bottomAboveSeatMm: 0,
      topAboveSeatMm: layout.backTopMm - seatTop,
      gapToSeatMm: 0,
      lengthMm: inner,
      fixedToWall: wall !== undefined,
    };
    const wallAlone = wall && {
      bottomAboveSeatMm: 0,
      topAboveSeatMm: wall.topMm - seatTop,
      gapToSeatMm: wall.gapMm,
      lengthMm: Math.min(inner, wall.coveredMm),
      fixedToWall: true,
    };
    return {
      pieceId: bench.id,
      mark: bench.mark,
      lengthMm: bench.lengthMm,
      effectiveDepthMm: layout.frontZMm - layout.faceZMm,
      placeIds: placesOf(found, bench).map(({ frame }) => frame.placeId),
      unpressedSeatTopMm: seatTop,
      accessible: bench.accessible,
      back: layout.hasBack ? own : wallAlone,
      lumbar: layout.hasBack ? (bench.lumbar ?? { apexMm: 0, recessMm: 0 }) : undefined,
      slidePast: peopleToSlidePast(found, bench),
      // Measured where it is asked: a wheelchair comes alongside a bench that is kept accessible.
      endSpace: bench.accessible ? endSpace(found, bench) : undefined,
    };
  });
}

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

/**
 * First places beyond the inside corners of L and U benches.
 *
 * @param found - the survey
 * @returns one entry a leg of each corner that has places
 */
export function cornerSituations(found: Survey): CornerSituation[] {
  return benchesOf(found).flatMap((bench) =>
    insideCorners(bench, found.document).flatMap((corner): CornerSituation[] => {
      const place = placesOf(found, bench).at(corner.end === 'left' ? 0 : -1);
      if (place === undefined) return [];
      const [x] = toPiece(bench.at, place.frame.hipMm);
      return [
        {
          pieceIds: [bench.id, corner.other.id],
          marks: [bench.mark, corner.other.mark],
          placeId: place.frame.placeId,
          centreFromFrontMm: Math.abs(x - corner.otherFrontXMm),
          widthMm: place.frame.widthMm,
          effectiveDepthMm: place.effectiveDepthMm,
        },
      ];
    }),
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

/** The bulkhead a bench stands against. */
function wallBehind(
  found: Survey,
  bench: Bench,
): { topMm: number; gapMm: number; coveredMm: number } | undefined {
  const half = bench.lengthMm / 2;
  const rear: PlanOutline = rectangleOf(bench, [-half, half], [0, 0]);
  for (const { piece } of found.pieces) {
    if (piece.kind !== 'bulkhead') continue;
    if (Math.abs(normalTurnDeg(piece.at.turnDeg - bench.at.turnDeg)) > PARALLEL_WITHIN_DEG) continue;
    const wall = inFrame(rear, planOfPiece(piece));
    const [near, far] = extent(wall, 1);
    if (near < -TO_WALL_MM || far > TO_WALL_MM) continue;
    const beside = clippedLine(wall, { left: [-piece.lengthMm / 2, piece.lengthMm / 2] });
    if (beside.length === 0) continue;
    const [left, right] = extent(beside, 0);
    if (right - left < bench.lengthMm / 2) continue;
    return { topMm: piece.heightMm, gapMm: Math.max(0, far), coveredMm: right - left };
  }
  return undefined;
}
