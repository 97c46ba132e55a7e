import type { FitCell, FitSheet, RuleBook } from '@settlewright/anthropometry';

/** One column of the grid: cells of the same short name, whichever form of the rule was asked. */
export interface Column {
  name: string;
  cellOf: (cells: readonly FitCell[]) => FitCell | undefined;
}

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
      cellOf: (cells) => cells.find((cell) => ruleBook.rule(cell.ruleId).columnName === name),
    }));
}

/** Whose turn it is first: the order of the bench, the worst margin, or the name. */
export type RowOrder = 'place' | 'margin' | 'name';

const worstMargin = (row: FitSheet['rows'][number]) =>
  Math.min(...row.cells.map(({ outcome }) => (outcome.kind === 'verdict' ? outcome.margin : Infinity)));

/** Rows in the wanted order; the sheet itself is in order of place. */
export function orderedRows(sheet: FitSheet, order: RowOrder): FitSheet['rows'] {
  if (order === 'name') return [...sheet.rows].sort((a, b) => a.name.localeCompare(b.name));
  if (order === 'margin') return [...sheet.rows].sort((a, b) => worstMargin(a) - worstMargin(b));
  return sheet.rows;
}
