import { toPiece } from '../parts/placement.ts';
import { insideCorners, seatRun } from '../pieces/corners.ts';
import type { PieceOf, SetDocument } from '../room/document.ts';
import { outOfFrame, type PlanFrame } from '../situation/plan.ts';
import { placesOf, planOfPiece, type Survey, type SurveyedPlace } from '../situation/survey.ts';

type Bench = PieceOf<'bench'>;

const STEP_MM = 40;
/** This near to the other leg of a corner one turns about, knees inwards, and has the whole corner for it. */
const TURNING_MM = 150;

/** A spot on a seat: somebody who slides is there at some time. */
export interface Station {
  /** Origin on the seat's front, second axis ahead of whoever sits. */
  plan: PlanFrame;
  /** A place of the bench, to take the seat's sizes from. */
  on: SurveyedPlace;
  /** How far that is from the place one slides to. */
  slidMm: number;
  /** Places that one slides over up to there. */
  over: readonly string[];
  /** One may stand up here: before a place, or beside the end of the bench on a side of its frame. */
  out?: 'before' | -1 | 1;
}

/**
 * The seat to one side of a place, as far as it goes: along its bench, and round an inside corner along the next one.
 *
 * @param found - the survey
 * @param place - where one slides to
 * @param side - 1 to the sitter's left, -1 to the right
 * @returns stations from the place on; none for a chair
 */
export function seatLine(found: Survey, place: SurveyedPlace, side: 1 | -1): Station[] {
  const { piece } = place;
  if (piece.kind !== 'bench') return [];
  const corner = cornerAt(piece, found.document, side);
  const own = placeX(place, piece);
  const stations = along(found, piece, own, side, corner === undefined, {
    slidMm: 0,
    over: [],
    skip: place.frame.placeId,
  });
  const last = stations.at(-1);
  if (corner === undefined || last === undefined) return stations;
  const { other } = corner;
  const back = insideCorners(other, found.document).find(({ other: one }) => one.id === piece.id);
  if (back === undefined) return stations;
  const run = seatRun(other, found.document);
  const from = back.end === 'left' ? run.leftMm + TURNING_MM : run.rightMm - TURNING_MM;
  return [
    ...stations,
    ...along(found, other, from, back.end === 'left' ? 1 : -1, true, {
      slidMm: last.slidMm + place.effectiveDepthMm,
      over: last.over,
    }),
  ];
}

const placeX = (place: SurveyedPlace, bench: Bench): number => toPiece(bench.at, place.frame.frontMm)[0];

const cornerAt = (bench: Bench, document: SetDocument, side: 1 | -1) =>
  insideCorners(bench, document).find(({ end }) => end === (side > 0 ? 'right' : 'left'));

/** Stations along one bench. */
function along(
  found: Survey,
  bench: Bench,
  fromX: number,
  side: 1 | -1,
  toEnd: boolean,
  before: { slidMm: number; over: readonly string[]; skip?: string },
): Station[] {
  const places = placesOf(found, bench);
  const [on] = places;
  if (on === undefined) return [];
  const run = seatRun(bench, found.document);
  const endX = toEnd
    ? (side * bench.lengthMm) / 2
    : (side > 0 ? run.rightMm : run.leftMm) - side * TURNING_MM;
  const lengthMm = Math.max(0, side * (endX - fromX));
  const frontZ = toPiece(bench.at, on.frame.frontMm)[2];
  // Before each place one may stand up: a station lies there, besides those in between and the end.
  const ahead = places
    .map((place) => ({ id: place.frame.placeId, mm: side * (placeX(place, bench) - fromX) }))
    .filter(({ id, mm }) => id !== before.skip && mm > 0);
  const marks = [
    ...Array.from({ length: Math.floor(lengthMm / STEP_MM) + 1 }, (_, n) => n * STEP_MM),
    ...ahead.map(({ mm }) => mm),
    lengthMm,
  ].sort((a, b) => a - b);
  return marks
    .filter((mm, i) => mm !== marks[i - 1] && mm <= lengthMm)
    .map((mm): Station => {
      const [[xMm, zMm] = [0, 0]] = outOfFrame([[fromX + side * mm, frontZ]], planOfPiece(bench));
      const isPlace = ahead.some((one) => one.mm === mm) || (mm === 0 && before.skip !== undefined);
      const out = isPlace ? 'before' : toEnd && mm === lengthMm ? side : undefined;
      return {
        plan: { xMm, zMm, facingRad: on.plan.facingRad },
        on,
        slidMm: before.slidMm + mm,
        over: [...before.over, ...ahead.filter((one) => one.mm <= mm).map(({ id }) => id)],
        ...(out === undefined ? {} : { out }),
      };
    });
}
