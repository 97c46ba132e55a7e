import {
  outlineBox,
  type CushionEdge,
  type OutlineCorner,
  type Point2,
  type WearArea,
} from '@settlewright/geometry';

/** A cushion laid flat, in real millimetres. Page left and right, since the paper is read that way. */
export interface CushionPlan {
  /** Of the plain rectangle that buttons are measured in. */
  widthMm: number;
  depthMm: number;
  /** Seam to seam, y up the page; may stand out of that rectangle. */
  outline: readonly OutlineCorner[];
  /** Distances of the button columns from the seam on the datum side, rising. */
  columnsMm: readonly number[];
  /** Distances of the button rows from the back seam, rising. */
  rowsMm: readonly number[];
  /** Where the buttons stand, y up the page. */
  buttons: readonly Point2[];
  /** The side of the page the columns are measured from. */
  datum: 'left' | 'right';
  /** Board joints under the cushion, measured like the columns. */
  boardLinesMm: readonly number[];
  wall: { side: 'left' | 'right'; gapMm: number; columnsMm: readonly number[]; name: string } | null;
  /** Along its edge and round both ends. */
  closure: { edge: CushionEdge; path: readonly Point2[]; wrapMm: number; words: string } | null;
  edges: { back: string; front: string; left: string; right: string };
  cloth: ClothWay | null;
  /** Areas that are to look used. */
  wear: readonly WearArea[];
}

/** How the cloth lies on a cushion. */
export interface ClothWay {
  direction: 'up-roll' | 'railroad' | 'either';
  words: string;
  /** Where the pile runs, on the page. */
  nap: 'none' | 'up' | 'down' | 'left' | 'right';
}

export interface PlanPlace {
  /** Top left corner of the box round the outline, on the paper. */
  x: number;
  y: number;
  /** Paper millimetres for a real one. */
  factor: number;
  format: (mm: number) => string;
  /** Shown lengths are multiples of this; stops are rounded before they are subtracted, so that sums close. */
  stepMm: number;
}

/** From the plan to the paper. */
export function onPaper(plan: CushionPlan, { x, y, factor }: PlanPlace): (point: Point2) => Point2 {
  const { x0, y1 } = outlineBox(plan.outline);
  return ([px, py]) => [x + (px - x0) * factor, y + (y1 - py) * factor];
}

/** The side that the upright chains stand on: away from the wall. */
export function chainSide(plan: Pick<CushionPlan, 'wall'>): 'left' | 'right' {
  return plan.wall?.side === 'left' ? 'right' : 'left';
}
