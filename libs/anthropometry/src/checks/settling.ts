import type { MeasureKey } from '../measures/measures.ts';
import { jointOf, minus, type Amount, type PredictedMeasure } from './amount.ts';
import { covarianceOf } from './doubt.ts';
import { failLines, type Lines } from './fail-lines.ts';

/** Share of the margin's variance from which measuring, or sitting, is worth while. */
const WORTH_MEASURING = 0.05;
const MOST_MEASURES = 3;

/** What would settle a verdict. */
export interface Settling {
  measures: MeasureKey[];
  bySit: boolean;
}

/** A verdict that is sure. */
export const NOTHING_SETTLES: Settling = { measures: [], bySit: false };

/** Measures ordered by how much of the margin's variance goes once they are known, and whether sitting would help. */
export function settlingOf(
  question: Lines & { value: Amount },
  side: 'lower' | 'upper',
  predicted: readonly PredictedMeasure[],
): Settling {
  const line = failLines(question)[side] ?? question.pass[side];
  if (!line) return NOTHING_SETTLES;
  const margin = minus(question.value, line);
  const ofSeat = covarianceOf(margin.doubts, margin.doubts);
  const shares = new Map<MeasureKey, number>();
  for (const { body, key } of predicted) {
    const parts = margin.terms.find((term) => term.body === body)?.parts ?? [];
    let removed = 0;
    let total = ofSeat;
    for (const { weight, covariances } of body.joint([parts, [[key, 1]]])) {
      const [[variance = 0, together = 0] = [], [, own = 0] = []] = covariances;
      total += weight * variance;
      removed += own > 0 ? (weight * together * together) / own : 0;
    }
    if (total > 0) shares.set(key, Math.max(shares.get(key) ?? 0, removed / total));
  }
  const measures = [...shares]
    .filter(([, share]) => share >= WORTH_MEASURING)
    .sort(([, a], [, b]) => b - a)
    .slice(0, MOST_MEASURES)
    .map(([key]) => key);
  return { measures, bySit: ofSeat > 0 && ofSeat >= WORTH_MEASURING * varianceOf(margin) };
}

const varianceOf = (amount: Amount): number =>
  jointOf([amount]).reduce((sum, { weight, covariances }) => sum + weight * (covariances[0]?.[0] ?? 0), 0);
