import type anyAsciiType from 'any-ascii';

/** Half a megabyte of tables, read when a name first needs them. */
let anyAscii: typeof anyAsciiType | undefined;

/** Thai and Lao write some vowels before the consonant they follow in speech. */
const VOWEL_BEFORE = /([\u0e40-\u0e44])([\u0e01-\u0e2e])|([\u0ec0-\u0ec4])([\u0e81-\u0eae])/g;

/** Text of any script in plain Latin letters, letter by letter; what has no such letters shows its number. */
export function romanise(text: string): string {
  // eslint-disable-next-line @typescript-eslint/no-require-imports -- only when needed
  anyAscii ??= (require('any-ascii') as { default: typeof anyAsciiType }).default;
  const spoken = text.replace(VOWEL_BEFORE, '$2$1$4$3');
  return [...spoken].map(plainLetters).join('');
}

function plainLetters(character: string): string {
  const letter = /\p{L}/u.test(character);
  const plain = (anyAscii?.(character) ?? '').replaceAll('?', letter ? '' : '?');
  if (plain !== '' || /\p{M}|\p{Cf}/u.test(character)) return plain;
  return `U+${(character.codePointAt(0) ?? 0).toString(16).toUpperCase().padStart(4, '0')}`;
}
