import {
  formatAngle,
  formatExactLength,
  formatLength,
  type Dimension,
  type LengthStyle,
} from '@settlewright/geometry';

/** A value of a dimension, rounded for show. */
export function dimensionValue(value: number, unit: Dimension['unit'], style: LengthStyle): string {
  if (unit === 'mm') return formatLength(value, style);
  return unit === 'deg' ? formatAngle(value) : `${Math.round(value)}\u202fN`;
}

/** A value somebody will build to, never shown as another one. */
export function exactValue(value: number, unit: Dimension['unit'], style: LengthStyle): string {
  return unit === 'mm' ? formatExactLength(value, style) : dimensionValue(value, unit, style);
}

/** "Ottilie, Hetty and Wren", each once. */
export const joinWords = (words: readonly string[]): string =>
  new Intl.ListFormat('en-GB', { type: 'conjunction' }).format([...new Set(words)]);

/** "B1 to B4", "B1 and B3": marks that follow each other are said as a run. */
export function markWords(marks: readonly string[]): string {
  const numbers = marks.map((mark) => Number(mark.replace(/\D+/, '')));
  const letters = new Set(marks.map((mark) => mark.replace(/\d+/, '')));
  const inARow = numbers.every((number, n) => n === 0 || number === (numbers[n - 1] as number) + 1);
  if (marks.length > 2 && letters.size === 1 && inARow) return `${marks[0]} to ${marks.at(-1)}`;
  return joinWords(marks);
}

/** How a dimension stands in a list: "Seat height, pressed: B1 to B4 with T1 and T2". */
export function dimensionWords({ label, marks, tableMarks }: Dimension): string {
  const tables = tableMarks.length === 0 ? '' : ` with ${markWords(tableMarks)}`;
  return `${label}: ${markWords(marks)}${tables}`;
}

const STEPS: Record<Exclude<Dimension['unit'], 'mm'>, number> = { deg: 0.5, N: 5 };

/** The step by which a dimension is chosen. */
export const dimensionStep = (unit: Dimension['unit'], lengthStepMm: number): number =>
  unit === 'mm' ? lengthStepMm : STEPS[unit];

/** Ends a sentence that may have its full stop already. */
export const sentence = (text: string): string => text.replace(/[.\s]*$/, '.');

/** "about 23 in 100", "fewer than 1 in 100". */
export function aboutInHundred(share: number): string {
  const n = Math.round(share * 100);
  if (n === 0) return share > 0 ? 'fewer than 1 in 100' : 'nobody';
  if (n === 100 && share < 1) return 'more than 99 in 100';
  return `about ${n} in 100`;
}
