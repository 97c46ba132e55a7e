import { describe, expect, it } from 'vitest';
import { isSureOfShort } from './sure-of-short.ts';

describe('a shortage', () => {
  it.each([
    [-1, 0, true],
    [-3, 4, true],
    [-2.9, 4, false],
    [0, 0, false],
    [5, 2, false],
  ])('of %d with half a range of %d is sure: %s', (margin, half, sure) => {
    expect(isSureOfShort(margin, half)).toBe(sure);
  });
});
