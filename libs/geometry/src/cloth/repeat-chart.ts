import { MM_PER_INCH } from '../units/length-style.ts';

/** Upper end of each band of vertical and horizontal repeat together, inches, and what it adds. */
const BANDS = [
  { upToIn: 0, addPercent: 0 },
  { upToIn: 14, addPercent: 10 },
  { upToIn: 19, addPercent: 15 },
  { upToIn: 27, addPercent: 20 },
  { upToIn: 36, addPercent: 25 },
  { upToIn: 45, addPercent: 30 },
  { upToIn: 54, addPercent: 35 },
] as const;

/** Cloth as narrow as this, or narrower, adds ten points to every band that adds anything. */
const NARROW_IN = 52;
const NARROW_ADDS_PERCENT = 10;

/**
 * What a chart of the trade adds to a plain length of cloth for its repeat.
 *
 * @param repeatMm - vertical and horizontal repeat
 * @param clothWidthMm - full width
 * @returns percent to add; `undefined` beyond the chart's last band, 54 in of both repeats together
 * @source upholstery yardage chart: bands of vertical and horizontal repeat together for 54 in cloth; a sum between two
 * printed bands takes the higher one
 */
export function repeatChartPercent(
  repeatMm: { acrossMm: number; alongMm: number },
  clothWidthMm: number,
): number | undefined {
  const sum = (repeatMm.acrossMm + repeatMm.alongMm) / MM_PER_INCH;
  const band = BANDS.find(({ upToIn }) => sum <= upToIn + 1e-6);
  if (!band) return undefined;
  const narrow = clothWidthMm <= NARROW_IN * MM_PER_INCH + 1e-6 && band.addPercent > 0;
  return band.addPercent + (narrow ? NARROW_ADDS_PERCENT : 0);
}

/**
 * A quick rule for the cloth of one cushion, without a layout.
 *
 * @param size - finished; the longer side runs up the roll
 * @param options - folds of the cover over its length and whether ties are cut with it
 * @returns length of plain cloth, millimetres
 * @source published cushion yardage guide: longest side, twice the thickness, as much again per fold, 2 in for ties;
 * doubled when the shorter side with the thickness is over 25 in, 2.6 times when over 52 in
 */
export function quickClothMm(
  size: { widthMm: number; depthMm: number; thicknessMm: number },
  options: { folds?: number; ties?: boolean } = {},
): number {
  const { widthMm, depthMm, thicknessMm } = size;
  const length =
    Math.max(widthMm, depthMm) +
    2 * thicknessMm * (1 + (options.folds ?? 0)) +
    (options.ties ? 2 * MM_PER_INCH : 0);
  const across = (Math.min(widthMm, depthMm) + thicknessMm) / MM_PER_INCH;
  return length * (across > 52 ? 2.6 : across > 25 ? 2 : 1);
}
