import { spokenLength, type Dimension, type LengthStyle } from '@settlewright/geometry';
import { markWords } from '@/lib/dimension-words.ts';
type Unit = Dimension['unit'];

/** A value for a screen reader: "18 inches". */
export function sayValue(value: number, unit: Unit, style: LengthStyle): string {
  if (unit === 'mm') return spokenLength(value, style);
  return unit === 'deg' ? `${Math.round(value * 10) / 10} degrees` : `${Math.round(value)} newtons`;
}

/** "B1 to B4; tables T1 and T2 move with them". */
export function movingWords({ marks, tableMarks }: Pick<Dimension, 'marks' | 'tableMarks'>): string {
  const tables =
    tableMarks.length === 0
      ? ''
      : tableMarks.length === 1
        ? `; table ${tableMarks[0]} moves along`
        : `; tables ${markWords(tableMarks)} move along`;
  return `${markWords(marks)}${tables}`;
}

/** How a dimension stands in a list: "Seat height, pressed: B1 to B4 with T1 and T2". */
export function dimensionWords({ label, marks, tableMarks }: Dimension): string {
  const tables = tableMarks.length === 0 ? '' : ` with ${markWords(tableMarks)}`;
  return `${label}: ${markWords(marks)}${tables}`;
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
