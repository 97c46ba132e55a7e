import { boardRun } from '../parts/boards.ts';
import { benchLayout } from '../pieces/bench-layout.ts';
import type { PieceOf } from '../room/document.ts';

/** Vertical lines of a bench's back boards along its own x axis, millimetres, rising. */
export interface BoardLines {
  /** Middle of each reveal between two boards. */
  jointsMm: number[];
  /** Middle of each board. */
  centresMm: number[];
  moduleMm: number;
}

/**
 * Where the joints and the board centres of a bench's back stand.
 *
 * @param bench - the bench; its boards run between the end walls
 * @returns lines in the bench's own frame
 */
export function boardLines(bench: PieceOf<'bench'>): BoardLines {
  const { innerLeftMm, innerRightMm } = benchLayout(bench);
  const middle = (innerLeftMm + innerRightMm) / 2;
  const run = boardRun(innerRightMm - innerLeftMm, bench.boards);
  const reveal = bench.boards.revealMm;
  return {
    jointsMm: run.slice(1).map((board) => middle + board.centreMm - board.widthMm / 2 - reveal / 2),
    centresMm: run.map((board) => middle + board.centreMm),
    moduleMm: bench.boards.faceMm + reveal,
  };
}
