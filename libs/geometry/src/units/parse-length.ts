import { plainFractions } from './fraction.ts';
import { MM_PER_FOOT, MM_PER_INCH } from './length-style.ts';
import { fail, ok, type Result } from './result.ts';

/** Longest length that is read: 100 m. */
export const LONGEST_LENGTH_MM = 100_000;

/** Why a typed length was not taken. */
export interface LengthError {
  code: 'empty' | 'unreadable' | 'ambiguous' | 'negative' | 'too-large';
  /** What was typed. */
  read: string;
  /** What would be taken. */
  accepted: string;
  message: string;
  /** For what has two readings: both, in millimetres. */
  readings?: number[];
}

const ACCEPTED = 'a length such as 6′, 6′ 0 1/2″, 72 1/2 in, 72.5, 1842 mm, 184 cm or 1.842 m';
const DECIMAL = '(?:\\d+(?:\\.\\d*)?|\\.\\d+)';
const FRACTION = '\\d+ ?/ ?\\d+';
const QUANTITY = `(?:\\d+(?: |-)${FRACTION}|${FRACTION}|${DECIMAL})`;
const INCH = '(?:"|inches|inch|in\\.?)';
const FOOT = "(?:'|feet|foot|ft\\.?)";

const FEET_INCHES = new RegExp(`^(${QUANTITY}) ?${FOOT}(?:(?: |-)*(${QUANTITY}) ?${INCH}?)?$`);
const INCHES = new RegExp(`^(${QUANTITY}) ?${INCH}$`);
const METRIC = new RegExp(
  `^(${QUANTITY}) ?(mm|millimetres?|millimeters?|cm|centimetres?|centimeters?|m|metres?|meters?)$`,
);
const METRES_CENTIMETRES = /^(\d) ?m ?(\d\d) ?(?:cm)?$/;
const BARE = new RegExp(`^(${QUANTITY})$`);
const TWO_NUMBERS = new RegExp(`^(${DECIMAL})(?: |-)(${QUANTITY})$`);
const SLASHED = /^(\d+) ?\/ ?(\d+)$/;
const GROUPED = /^(\d{1,3}),(\d{3})( ?[a-z"']*)$/;

/**
 * Reads a length however it is typed; refuses what has two readings instead of guessing.
 *
 * @param text - as typed: 6', 6' 0 1/2", 6′ 0½″, 72.5, 72 1/2in, 17½, 1842mm, 184 cm, 1.842 m
 * @param bareUnit - unit of a bare number: the display unit
 * @param allow - `negative: true` for positions, which may lie on either side of the origin
 * @returns millimetres, or an error with what was read and, if there are two readings, both
 */
export function parseLength(
  text: string,
  bareUnit: 'in' | 'mm',
  allow: { negative?: boolean } = {},
): Result<number, LengthError> {
  const error = (code: LengthError['code'], message: string, readings?: number[]) =>
    fail<LengthError>({
      code,
      read: text,
      accepted: ACCEPTED,
      message,
      ...(readings === undefined ? {} : { readings }),
    });
  const plain = normalised(text);
  if (plain === '') return error('empty', `Nothing was typed. Type ${ACCEPTED}.`);
  const negative = plain.startsWith('-');
  const body = negative ? plain.slice(1).trim() : plain;
  const sign = negative ? -1 : 1;

  const readings = twoReadings(body, bareUnit);
  if (readings !== undefined) {
    const signed = readings.map((mm) => sign * exact(mm));
    return error('ambiguous', `“${text.trim()}” can be read in more than one way. Choose one.`, signed);
  }
  const mm = read(body.replace(',', '.'), bareUnit);
  if (mm === undefined) return error('unreadable', `“${text.trim()}” is not a length. Type ${ACCEPTED}.`);
  if (negative && mm > 0 && allow.negative !== true) {
    return error('negative', `“${text.trim()}” is below zero. Type a length of zero or more.`);
  }
  if (mm > LONGEST_LENGTH_MM) {
    return error('too-large', `“${text.trim()}” is longer than 100 m (328 ft), the longest length read.`);
  }
  return ok(mm === 0 ? 0 : sign * exact(mm));
}

/** Without the last digits that binary arithmetic adds to 6 × 304.8. */
function exact(mm: number): number {
  return Math.round(mm * 1e6) / 1e6;
}

function normalised(text: string): string {
  return plainFractions(text)
    .toLowerCase()
    .replace(/[\u00a0\u2000-\u200a\u202f\s]+/g, ' ')
    .replace(/[−–—‒]/g, '-')
    .replace(/[″“”]|''|′′|’’/g, '"')
    .replace(/[′‘’`´]/g, "'")
    .trim();
}

/** Value of "17 1/2", "17-1/2", "1/2" or "17.5"; undefined when a denominator is zero. */
function quantity(text: string): number | undefined {
  const parts = /^(?:(\d+)(?: |-))?(\d+) ?\/ ?(\d+)$/.exec(text);
  if (parts === null) return Number(text);
  const denominator = Number(parts[3]);
  if (denominator === 0) return undefined;
  return Number(parts[1] ?? 0) + Number(parts[2]) / denominator;
}

function read(text: string, bareUnit: 'in' | 'mm'): number | undefined {
  const feet = FEET_INCHES.exec(text);
  if (feet !== null) {
    const whole = quantity(feet[1] ?? '');
    const inches = feet[2] === undefined ? 0 : quantity(feet[2]);
    return whole === undefined || inches === undefined
      ? undefined
      : whole * MM_PER_FOOT + inches * MM_PER_INCH;
  }
  const inches = INCHES.exec(text);
  if (inches !== null) return scaled(inches[1], MM_PER_INCH);
  const metric = METRIC.exec(text);
  if (metric !== null) {
    const unit = metric[2] ?? '';
    const perUnit = unit.startsWith('mm') || unit.startsWith('milli') ? 1 : unit.startsWith('c') ? 10 : 1000;
    return scaled(metric[1], perUnit);
  }
  const metres = METRES_CENTIMETRES.exec(text);
  if (metres !== null) return Number(metres[1]) * 1000 + Number(metres[2]) * 10;
  const bare = BARE.exec(text);
  return bare === null ? undefined : scaled(bare[1], bareUnit === 'in' ? MM_PER_INCH : 1);
}

function scaled(text: string | undefined, perUnit: number): number | undefined {
  const value = quantity(text ?? '');
  return value === undefined ? undefined : value * perUnit;
}

/** Both readings of "6 3", "6-3", "3/0", "6/8" and "1,842"; undefined for what has one reading. */
function twoReadings(text: string, bareUnit: 'in' | 'mm'): number[] | undefined {
  const bareMm = bareUnit === 'in' ? MM_PER_INCH : 1;
  const feetInches = (feet: number, inches: number) => feet * MM_PER_FOOT + inches * MM_PER_INCH;
  const slashed = SLASHED.exec(text);
  if (slashed !== null) {
    const [n, d] = [Number(slashed[1]), Number(slashed[2])];
    if (d === 0) return [feetInches(n, 0), Number(`${slashed[1]}${slashed[2]}`) * bareMm];
    const reduced = [2, 4, 8, 16, 32, 64].includes(d) && n % 2 === 1 && n < d;
    return reduced || d > 64 || n > 64 ? undefined : [feetInches(n, d), (n / d) * bareMm];
  }
  const grouped = GROUPED.exec(text);
  if (grouped !== null) {
    const unit = grouped[3] ?? '';
    const both = [`${grouped[1]}${grouped[2]}${unit}`, `${grouped[1]}.${grouped[2]}${unit}`];
    const values = both.map((one) => read(one, bareUnit));
    return values.every((mm) => mm !== undefined) ? values : undefined;
  }
  const two = BARE.test(text) ? null : TWO_NUMBERS.exec(text);
  if (two === null) return undefined;
  const [first, second] = [Number(two[1]), quantity(two[2] ?? '')];
  if (second === undefined) return undefined;
  const together = quantity(`${two[1]}${two[2]}`);
  const readings = [feetInches(first, second), ...(together === undefined ? [] : [together * bareMm])];
  return readings.filter((mm) => Number.isFinite(mm));
}
