import type { Box } from '../drawing/page-box.ts';

/** One sheet of a drawing that is larger than the paper. */
export interface Tile {
  column: number;
  row: number;
  /** The corner of the set that lies in the upper left corner of the sheet's free space, millimetres. */
  xMm: number;
  yMm: number;
}

/** What two neighbouring sheets both show, millimetres of paper. */
export const TILE_OVERLAP_MM = 10;

function starts(from: number, length: number, paperMm: number, scale: number): number[] {
  const room = paperMm * scale;
  if (length <= room) return [from + length / 2 - room / 2];
  const step = (paperMm - TILE_OVERLAP_MM) * scale;
  const count = 1 + Math.ceil((length - room) / step);
  // The first sheet is full, what is left over goes on the last: whole pieces stand together on the first.
  return Array.from({ length: count }, (_, n) => from + n * step);
}

/**
 * Lays a drawing out on sheets at its own scale: on more of them when one is too small, never smaller.
 *
 * @param bounds - of the drawing, millimetres of the real thing
 * @param scale - real millimetres for one of the paper
 * @param space - free on each sheet, millimetres of paper; wider and higher than the overlap
 * @returns sheets row by row from the upper left
 */
export function tilesOf(bounds: Box, scale: number, space: { widthMm: number; heightMm: number }): Tile[] {
  const across = starts(bounds.x, bounds.width, space.widthMm, scale);
  const down = starts(bounds.y, bounds.height, space.heightMm, scale);
  return down.flatMap((yMm, row) => across.map((xMm, column) => ({ column, row, xMm, yMm })));
}
