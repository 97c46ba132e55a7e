import { spokenLength, type Dimension, type LengthStyle } from '@settlewright/geometry';
import { markWords } from '@/lib/dimension-words.ts';
import { numberWord } from '@/lib/number-word.ts';
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

/** Small numbers as words, "none" for 0. */
export const countWords = (n: number): string => (n === 0 ? 'none' : numberWord(n));

/** "23 in 100". */
export const inHundred = (share: number): string => `${Math.round(share * 100)} in 100`;
