import type { FitCell, FitSheet, SitterRow } from '@settlewright/anthropometry';
import { isGain, isLoss, stateOf, type CellState } from './sheet-changes.ts';

/** One check in two sheets. */
export interface ComparedCell {
  ruleId: string;
  marks: string[];
  before: FitCell;
  /** Absent where the second sheet has no such cell. */
  after?: FitCell;
  from: CellState;
  /** `gone` where the second sheet no longer answers; that is a loss, whatever was answered before. */
  to: CellState;
}

/** One sitter in two sheets. */
export interface ComparedSitter {
  sitterId: string;
  name: string;
  gains: ComparedCell[];
  losses: ComparedCell[];
  /** Checks that keep their verdict. */
  kept: number;
}

/** Two fit sheets side by side. */
export interface ComparedSheets {
  sitters: ComparedSitter[];
  pieces: { gains: ComparedCell[]; losses: ComparedCell[]; kept: number };
  /** Sitters of the second sheet only, and of the first only. */
  joined: string[];
  left: string[];
}

/**
 * Who gained and who lost between two sheets, person by person.
 *
 * @param before - the first sheet
 * @param after - the second sheet
 * @returns sitters that are in both, in the order of the second; a person keeps their answers when they change places.
 *   A check that only the first sheet answers is a loss; one that only the second answers is new and not counted
 */
export function compareSheets(before: FitSheet, after: FitSheet): ComparedSheets {
  const earlier = new Map(before.rows.map((row) => [row.sitterId, row]));
  const later = new Set(after.rows.map(({ sitterId }) => sitterId));
  return {
    sitters: after.rows.flatMap((row) => {
      const then = earlier.get(row.sitterId);
      return then ? [comparedSitter(then, row)] : [];
    }),
    pieces: sorted(pairs(before.piecesAndWays, after.piecesAndWays, ({ id }) => id)),
    joined: after.rows.filter(({ sitterId }) => !earlier.has(sitterId)).map(({ name }) => name),
    left: before.rows.filter(({ sitterId }) => !later.has(sitterId)).map(({ name }) => name),
  };
}

function comparedSitter(before: SitterRow, after: SitterRow): ComparedSitter {
  const { sitterId, name } = after;
  return { sitterId, name, ...sorted(pairs(before.cells, after.cells, ({ ruleId }) => ruleId)) };
}

function pairs(
  before: readonly FitCell[],
  after: readonly FitCell[],
  keyOf: (cell: FitCell) => string,
): ComparedCell[] {
  const later = new Map(after.map((cell) => [keyOf(cell), cell]));
  return before.flatMap((then): ComparedCell[] => {
    const cell = later.get(keyOf(then));
    const from = stateOf(then);
    if (from === undefined) return [];
    const { ruleId, marks } = cell ?? then;
    const to = (cell && stateOf(cell)) ?? 'gone';
    return [{ ruleId, marks, before: then, ...(cell ? { after: cell } : {}), from, to }];
  });
}

function sorted(cells: readonly ComparedCell[]): {
  gains: ComparedCell[];
  losses: ComparedCell[];
  kept: number;
} {
  const gains = cells.filter(isGain);
  const losses = cells.filter(isLoss);
  return { gains, losses, kept: cells.length - gains.length - losses.length };
}
