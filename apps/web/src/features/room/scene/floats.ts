/** Whole points and whole pairs of points, however many numbers each has: memory is read as all of one or the other. */
const STRIDE = 12;
const FIRST = 512 * STRIDE;

/** Numbers in memory that is used again: what is made for each frame of a pull takes none anew. */
abstract class Numbers<Memory extends Float32Array | Uint32Array> {
  /** The memory; numbers stand in its first `length` places. It is another one after it grew. */
  memory: Memory;
  length = 0;

  constructor(private readonly make: (length: number) => Memory) {
    this.memory = make(FIRST);
  }

  clear(): void {
    this.length = 0;
  }

  /** Takes so many places more, for the caller to write; gives the first of them. */
  take(count: number): number {
    const start = this.length;
    this.length += count;
    if (this.length > this.memory.length) {
      const grown = this.make(Math.max(Math.ceil(this.length / STRIDE) * STRIDE, 2 * this.memory.length));
      grown.set(this.memory);
      this.memory = grown;
    }
    return start;
  }

  push(value: number): void {
    const start = this.take(1);
    this.memory[start] = value;
  }

  push3(a: number, b: number, c: number): void {
    const start = this.take(3);
    const { memory } = this;
    memory[start] = a;
    memory[start + 1] = b;
    memory[start + 2] = c;
  }

  /** The numbers alone, in memory of their own. */
  packed(): Memory {
    const packed = this.make(this.length);
    packed.set(this.memory.subarray(0, this.length));
    return packed;
  }
}

export class Floats extends Numbers<Float32Array> {
  constructor() {
    super((length) => new Float32Array(length));
  }
}

/** Which points a triangle stands on. */
export class Indices extends Numbers<Uint32Array> {
  constructor() {
    super((length) => new Uint32Array(length));
  }
}
