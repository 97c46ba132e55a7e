import { MM_PER_INCH } from './length-style.ts';
import { parseLength, type LengthError } from './parse-length.ts';
import { ok, type Result } from './result.ts';

const BARE = /^\d+(?:[.,]\d+)?$/;
/** What heights of people are said in without a unit: centimetres, metres, millimetres; inches where inches rule. */
const METRIC_MM = [10, 1000, 1];

/**
 * Reads the height of a person: as any length, and a number without a unit that only one unit makes a height of.
 *
 * @param text - as typed: 5'11, 5 ft 11 1/2, 180, 1.80 m, 180cm, 1m80
 * @param bareUnit - unit of a bare number, where that is possible: the display unit
 * @param range - heights that are taken, millimetres; what several units bring into it is left to the display unit
 * @returns millimetres, perhaps outside the range: then it is what the display unit makes of the number; or an error with what was read
 */
export function parseStature(
  text: string,
  bareUnit: 'in' | 'mm',
  range: { minMm: number; maxMm: number },
): Result<number, LengthError> {
  const isHeight = (mm: number) => mm >= range.minMm && mm <= range.maxMm;
  const reading = parseLength(text, bareUnit);
  const plain = text.trim();
  if (!BARE.test(plain) || !reading.ok || isHeight(reading.value)) return reading;
  const units = bareUnit === 'in' ? [MM_PER_INCH, ...METRIC_MM] : METRIC_MM;
  const heights = units.map((mm) => Number(plain.replace(',', '.')) * mm).filter(isHeight);
  const [only] = heights;
  return heights.length === 1 && only !== undefined ? ok(Math.round(only * 1e6) / 1e6) : reading;
}
