import type { PlaceSituation, RuleBook, SetSituation } from '@settlewright/anthropometry';
import { benchLayout } from '../pieces/bench-layout.ts';
import { foamSituation } from '../pieces/foam-situation.ts';
import { pressedSeatHeightMm } from '../pieces/seat-sink.ts';
import type { SetDocument } from '../room/document.ts';
import { radians } from '../units/angle.ts';
import { benchSituations, cornerSituations } from './benches.ts';
import { clearCircle, clearTeeArm } from './clear-floor.ts';
import { facingSituations } from './facing.ts';
import { overheadAheadOf, overheadOf, sillsBeside, wallsBeside } from './beside.ts';
import { lapTable } from './lap-table.ts';
import { limitsOf } from './limits.ts';
import { routeStretches } from './route.ts';
import { rowSituations } from './rows.ts';
import { survey, type Survey, type SurveyedPlace } from './survey.ts';
import { tableDiners, tableSituations, type TableDiners } from './tables.ts';
import { waySituations } from './ways.ts';

/**
 * How far from the seat's centreline a sill's near edge may lie and still be beside the place:
 * half of the widest forearms of SILL-04 (667 mm) and 75 mm.
 */
const SILL_REACH_MM = 667 / 2 + 75;

/** What a set offers to whoever sits: what can be measured without the rules of pieces and ways. */
export interface SeatSituation extends Pick<SetSituation, 'places' | 'facing' | 'corners'> {
  tables: TableDiners[];
}

/**
 * Measures what a set offers to whoever sits. Checks of single sitters read nothing else of the set. It answers for the
 * posture that each place suggests; a posture somebody chose by hand moves the drawn body, not the checks.
 *
 * @param document - the set
 * @returns lengths in millimetres, angles in radians
 */
export function measureSet(document: SetDocument): SeatSituation;
/**
 * Measures what a set offers at every place, bench, table and way. Checks read nothing else of the set.
 *
 * @param document - the set
 * @param ruleBook - some rules of pieces and ways say how they are measured
 * @returns lengths in millimetres, angles in radians
 */
export function measureSet(document: SetDocument, ruleBook: Pick<RuleBook, 'rule'>): SetSituation;
export function measureSet(
  document: SetDocument,
  ruleBook?: Pick<RuleBook, 'rule'>,
): SeatSituation | SetSituation {
  const found = survey(document);
  const places = found.places.map((place) => placeSituation(found, place));
  const seats = { places, facing: facingSituations(found), corners: cornerSituations(found) };
  if (!ruleBook) return { ...seats, tables: tableDiners(found, places) };
  const limits = limitsOf(ruleBook);
  const { route, turningAt } = document.asked;
  return {
    ...seats,
    benches: benchSituations(found, limits),
    tables: tableSituations(found, places, limits),
    ways: waySituations(found, places, limits),
    rows: rowSituations(found, limits),
    ...(route ? { route: routeStretches(found, route, limits) } : {}),
    ...(turningAt
      ? {
          turning: {
            circleMm: clearCircle(found, turningAt, limits),
            teeArmMm: clearTeeArm(found, turningAt, limits),
          },
        }
      : {}),
  };
}

function placeSituation(found: Survey, place: SurveyedPlace): PlaceSituation {
  const { frame, piece } = place;
  return {
    placeId: frame.placeId,
    pieceId: piece.id,
    mark: piece.mark,
    place: frame.place,
    seatTopFrontMm: frame.frontMm[1],
    seatTopHipMm: frame.hipMm[1],
    deckHeightMm: piece.deckHeightMm,
    foam: foamSituation(piece.seatCushion),
    effectiveDepthMm: place.effectiveDepthMm,
    widthMm: frame.widthMm,
    heelRoomMm: heelRoom(piece),
    seatTiltRad: piece.kind === 'bench' ? radians(piece.seatTiltDeg) : 0,
    backLeanRad: radians(piece.backLeanDeg),
    backTopMm: piece.backHeightMm > 0 ? pressedSeatHeightMm(piece) + piece.backHeightMm : undefined,
    wallMm: wallsBeside(found, place),
    sills: sillsBeside(found, place, SILL_REACH_MM),
    table: lapTable(found, place),
    overhead: overheadOf(found, place),
    overheadAhead: overheadAheadOf(found, place),
  };
}

function heelRoom(piece: SurveyedPlace['piece']): number | undefined {
  if (piece.kind !== 'bench' || piece.base === 'open') return undefined;
  const layout = benchLayout(piece);
  return layout.frontZMm - layout.kickFrontZMm;
}
