import { describe, expect, it } from 'vitest';
import { hiddenIn } from './use-hidden-aside.ts';

const sitters = (count: number, widthPx: number, scrolledPx = 0) =>
  Array.from({ length: count }, (_, n) => ({
    left: n * widthPx - scrolledPx,
    right: (n + 1) * widthPx - scrolledPx,
  }));

describe('what a row of sitters hides', () => {
  it('counts those that are cut as well as those beyond the edge', () => {
    const row = { left: 0, right: 900 };
    expect(hiddenIn(row, sitters(6, 150))).toEqual({ before: 0, after: 0 });
    expect(hiddenIn(row, sitters(12, 160))).toEqual({ before: 0, after: 7 });
    expect(hiddenIn(row, sitters(12, 160, 400))).toEqual({ before: 3, after: 4 });
    expect(hiddenIn(row, sitters(12, 160, 1020))).toEqual({ before: 7, after: 0 });
  });

  it('does not count a hair’s breadth', () => {
    expect(hiddenIn({ left: 0, right: 900 }, sitters(6, 150.3))).toEqual({ before: 0, after: 0 });
  });
});
