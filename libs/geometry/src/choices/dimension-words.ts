import { formatAngle } from '../units/angle.ts';
import { formatExactLength, formatLength } from '../units/format-length.ts';
import type { LengthStyle } from '../units/length-style.ts';
import type { Dimension } from './dimension.ts';

/**
 * A value of a dimension, rounded for show.
 *
 * @param value - in the unit
 * @param unit - unit of the dimension
 * @param style - how lengths are shown
 */
export function dimensionValue(value: number, unit: Dimension['unit'], style: LengthStyle): string {
  if (unit === 'mm') return formatLength(value, style);
  return unit === 'deg' ? formatAngle(value) : `${Math.round(value)}\u202fN`;
}

/**
 * A value somebody will build to, never shown as another one.
 *
 * @param value - in the unit
 * @param unit - unit of the dimension
 * @param style - how lengths are shown
 */
export function exactValue(value: number, unit: Dimension['unit'], style: LengthStyle): string {
  return unit === 'mm' ? formatExactLength(value, style) : dimensionValue(value, unit, style);
}

/**
 * "B1 to B4", "B1 and B3": marks that follow each other are said as a run.
 *
 * @param marks - marks of pieces, in order
 */
export function markWords(marks: readonly string[]): string {
  const numbers = marks.map((mark) => Number(mark.replace(/\D+/, '')));
  const letters = new Set(marks.map((mark) => mark.replace(/\d+/, '')));
  const inARow = numbers.every((number, n) => n === 0 || number === (numbers[n - 1] as number) + 1);
  if (marks.length > 2 && letters.size === 1 && inARow) return `${marks[0]} to ${marks.at(-1)}`;
  return new Intl.ListFormat('en-GB', { type: 'conjunction' }).format([...new Set(marks)]);
}

/**
 * How a dimension stands in a list: "Seat height, pressed: B1 to B4 with T1 and T2".
 *
 * @param dimension - the dimension
 */
export function dimensionWords({ label, marks, tableMarks }: Dimension): string {
  const tables = tableMarks.length === 0 ? '' : ` with ${markWords(tableMarks)}`;
  return `${label}: ${markWords(marks)}${tables}`;
}

const STEPS: Record<Exclude<Dimension['unit'], 'mm'>, number> = { deg: 0.5, N: 5 };

/**
 * The step by which a dimension is chosen.
 *
 * @param unit - unit of the dimension
 * @param lengthStepMm - rounding step of lengths, millimetres
 * @returns in the unit: 0.5 degrees and 5 newtons beside lengths
 */
export const dimensionStep = (unit: Dimension['unit'], lengthStepMm: number): number =>
  unit === 'mm' ? lengthStepMm : STEPS[unit];
