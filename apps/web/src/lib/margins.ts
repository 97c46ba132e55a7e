import { isSureOfShort, type RuleUnit, type VerdictOutcome } from '@settlewright/anthropometry';
import { formatAngle, formatLength, type LengthStyle } from '@settlewright/geometry';

const INCH = 25.4;
/** A prediction this wide or wider each way is shown to the half inch or the ten millimetres. */
const WIDE_RANGE_MM = 0.75 * INCH;

/** Stands where a number was: it went with the person it told of. */
export const REMOVED = 'removed';

/** Stands where a number is short of a line by less than is shown; equality is within a tenth of a millimetre. */
export const JUST_SHORT = 'just short';
const EQUAL = 0.1;

/** Short of the line by so little that the number would read as none. */
export function isJustShort(margin: number, unit: RuleUnit, style: LengthStyle): boolean {
  return (
    unit === 'mm' && margin < -EQUAL - 1e-9 && amountText(-margin, unit, style) === amountText(0, unit, style)
  );
}

/** A number of a check in its own unit. */
export function amountText(value: number, unit: RuleUnit, style: LengthStyle): string {
  if (unit === 'deg') return formatAngle(value);
  if (unit === 'count') return String(Math.round(value));
  return formatLength(value, style);
}

function coarse(valueMm: number, style: LengthStyle): number {
  const step = style.system === 'millimetres' ? 10 : INCH / 2;
  return Math.round(valueMm / step) * step;
}

function signed(text: string, value: number): string {
  return value >= 0 && !text.startsWith('−') ? `+${text}` : text;
}

/** The margin of a verdict; a stored sheet has lost those of people who were removed. */
export type WithMargin = { margin: number | null; marginRange?: VerdictOutcome['marginRange'] | null };

/** Short by no more than is shown, and sure of it. */
export const isSurelyShort = (
  margin: number,
  half: number | undefined,
  unit: RuleUnit,
  style: LengthStyle,
): boolean => isJustShort(margin, unit, style) && isSureOfShort(margin, half ?? 0);

/** Margin and half its range, rounded to what is known; no range where nothing was predicted. */
export function knownMargin(
  margin: number,
  range: VerdictOutcome['marginRange'] | null,
  unit: RuleUnit,
  style: LengthStyle,
): { margin: number; half: number | undefined } {
  if (unit !== 'mm' || !range) return { margin, half: undefined };
  const half = (range.high - range.low) / 2;
  if (half < WIDE_RANGE_MM) return { margin, half };
  return { margin: coarse(margin, style), half: coarse(half, style) };
}

/** Margin as the sheet shows it: "+1½″", and half its range when it is predicted: "± 1". */
export function marginText(
  outcome: WithMargin,
  unit: RuleUnit,
  style: LengthStyle,
): { margin: string; range: string | undefined } {
  if (outcome.margin === null) return { margin: REMOVED, range: undefined };
  const { margin, half } = knownMargin(outcome.margin, outcome.marginRange ?? null, unit, style);
  if (isSurelyShort(margin, half, unit, style)) return { margin: JUST_SHORT, range: undefined };
  const shown = amountText(margin, unit, style);
  const text = shown === amountText(0, unit, style) ? `+${shown}` : signed(shown, margin);
  if (half === undefined) return { margin: text, range: undefined };
  const halfText = formatLength(half, style).replace(/[\s\u202f]*(mm|″)$/, '');
  return { margin: text, range: halfText === '0' ? undefined : `± ${halfText}` };
}
