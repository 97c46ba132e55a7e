import type { FitCell, FitSheet, RuleBook } from '@settlewright/anthropometry';

/** One column of the grid: cells of the same short name, whichever form of the rule was asked. */
export interface Column {
  name: string;
  cellOf: <Cell extends FitCell>(cells: readonly Cell[]) => Cell | undefined;
}

const SEVERITY = { wontFit: 0, notKnown: 1, tight: 2, fits: 3 } as const;
const NO_VERDICT = { clause: 4, information: 4, doesNotApply: 5, notAsked: 5 } as const;

const severityOf = ({ outcome }: FitCell): number =>
  outcome.kind === 'verdict' ? SEVERITY[outcome.verdict] : NO_VERDICT[outcome.kind];

/** Columns in the order of the sheet; a check that applies to nobody here is left out. */
export function columnsOf(sheet: FitSheet, ruleBook: RuleBook): Column[] {
  const names = new Map<string, boolean>();
  for (const cell of sheet.rows.flatMap((row) => row.cells)) {
    const name = ruleBook.rule(cell.ruleId).columnName;
    const speaks = cell.outcome.kind === 'verdict' || cell.outcome.kind === 'information';
    names.set(name, (names.get(name) ?? false) || speaks);
  }
  return [...names]
    .filter(([, speaks]) => speaks)
    .map(([name]) => ({
      name,
      // Where two forms of a rule share a column, the worse one is shown.
      cellOf: (cells) =>
        cells
          .filter((cell) => ruleBook.rule(cell.ruleId).columnName === name)
          .sort((a, b) => severityOf(a) - severityOf(b))[0],
    }));
}

/** Whose turn it is first: the order of the bench, the worst margin, or the name. */
export type RowOrder = 'place' | 'margin' | 'name';

/** A margin that is no number, in a stored sheet, comes last. */
const worstMargin = (row: FitSheet['rows'][number]) =>
  Math.min(
    ...row.cells.map(({ outcome }) =>
      outcome.kind === 'verdict' && typeof outcome.margin === 'number' ? outcome.margin : Infinity,
    ),
  );

/** Rows in the wanted order; the sheet itself is in order of place. */
export function orderedRows(sheet: FitSheet, order: RowOrder): FitSheet['rows'] {
  if (order === 'name') return [...sheet.rows].sort((a, b) => a.name.localeCompare(b.name));
  if (order === 'margin') return [...sheet.rows].sort((a, b) => worstMargin(a) - worstMargin(b));
  return sheet.rows;
}

/** Trouble first, as the phone lists people; what is not known is never better than tight. */
export function troubleFirst(rows: FitSheet['rows']): FitSheet['rows'] {
  return [...rows].sort((a, b) => SEVERITY[a.worst] - SEVERITY[b.worst]);
}
