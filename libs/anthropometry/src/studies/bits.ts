/**
 * Sets of people, one bit each: bit b of word w is person 32 w + b. Bits beyond the last person are never set.
 */
export type Bits = Uint32Array;

/** A body need of people in steps of 1/16384 mm, filled up with `NOBODY` to a whole number of words. */
export type NeedColumn = Int32Array;

/** Steps a millimetre in a need column. */
export const STEPS_PER_MM = 16384;
/** Farthest end of a window, in steps: 32 m either way, so that no body is beyond and differences stay in 32 bits. */
export const OPEN = 2 ** 29;
/** Stands for no person: outside every window. */
export const NOBODY = OPEN + 1;

/** Words that hold so many people. */
export const wordsFor = (people: number): number => (people + 31) >>> 5;

/**
 * Everyone.
 *
 * @param people - whole number, >= 0
 */
export function everyone(people: number): Bits {
  const bits = new Uint32Array(wordsFor(people)).fill(0xffffffff);
  if (people % 32 > 0) bits[bits.length - 1] = (1 << (people % 32)) - 1;
  return bits;
}

/**
 * People whose need lies in a window, both ends included.
 *
 * @param column - needs, in steps
 * @param low - lower end, in steps, from -OPEN
 * @param high - upper end, in steps, to OPEN
 */
export function withinWindow(column: NeedColumn, low: number, high: number): Bits {
  const bits = new Uint32Array(column.length >>> 5);
  let i = 0;
  for (let word = 0; word < bits.length; word += 1) {
    let set = 0;
    // The sign of either difference says "outside"; four people a turn, so that no branch hangs on a person.
    for (let turn = 0; turn < 8; turn += 1, i += 4) {
      const a = column[i] as number;
      const b = column[i + 1] as number;
      const c = column[i + 2] as number;
      const d = column[i + 3] as number;
      set =
        (set >>> 4) |
        ((~((high - a) | (a - low)) >>> 31) << 28) |
        ((~((high - b) | (b - low)) >>> 31) << 29) |
        ((~((high - c) | (c - low)) >>> 31) << 30) |
        (~((high - d) | (d - low)) & 0x80000000);
    }
    bits[word] = set;
  }
  return bits;
}

/** Turns over the bits of the people at some ranks of a sorted need. */
export function flip(bits: Bits, order: Uint32Array, from: number, to: number): void {
  for (let rank = from; rank < to; rank += 1) {
    const person = order[rank] as number;
    bits[person >>> 5] = (bits[person >>> 5] as number) ^ (1 << (person & 31));
  }
}

/**
 * Those who are in every set.
 *
 * @param sets - at least two
 */
export function inAll(sets: readonly Bits[]): Bits {
  const [first, second] = sets as [Bits, Bits];
  const into = new Uint32Array(first.length);
  for (let word = 0; word < into.length; word += 1) {
    into[word] = (first[word] as number) & (second[word] as number);
  }
  // Three at a time: half the reading and writing of what was kept so far.
  let next = 2;
  for (; next + 2 < sets.length; next += 3) {
    const [a, b, c] = [sets[next] as Bits, sets[next + 1] as Bits, sets[next + 2] as Bits];
    for (let word = 0; word < into.length; word += 1) {
      into[word] = (into[word] as number) & (a[word] as number) & (b[word] as number) & (c[word] as number);
    }
  }
  for (; next < sets.length; next += 1) {
    const other = sets[next] as Bits;
    for (let word = 0; word < into.length; word += 1) {
      into[word] = (into[word] as number) & (other[word] as number);
    }
  }
  return into;
}

/** Those who are in one set or the other. */
export function inEither(one: Bits, other: Bits): Bits {
  const into = new Uint32Array(one.length);
  for (let word = 0; word < into.length; word += 1) {
    into[word] = (one[word] as number) | (other[word] as number);
  }
  return into;
}

/** Those of a set who are not in another one. */
export function without(bits: Bits, other: Bits): Bits {
  const into = new Uint32Array(bits.length);
  for (let word = 0; word < into.length; word += 1) {
    into[word] = (bits[word] as number) & ~(other[word] as number);
  }
  return into;
}

/** Number of bits set in one word. */
function ones(word: number): number {
  const pairs = word - ((word >>> 1) & 0x55555555);
  const fours = (pairs & 0x33333333) + ((pairs >>> 2) & 0x33333333);
  return Math.imul((fours + (fours >>> 4)) & 0x0f0f0f0f, 0x01010101) >>> 24;
}

/** Number of people in a set. */
export function countOf(bits: Bits): number {
  let count = 0;
  for (let word = 0; word < bits.length; word += 1) count += ones(bits[word] as number);
  return count;
}

/** Number of people who are in both sets. */
export function countOfBoth(a: Bits, b: Bits): number {
  let count = 0;
  for (let word = 0; word < a.length; word += 1) count += ones((a[word] as number) & (b[word] as number));
  return count;
}

/** Parts of a millimetre (of a kilogram) in which measures are summed: sums of whole numbers do not hang on the order. */
export const TENTHS = 10;

/**
 * Sum of a measure over the people in a set, in whole tenths.
 *
 * @param bits - the set
 * @param values - measure of each person
 */
export function sumOver(bits: Bits, values: Float32Array): number {
  let sum = 0;
  for (let word = 0; word < bits.length; word += 1) {
    for (let rest = bits[word] as number; rest !== 0; rest &= rest - 1) {
      const person = (word << 5) + 31 - Math.clz32(rest & -rest);
      sum += ((values[person] as number) * TENTHS + 0.5) | 0;
    }
  }
  return sum;
}

/** Sum of a measure over everyone, and of its squares, in whole tenths and square tenths. */
export function sumsOf(values: Float32Array): { sum: number; squares: number } {
  let sum = 0;
  let squares = 0;
  for (let person = 0; person < values.length; person += 1) {
    const tenths = ((values[person] as number) * TENTHS + 0.5) | 0;
    sum += tenths;
    squares += tenths * tenths;
  }
  return { sum, squares };
}
