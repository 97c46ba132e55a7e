import { exactParts } from './exact-style.ts';
import { lengthStep, MM_PER_INCH, type LengthStyle } from './length-style.ts';

const UNITS = [
  'zero',
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
  'thirteen',
  'fourteen',
  'fifteen',
  'sixteen',
  'seventeen',
  'eighteen',
  'nineteen',
];
const TENS = ['', '', 'twenty', 'thirty', 'forty', 'fifty', 'sixty', 'seventy', 'eighty', 'ninety'];
const PARTS: Record<number, [string, string]> = {
  2: ['half', 'halves'],
  4: ['quarter', 'quarters'],
  8: ['eighth', 'eighths'],
  16: ['sixteenth', 'sixteenths'],
  32: ['thirty-second', 'thirty-seconds'],
  64: ['sixty-fourth', 'sixty-fourths'],
};

/**
 * Says a length in words, for a screen reader: "seventeen and one half inches".
 *
 * @param mm - the length, finite
 * @param style - the display style; rounding is the same as in `formatLength`
 * @returns words, with "minus" in front of a negative length
 */
export function spokenLength(mm: number, style: LengthStyle): string {
  const stepMm = lengthStep(style);
  return sayInSteps(mm < 0, Math.round(Math.abs(mm) / stepMm), stepMm, style);
}

/**
 * Says a length that somebody chose, never as another one; the words of `formatExactLength`.
 *
 * @param mm - the length, finite
 * @param style - the display style
 * @returns words, with "about" in front where the length had to be rounded
 */
export function spokenExactLength(mm: number, style: LengthStyle): string {
  const { stepMm, steps, exact } = exactParts(mm, style);
  return `${exact ? '' : 'about '}${sayInSteps(mm < 0, steps, stepMm, style)}`;
}

function sayInSteps(negative: boolean, steps: number, stepMm: number, style: LengthStyle): string {
  const sign = negative && steps > 0 ? 'minus ' : '';
  if (style.system === 'millimetres') {
    const size = Number((steps * stepMm).toFixed(1));
    return `${sign}${size} ${size === 1 ? 'millimetre' : 'millimetres'}`;
  }
  if (style.system === 'decimal-inches') {
    const inches = Number(((steps * stepMm) / MM_PER_INCH).toFixed(3));
    return `${sign}${inches} ${inches === 1 ? 'inch' : 'inches'}`;
  }
  const per = Math.round(MM_PER_INCH / stepMm);
  const perFoot = 12 * per;
  const feet = style.feet === true ? Math.floor(steps / perFoot) : 0;
  const rest = steps - feet * perFoot;
  if (feet === 0) return `${sign}${spokenInches(rest, per)}`;
  const feetWords = `${numberWords(feet)} ${feet === 1 ? 'foot' : 'feet'}`;
  return `${sign}${feetWords}${rest === 0 ? '' : ` ${spokenInches(rest, per)}`}`;
}

function spokenInches(parts: number, per: number): string {
  const whole = Math.floor(parts / per);
  let n = parts - whole * per;
  let d = per;
  while (n !== 0 && n % 2 === 0) {
    n /= 2;
    d /= 2;
  }
  if (n === 0) return `${numberWords(whole)} ${whole === 1 ? 'inch' : 'inches'}`;
  const fraction = `${numberWords(n)} ${PARTS[d]?.[n === 1 ? 0 : 1] ?? ''}`;
  return whole === 0 ? `${fraction} of an inch` : `${numberWords(whole)} and ${fraction} inches`;
}

/**
 * Says a whole number in words: "zero", "seventeen", "forty-two".
 *
 * @param n - whole, >= 0
 * @returns words below a hundred, digits from there on
 */
export function numberWords(n: number): string {
  if (n < 20) return UNITS[n] ?? String(n);
  if (n >= 100) return String(n);
  const rest = n % 10;
  return `${TENS[Math.floor(n / 10)] ?? ''}${rest === 0 ? '' : `-${UNITS[rest] ?? ''}`}`;
}
