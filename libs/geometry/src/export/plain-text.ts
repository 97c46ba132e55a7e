import { plainFractions } from '../units/fraction.ts';

/**
 * Words for files whose fonts know ASCII only: 17½″ becomes 17 1/2".
 *
 * @param text - as shown
 * @returns printable ASCII; letters beyond it as \U+XXXX, which drawing programs read as the letter
 */
export function plainText(text: string): string {
  const plain = plainFractions(text)
    .replaceAll('′', "'")
    .replaceAll('″', '"')
    .replaceAll('−', '-')
    .replaceAll('≈', '~')
    .replace(/[\u00a0\u202f]/g, ' ')
    .replace(/ {2,}/g, ' ')
    .trim();
  return [...plain]
    .map((letter) => {
      const code = letter.codePointAt(0) ?? 0;
      if (code >= 32 && code < 127) return letter;
      return code > 0xffff ? '?' : `\\U+${code.toString(16).toUpperCase().padStart(4, '0')}`;
    })
    .join('');
}
