import type { FitCell, FitSheet, Outcome, RuleBook, RuleUnit } from '@settlewright/anthropometry';

/** Exact margins of several checks would give back the measure that they read. */
const STEP_MM = 5;

/** What everybody may know of a verdict: the word, about how much room is left, and whether it was predicted. */
interface VerdictOnly {
  kind: 'verdict';
  verdict: Extract<Outcome, { kind: 'verdict' }>['verdict'];
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
 * new in a cell stays hidden until it is put on the list.
 */
export function verdictsOnly(sheet: FitSheet, ruleBook: RuleBook): VerdictSheet {
  const units = new Map(ruleBook.rules.map(({ id, unit }) => [id, unit]));
  const openCell = (cell: FitCell) => opened(cell, units.get(cell.ruleId) ?? 'mm');
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
      cells: sheet.publicRow.cells.map((cell) => ({ ...openCell(cell), readAs: cell.readAs })),
    },
    piecesAndWays: sheet.piecesAndWays.map(openCell),
    emptyPlaceIds: sheet.emptyPlaceIds,
    counts: sheet.counts,
    confidence: sheet.confidence,
    ruleVersion: sheet.ruleVersion,
  };
}

function opened(cell: FitCell, unit: RuleUnit): OpenCell {
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
    outcome: openOutcome(outcome, unit),
  };
}

function openOutcome(outcome: Outcome, unit: RuleUnit): OpenOutcome {
  switch (outcome.kind) {
    case 'verdict': {
      const { kind, verdict, marginRange, estimated } = outcome;
      // A hair below zero counts as equal, and then the verdict is the better one.
      const insideFail = verdict === 'fits' || verdict === 'tight';
      const margin = insideFail && outcome.margin < 0 ? 0 : outcome.margin;
      if (unit !== 'mm') return { kind, verdict, margin, ...(marginRange ? { marginRange } : {}), estimated };
      const range = marginRange && { low: coarse(marginRange.low), high: coarse(marginRange.high) };
      return { kind, verdict, margin: coarse(margin), ...(range ? { marginRange: range } : {}), estimated };
    }
    case 'information':
      return { kind: 'notAsked', reason: 'shown to owner and designer' };
    default:
      return outcome;
  }
}

/** To the nearest step, and never over zero: what is missing stays missing. Erased numbers stay empty. */
function coarse(mm: number): number {
  if (typeof mm !== 'number') return mm;
  const near = Math.round(mm / STEP_MM) * STEP_MM;
  return mm < 0 ? Math.min(-STEP_MM, near) : near;
}
