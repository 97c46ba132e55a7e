import { CholeskyDecomposition, Matrix } from 'ml-matrix';
import type { MeasureKey } from '../measures/measures.ts';
import { digits, percentileOfSorted } from './column-statistics.ts';
import { leastSquares, meanOf } from './least-squares.ts';

/** Factors of 1, ln stature, ln weight and its square, both logs about their centre. */
export type SpreadFactors = readonly [
  constant: number,
  stature: number,
  weight: number,
  weightSquared: number,
];

/** How the spread of what is left over hangs on stature and weight, once some measures are known. */
export interface SpreadSet {
  /** The known measures: stature and weight, and for a second set elbow rest height too. */
  given: readonly MeasureKey[];
  factors: Partial<Record<MeasureKey, SpreadFactors>>;
}

/** Log-linear model of the variance that is left over, of one group. */
export interface SpreadModel {
  /** Means of ln stature (mm) and ln weight (kg). */
  centre: readonly [stature: number, weight: number];
  /** Between which logs the model was fitted; outside, its end stands. */
  range: readonly [stature: readonly [number, number], weight: readonly [number, number]];
  /** The set with more given measures comes later. */
  sets: readonly SpreadSet[];
}

/** Measures whose knowledge changes how the spread grows. */
export const SPREAD_GIVEN: readonly (readonly MeasureKey[])[] = [
  ['stature', 'weight_kg'],
  ['stature', 'weight_kg', 'elbow_rest_height'],
];

/**
 * By how much the variance of what is left over differs from the group's average.
 *
 * @param model - centre and range
 * @param factors - of one measure
 * @param lnStature - natural log of millimetres
 * @param lnWeight - natural log of kilograms
 * @returns factor on the variance, above 0; 1 on average over the group
 */
export function varianceFactor(
  { centre, range }: SpreadModel,
  [constant, perStature, perWeight, perSquare]: SpreadFactors,
  lnStature: number,
  lnWeight: number,
): number {
  const s = within(lnStature, range[0]) - centre[0];
  const w = within(lnWeight, range[1]) - centre[1];
  return Math.exp(constant + perStature * s + perWeight * w + perSquare * w * w);
}

const within = (x: number, [low, high]: readonly [number, number]): number =>
  Math.min(high, Math.max(low, x));

/**
 * Fits the model on people.
 *
 * @param worked - worked values by measure, columns of equal length; stature and weight among them
 * @returns the model; factors printed to 5 digits
 * @source maximum likelihood of a normal with log-linear variance, by Fisher scoring (Harvey 1976)
 */
export function fitSpread(worked: ReadonlyMap<MeasureKey, Float64Array>): SpreadModel {
  const stature = worked.get('stature') as Float64Array;
  const weight = worked.get('weight_kg') as Float64Array;
  const centre = [digits(meanOf(stature), 7), digits(meanOf(weight), 7)] as const;
  const s = stature.map((x) => x - centre[0]);
  const w = weight.map((x) => x - centre[1]);
  const design = [new Float64Array(s.length).fill(1), s, w, w.map((x) => x * x)];
  const inverse = new CholeskyDecomposition(gramOf(design)).solve(Matrix.eye(design.length));
  const sets = SPREAD_GIVEN.filter((given) => given.every((key) => worked.has(key))).map((given) => {
    const predictors = given.map((key) => worked.get(key) as Float64Array);
    const factors: Partial<Record<MeasureKey, SpreadFactors>> = {};
    for (const [key, values] of worked) {
      if (given.includes(key)) continue;
      const { residuals } = leastSquares(predictors, values);
      factors[key] = fitFactors(design, inverse, residuals);
    }
    return { given, factors };
  });
  return { centre, range: [endsOf(stature), endsOf(weight)], sets };
}

const SCORING_STEPS = 60;
const SETTLED = 1e-9;

function fitFactors(
  design: readonly Float64Array[],
  inverse: Matrix,
  residuals: Float64Array,
): SpreadFactors {
  const n = residuals.length;
  const factors = design.map(() => 0);
  factors[0] = Math.log(residuals.reduce((sum, r) => sum + r * r, 0) / n);
  const logVariance = (row: number): number =>
    design.reduce((sum, column, i) => sum + (factors[i] as number) * (column[row] as number), 0);
  for (let step = 0; step < SCORING_STEPS; step += 1) {
    const score = new Matrix(design.length, 1);
    for (let row = 0; row < n; row += 1) {
      const excess = (residuals[row] as number) ** 2 * Math.exp(-logVariance(row)) - 1;
      design.forEach((column, i) => score.set(i, 0, score.get(i, 0) + excess * (column[row] as number)));
    }
    const move = inverse.mmul(score).to1DArray();
    move.forEach((by, i) => {
      factors[i] = (factors[i] as number) + by;
    });
    if (move.every((by) => Math.abs(by) < SETTLED)) break;
  }
  let sum = 0;
  for (let row = 0; row < n; row += 1) sum += Math.exp(logVariance(row));
  factors[0] = factors[0] - Math.log(sum / n);
  return factors.map((x) => digits(x, 5)) as unknown as SpreadFactors;
}

function gramOf(columns: readonly Float64Array[]): Matrix {
  const gram = new Matrix(columns.length, columns.length);
  columns.forEach((a, i) =>
    columns.forEach((b, j) => {
      let sum = 0;
      for (let row = 0; row < a.length; row += 1) sum += (a[row] as number) * (b[row] as number);
      gram.set(i, j, sum);
    }),
  );
  return gram;
}

function endsOf(values: Float64Array): [number, number] {
  const sorted = values.slice().sort();
  return [digits(percentileOfSorted(sorted, 0), 7), digits(percentileOfSorted(sorted, 100), 7)];
}
