import { exactParts } from './exact-style.ts';
import { fractionText } from './fraction.ts';
import { lengthStep, MM_PER_INCH, type LengthStyle } from './length-style.ts';

const PRIME = '′';
const DOUBLE_PRIME = '″';
const MINUS = '−';
const NO_BREAK_SPACE = '\u00a0';
const NARROW_NO_BREAK_SPACE = '\u202f';
const ABOUT = '≈';

/**
 * Writes a length for show: "3′ 8″", "17½″", "17.50″" or "457 mm". Rounds for show only.
 *
 * @param mm - the length, finite; negative is written with a true minus sign
 * @param style - the display style
 * @returns text whose parts cannot be separated by a line break
 */
export function formatLength(mm: number, style: LengthStyle): string {
  const stepMm = lengthStep(style);
  return inSteps(mm < 0, Math.round(Math.abs(mm) / stepMm), stepMm, style);
}

/**
 * Writes a length that somebody chose, never as another one: finer than the style where it lies on a finer
 * part ("28⁷⁄₁₆″", "457.2 mm"), and with "≈" before the rounded figure where it lies on none.
 *
 * @param mm - the length, finite; negative is written with a true minus sign
 * @param style - the display style
 * @returns text as from `formatLength` for every length on the step of the style
 */
export function formatExactLength(mm: number, style: LengthStyle): string {
  const { stepMm, steps, exact } = exactParts(mm, style);
  return `${exact ? '' : ABOUT}${inSteps(mm < 0, steps, stepMm, style)}`;
}

function inSteps(negative: boolean, steps: number, stepMm: number, style: LengthStyle): string {
  const sign = negative && steps > 0 ? MINUS : '';
  if (style.system === 'millimetres') {
    const size = stepMm < 1 ? (steps * stepMm).toFixed(1) : String(steps);
    return `${sign}${size}${NARROW_NO_BREAK_SPACE}mm`;
  }
  if (style.system === 'decimal-inches') {
    const stepIn = stepMm / MM_PER_INCH;
    const decimals = stepIn < 0.005 ? 3 : stepIn < 0.075 ? 2 : 1;
    return `${sign}${(steps * stepIn).toFixed(decimals)}${DOUBLE_PRIME}`;
  }
  const per = Math.round(MM_PER_INCH / stepMm);
  const perFoot = 12 * per;
  const feet = style.feet === true ? Math.floor(steps / perFoot) : 0;
  const inches = inchText(steps - feet * perFoot, per);
  const before = feet > 0 ? `${feet}${PRIME}${NO_BREAK_SPACE}` : '';
  return `${sign}${before}${inches}${DOUBLE_PRIME}`;
}

function inchText(parts: number, per: number): string {
  const whole = Math.floor(parts / per);
  const rest = parts - whole * per;
  if (rest === 0) return String(whole);
  return `${whole === 0 ? '' : whole}${fractionText(rest, per)}`;
}
