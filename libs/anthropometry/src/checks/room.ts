import { bivariateNormalCdf } from '../people/bivariate.ts';
import { normalCdf, normalQuantile } from '../people/normal.ts';
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
 * The same room to other lines, where these differ from the first only by plain numbers.
 *
 * @param rooms - from `roomWithin` with the first band
 * @param from - the first band
 * @param to - the other band
 * @returns the room, or `undefined` when the bands hang on different measures
 */
export function roomMoved(rooms: readonly Room[], from: Band, to: Band): Room[] | undefined {
  if (from.lower?.terms !== to.lower?.terms || from.upper?.terms !== to.upper?.terms) return undefined;
  const moves: number[] = [];
  if (from.lower && to.lower) moves.push(from.lower.constant - to.lower.constant);
  if (from.upper && to.upper) moves.push(to.upper.constant - from.upper.constant);
  return rooms.map(({ weight, means, sds, correlation }) => ({
    weight,
    means: means.map((mean, i) => mean + (moves[i] as number)),
    sds,
    correlation,
  }));
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
    const h = standardRoom(means[0] as number, sds[0] as number, least);
    const k = means.length > 1 ? standardRoom(means[1] as number, sds[1] as number, least) : Infinity;
    if (h === -Infinity || k === -Infinity) continue;
    if (h === Infinity) sum += weight * (k === Infinity ? 1 : normalCdf(k));
    else if (k === Infinity) sum += weight * normalCdf(h);
    else sum += weight * bivariateNormalCdf(h, k, correlation);
  }
  return Math.min(1, sum);
}

function standardRoom(mean: number, sd: number, least: number): number {
  if (sd > 0) return (mean - least) / sd;
  return mean >= least ? Infinity : -Infinity;
}

const STEPS = 60;
const CLOSE_ENOUGH = 1e-4;

/**
 * The room that a share p of such people have less than.
 *
 * @param rooms - from `roomWithin`
 * @param p - share, one of the two ends of the 90 % range
 * @param tolerance - stop when known this well, rule's unit
 * @returns rule's unit
 */
export function roomQuantile(rooms: readonly Room[], p: 0.05 | 0.95, tolerance = 0.05): number {
  // Of two sides the lesser room counts: its quantile lies under both sides' own, and over their half-share ones.
  const whole = standardQuantile(p);
  const half = standardQuantile(p / 2);
  let low = Infinity;
  let high = -Infinity;
  for (const { means, sds } of rooms) {
    const z = means.length > 1 ? half : whole;
    low = Math.min(low, leastAt(means, sds, z));
    high = Math.max(high, leastAt(means, sds, whole));
  }
  // Regula falsi with halved ends, and a plain halving every third step.
  let fLow = 1 - probabilityOfRoom(rooms, low) - p;
  let fHigh = 1 - probabilityOfRoom(rooms, high) - p;
  if (Math.abs(fHigh) < CLOSE_ENOUGH) return high;
  if (Math.abs(fLow) < CLOSE_ENOUGH) return low;
  let last = 0;
  for (let step = 1; step < STEPS && high - low > tolerance; step += 1) {
    const middle = step % 3 === 0 ? (low + high) / 2 : (low * fHigh - high * fLow) / (fHigh - fLow);
    const f = 1 - probabilityOfRoom(rooms, middle) - p;
    if (Math.abs(f) < CLOSE_ENOUGH) return middle;
    const sign = Math.sign(f);
    if (sign < 0) {
      low = middle;
      fLow = f;
      if (last < 0) fHigh /= 2;
    } else {
      high = middle;
      fHigh = f;
      if (last > 0) fLow /= 2;
    }
    last = sign;
  }
  return (low + high) / 2;
}

const quantiles = new Map<number, number>();

/** The few quantiles that are asked for again and again. */
function standardQuantile(p: number): number {
  const known = quantiles.get(p);
  if (known !== undefined) return known;
  const z = normalQuantile(p);
  quantiles.set(p, z);
  return z;
}

const leastAt = (means: readonly number[], sds: readonly number[], z: number): number =>
  means.reduce((least, mean, i) => Math.min(least, mean + z * (sds[i] as number)), Infinity);
