import { numberWords } from '@settlewright/geometry';

const LAST_IN_WORDS = 12;

/** "no", "four", or "13" from there on. */
export function numberWord(count: number): string {
  if (count === 0) return 'no';
  return count <= LAST_IN_WORDS ? numberWords(count) : String(count);
}
