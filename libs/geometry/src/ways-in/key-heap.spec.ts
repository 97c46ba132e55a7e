import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { createKeyHeap } from './key-heap.ts';

describe('a heap of keys', () => {
  it('gives its items back lowest key first', () => {
    fc.assert(
      fc.property(fc.array(fc.integer({ min: 0, max: 50 })), (keys) => {
        const heap = createKeyHeap();
        keys.forEach((key, item) => heap.push(key, item));
        const items = keys.map(() => heap.pop());
        expect(items.map((item) => keys[item])).toEqual([...keys].sort((a, b) => a - b));
        expect([...items].sort((a, b) => a - b)).toEqual(keys.map((_, item) => item));
        expect(heap.pop()).toBe(-1);
      }),
    );
  });
});
