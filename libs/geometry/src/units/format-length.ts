import { fractionText } from './fraction.ts';
import { lengthStep, MM_PER_INCH, type LengthStyle } from './length-style.ts';

const PRIME = '′';
const DOUBLE_PRIME = '″';
const MINUS = '−';
const NO_BREAK_SPACE = '\u00a0';
const NARROW_NO_BREAK_SPACE = '\u202f';

/**
 * Writes a length for show: "3′ 8″", "17½″", "17.50″" or "457 mm". Rounds for show only.
 *
 * @param mm - the length, finite; negative is written with a true minus sign
 * @param style - the display style
 * @returns text whose parts cannot be separated by a line break
 */
export function formatLength(mm: number, style: LengthStyle): string {
  const steps = Math.round(Math.abs(mm) / lengthStep(style));
  const sign = mm < 0 && steps > 0 ? MINUS : '';
  if (style.system === 'millimetres') return `${sign}${steps}${NARROW_NO_BREAK_SPACE}mm`;
  if (style.system === 'decimal-inches') {
    const inches = (steps * lengthStep(style)) / MM_PER_INCH;
    return `${sign}${inches.toFixed(style.roundTo === 16 ? 2 : 1)}${DOUBLE_PRIME}`;
  }
  const perFoot = 12 * style.roundTo;
  const feet = style.feet === true ? Math.floor(steps / perFoot) : 0;
  const inches = inchText(steps - feet * perFoot, style.roundTo);
  const before = feet > 0 ? `${feet}${PRIME}${NO_BREAK_SPACE}` : '';
  return `${sign}${before}${inches}${DOUBLE_PRIME}`;
}

function inchText(parts: number, per: number): string {
  const whole = Math.floor(parts / per);
  const rest = parts - whole * per;
  if (rest === 0) return String(whole);
  return `${whole === 0 ? '' : whole}${fractionText(rest, per)}`;
}
