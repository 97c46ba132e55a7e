import type { MeasureKey } from '../measures/measures.ts';
import type { Body } from '../people/body.ts';
import { bestValue, probabilityBetween, range90 } from '../people/estimate.ts';
import type { Estimate } from '../people/person.ts';
import { skewOf } from '../people/shifted-lognormal.ts';
import { jointOf, type Amount } from './amount.ts';

/** Best value and the range that holds 90 in 100. */
export interface Spread {
  best: number;
  low: number;
  high: number;
}

/** What is believed of the difference between two bodies. */
export interface Difference {
  spread: Spread;
  /** Probability that the difference is at least so much; exactly 0 or 1 where nothing was predicted. */
  atLeast: (least: number) => number;
}

/**
 * What is believed of an amount that hangs on two bodies, independent once what is known of each is counted.
 *
 * @param amount - difference of two amounts, millimetres (kilograms for weight alone)
 * @returns best value, 90 % range and probabilities, same unit
 */
export function differenceOf(amount: Amount): Difference {
  const estimate: Estimate = {
    components: jointOf([amount]).map(({ weight, means, covariances, thirds }) => {
      const variance = covariances[0]?.[0] as number;
      return {
        weight,
        mean: means[0] as number,
        sd: Math.sqrt(variance),
        skew: skewOf(variance, thirds[0] as number),
      };
    }),
    measured: false,
  };
  const { low, high } = range90(estimate);
  return {
    spread: { best: bestValue(estimate), low, high },
    atLeast: (least) => probabilityBetween(estimate, least, Infinity),
  };
}

/**
 * Share of an amount's variance that goes once one more measure of a body is known.
 *
 * @param amount - hangs on the body
 * @param body - whose measure it is
 * @param key - the measure
 * @returns 0 to 1
 */
export function shareSettledBy(amount: Amount, body: Body, key: MeasureKey): number {
  const parts = amount.terms.find((term) => term.body === body)?.parts ?? [];
  const total = jointOf([amount]).reduce(
    (sum, { weight, covariances }) => sum + weight * at(covariances, 0, 0),
    0,
  );
  if (total === 0) return 0;
  let removed = 0;
  for (const { weight, covariances } of body.joint([parts, [[key, 1]]])) {
    const own = at(covariances, 1, 1);
    if (own > 0) removed += (weight * at(covariances, 0, 1) ** 2) / own;
  }
  return removed / total;
}

const at = (matrix: readonly (readonly number[])[], i: number, j: number): number => matrix[i]?.[j] ?? 0;
