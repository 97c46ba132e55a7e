import type { CushionDrop } from './fit-sheet.ts';
import type { FoamSituation } from './situation.ts';

/** What is not known of the seat itself: how far a cushion goes down. The cushions of two places are independent. */
export interface Doubt {
  /** The cushion that it is about; one and the same doubt wherever this object stands. */
  foam: FoamSituation;
  drop: CushionDrop;
  /** Standard deviation times the factor with which the cushion enters, millimetres. */
  by: number;
}

/** The doubts of one amount and, times a factor, of another. */
export function doubtsTogether(a: readonly Doubt[], b: readonly Doubt[], factor: number): readonly Doubt[] {
  if (b.length === 0) return a;
  if (a.length === 0 && factor === 1) return b;
  const doubts = a.slice();
  for (const doubt of b) {
    const by = factor * doubt.by;
    const at = doubts.findIndex(({ foam }) => foam === doubt.foam);
    const same = doubts[at];
    if (same) doubts[at] = { ...same, by: same.by + by };
    else doubts.push({ ...doubt, by });
  }
  return doubts;
}

/** What the doubts about cushions that two amounts share add to their covariance. */
export function covarianceOf(a: readonly Doubt[], b: readonly Doubt[]): number {
  let sum = 0;
  for (const one of a) for (const other of b) if (one.foam === other.foam) sum += one.by * other.by;
  return sum;
}

/** Standard deviation that cushions alone give an amount; 0 where it hangs on none. */
export const spreadOf = (doubts: readonly Doubt[]): number =>
  doubts.length === 0 ? 0 : Math.sqrt(covarianceOf(doubts, doubts));
