import { normalCdf, Z90 } from '../people/normal.ts';
import type { LimitLines } from './fit-sheet.ts';

/** A value that is normal about its best, of which nothing else is open. */
export interface NormalValue {
  best: number;
  /** Standard deviation; > 0. */
  sd: number;
}

const STEPS = 40;
const CLOSE_ENOUGH = 0.01;

/**
 * Probability that a normal value keeps between plain lines.
 *
 * @param value - in the rule's unit
 * @param lines - same unit; either may be open
 * @param tolerance - how far past a line still counts as on it
 * @returns 0 to 1
 * @source the same as `probabilityOfRoom` where no measure of a body is predicted
 */
export function probabilityWithin(
  { best, sd }: NormalValue,
  { lower, upper }: LimitLines,
  tolerance: number,
): number {
  const below = upper === undefined ? 1 : normalCdf((upper + tolerance - best) / sd);
  const under = lower === undefined ? 0 : normalCdf((lower - tolerance - best) / sd);
  return Math.max(0, below - under);
}

/**
 * 90 % range of the room that a normal value has to the nearer of its lines.
 *
 * @param value - in the rule's unit
 * @param lines - same unit; at least one
 * @returns both ends, known to a hundredth
 * @source the same as `roomQuantile` where no measure of a body is predicted
 */
export function rangeOfRoom(
  { best, sd }: NormalValue,
  { lower = -Infinity, upper = Infinity }: LimitLines,
): { low: number; high: number } {
  const sides = [best - lower, upper - best];
  const [near, far] = [Math.min(...sides), Math.max(...sides)];
  /** Share of outcomes with less room; of two sides the lesser room counts. */
  const less = (room: number) => normalCdf((room - near) / sd) + normalCdf((room - far) / sd);
  const at = (p: number, z: number): number => {
    const alone = near + z * sd;
    if (less(alone) - p < 1e-6) return alone;
    let [low, high] = [near - 2 * sd, alone];
    for (let step = 0; step < STEPS && high - low > CLOSE_ENOUGH; step += 1) {
      const middle = (low + high) / 2;
      if (less(middle) < p) low = middle;
      else high = middle;
    }
    return (low + high) / 2;
  };
  return { low: at(0.05, -Z90), high: at(0.95, Z90) };
}
