import type { FitCell, FitSheet, SitterRow, VerdictOutcome } from '@settlewright/anthropometry';
import type { SetDocument } from '../room/document.ts';
import type { Dimension } from './dimension.ts';
import { worseOf } from './candidates.ts';
import { movingRules } from './moving-rules.ts';
import { cellsOf, type CellState } from './sheet-changes.ts';
import { sittersAlong, verdictsAlong, worstState, type SitterAlong } from './sitters-along.ts';
import { stretches, whereAll, type Stretch } from './stretches.ts';

/** One sitter's answer along a dimension. */
export interface StickRow {
  sitterId: string;
  placeId: string;
  name: string;
  /** Best values: of somebody who was not measured, or of how far a cushion goes down where that decides. */
  estimated: boolean;
  /** Where the sitter fits, by best values. */
  fits: Stretch[];
  /** Where the sitter is at least tight, by best values; holds `fits`. */
  tight: Stretch[];
  /**
   * Where each shown check keeps its fail line at the low end of its own 90 % range, and at the high end; as `tight`
   * when measured and on a hard seat. One check alone holds for 95, or for 5, of 100 such people; several together for no share that
   * follows from their ranges.
   */
  surelyTight: Stretch[];
  perhapsTight: Stretch[];
  /** Worst verdict at each value; `gone` where a check that the present set answers no longer does. */
  states: CellState[];
}

/** A code clause along a dimension. */
export interface StickClause {
  ruleId: string;
  clause: string;
  marks: string[];
  inside: Stretch[];
}

/** Everything a story stick shows of one dimension. */
export interface StoryStick {
  dimension: Dimension;
  /** Rising values that were tried. */
  values: number[];
  /** Rules whose cells answer differently somewhere along the dimension or come nearer to it. */
  ruleIds: string[];
  rows: StickRow[];
  clauses: StickClause[];
  /**
   * Tried values at which every row's verdict is fits, and at least tight: from one tried value to another, with the
   * probability that verdicts are given from. What is not known is in neither.
   */
  allFit: Stretch[];
  allTight: Stretch[];
  /** Everybody by every rule of `ruleIds`, whichever the rows show. */
  sitters: SitterAlong[];
  /** At each value, answers about pieces and ways that are good in the present set and not there. */
  worse: number[];
}

const MOST_VALUES = 96;

/**
 * The values along a dimension that a stick tries: multiples of the rounding step, and the present value.
 *
 * @param dimension - the dimension
 * @param stepSize - rounding step in the dimension's unit
 * @returns rising values, at most about a hundred
 */
export function stickValues(dimension: Dimension, stepSize: number): number[] {
  const { min, max, value } = dimension;
  const times = Math.max(1, Math.ceil((max - min) / stepSize / MOST_VALUES));
  const step = stepSize * times;
  const values = [value];
  for (let n = Math.ceil(min / step - 1e-9); n * step <= max + 1e-9; n += 1) {
    if (Math.abs(n * step - value) > 1e-6) values.push(n * step);
  }
  return values.sort((a, b) => a - b);
}

/**
 * Tries a dimension value by value and tells where each sitter fits.
 *
 * @param input - the dimension; the values to try, rising; the check of a set; and the rule whose bands are wanted,
 *   or every person rule that the dimension moves when absent
 * @returns a generator that yields how many values were tried, so that a page can paint between them, and returns the
 *   stick. Ends of bands lie where the best value crosses a line, between two values by straight interpolation
 */
export function* storyStick(input: {
  dimension: Dimension;
  values: readonly number[];
  check: (document: SetDocument) => FitSheet;
  ruleId?: string;
}): Generator<number, StoryStick, void> {
  const { dimension, check, ruleId } = input;
  const values: number[] = [];
  const sheets: FitSheet[] = [];
  for (const [index, value] of input.values.entries()) {
    const document = dimension.at(value);
    if (document !== undefined) {
      values.push(value);
      sheets.push(check(document));
    }
    yield index + 1;
  }
  const present = sheets[nearestTo(dimension.value, values)];
  const moving = movingRules(present, sheets);
  const shown = ruleId === undefined ? moving : new Set([ruleId]);
  const rows = (present?.rows ?? []).map((row) => stickRow(row, values, sheets, shown));
  const told = rows.filter(({ states }) => states.some((state) => state !== 'gone'));
  return {
    dimension,
    values,
    ruleIds: [...moving],
    rows: told,
    clauses: clausesOf(values, sheets),
    allFit: whereAll(values, told, ['fits']),
    allTight: whereAll(values, told, ['fits', 'tight']),
    sitters: sittersAlong(present, sheets, moving),
    worse: sheets.map((sheet) => (present ? worseOf(present, sheet) : 0)),
  };
}

const nearestTo = (value: number, values: readonly number[]): number =>
  values.reduce(
    (best, one, i) => (Math.abs(one - value) < Math.abs((values[best] as number) - value) ? i : best),
    0,
  );

function stickRow(
  row: SitterRow,
  values: readonly number[],
  sheets: readonly FitSheet[],
  shown: ReadonlySet<string>,
): StickRow {
  const along = verdictsAlong(row, sheets, shown);
  const rooms = (room: (outcome: VerdictOutcome) => number) =>
    along.map(({ cells, gone }) =>
      gone > 0
        ? -Infinity
        : Math.min(...cells.map(({ outcome }) => (outcome.kind === 'verdict' ? room(outcome) : Infinity))),
    );
  const { sitterId, placeId, name, noBody } = row;
  // Without a body there is no best value, and so no stretch.
  const where = (room: (outcome: VerdictOutcome) => number) => (noBody ? [] : stretches(values, rooms(room)));
  return {
    sitterId,
    placeId,
    name,
    estimated: along.some(({ cells }) =>
      cells.some(({ outcome }) => outcome.kind === 'verdict' && outcome.estimated),
    ),
    fits: where(roomToPass),
    tight: where(({ margin }) => margin),
    surelyTight: where(({ margin, marginRange }) => marginRange?.low ?? margin),
    perhapsTight: where(({ margin, marginRange }) => marginRange?.high ?? margin),
    states: along.map(({ cells, gone }) => (gone > 0 ? 'gone' : worstState(cells))),
  };
}

const roomToPass = ({ value, pass }: VerdictOutcome): number =>
  Math.min(
    pass.lower === undefined ? Infinity : value - pass.lower,
    pass.upper === undefined ? Infinity : pass.upper - value,
  );

/** Clauses that are asked and answer differently along the dimension. */
function clausesOf(values: readonly number[], sheets: readonly FitSheet[]): StickClause[] {
  const found = new Map<string, { cell: FitCell; clause: string; rooms: number[] }>();
  for (const [i, sheet] of sheets.entries()) {
    for (const cell of cellsOf(sheet)) {
      if (cell.outcome.kind !== 'clause') continue;
      const entry = found.get(cell.id) ?? { cell, clause: cell.outcome.clause, rooms: sheets.map(() => -1) };
      entry.rooms[i] = cell.outcome.inside ? 1 : -1;
      found.set(cell.id, entry);
    }
  }
  return [...found.values()]
    .filter(({ rooms }) => rooms.some((room) => room !== rooms[0]))
    .map(({ cell, clause, rooms }) => ({
      ruleId: cell.ruleId,
      clause,
      marks: cell.marks,
      inside: stretches(values, rooms),
    }));
}
