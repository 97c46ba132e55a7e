import type { FitCell, FitSheet, Verdict } from '@settlewright/anthropometry';

/** How one cell answers, reduced to what can be compared. */
export type CellState = Verdict | 'inside' | 'outside' | 'gone';

/** A cell that answers differently in two sheets. */
export interface CellChange {
  cellId: string;
  ruleId: string;
  placeId?: string;
  sitterId?: string;
  marks: string[];
  from: CellState;
  to: CellState;
}

/** Better answers rank higher; what is not known is never better than tight. */
export const STATE_RANK: Record<CellState, number> = {
  gone: -1,
  wontFit: 0,
  outside: 0,
  notKnown: 1,
  tight: 2,
  fits: 3,
  inside: 3,
};

/** Sitters' cells, then those of pieces and ways. */
export function cellsOf(sheet: FitSheet): FitCell[] {
  return [...sheet.rows.flatMap(({ cells }) => cells), ...sheet.piecesAndWays];
}

/**
 * What a cell answers, where it answers with a verdict or a clause.
 *
 * @param cell - a cell of a fit sheet
 * @returns the state; `undefined` for information and for rules that were not asked or have no object
 */
export function stateOf(cell: FitCell): CellState | undefined {
  if (cell.outcome.kind === 'verdict') return cell.outcome.verdict;
  if (cell.outcome.kind === 'clause') return cell.outcome.inside ? 'inside' : 'outside';
  return undefined;
}

/**
 * Cells that answer differently in two sheets of the same people.
 *
 * @param before - the first sheet
 * @param after - the second sheet
 * @returns changes in the order of the first sheet; a cell that is there only before is gone, one only after is
 *   new and not counted
 */
export function sheetChanges(before: FitSheet, after: FitSheet): CellChange[] {
  const later = new Map(cellsOf(after).map((cell) => [cell.id, stateOf(cell)]));
  return cellsOf(before).flatMap((cell) => {
    const from = stateOf(cell);
    const to = later.get(cell.id) ?? 'gone';
    if (from === undefined || to === from) return [];
    return [
      {
        cellId: cell.id,
        ruleId: cell.ruleId,
        ...(cell.placeId === undefined ? {} : { placeId: cell.placeId }),
        ...(cell.sitterId === undefined ? {} : { sitterId: cell.sitterId }),
        marks: cell.marks,
        from,
        to,
      },
    ];
  });
}

/** True for a change to a better answer. */
export const isGain = ({ from, to }: Pick<CellChange, 'from' | 'to'>): boolean =>
  STATE_RANK[to] > STATE_RANK[from];

/** True for a change to a worse answer. */
export const isLoss = ({ from, to }: Pick<CellChange, 'from' | 'to'>): boolean =>
  STATE_RANK[to] < STATE_RANK[from];
