import { ARRANGEMENTS, deriveParts } from '@settlewright/geometry';
import { describe, expect, it } from 'vitest';
import { mergeParts } from './solids.ts';

const parts = deriveParts(ARRANGEMENTS.find(({ id }) => id === 'banquette')!.build());
const boards = parts.filter(({ role }) => role === 'back-board');

/** Grain at every corner of a part, four numbers each. */
const grains = (part: (typeof parts)[number]) => {
  const { grains: all } = mergeParts([part]);
  return Array.from({ length: all.length / 4 }, (_, n) => [...all.slice(n * 4, n * 4 + 4)]);
};
const span = (values: number[]) => Math.max(...values) - Math.min(...values);

describe('the grain of a board', () => {
  it('runs along it, however it leans', () => {
    const [board] = boards;
    if (board?.solid.shape !== 'box') throw new Error('a board of a back is a box');
    const corners = grains(board);
    expect(span(corners.map(([along]) => along!))).toBeCloseTo(board.solid.sizeMm[1], 3);
    expect(span(corners.map(([, across]) => across!))).toBeCloseTo(board.solid.sizeMm[2], 3);
    expect(span(corners.map(([, , other]) => other!))).toBeCloseTo(board.solid.sizeMm[0], 3);
  });

  it('differs from that of the board beside it and stays as it is', () => {
    const seeds = boards.map((board) => grains(board)[0]![3]!);
    expect(new Set(seeds).size).toBeGreaterThan(boards.length * 0.9);
    expect(Math.min(...seeds)).toBeGreaterThan(0);
    expect(boards.map((board) => grains(board)[0]![3]!)).toEqual(seeds);
  });

  it('is left out on cloth and paint', () => {
    const plain = parts.filter(({ material }) => material === 'cloth' || material === 'wall');
    expect(plain.length).toBeGreaterThan(0);
    for (const part of plain)
      expect(
        grains(part)
          .flat()
          .every((value) => value === 0),
      ).toBe(true);
  });
});
