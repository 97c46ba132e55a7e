import { describe, expect, it } from 'vitest';
import { halfOutline } from './half-outline.ts';

const SQUARE = [
  [0, 0],
  [10, 0],
  [10, 10],
  [0, 10],
] as const;

describe('half of an outline', () => {
  it('lies on the side that is asked for', () => {
    expect(halfOutline(SQUARE, 0, 4, 1)).toEqual([
      [4, 0],
      [10, 0],
      [10, 10],
      [4, 10],
    ]);
    expect(halfOutline(SQUARE, 1, 4, -1)).toEqual([
      [0, 0],
      [10, 0],
      [10, 4],
      [0, 4],
    ]);
  });

  it('has a corner that lies on the line once', () => {
    const onEdge = halfOutline([...SQUARE.slice(0, 3), [4, 10], [0, 5]], 0, 4, 1);
    expect(onEdge).toHaveLength(new Set(onEdge.map(String)).size);
    expect(halfOutline(SQUARE, 0, 10, 1)).toEqual([
      [10, 0],
      [10, 10],
    ]);
  });

  it('is all of it, or nothing, where the line lies beyond', () => {
    expect(halfOutline(SQUARE, 0, -Infinity, 1)).toEqual(SQUARE);
    expect(halfOutline(SQUARE, 0, Infinity, -1)).toEqual(SQUARE);
    expect(halfOutline(SQUARE, 0, 11, 1)).toEqual([]);
  });
});
