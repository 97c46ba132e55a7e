import { describe, expect, it } from 'vitest';
import { contours } from './contours.ts';

describe('lines of a level over a grid', () => {
  it('lie where straight interpolation crosses it', () => {
    const slope = [
      [0, 1, 2],
      [0, 1, 2],
    ];
    const lines = contours(slope, 0.25);
    expect(lines).toHaveLength(1);
    for (const [across] of lines.flat()) expect(across).toBeCloseTo(0.25, 9);
  });

  it('close around a hill', () => {
    const hill = [
      [-1, -1, -1],
      [-1, 1, -1],
      [-1, -1, -1],
    ];
    const ends = contours(hill, 0)
      .flat()
      .map((point) => point.join(' '))
      .sort();
    expect(ends).toHaveLength(8);
    expect(new Set(ends).size).toBe(4);
  });

  it('draw nothing where nothing is known or all lies on one side', () => {
    expect(
      contours(
        [
          [NaN, NaN],
          [NaN, NaN],
        ],
        0,
      ),
    ).toEqual([]);
    expect(
      contours(
        [
          [1, 1],
          [1, 1],
        ],
        0,
      ),
    ).toEqual([]);
  });
});
