import type { FitCell, Outcome, VerdictOutcome } from './fit-sheet.ts';
import { MM_PER_INCH, type RuleBook, type RuleConflict } from './rule-book.ts';

/** What of a cell tells whether rules are at odds; a sheet of verdicts alone has it too. */
type SaidCell = Pick<FitCell, 'ruleId' | 'pieceIds' | 'marks'> & {
  outcome:
    | (Pick<VerdictOutcome, 'kind' | 'verdict'> & Partial<Pick<VerdictOutcome, 'value'>>)
    | Exclude<Outcome, VerdictOutcome>;
};

/** Cells by where they stand on a sheet. */
interface SaidSheet<C> {
  rows: readonly { cells: readonly C[] }[];
  publicRow: { cells: readonly C[] };
  piecesAndWays: readonly C[];
}

/** What one side of a conflict says in a sheet: the worst cell of each of its rules. */
export interface SideSaid<C = FitCell> {
  purpose: string;
  cells: C[];
}

/** Two sides that are at odds in a sheet. */
export interface ConflictFound<C = FitCell> {
  conflict: RuleConflict;
  /** Marks of the pieces that both sides are about. */
  marks: string[];
  sides: [SideSaid<C>, SideSaid<C>];
}

/** Worst first. */
const RANK = { wontFit: 0, outside: 0, tight: 1, fits: 2, inside: 2 } as const;

/**
 * Rules that pull against each other in this sheet: both sides are asked of a common piece, both can be told, and
 * at least one of them is not met, so that mending it takes from the other. A conflict that names a range of values is
 * at odds wherever the value lies in it.
 *
 * @param sheet - a fit sheet; of verdicts alone, conflicts at a value are not found
 * @param ruleBook - the rules it was made with
 * @returns conflicts in the order of the rule book, each with the worst that either side says
 */
export function conflictsIn<C extends SaidCell>(sheet: SaidSheet<C>, ruleBook: RuleBook): ConflictFound<C>[] {
  const cells: C[] = [
    ...sheet.rows.flatMap((row) => row.cells),
    ...sheet.publicRow.cells,
    ...sheet.piecesAndWays,
  ];
  return ruleBook.conflicts.flatMap((conflict): ConflictFound<C>[] => {
    const [one, other] = conflict.sides.map(({ rules }) =>
      cells.filter((cell) => rules.includes(cell.ruleId) && metOf(cell) !== undefined),
    ) as [C[], C[]];
    const pairs = conflict.sides[1].rules.length === 0 ? alone(conflict, one) : pairsOf(conflict, one, other);
    if (pairs.length === 0) return [];
    return [
      {
        conflict,
        marks: marksOf(pairs),
        sides: [
          { purpose: conflict.sides[0].purpose, cells: worstOfEach(pairs.map(([cell]) => cell)) },
          { purpose: conflict.sides[1].purpose, cells: worstOfEach(pairs.flatMap(([, cell]) => cell ?? [])) },
        ],
      },
    ];
  });
}

type Pair<C> = readonly [C, C | undefined];

const alone = <C extends SaidCell>(conflict: RuleConflict, cells: readonly C[]): Pair<C>[] =>
  cells.filter((cell) => isInRange(conflict, cell)).map((cell) => [cell, undefined]);

function pairsOf<C extends SaidCell>(
  conflict: RuleConflict,
  ones: readonly C[],
  others: readonly C[],
): Pair<C>[] {
  return ones.flatMap((one) =>
    others
      .filter((other) => one.pieceIds.some((id) => other.pieceIds.includes(id)))
      .filter((other) =>
        conflict.atValue
          ? isInRange(conflict, one) || isInRange(conflict, other)
          : metOf(one) === false || metOf(other) === false,
      )
      .map((other): Pair<C> => [one, other]),
  );
}

function isInRange({ atValue }: RuleConflict, { ruleId, outcome }: SaidCell): boolean {
  if (!atValue || atValue.rule !== ruleId || outcome.kind !== 'verdict') return false;
  if (outcome.value === undefined) return false;
  return outcome.value >= atValue.lowerMm - 0.1 && outcome.value <= atValue.upperMm + 0.1;
}

/** Whether a cell is met; undefined where that cannot be told. */
function metOf({ outcome }: SaidCell): boolean | undefined {
  if (outcome.kind === 'clause') return outcome.inside;
  if (outcome.kind !== 'verdict' || outcome.verdict === 'notKnown') return undefined;
  return outcome.verdict === 'fits';
}

function rankOf({ outcome }: SaidCell): number {
  if (outcome.kind === 'clause') return RANK[outcome.inside ? 'inside' : 'outside'];
  return outcome.kind === 'verdict' && outcome.verdict !== 'notKnown' ? RANK[outcome.verdict] : RANK.fits;
}

function worstOfEach<C extends SaidCell>(cells: readonly C[]): C[] {
  const worst = new Map<string, C>();
  for (const cell of cells) {
    const known = worst.get(cell.ruleId);
    if (known === undefined || rankOf(cell) < rankOf(known)) worst.set(cell.ruleId, cell);
  }
  return [...worst.values()];
}

function marksOf(pairs: readonly Pair<SaidCell>[]): string[] {
  const marks = pairs.flatMap(([one, other]) =>
    one.marks.filter((_, i) => !other || other.pieceIds.includes(one.pieceIds[i] ?? '')),
  );
  return [...new Set(marks)];
}

/**
 * The note of a conflict with its numbers written in.
 *
 * @param conflict - from the rule book
 * @param sayLength - a length in millimetres, in the reader's units
 * @returns one sentence; shares are told in a hundred
 */
export function conflictNote(
  { note, numbers }: RuleConflict,
  sayLength: (millimetres: number) => string,
): string {
  return note.replace(/\{(\w+)\}/g, (_, name: string) => {
    const value = numbers[name] ?? NaN;
    if (name.endsWith('Share')) return `${Math.round(value * 100)} in 100`;
    return sayLength(name.endsWith('In') ? value * MM_PER_INCH : value);
  });
}
