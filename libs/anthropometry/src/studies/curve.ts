import type { PlaceSituation } from '../checks/situation.ts';
import { added, type FitTally } from './counts.ts';
import type { Study } from './study.ts';

/** Counts at one value of a dimension. */
export interface CurvePoint {
  /** In the unit of the dimension. */
  value: number;
  /** Ticked rules together at all ticked places. */
  all: FitTally;
  checks: (FitTally & { ruleId: string })[];
}

/** Counts at each value of two dimensions, row by row of the second. */
export interface CountMap {
  across: number[];
  up: number[];
  /** Ticked rules together at all ticked places; `up.length` rows of `across.length`. */
  all: FitTally[][];
}

/**
 * How counts change with one dimension: the curve over a story stick.
 *
 * @param study - the people and the ticks; it is left as it was
 * @param values - values of the dimension, in its unit
 * @param placesAt - what the set offers with the dimension at a value
 * @returns a point for each value, in their order
 */
export const curveOf = (
  study: Study,
  values: readonly number[],
  placesAt: (value: number) => readonly PlaceSituation[],
): CurvePoint[] => values.map((value) => ({ value, ...study.countAt(placesAt(value)) }));

/**
 * How the count of all rules at once changes with two dimensions.
 *
 * @param study - the people and the ticks; it is left as it was
 * @param across - values of the first dimension
 * @param up - values of the second dimension
 * @param placesAt - what the set offers with both at a value
 */
export const mapOf = (
  study: Study,
  across: readonly number[],
  up: readonly number[],
  placesAt: (first: number, second: number) => readonly PlaceSituation[],
): CountMap => ({
  across: [...across],
  up: [...up],
  all: up.map((second) => across.map((first) => study.countAllAt(placesAt(first, second)))),
});

/**
 * Puts curves of different blocks of people together.
 *
 * @param curves - of the same values and rules; at least one
 * @throws RangeError when there is none or they differ in their values
 */
export function mergeCurves(curves: readonly (readonly CurvePoint[])[]): CurvePoint[] {
  const [first, ...rest] = curves;
  if (!first) throw new RangeError('No curve was given; accepted: at least one');
  return rest.reduce<CurvePoint[]>(
    (sum, curve) => {
      if (curve.length !== sum.length || curve.some(({ value }, at) => value !== sum[at]?.value)) {
        throw new RangeError('Curves of different values; accepted: the same values');
      }
      return sum.map((point, at) => ({ ...added(point, curve[at] as CurvePoint), value: point.value }));
    },
    [...first],
  );
}
