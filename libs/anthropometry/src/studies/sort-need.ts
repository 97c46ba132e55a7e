import { OPEN, type NeedColumn } from './bits.ts';

/** People in the order of what they need. */
export interface SortedNeed {
  order: Uint32Array;
  /** The needs in that order, rising. */
  values: Int32Array;
}

const DIGIT_BITS = 11;
const DIGITS = 3;
const RADIX = 1 << DIGIT_BITS;

/**
 * Sorts people by a need: radix sort, three digits of eleven bits, least first.
 *
 * @param column - needs, in steps
 * @param people - how many of its first entries are people
 */
export function sortNeed(column: NeedColumn, people: number): SortedNeed {
  let order = new Uint32Array(people);
  let next = new Uint32Array(people);
  for (let i = 0; i < people; i += 1) order[i] = i;
  const starts = new Uint32Array(RADIX);
  for (let digit = 0; digit < DIGITS; digit += 1) {
    const shift = digit * DIGIT_BITS;
    starts.fill(0);
    for (let i = 0; i < people; i += 1) {
      const at = (((column[i] as number) + OPEN) >>> shift) & (RADIX - 1);
      starts[at] = (starts[at] as number) + 1;
    }
    let sum = 0;
    for (let at = 0; at < RADIX; at += 1) {
      const count = starts[at] as number;
      starts[at] = sum;
      sum += count;
    }
    for (let i = 0; i < people; i += 1) {
      const person = order[i] as number;
      const at = (((column[person] as number) + OPEN) >>> shift) & (RADIX - 1);
      const to = starts[at] as number;
      starts[at] = to + 1;
      next[to] = person;
    }
    [order, next] = [next, order];
  }
  const values = new Int32Array(people);
  for (let i = 0; i < people; i += 1) values[i] = column[order[i] as number] as number;
  return { order, values };
}

/** Number of needs below an end: the first rank at or above it. */
export function rankOf(values: Int32Array, end: number): number {
  let low = 0;
  let high = values.length;
  while (low < high) {
    const middle = (low + high) >>> 1;
    if ((values[middle] as number) < end) low = middle + 1;
    else high = middle;
  }
  return low;
}
