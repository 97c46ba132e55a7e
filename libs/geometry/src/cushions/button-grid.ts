/** Board lines and spacing that button columns have to follow. */
export interface ColumnRule {
  /** Lines to stand on, along the bench, rising: joints or board centres. */
  linesMm: readonly number[];
  /** A column on every n-th line. */
  every: number;
  /** Least distance from a seam. */
  edgeMm: number;
}

/**
 * Columns of buttons on one cushion: every n-th board line, starting where most columns fit and the
 * margins at both ends are most alike.
 *
 * @param leftMm - left seam, in the coordinate of the lines
 * @param rightMm - right seam
 * @param rule - lines, spacing and margin
 * @returns places of the columns in the coordinate of the lines, rising; none when no line is far enough inside
 */
export function buttonColumns(leftMm: number, rightMm: number, rule: ColumnRule): number[] {
  const inside = (line: number): boolean =>
    line >= leftMm + rule.edgeMm - 1e-6 && line <= rightMm - rule.edgeMm + 1e-6;
  let best: number[] = [];
  let bestUneven = Infinity;
  for (let phase = 0; phase < rule.every; phase += 1) {
    const columns = rule.linesMm.filter((line, i) => i % rule.every === phase && inside(line));
    const first = columns[0];
    const last = columns[columns.length - 1];
    if (first === undefined || last === undefined) continue;
    const uneven = Math.abs(first - leftMm - (rightMm - last));
    if (columns.length > best.length || (columns.length === best.length && uneven < bestUneven - 1e-6)) {
      best = columns;
      bestUneven = uneven;
    }
  }
  return best;
}

/**
 * Rows of buttons over the depth of a cushion, evenly spaced, none nearer to a seam than asked.
 *
 * @param sizeMm - depth, or height of a back cushion
 * @param count - rows wanted
 * @param edgeMm - least distance from a seam
 * @returns distances from the back (or top) seam, rising; fewer than asked when the cushion is too small
 */
export function buttonRows(sizeMm: number, count: number, edgeMm: number): number[] {
  if (count <= 0 || sizeMm < 2 * edgeMm) return [];
  const even = sizeMm / (count + 1);
  if (even >= edgeMm) return Array.from({ length: count }, (_, i) => even * (i + 1));
  if (count === 1) return [sizeMm / 2];
  const pitch = (sizeMm - 2 * edgeMm) / (count - 1);
  return Array.from({ length: count }, (_, i) => edgeMm + pitch * i);
}

/**
 * A field of whole diamonds in a panel, margins shared.
 *
 * @param panel - width and height
 * @param diamond - width and height of one
 * @param leastMarginMm - least margin on every side
 * @returns how many across and high, half-diamond grid and the margins that remain
 * @source upholstery tufting page: 30 x 16 with 3 x 5 diamonds gives 8 x 2, grid 1.5 x 2.5, margin 3
 */
export function diamondField(
  panel: { widthMm: number; heightMm: number },
  diamond: { widthMm: number; heightMm: number },
  leastMarginMm: number,
): { across: number; high: number; gridXMm: number; gridYMm: number; marginXMm: number; marginYMm: number } {
  const whole = (size: number, one: number): number =>
    Math.max(0, Math.floor((size - 2 * leastMarginMm) / one + 1e-9));
  const across = whole(panel.widthMm, diamond.widthMm);
  const high = whole(panel.heightMm, diamond.heightMm);
  return {
    across,
    high,
    gridXMm: diamond.widthMm / 2,
    gridYMm: diamond.heightMm / 2,
    marginXMm: (panel.widthMm - across * diamond.widthMm) / 2,
    marginYMm: (panel.heightMm - high * diamond.heightMm) / 2,
  };
}
