import type { FitCell, FitSheet, Outcome, VerdictOutcome } from '@settlewright/anthropometry';
import { PersonName } from '../common/person-name';

/**
 * Rules about a bench, a table or a way that read nobody's body. All others lose their values. Clauses of a code are
 * not among them, as they give no verdict that could lose its numbers.
 */
export const READS_NO_BODY: ReadonlySet<string> = new Set([
  'SIDE-02',
  'SEAT-06',
  'SEAT-07',
  'BACK-01',
  'BACK-02',
  'BACK-04',
  'SILL-03',
  'TABLE-07',
  'TABLE-08',
  'TABLE-09',
  'TABLE-10',
  'EGRESS-01',
  'EGRESS-02',
  'EGRESS-08',
]);

/** A verdict whose numbers went with the person they told of. */
type EmptiedOutcome = { [K in keyof VerdictOutcome]: VerdictOutcome[K] | null } & {
  kind: 'verdict';
  verdict: VerdictOutcome['verdict'];
};

/**
 * A stored sheet without one person: the verdicts stay, every number that tells of that body goes, the name
 * becomes another one.
 */
export function withoutPerson(
  sheet: FitSheet,
  person: { id: string; name: string },
  newName: string,
): FitSheet {
  const rows = sheet.rows.filter(({ sitterId }) => sitterId === person.id);
  if (rows.length === 0) return sheet;
  const benches = new Set(rows.map(({ placeId }) => placeId.slice(0, placeId.lastIndexOf(':'))));
  const cleared: FitSheet = {
    ...sheet,
    rows: sheet.rows.map((row) =>
      row.sitterId === person.id ? { ...row, name: newName, cells: row.cells.map(emptied) } : row,
    ),
    piecesAndWays: sheet.piecesAndWays.map((cell) =>
      !READS_NO_BODY.has(cell.ruleId) && cell.pieceIds.some((id) => benches.has(id)) ? emptied(cell) : cell,
    ),
  };
  return renamed(cleared, person.name, newName);
}

function emptied(cell: FitCell): FitCell {
  return { ...cell, outcome: emptiedOutcome(cell.outcome) };
}

function emptiedOutcome(outcome: Outcome): Outcome {
  if (outcome.kind === 'information') return { kind: 'notAsked', reason: 'the sitter was removed' };
  if (outcome.kind !== 'verdict') return outcome;
  const empty: EmptiedOutcome = {
    kind: 'verdict',
    verdict: outcome.verdict,
    value: null,
    pass: {},
    fail: {},
    margin: null,
    estimated: outcome.estimated,
    probability: null,
    settleWith: [],
    bodyLedger: [],
    setLedger: [],
  };
  // The library's type describes a sheet that was just made; only a stored one can have lost numbers.
  return empty as VerdictOutcome;
}

/** Replaces the name wherever a text of the sheet says it as whole words. */
function renamed<T>(value: T, name: string, newName: string): T {
  const said = new PersonName(name);
  const walk = (part: unknown): unknown => {
    if (typeof part === 'string') return said.replacedIn(part, newName);
    if (Array.isArray(part)) return part.map(walk);
    if (typeof part !== 'object' || part === null) return part;
    return Object.fromEntries(Object.entries(part).map(([key, entry]) => [key, walk(entry)]));
  };
  return walk(value) as T;
}
