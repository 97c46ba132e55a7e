import type { Dimension } from '@settlewright/geometry';
import {
  formatAngle,
  formatExactLength,
  formatLength,
  spokenLength,
  type LengthStyle,
} from '@settlewright/geometry';

type Unit = Dimension['unit'];

/** A value somebody chose, never shown as another one. */
export function showValue(value: number, unit: Unit, style: LengthStyle): string {
  if (unit === 'mm') return formatExactLength(value, style);
  return unit === 'deg' ? formatAngle(value) : `${Math.round(value)}\u202fN`;
}

/** A size that was worked out, rounded for show. */
export function showSize(size: number, unit: Unit, style: LengthStyle): string {
  return unit === 'mm' ? formatLength(size, style) : showValue(size, unit, style);
}

/** A value for a screen reader: "18 inches". */
export function sayValue(value: number, unit: Unit, style: LengthStyle): string {
  if (unit === 'mm') return spokenLength(value, style);
  return unit === 'deg' ? `${Math.round(value * 10) / 10} degrees` : `${Math.round(value)} newtons`;
}

/** First name for lines where room is short; a mannequin keeps "Woman, 5th". */
export function shortName(name: string): string {
  const [mannequin] = /^(Woman|Man), \d+\w\w/.exec(name) ?? [];
  return mannequin ?? name.split(' ')[0] ?? name;
}

/** "Ottilie, Hetty and Wren", each once. */
export function joinNames(names: readonly string[]): string {
  return new Intl.ListFormat('en-GB', { type: 'conjunction' }).format([...new Set(names)]);
}

/** "B1 to B4", "B1 and B3": marks that follow each other are said as a run. */
export function marksWords(marks: readonly string[]): string {
  const numbers = marks.map((mark) => Number(mark.replace(/\D+/, '')));
  const letters = new Set(marks.map((mark) => mark.replace(/\d+/, '')));
  const inARow = numbers.every((number, n) => n === 0 || number === (numbers[n - 1] as number) + 1);
  if (marks.length > 2 && letters.size === 1 && inARow) return `${marks[0]} to ${marks.at(-1)}`;
  return joinNames(marks);
}

/** "B1 to B4; tables T1 and T2 move with them". */
export function movingWords({ marks, tableMarks }: Pick<Dimension, 'marks' | 'tableMarks'>): string {
  const tables =
    tableMarks.length === 0
      ? ''
      : tableMarks.length === 1
        ? `; table ${tableMarks[0]} moves along`
        : `; tables ${marksWords(tableMarks)} move along`;
  return `${marksWords(marks)}${tables}`;
}

/** How a dimension stands in a list: "Seat height, pressed: B1 to B4 with T1 and T2". */
export function dimensionWords({ label, marks, tableMarks }: Dimension): string {
  const tables = tableMarks.length === 0 ? '' : ` with ${marksWords(tableMarks)}`;
  return `${label}: ${marksWords(marks)}${tables}`;
}

const SMALL = [
  'none',
  'one',
  'two',
  'three',
  'four',
  'five',
  'six',
  'seven',
  'eight',
  'nine',
  'ten',
  'eleven',
  'twelve',
];

/** Small numbers as words. */
export const countWords = (n: number): string => SMALL[n] ?? String(n);

/** "23 in 100". */
export const inHundred = (share: number): string => `${Math.round(share * 100)} in 100`;
