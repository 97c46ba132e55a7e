import { hasGlyph } from './work-sans';

const NO_BREAK = '\u00a0';
const NARROW_NO_BREAK = '\u202f';

/**
 * Text as it can stand on paper: on one line, a number held to its unit, and nothing the face cannot draw
 * (a letter loses its accent before it becomes a question mark).
 */
export function printable(text: string): string {
  const plain = text
    .normalize('NFC')
    .replace(/\t/g, ' ')
    .replace(/[\s\u2028\u2029]*[\n\r\u2028\u2029][\s\u2028\u2029]*/g, ' ')
    .replace(/(\d)[ \u2009\u202f](mm|cm|m|kg|lb|yd|ft|in|N|%)(?![\p{L}])/gu, `$1${NO_BREAK}$2`)
    .replace(/′ (?=[\d¼½¾⅛⅜⅝⅞⁰¹²³⁴⁵⁶⁷⁸⁹])/g, `′${NO_BREAK}`)
    .replace(/ × /g, `${NO_BREAK}×${NO_BREAK}`);
  return [...plain].map(drawable).join('');
}

function drawable(character: string): string {
  const code = character.codePointAt(0) ?? 0;
  if (hasGlyph(code)) return character;
  if (/\p{Cc}|\p{Cf}|\p{M}/u.test(character)) return '';
  if (character === NARROW_NO_BREAK) return NO_BREAK;
  if (/\p{Zs}/u.test(character)) return ' ';
  const plainer = [...character.normalize('NFKD')].filter((part) => hasGlyph(part.codePointAt(0) ?? 0));
  return plainer.length > 0 ? plainer.join('') : '?';
}
