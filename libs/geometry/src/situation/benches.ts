import type { BenchSituation, CornerSituation } from '@settlewright/anthropometry';
import { normalTurnDeg, toPiece } from '../parts/placement.ts';
import { benchLayout } from '../pieces/bench-layout.ts';
import { insideCorners } from '../pieces/corners.ts';
import type { PieceOf } from '../room/document.ts';
import { radians } from '../units/angle.ts';
import { clippedLine, extent, inFrame, type PlanOutline } from './plan.ts';
import { endSpace } from './clear-floor.ts';
import type { Limits } from './limits.ts';
import { peopleToSlidePast } from './ways-out.ts';
import { benchesOf, placesOf, planOfPiece, rectangleOf, type Survey } from './survey.ts';

type Bench = PieceOf<'bench'>;

/**
 * Every bench as a whole.
 *
 * @param found - the survey
 * @param limits - of the rules
 * @returns one entry a bench
 */
export function benchSituations(found: Survey, limits: Limits): BenchSituation[] {
  return benchesOf(found).map((bench) => {
    const layout = benchLayout(bench);
    const seatTop = layout.seatTopFrontMm;
    const wall = wallBehind(found, bench, limits);
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
      slidePast: peopleToSlidePast(found, bench, limits),
      // Measured where it is asked: a wheelchair comes alongside a bench that is kept accessible.
      endSpace: bench.accessible ? endSpace(found, bench, limits) : undefined,
    };
  });
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

/** The bulkhead a bench stands against. */
function wallBehind(
  found: Survey,
  bench: Bench,
  { wall: { withinMm, parallelRad } }: Limits,
): { topMm: number; gapMm: number; coveredMm: number } | undefined {
  const half = bench.lengthMm / 2;
  const rear: PlanOutline = rectangleOf(bench, [-half, half], [0, 0]);
  for (const { piece } of found.pieces) {
    if (piece.kind !== 'bulkhead') continue;
    if (Math.abs(radians(normalTurnDeg(piece.at.turnDeg - bench.at.turnDeg))) > parallelRad) continue;
    const wall = inFrame(rear, planOfPiece(piece));
    const [near, far] = extent(wall, 1);
    if (near < -withinMm || far > withinMm) continue;
    const beside = clippedLine(wall, { left: [-piece.lengthMm / 2, piece.lengthMm / 2] });
    if (beside.length === 0) continue;
    const [left, right] = extent(beside, 0);
    if (right - left < bench.lengthMm / 2) continue;
    return { topMm: piece.heightMm, gapMm: Math.max(0, far), coveredMm: right - left };
  }
  return undefined;
}
