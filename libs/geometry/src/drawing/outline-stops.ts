import { outlineBox, type OutlineCorner } from '../outlines/outline.ts';

/** Corners beyond this number are left to the table of the template: chains of them would not be read. */
export const MOST_CHAINED_CORNERS = 14;

/** Where an outline has corners, for chains along the edges of the page; plan millimetres, rising. */
export interface OutlineStops {
  above: number[];
  below: number[];
  upright: number[];
}

/** Stops nearer to each other than this are one. */
const SAME_MM = 0.4;

/**
 * The stops that say an outline: across the page from the corners of its upper and of its lower half, up the page from
 * all. A side that has no more than its two ends says nothing.
 *
 * @param outline - anticlockwise, y up, millimetres
 */
export function outlineStops(outline: readonly OutlineCorner[]): OutlineStops {
  const { x0, x1, y0, y1 } = outlineBox(outline);
  if (outline.length > MOST_CHAINED_CORNERS) return { above: [], below: [], upright: [] };
  const middle = (y0 + y1) / 2;
  const xsOf = (is: (y: number) => boolean) => outline.filter(({ at }) => is(at[1])).map(({ at }) => at[0]);
  const across = (xs: number[]) => more(distinct([x0, ...xs, x1]));
  return {
    above: across(xsOf((y) => y > middle)),
    below: across(xsOf((y) => y <= middle)),
    upright: more(distinct(outline.map(({ at }) => at[1]))),
  };
}

const more = (stops: number[]): number[] => (stops.length > 2 ? stops : []);

function distinct(values: readonly number[]): number[] {
  const sorted = [...values].sort((a, b) => a - b);
  return sorted.filter((value, i) => i === 0 || value - sorted[i - 1]! > SAME_MM);
}
