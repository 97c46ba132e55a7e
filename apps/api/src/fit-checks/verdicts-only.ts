import type { FitCell, FitSheet, Outcome, RuleBook } from '@settlewright/anthropometry';
import { READS_NO_BODY } from './without-person';

/** Fine margins of several checks would give back the measure that they read. */
export const COARSE_STEP_MM = 25.4;
/** Room beyond this is only said to be at least so much: more helps nobody who builds, and tells of the body. */
export const MOST_ROOM_MM = 3 * COARSE_STEP_MM;

/** What everybody may know of a verdict: the word, roughly how much room is left, and whether it was predicted. */
interface VerdictOnly {
  kind: 'verdict';
  verdict: Extract<Outcome, { kind: 'verdict' }>['verdict'];
  /** In whole inches: at least so much room is left, or at most so much is missing. */
  margin: number;
  marginRange?: { low: number; high: number };
  estimated: boolean;
}

type OpenOutcome = VerdictOnly | Exclude<Outcome, { kind: 'verdict' | 'information' }>;
export type OpenCell = Omit<FitCell, 'outcome'> & { outcome: OpenOutcome };

export interface VerdictSheet extends Omit<FitSheet, 'rows' | 'publicRow' | 'piecesAndWays'> {
  rows: (Omit<FitSheet['rows'][number], 'cells'> & { cells: OpenCell[] })[];
  publicRow: { cells: (OpenCell & { readAs: string })[] };
  piecesAndWays: OpenCell[];
}

/**
 * The sheet for people who do not see measures. Built from a list of what is shown, so that something
 * new in a cell stays hidden until it is put on the list. Margins that read a sitter's body are coarse; those of
 * the public and of pieces alone tell of nobody.
 */
export function verdictsOnly(sheet: FitSheet, ruleBook: RuleBook): VerdictSheet {
  const units = new Map(ruleBook.rules.map(({ id, unit }) => [id, unit]));
  const unitOf = ({ ruleId }: FitCell) => units.get(ruleId) ?? 'mm';
  const openCell = (cell: FitCell) => opened(cell, unitOf(cell) === 'mm');
  const exactCell = (cell: FitCell) => opened(cell, false);
  return {
    rows: sheet.rows.map(({ sitterId, name, kind, placeId, mark, place, worst, cells }) => ({
      sitterId,
      name,
      kind,
      placeId,
      mark,
      place,
      worst,
      cells: cells.map(openCell),
    })),
    publicRow: {
      cells: sheet.publicRow.cells.map((cell) => ({ ...exactCell(cell), readAs: cell.readAs })),
    },
    piecesAndWays: sheet.piecesAndWays.map((cell) =>
      READS_NO_BODY.has(cell.ruleId) ? exactCell(cell) : openCell(cell),
    ),
    emptyPlaceIds: sheet.emptyPlaceIds,
    counts: sheet.counts,
    confidence: sheet.confidence,
    ruleVersion: sheet.ruleVersion,
  };
}

function opened(cell: FitCell, isCoarse: boolean): OpenCell {
  const { id, ruleId, scope, placeId, sitterId, pieceIds, marks, side, outcome } = cell;
  return {
    id,
    ruleId,
    scope,
    ...(placeId === undefined ? {} : { placeId }),
    ...(sitterId === undefined ? {} : { sitterId }),
    pieceIds,
    marks,
    ...(side === undefined ? {} : { side }),
    outcome: openOutcome(outcome, isCoarse),
  };
}

function openOutcome(outcome: Outcome, isCoarse: boolean): OpenOutcome {
  switch (outcome.kind) {
    case 'verdict': {
      const { kind, verdict, marginRange, estimated } = outcome;
      // A hair below zero counts as equal, and then the verdict is the better one.
      const insideFail = verdict === 'fits' || verdict === 'tight';
      const margin = insideFail && outcome.margin < 0 ? 0 : outcome.margin;
      if (!isCoarse) return { kind, verdict, margin, ...(marginRange ? { marginRange } : {}), estimated };
      const shown = coarse(margin);
      const range = marginRange && { low: coarse(marginRange.low), high: -coarse(-marginRange.high) };
      // Room that is only said to be at least so much has no other end.
      const withRange = range && shown < MOST_ROOM_MM ? { marginRange: range } : {};
      return { kind, verdict, margin: shown, ...withRange, estimated };
    }
    case 'information':
      return { kind: 'notAsked', reason: 'shown to owner and designer' };
    default:
      return outcome;
  }
}

/** Down to a whole step, so that room is never overstated and what is missing stays missing. Erased numbers stay empty. */
function coarse(mm: number): number {
  if (typeof mm !== 'number') return mm;
  const steps = Math.floor(mm / COARSE_STEP_MM + ON_A_STEP);
  return Math.min(MOST_ROOM_MM, steps * COARSE_STEP_MM);
}

/** What lies on a step stays there, whatever a sum lost in its last digit. */
const ON_A_STEP = 1e-9;
