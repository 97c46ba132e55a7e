import type { CushionEdge } from '@settlewright/geometry';
/** A cushion laid flat, in real millimetres. Page left and right, since the paper is read that way. */
export interface CushionPlan {
  widthMm: number;
  depthMm: number;
  /** Distances of the button columns from the seam on the datum side, rising. */
  columnsMm: readonly number[];
  /** Distances of the button rows from the back seam, rising. */
  rowsMm: readonly number[];
  /** The side of the page the columns are measured from. */
  datum: 'left' | 'right';
  /** Board joints under the cushion, measured like the columns. */
  boardLinesMm: readonly number[];
  wall: { side: 'left' | 'right'; gapMm: number; columnsMm: readonly number[]; name: string } | null;
  closure: { edge: CushionEdge; wrapMm: number; words: string } | null;
  edges: { back: string; front: string; left: string; right: string };
}

export interface PlanPlace {
  /** Top left corner of the cushion on the paper. */
  x: number;
  y: number;
  /** Paper millimetres for a real one. */
  factor: number;
  format: (mm: number) => string;
  /** Shown lengths are multiples of this; stops are rounded before they are subtracted, so that sums close. */
  stepMm: number;
}

/** Paper that the upright chains, the wall and the lower chain need around the cushion itself. */
export const PLAN_SPACE = { chains: 20, wall: 17, bottom: 11 } as const;

/** The side that the upright chains stand on: away from the wall. */
export function chainSide(plan: Pick<CushionPlan, 'wall'>): 'left' | 'right' {
  return plan.wall?.side === 'left' ? 'right' : 'left';
}
