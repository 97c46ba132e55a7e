import type { FitCell, FitSheet, Outcome } from '@settlewright/anthropometry';

/** What everybody may know of a verdict: the word, the room left, and whether it was predicted. */
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
export function verdictsOnly(sheet: FitSheet): VerdictSheet {
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
    ruleVersion: sheet.ruleVersion,
  };
}

function openCell(cell: FitCell): OpenCell {
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
    outcome: openOutcome(outcome),
  };
}

function openOutcome(outcome: Outcome): OpenOutcome {
  switch (outcome.kind) {
    case 'verdict': {
      const { kind, verdict, margin, marginRange, estimated } = outcome;
      return { kind, verdict, margin, ...(marginRange ? { marginRange } : {}), estimated };
    }
    case 'information':
      return { kind: 'notAsked', reason: 'shown to owner and designer' };
    default:
      return outcome;
  }
}
