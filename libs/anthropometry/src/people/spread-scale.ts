import type { MeasureKey } from '../measures/measures.ts';
import { varianceFactor, type SpreadModel } from '../populations/spread.ts';

/** What is left over of each measure, once some are known: variances in the order of the matrix. */
export type LeftOver = (known: readonly MeasureKey[]) => Float64Array;

/**
 * Factors on the standard deviations of what is left over, for a person of known stature and weight.
 *
 * A further known measure may change how the spread grows; it never widens it beyond what held without it.
 *
 * @param model - how the spread grows, of one group
 * @param keys - measures in the order of the matrix
 * @param known - measures of which something is known
 * @param mean - expected worked values, in the order of the matrix
 * @param leftOver - variances that are left over, by the known measures
 * @returns one factor a measure, or `undefined` when stature or weight is not known
 */
export function spreadScale(
  model: SpreadModel,
  keys: readonly MeasureKey[],
  known: readonly MeasureKey[],
  mean: Float64Array,
  leftOver: LeftOver,
): Float64Array | undefined {
  const sets = model.sets.filter(({ given }) => given.every((key) => known.includes(key)));
  const lnStature = mean[keys.indexOf('stature')] as number;
  const lnWeight = mean[keys.indexOf('weight_kg')] as number;
  let scale: Float64Array | undefined;
  let before: Float64Array | undefined;
  sets.forEach(({ factors }, at) => {
    const later = new Set(sets.slice(at + 1).flatMap(({ given }) => given));
    const here = sets[at]?.given ?? [];
    const left = leftOver(known.filter((key) => here.includes(key) || !later.has(key)));
    const last = scale;
    const leftBefore = before;
    scale = Float64Array.from(keys, (key, i) => {
      const own = factors[key];
      const factor = own ? Math.sqrt(varianceFactor(model, own, lnStature, lnWeight)) : 1;
      const variance = left[i] as number;
      if (!last || !leftBefore || variance <= 0) return factor;
      return Math.min(factor, (last[i] as number) * Math.sqrt((leftBefore[i] as number) / variance));
    });
    before = left;
  });
  return scale;
}
