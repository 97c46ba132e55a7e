import { hasGlyph } from './work-sans';

const SUPERIORS = '⁰¹²³⁴⁵⁶⁷⁸⁹';
const INFERIORS = '₀₁₂₃₄₅₆₇₈₉';
const READY_MADE: Record<string, string> = {
  '1/2': '½',
  '1/4': '¼',
  '3/4': '¾',
  '1/8': '⅛',
  '3/8': '⅜',
  '5/8': '⅝',
  '7/8': '⅞',
};
const NO_BREAK = '\u00a0';

const digits = (text: string, set: string) => [...text].map((d) => set[Number(d)] ?? d).join('');

/** One fraction as the face can draw it: a glyph of its own, or raised figures, a slash and lowered ones. */
export function fraction(over: string, under: string): string {
  return READY_MADE[`${over}/${under}`] ?? `${digits(over, SUPERIORS)}⁄${digits(under, INFERIORS)}`;
}

/**
 * Text as it can stand on paper: on one line, fractions made of glyphs that exist, a number held to its
 * unit, and nothing the face cannot draw (a letter loses its accent before it becomes a question mark).
 */
export function printable(text: string): string {
  const plain = text
    .normalize('NFC')
    .replace(/[\s\u2028\u2029]*[\n\r\u2028\u2029][\s\u2028\u2029]*/g, ' ')
    .replace(/(?<![\d⁄])(\d{1,2})⁄(\d{1,2})(?![\d⁄])/g, (_, over: string, under: string) =>
      fraction(over, under),
    )
    .replace(/(\d)[ \u2009\u202f](mm|cm|m|kg|lb|yd|ft|in|N|%)(?![\p{L}])/gu, `$1${NO_BREAK}$2`)
    .replace(/′ (?=[\d¼½¾⅛⅜⅝⅞⁰¹²³⁴⁵⁶⁷⁸⁹])/g, `′${NO_BREAK}`)
    .replace(/ × /g, `${NO_BREAK}×${NO_BREAK}`);
  return [...plain].map(drawable).join('');
}

function drawable(character: string): string {
  const code = character.codePointAt(0) ?? 0;
  if (hasGlyph(code)) return character;
  if (/\p{Cc}|\p{Cf}|\p{M}/u.test(character)) return '';
  if (/\p{Zs}/u.test(character)) return ' ';
  const plainer = [...character.normalize('NFKD')].filter((part) => hasGlyph(part.codePointAt(0) ?? 0));
  return plainer.length > 0 ? plainer.join('') : '?';
}
