import { describe, expect, it } from 'vitest';
import { Floats } from './floats.ts';

describe('numbers in memory that is used again', () => {
  it('stand one after another, however often the memory grew', () => {
    const floats = new Floats();
    const told = Array.from({ length: 40_002 }, (_, n) => n);
    for (let n = 0; n < told.length; n += 3) floats.push3(n, n + 1, n + 2);
    expect([...floats.packed()]).toEqual(told);
  });

  it('holds whole points, of one to four numbers, at every size', () => {
    const floats = new Floats();
    for (let n = 0; n < 30; n += 1) {
      for (const size of [1, 2, 3, 4, 6]) expect(floats.memory.length % size).toBe(0);
      floats.take(1009);
    }
  });

  it('takes no memory anew for what has room', () => {
    const floats = new Floats();
    floats.push3(1, 2, 3);
    const { memory } = floats;
    floats.clear();
    floats.push(4);
    floats.push(5);
    expect(floats.memory).toBe(memory);
    expect([...floats.packed()]).toEqual([4, 5]);
  });
});
