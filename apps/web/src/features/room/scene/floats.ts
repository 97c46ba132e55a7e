import type { NumberList } from './solid-arrays';

/** Whole points and whole pairs of points, however many numbers each has: memory is read as all of one or the other. */
const STRIDE = 12;
const FIRST = 512 * STRIDE;

/** Numbers in memory that is used again: what is made for each frame of a pull takes none anew. */
export class Floats implements NumberList {
  /** The memory; numbers stand in its first `length` places. It is another one after it grew. */
  memory = new Float32Array(FIRST);
  length = 0;

  clear(): void {
    this.length = 0;
  }

  push(...values: number[]): void {
    const start = this.length;
    this.length += values.length;
    if (this.length > this.memory.length) {
      const grown = new Float32Array(
        Math.max(Math.ceil(this.length / STRIDE) * STRIDE, 2 * this.memory.length),
      );
      grown.set(this.memory);
      this.memory = grown;
    }
    for (let n = 0; n < values.length; n++) this.memory[start + n] = values[n]!;
  }

  slice(start: number): Float32Array {
    return this.memory.slice(start, this.length);
  }
}
