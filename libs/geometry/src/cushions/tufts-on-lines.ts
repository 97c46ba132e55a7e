/** Lines that columns of tufts have to follow, and the face they stand in. */
export interface TuftLines {
  /** Along the bench, rising: joints or board centres. */
  linesMm: readonly number[];
  /** Seams of the cushion in the coordinate of the lines. */
  lowMm: number;
  highMm: number;
  /** Least distance of a column from either seam. */
  borderMm: number;
  /** Wanted width of a tuft. */
  widthMm: number;
  /** Columns to a tuft: 1 of biscuits, 2 of diamonds, whose every other row is set over by half. */
  steps: 1 | 2;
}

/** Columns further from evenly spaced than this stand on a board that was cut narrower. */
const EVEN_MM = 0.5;

/**
 * Columns of a field of tufts on board lines: as near to the wanted width as whole boards allow, as many whole tufts as
 * there is room for, margins at both ends as alike as can be.
 *
 * @param field - lines, face and wanted tuft
 * @returns places of the columns in the coordinate of the lines, rising, evenly spaced; none where not one tuft fits
 */
export function tuftColumns({ linesMm, lowMm, highMm, borderMm, widthMm, steps }: TuftLines): number[] {
  const lines = linesMm.filter((x) => x >= lowMm + borderMm - 1e-6 && x <= highMm - borderMm + 1e-6);
  const gaps = lines.slice(1).map((x, i) => x - lines[i]!);
  const pitch = gaps.toSorted((a, b) => a - b)[Math.floor(gaps.length / 2)];
  if (pitch === undefined) return [];
  const every = Math.max(1, Math.round(widthMm / steps / pitch));
  const uneven = (xs: readonly number[]): number => Math.abs(xs[0]! - lowMm - (highMm - xs.at(-1)!));
  let best: number[] = [];
  for (let start = 0; start < lines.length; start += 1) {
    const xs = evenFrom(lines, start, every, pitch * every);
    // Whole tufts alone: half a diamond at an end has no button to hold it.
    const whole = xs.slice(0, steps * Math.floor((xs.length - 1) / steps) + 1);
    if (whole.length <= steps) continue;
    const isBetter =
      whole.length > best.length || (whole.length === best.length && uneven(whole) < uneven(best) - 1e-6);
    if (isBetter) best = whole;
  }
  return best;
}

/** Every n-th line from one on, as long as they stand evenly. */
function evenFrom(lines: readonly number[], start: number, every: number, stepMm: number): number[] {
  const xs: number[] = [];
  for (let i = start; i < lines.length; i += every) {
    const x = lines[i]!;
    if (xs.length > 0 && Math.abs(x - xs.at(-1)! - stepMm) > EVEN_MM) break;
    xs.push(x);
  }
  return xs;
}
