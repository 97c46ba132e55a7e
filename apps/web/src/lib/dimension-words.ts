export { dimensionStep, dimensionValue, dimensionWords, exactValue, markWords } from '@settlewright/geometry';

/** "Ottilie, Hetty and Wren", each once. */
export const joinWords = (words: readonly string[]): string =>
  new Intl.ListFormat('en-GB', { type: 'conjunction' }).format([...new Set(words)]);

/** Ends a sentence that may have its full stop already. */
export const sentence = (text: string): string => text.replace(/[.\s]*$/, '.');

/** "about 23 in 100", "fewer than 1 in 100". */
export function aboutInHundred(share: number): string {
  const n = Math.round(share * 100);
  if (n === 0) return share > 0 ? 'fewer than 1 in 100' : 'nobody';
  if (n === 100 && share < 1) return 'more than 99 in 100';
  return `about ${n} in 100`;
}
