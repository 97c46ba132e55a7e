const GLYPHS: Record<string, string> = {
  '1/2': '½',
  '1/4': '¼',
  '3/4': '¾',
  '1/8': '⅛',
  '3/8': '⅜',
  '5/8': '⅝',
  '7/8': '⅞',
};

const SUPERSCRIPTS = '⁰¹²³⁴⁵⁶⁷⁸⁹';
const SUBSCRIPTS = '₀₁₂₃₄₅₆₇₈₉';

const inDigits = (n: number, digits: string): string =>
  [...String(n)].map((d) => digits[Number(d)] ?? '').join('');

/**
 * A proper fraction as one drawn figure: a glyph where fonts have one, else raised and lowered numerals.
 *
 * @param numerator - whole, at least 1 and below the denominator
 * @param denominator - a power of two
 * @returns text such as "½" or "³⁄₁₆", in lowest terms
 */
export function fractionText(numerator: number, denominator: number): string {
  let n = numerator;
  let d = denominator;
  while (n % 2 === 0 && d % 2 === 0) {
    n /= 2;
    d /= 2;
  }
  return GLYPHS[`${n}/${d}`] ?? `${inDigits(n, SUPERSCRIPTS)}⁄${inDigits(d, SUBSCRIPTS)}`;
}

/**
 * Rewrites every drawn fraction in a text as plain "n/d", parted from a whole number by a space.
 *
 * @param text - as typed or as shown by `formatLength`
 * @returns the same text with only ASCII fractions
 */
export function plainFractions(text: string): string {
  let plain = text;
  for (const [ascii, glyph] of Object.entries(GLYPHS)) plain = plain.replaceAll(glyph, ` ${ascii}`);
  plain = plain.replace(/([⁰¹²³⁴⁵⁶⁷⁸⁹]+)⁄([₀₁₂₃₄₅₆₇₈₉]+)/g, (_, n: string, d: string) => {
    const read = (figures: string, digits: string) =>
      [...figures].map((f) => String(digits.indexOf(f))).join('');
    return ` ${read(n, SUPERSCRIPTS)}/${read(d, SUBSCRIPTS)}`;
  });
  return plain.replaceAll('⁄', '/');
}
