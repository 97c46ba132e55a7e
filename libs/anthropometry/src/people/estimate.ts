import type { Estimate } from './person.ts';
import { normalCdf, normalQuantile } from './normal.ts';
import { shapeOf, standardOf, valueAt } from './shifted-lognormal.ts';

/**
 * Probability that an estimated value lies between two bounds, bounds included.
 *
 * @param estimate - mixture of shifted lognormals, unit of the value
 * @param low - lower bound, same unit; -Infinity for none
 * @param high - upper bound, same unit; Infinity for none
 * @returns 0 to 1; exactly 0 or 1 for a measured value
 */
export function probabilityBetween(estimate: Estimate, low: number, high: number): number {
  let sum = 0;
  for (const { weight, mean, sd, skew } of estimate.components) {
    if (sd === 0) {
      sum += mean >= low && mean <= high ? weight : 0;
      continue;
    }
    const shape = shapeOf(mean, sd, skew);
    sum += weight * Math.max(0, normalCdf(standardOf(shape, high)) - normalCdf(standardOf(shape, low)));
  }
  return sum;
}

/**
 * The value below which the share p of an estimate lies.
 *
 * @param estimate - mixture of shifted lognormals
 * @param p - strictly between 0 and 1
 * @returns unit of the value; never falls as p rises
 * @throws RangeError when p is not strictly between 0 and 1
 */
export function quantile(estimate: Estimate, p: number): number {
  const z = normalQuantile(p);
  const ends = estimate.components.map(({ mean, sd, skew }) => valueAt(shapeOf(mean, sd, skew), z));
  let low = Math.min(...ends);
  let high = Math.max(...ends);
  for (let step = 0; step < 60 && high - low > 1e-9; step += 1) {
    const middle = (low + high) / 2;
    if (probabilityBetween(estimate, -Infinity, middle) < p) low = middle;
    else high = middle;
  }
  return (low + high) / 2;
}

/**
 * The range that holds 90 of 100 such people.
 *
 * @param estimate - mixture of shifted lognormals
 * @returns 5th and 95th percentile, unit of the value
 */
export function range90(estimate: Estimate): { low: number; high: number } {
  return { low: quantile(estimate, 0.05), high: quantile(estimate, 0.95) };
}

/**
 * Best single value of an estimate: its mean.
 *
 * @param estimate - mixture of shifted lognormals
 * @returns unit of the value
 */
export function bestValue(estimate: Estimate): number {
  return estimate.components.reduce((sum, { weight, mean }) => sum + weight * mean, 0);
}
