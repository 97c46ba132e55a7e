import type { OutlineCorner } from '../../outlines/outline.ts';

/** One kind of panel of a cushion's cover. */
export interface CutPanel {
  /** What it is called on the sheet. */
  name: string;
  count: number;
  /** Seam to seam; its own up points up the page. */
  finished: OutlineCorner[];
  /** To cut, every allowance included. */
  cut: OutlineCorner[];
  /** Where it is sewn to a corner of the plan: distances along its length from its left end, seam to seam. */
  marksMm: number[];
}

/** Foam and board as outlines of the plan. */
export interface CutSlab {
  outline: OutlineCorner[];
  thicknessMm: number;
}

/** Everything that is cut for one cushion. */
export interface CushionPanels {
  panels: CutPanel[];
  foam: CutSlab;
  /** Plywood under the foam, where the cushion has one; the finished thickness is without it. */
  board?: CutSlab;
  /** Round the plan, seam to seam. */
  perimeterMm: number;
  /** Height of the edge between its seams, or 0 where both plates meet in one seam. */
  edgeHeightMm: number;
  /** Most that its middle stands over its edges, without what a wrap adds. */
  crownMm: number;
  /** The closure along the plan's edge: the edge, what goes round each end, and both together. */
  closure: { edgeMm: number; wrapMm: number; lengthMm: number };
  welt: { seams: number; alongSeamsMm: number; joinsMm: number; lengthMm: number };
}

/**
 * A rectangle as an outline.
 *
 * @param widthMm - across the page
 * @param heightMm - up the page
 * @param extraMm - added all round
 */
export function rectangleOutline(widthMm: number, heightMm: number, extraMm = 0): OutlineCorner[] {
  const [x0, y0, x1, y1] = [-extraMm, -extraMm, widthMm + extraMm, heightMm + extraMm];
  const corner = (x: number, y: number, edge: string): OutlineCorner => ({ at: [x, y], radiusMm: 0, edge });
  return [corner(x0, y0, 'front'), corner(x1, y0, 'left'), corner(x1, y1, 'back'), corner(x0, y1, 'right')];
}

/**
 * A rectangular panel with a seam all round.
 *
 * @param name - on the sheet
 * @param size - seam to seam
 * @param seamMm - seam allowance
 * @param count - how many
 * @param marksMm - where corners of the plan are met
 */
export function rectanglePanel(
  name: string,
  size: { widthMm: number; heightMm: number },
  seamMm: number,
  count = 1,
  marksMm: number[] = [],
): CutPanel {
  return {
    name,
    count,
    finished: rectangleOutline(size.widthMm, size.heightMm),
    cut: rectangleOutline(size.widthMm, size.heightMm, seamMm),
    marksMm,
  };
}
