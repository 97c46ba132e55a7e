import { bivariateNormalCdf } from '../people/bivariate.ts';
import { normalCdf } from '../people/normal.ts';
import { jointOf, minus, type Amount } from './amount.ts';

/** Two lines that a value should keep between; either may be open. */
export interface Band {
  lower?: Amount;
  upper?: Amount;
}

/** Room to the lines of a band: two correlated normals per component, or one where a side is open. */
export interface Room {
  weight: number;
  means: number[];
  sds: number[];
  correlation: number;
}

/**
 * Room from a value to both lines of a band.
 *
 * @param value - what the set gives, in the rule's unit
 * @param band - lines, same unit; at least one
 * @returns a mixture over what is not known of the sitter
 */
export function roomWithin(value: Amount, band: Band): Room[] {
  const sides: Amount[] = [];
  if (band.lower) sides.push(minus(value, band.lower));
  if (band.upper) sides.push(minus(band.upper, value));
  return jointOf(sides).map(({ weight, means, covariances }) => {
    const sds = covariances.map((row, i) => Math.sqrt(row[i] as number));
    const [first = 0, second = 0] = sds;
    const both = first > 0 && second > 0;
    const correlation = both ? (covariances[0]?.[1] as number) / (first * second) : 0;
    return { weight, means, sds, correlation: Math.max(-1, Math.min(1, correlation)) };
  });
}

/**
 * Probability that the room on every side is at least so much.
 *
 * @param rooms - from `roomWithin`
 * @param least - room asked for, in the rule's unit
 * @returns 0 to 1; exactly 0 or 1 when nothing was predicted
 */
export function probabilityOfRoom(rooms: readonly Room[], least: number): number {
  let sum = 0;
  for (const { weight, means, sds, correlation } of rooms) {
    const limits = means.map((mean, i) => {
      const sd = sds[i] as number;
      if (sd > 0) return (mean - least) / sd;
      return mean >= least ? Infinity : -Infinity;
    });
    const [h = Infinity, k = Infinity] = limits;
    if (h === -Infinity || k === -Infinity) continue;
    if (h === Infinity) sum += weight * (k === Infinity ? 1 : normalCdf(k));
    else if (k === Infinity) sum += weight * normalCdf(h);
    else sum += weight * bivariateNormalCdf(h, k, correlation);
  }
  return Math.min(1, sum);
}

const STEPS = 60;

/**
 * The room that a share p of such people have less than.
 *
 * @param rooms - from `roomWithin`
 * @param p - strictly between 0 and 1
 * @param tolerance - stop when known this well, rule's unit
 * @returns rule's unit
 */
export function roomQuantile(rooms: readonly Room[], p: number, tolerance = 0.02): number {
  const spread = 8;
  let low = Infinity;
  let high = -Infinity;
  for (const { means, sds } of rooms) {
    low = Math.min(low, ...means.map((mean, i) => mean - spread * (sds[i] as number)));
    high = Math.max(high, Math.min(...means.map((mean, i) => mean + spread * (sds[i] as number))));
  }
  // Regula falsi with halved ends: few evaluations, and it never leaves the bracket.
  let fLow = -p;
  let fHigh = 1 - p;
  let kept = 0;
  for (let step = 0; step < STEPS && high - low > tolerance; step += 1) {
    const middle = step % 3 === 2 ? (low + high) / 2 : (low * fHigh - high * fLow) / (fHigh - fLow);
    const f = 1 - probabilityOfRoom(rooms, middle) - p;
    if (Math.abs(f) < 1e-5) return middle;
    if (f < 0) {
      low = middle;
      fLow = f;
      if (kept < 0) fHigh /= 2;
      kept = -1;
    } else {
      high = middle;
      fHigh = f;
      if (kept > 0) fLow /= 2;
      kept = 1;
    }
  }
  return (low + high) / 2;
}
