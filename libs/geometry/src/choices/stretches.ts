import type { CellState } from './sheet-changes.ts';

/** A stretch of values. */
export interface Stretch {
  from: number;
  to: number;
}

/** How far below zero still counts as on the line, millimetres. */
const ON_THE_LINE = 0.1;

/**
 * Where a series is not negative.
 *
 * @param values - rising values
 * @param rooms - the series at each value
 * @returns stretches, their ends by straight interpolation between two values
 */
export function stretches(values: readonly number[], rooms: readonly number[]): Stretch[] {
  const found: Stretch[] = [];
  let from: number | undefined;
  for (const [i, room] of rooms.entries()) {
    const value = values[i] as number;
    const inside = room >= -ON_THE_LINE && room !== Infinity;
    if (inside && from === undefined) from = crossing(values, rooms, i - 1, i) ?? value;
    if (!inside && from !== undefined) {
      found.push({ from, to: crossing(values, rooms, i - 1, i) ?? (values[i - 1] as number) });
      from = undefined;
    }
  }
  if (from !== undefined) found.push({ from, to: values.at(-1) as number });
  return found;
}

function crossing(
  values: readonly number[],
  rooms: readonly number[],
  before: number,
  after: number,
): number | undefined {
  const [a, b] = [rooms[before], rooms[after]];
  if (a === undefined || b === undefined || !Number.isFinite(a) || !Number.isFinite(b) || a === b)
    return undefined;
  const share = Math.min(1, Math.max(0, -a / (b - a)));
  const [from, to] = [values[before] as number, values[after] as number];
  return from + share * (to - from);
}

/**
 * Tried values at which every row answers with one of some states.
 *
 * @param values - rising values that were tried
 * @param rows - the rows; without any there is no such value
 * @param good - states that count
 * @returns stretches from one tried value to another
 */
export function whereAll(
  values: readonly number[],
  rows: readonly { states: readonly CellState[] }[],
  good: readonly CellState[],
): Stretch[] {
  if (rows.length === 0) return [];
  const isGood = (i: number) => rows.every(({ states }) => good.includes(states[i] ?? 'gone'));
  return stretches(
    values,
    values.map((_, i) => (isGood(i) ? 0 : -Infinity)),
  );
}
