import { bivariateNormalCdf } from '../people/bivariate.ts';
import { normalCdf, normalQuantile } from '../people/normal.ts';
import {
  shapeOf,
  skewOf,
  standardCorrelation,
  standardOf,
  valueAt,
  type Shape,
} from '../people/shifted-lognormal.ts';
import { jointOf, minus, type Amount } from './amount.ts';

/** Two lines that a value should keep between; either may be open. */
export interface Band {
  lower?: Amount;
  upper?: Amount;
}

/**
 * Room to the lines of a band: two shapes per component, or one where a side is open. The standard normal numbers
 * under two shapes are correlated.
 */
export interface Room {
  weight: number;
  shapes: Shape[];
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
  return jointOf(sides).map(({ weight, means, covariances, thirds }) => {
    const shapes = means.map((mean, i) => {
      const variance = covariances[i]?.[i] as number;
      return shapeOf(mean, Math.sqrt(variance), skewOf(variance, thirds[i] as number));
    });
    const [first, second] = shapes;
    let correlation = 0;
    if (first && second && first.sd > 0 && second.sd > 0) {
      const together = (covariances[0]?.[1] as number) / (first.sd * second.sd);
      correlation = standardCorrelation(first, second, Math.max(-1, Math.min(1, together)));
    }
    return { weight, shapes, correlation };
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
  if (!hangsOnTheSame(from.lower, to.lower) || !hangsOnTheSame(from.upper, to.upper)) return undefined;
  const moves: number[] = [];
  if (from.lower && to.lower) moves.push(from.lower.constant - to.lower.constant);
  if (from.upper && to.upper) moves.push(to.upper.constant - from.upper.constant);
  return rooms.map(({ weight, shapes, correlation }) => ({
    weight,
    shapes: shapes.map((shape, i) => ({ ...shape, mean: shape.mean + (moves[i] as number) })),
    correlation,
  }));
}

const hangsOnTheSame = (a: Amount | undefined, b: Amount | undefined): boolean =>
  a?.terms === b?.terms && a?.doubts === b?.doubts;

/**
 * Probability that the room on every side is at least so much.
 *
 * @param rooms - from `roomWithin`
 * @param least - room asked for, in the rule's unit
 * @returns 0 to 1; exactly 0 or 1 when nothing was predicted
 */
export function probabilityOfRoom(rooms: readonly Room[], least: number): number {
  let sum = 0;
  for (const { weight, shapes, correlation } of rooms) {
    const h = standardRoom(shapes[0] as Shape, least);
    const k = shapes.length > 1 ? standardRoom(shapes[1] as Shape, least) : Infinity;
    if (h === -Infinity || k === -Infinity) continue;
    if (h === Infinity) sum += weight * (k === Infinity ? 1 : normalCdf(k));
    else if (k === Infinity) sum += weight * normalCdf(h);
    else sum += weight * bivariateNormalCdf(h, k, correlation);
  }
  return Math.min(1, sum);
}

function standardRoom(shape: Shape, least: number): number {
  if (shape.sd > 0) return -standardOf(shape, least);
  return shape.mean >= least ? Infinity : -Infinity;
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
  for (const { shapes } of rooms) {
    const z = shapes.length > 1 ? half : whole;
    low = Math.min(low, leastAt(shapes, z));
    high = Math.max(high, leastAt(shapes, whole));
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

const leastAt = (shapes: readonly Shape[], z: number): number =>
  shapes.reduce((least, shape) => Math.min(least, valueAt(shape, z)), Infinity);
