import type { FitCell, FitSheet, SitterRow } from '@settlewright/anthropometry';
import { STATE_RANK, stateOf, type CellState } from './sheet-changes.ts';

/** One sitter by every check that a dimension moves, whichever of them are shown. */
export interface SitterAlong {
  sitterId: string;
  placeId: string;
  name: string;
  /** Worst verdict at each value; `gone` where a check that the present set answers no longer does. */
  states: CellState[];
  /** Checks at each value that are not at least tight: short, not known, or no longer answered. */
  missed: number[];
}

/**
 * The verdicts of one sitter along a dimension.
 *
 * @param row - the sitter's row of the present sheet
 * @param sheets - sheets of the sets that are tried
 * @param shown - rules that count
 * @returns for each sheet the cells that answer with a verdict, and the rules the present sheet answers and it does not
 */
export function verdictsAlong(
  row: SitterRow,
  sheets: readonly FitSheet[],
  shown: ReadonlySet<string>,
): { cells: FitCell[]; gone: number }[] {
  const counts = ({ ruleId, outcome }: FitCell) => shown.has(ruleId) && outcome.kind === 'verdict';
  const asked = new Set(row.cells.filter(counts).map(({ ruleId }) => ruleId));
  return sheets.map((sheet) => {
    const cells = sheet.rows.find(({ placeId }) => placeId === row.placeId)?.cells.filter(counts) ?? [];
    const answered = new Set(cells.map(({ ruleId }) => ruleId));
    return { cells, gone: [...asked].filter((ruleId) => !answered.has(ruleId)).length };
  });
}

/**
 * The worst answer among cells.
 *
 * @param cells - cells that answer with a verdict
 * @returns the state; `gone` without any cell
 */
export const worstState = (cells: readonly FitCell[]): CellState =>
  cells
    .map((cell) => stateOf(cell) ?? 'gone')
    .reduce<CellState>((worst, state) => {
      if (worst === 'gone') return state;
      return STATE_RANK[state] < STATE_RANK[worst] ? state : worst;
    }, 'gone');

const isMissed = (cell: FitCell): boolean => !['fits', 'tight'].includes(stateOf(cell) ?? 'gone');

/**
 * Everybody by every check that a dimension moves.
 *
 * @param present - sheet of the present set
 * @param sheets - sheets of the sets that are tried
 * @param moving - ids of the rules that the dimension moves
 * @returns sitters of whom such a check is asked somewhere, in the order of the sheet
 */
export function sittersAlong(
  present: FitSheet | undefined,
  sheets: readonly FitSheet[],
  moving: ReadonlySet<string>,
): SitterAlong[] {
  return (present?.rows ?? []).flatMap((row): SitterAlong[] => {
    const { sitterId, placeId, name } = row;
    const along = verdictsAlong(row, sheets, moving);
    if (along.every(({ cells }) => cells.length === 0)) return [];
    return [
      {
        sitterId,
        placeId,
        name,
        states: along.map(({ cells, gone }) => (gone > 0 ? 'gone' : worstState(cells))),
        missed: along.map(({ cells, gone }) => gone + cells.filter(isMissed).length),
      },
    ];
  });
}
