import { DIRECTION_NUMBERS } from './direction-numbers.ts';

const BITS = 32;
/** Dimensions that the sequence has. */
export const MOST_DIMENSIONS = DIRECTION_NUMBERS.length + 1;

/** Walks the points of a sequence in order. */
export interface PointWalk {
  /** The present point: one 32-bit fraction per dimension. */
  readonly point: Uint32Array;
  /** Goes on to the next point. */
  next(): void;
}

/**
 * The Sobol sequence, moved by a seed so that every seed gives another sample with the same evenness.
 *
 * @param dimensions - 1 to `MOST_DIMENSIONS`
 * @param seed - whole number
 * @param from - number of the first point, 0 or more; a walk from n gives what a walk from 0 gives after n steps
 * @returns the walk, standing on that point
 * @throws RangeError when a number is out of range
 * @source Sobol 1967 in Gray-code order (Antonov and Saleev 1979), with a random digital shift
 */
export function sobolWalk(dimensions: number, seed: number, from: number): PointWalk {
  if (!(Number.isInteger(dimensions) && dimensions >= 1 && dimensions <= MOST_DIMENSIONS)) {
    throw new RangeError(`dimensions is ${dimensions}; accepted: whole numbers from 1 to ${MOST_DIMENSIONS}`);
  }
  if (!(Number.isInteger(from) && from >= 0 && from < 2 ** (BITS - 1))) {
    throw new RangeError(`from is ${from}; accepted: whole numbers from 0 to ${2 ** (BITS - 1) - 1}`);
  }
  const steps = stepsOf(dimensions);
  const point = Uint32Array.from({ length: dimensions }, (_, dimension) => shiftOf(seed, dimension));
  const gray = from ^ (from >>> 1);
  for (let bit = 0; bit < BITS; bit += 1) {
    if (((gray >>> bit) & 1) === 1) move(bit);
  }
  let index = from;

  function move(bit: number): void {
    const offset = bit * dimensions;
    for (let d = 0; d < dimensions; d += 1) {
      point[d] = (point[d] as number) ^ (steps[offset + d] as number);
    }
  }

  return {
    point,
    next() {
      index += 1;
      // The bit that changes in Gray code is the lowest one set in the new index.
      move(31 - Math.clz32(index & -index));
    },
  };
}

const kept = new Map<number, Uint32Array>();

/** Direction numbers, bit by bit and within a bit dimension by dimension. */
function stepsOf(dimensions: number): Uint32Array {
  const known = kept.get(dimensions);
  if (known) return known;
  const steps = new Uint32Array(BITS * dimensions);
  for (let dimension = 0; dimension < dimensions; dimension += 1) {
    directionsOf(dimension).forEach((value, bit) => {
      steps[bit * dimensions + dimension] = value;
    });
  }
  kept.set(dimensions, steps);
  return steps;
}

function directionsOf(dimension: number): Uint32Array {
  const values = new Uint32Array(BITS);
  if (dimension === 0) return values.map((_, bit) => 2 ** (BITS - 1 - bit));
  const [polynomial = 0, ...first] = DIRECTION_NUMBERS[dimension - 1] ?? [];
  const degree = first.length;
  for (let bit = 0; bit < BITS; bit += 1) {
    if (bit < degree) {
      values[bit] = (first[bit] as number) * 2 ** (BITS - 1 - bit);
      continue;
    }
    const back = values[bit - degree] as number;
    let value = back ^ (back >>> degree);
    for (let k = 1; k < degree; k += 1) {
      if (((polynomial >>> (degree - k)) & 1) === 1) value ^= values[bit - k] as number;
    }
    values[bit] = value;
  }
  return values;
}

/** A 32-bit number that hangs on both arguments in every bit; the finish of MurmurHash3, public domain. */
function shiftOf(seed: number, dimension: number): number {
  let h = Math.imul(seed ^ 0x9e3779b9, 0x85ebca6b) ^ Math.imul(dimension + 1, 0xc2b2ae35);
  for (let round = 0; round < 2; round += 1) {
    h = Math.imul(h ^ (h >>> 16), 0x85ebca6b);
    h = Math.imul(h ^ (h >>> 13), 0xc2b2ae35);
    h ^= h >>> 16;
  }
  return h >>> 0;
}
