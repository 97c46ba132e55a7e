import type { BoardModule } from '../room/document.ts';

/** One board of a run: its middle, measured from the middle of the run, and its width. */
export interface BoardInRun {
  centreMm: number;
  widthMm: number;
}

/**
 * Lays boards side by side over a length, whole boards in the middle and both end boards ripped alike.
 *
 * @param lengthMm - the run to cover, > 0
 * @param boards - face and reveal
 * @returns the boards from the low end to the high end; a run of n · module − reveal needs no ripping
 */
export function boardRun(lengthMm: number, boards: BoardModule): BoardInRun[] {
  const module = boards.faceMm + boards.revealMm;
  const count = Math.max(1, Math.ceil((lengthMm + boards.revealMm) / module - 1e-6));
  const start = -(count * module - boards.revealMm) / 2;
  const run: BoardInRun[] = [];
  for (let i = 0; i < count; i += 1) {
    const low = Math.max(start + i * module, -lengthMm / 2);
    const high = Math.min(start + i * module + boards.faceMm, lengthMm / 2);
    if (high - low > 1) run.push({ centreMm: (low + high) / 2, widthMm: high - low });
  }
  return run;
}

/**
 * The nearest length that takes whole boards only: n · module − reveal.
 *
 * @param lengthMm - the wanted length, > 0
 * @param boards - face and reveal
 * @returns the length and the number of boards, at least one
 */
export function snapToBoards(lengthMm: number, boards: BoardModule): { lengthMm: number; boards: number } {
  const module = boards.faceMm + boards.revealMm;
  const count = Math.max(1, Math.round((lengthMm + boards.revealMm) / module));
  return { lengthMm: count * module - boards.revealMm, boards: count };
}
