import type { MeasureKey } from '../measures/measures.ts';
import { flip, OPEN, withinWindow, type Bits, type NeedColumn } from './bits.ts';
import {
  foamName,
  isKnown,
  needColumn,
  strainsUnder,
  type Firmness,
  type MeasureColumns,
  type Need,
  type Window,
} from './need.ts';
import { sortNeed, rankOf, type SortedNeed } from './sort-need.ts';

/** People of one sex, with what they need by each line. Columns are made once, when first asked for. */
export interface Crowd {
  readonly people: number;
  isKnown(need: Need): boolean;
  /** Measure of each of them, or `undefined` where it is not known. */
  measure(key: MeasureKey): Float32Array | undefined;
  /** People inside a window; made from a set for nearly the same window where there is one. */
  within(window: Window, like?: { window: Window; bits: Bits }): Bits;
  /** Number of people inside a window by a sorted need; `undefined` while needs are not sorted. */
  countWithin(window: Window): number | undefined;
  /** From now on needs are sorted, so that a window that moves a little costs little. */
  sortNeeds(): void;
}

/** Beyond this share of the people it is quicker to ask everyone again. */
const FEW = 0.25;

/**
 * People of one sex out of a population's draws.
 *
 * @param columns - measures in millimetres, kilograms for the weight
 * @param rows - rows that are these people
 */
export function createCrowd(columns: MeasureColumns, rows: Uint32Array): Crowd {
  const needs = new Map<string, NeedColumn>();
  const sorted = new Map<string, SortedNeed>();
  const strains = new Map<string, Float32Array>();
  const measures = new Map<MeasureKey, Float32Array>();
  const scratch = new Float64Array(rows.length);
  let sorting = false;

  const measured = {
    measure: (key: MeasureKey): Float32Array =>
      kept(measures, key, () => taken(columns[key] as Float32Array, rows)),
    strain: (foam: Firmness): Float32Array =>
      kept(strains, foamName(foam), () => strainsUnder(foam, measured.measure('weight_kg'))),
  };
  const columnOf = (need: Need): NeedColumn =>
    kept(needs, need.id, () => needColumn(need, measured, scratch));
  const sortedOf = (need: Need): SortedNeed =>
    kept(sorted, need.id, () => sortNeed(columnOf(need), rows.length));

  function movedFrom(window: Window, like: { window: Window; bits: Bits }): Bits | undefined {
    const { order, values } = sortedOf(window.need);
    const ends = [like.window.low, window.low, like.window.high + 1, window.high + 1].map((end) =>
      rankOf(values, end),
    );
    const [lowBefore, low, highBefore, high] = ends as [number, number, number, number];
    const apart = low > high || lowBefore > highBefore;
    const turned = Math.abs(low - lowBefore) + Math.abs(high - highBefore);
    if (apart || turned > FEW * rows.length) return undefined;
    const bits = like.bits.slice();
    flip(bits, order, Math.min(low, lowBefore), Math.max(low, lowBefore));
    flip(bits, order, Math.min(high, highBefore), Math.max(high, highBefore));
    return bits;
  }

  return {
    people: rows.length,
    isKnown: (need) => isKnown(need, columns),
    measure: (key) => (Number.isFinite(columns[key]?.[0]) ? measured.measure(key) : undefined),
    within: (window, like) =>
      (sorting && like ? movedFrom(window, like) : undefined) ??
      withinWindow(columnOf(window.need), window.low, window.high),
    countWithin: ({ need, low, high }) => {
      if (!sorting) return undefined;
      const { values } = sortedOf(need);
      return Math.max(0, rankOf(values, high + 1) - rankOf(values, Math.max(low, -OPEN)));
    },
    sortNeeds: () => {
      sorting = true;
    },
  };
}

function taken(column: Float32Array, rows: Uint32Array): Float32Array {
  const values = new Float32Array(rows.length);
  for (let i = 0; i < rows.length; i += 1) values[i] = column[rows[i] as number] as number;
  return values;
}

function kept<Key, Value>(map: Map<Key, Value>, key: Key, make: () => Value): Value {
  const known = map.get(key);
  if (known !== undefined) return known;
  const made = make();
  map.set(key, made);
  return made;
}
