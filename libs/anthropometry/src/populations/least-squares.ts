import { CholeskyDecomposition, Matrix } from 'ml-matrix';

/** A straight-line fit of one column on others. */
export interface LineFit {
  intercept: number;
  /** One slope per predictor. */
  slopes: number[];
  residuals: Float64Array;
  /** With as many degrees of freedom as are left. */
  residualSd: number;
  /** Share of the variance that the line explains. */
  r2: number;
}

/** Mean of a column. */
export const meanOf = (values: Float64Array): number =>
  values.reduce((sum, value) => sum + value, 0) / values.length;

/**
 * Fits a column on others by ordinary least squares, with an intercept.
 *
 * @param predictors - columns of equal length, none fixed by the others
 * @param values - column to explain
 * @returns the fit
 * @throws Error when a predictor follows from the others
 */
export function leastSquares(predictors: readonly Float64Array[], values: Float64Array): LineFit {
  const n = values.length;
  const count = predictors.length;
  const means = predictors.map(meanOf);
  const mean = meanOf(values);
  const gram = new Matrix(count, count);
  const cross = new Matrix(count, 1);
  let total = 0;
  for (let r = 0; r < n; r += 1) {
    const y = (values[r] as number) - mean;
    total += y * y;
    for (let i = 0; i < count; i += 1) {
      const x = (predictors[i]?.[r] as number) - (means[i] as number);
      cross.set(i, 0, cross.get(i, 0) + x * y);
      for (let j = 0; j <= i; j += 1) {
        gram.set(i, j, gram.get(i, j) + x * ((predictors[j]?.[r] as number) - (means[j] as number)));
      }
    }
  }
  for (let i = 0; i < count; i += 1) for (let j = i + 1; j < count; j += 1) gram.set(i, j, gram.get(j, i));
  const cholesky = new CholeskyDecomposition(gram);
  if (!cholesky.isPositiveDefinite()) {
    throw new Error('A predictor follows from the others; accepted: predictors of which none is fixed');
  }
  const slopes = cholesky.solve(cross).to1DArray();
  const intercept = slopes.reduce((rest, slope, i) => rest - slope * (means[i] as number), mean);
  const residuals = new Float64Array(n);
  let left = 0;
  for (let r = 0; r < n; r += 1) {
    let rest = (values[r] as number) - intercept;
    for (let i = 0; i < count; i += 1) rest -= (slopes[i] as number) * (predictors[i]?.[r] as number);
    residuals[r] = rest;
    left += rest * rest;
  }
  return {
    intercept,
    slopes,
    residuals,
    residualSd: Math.sqrt(left / (n - 1 - count)),
    r2: 1 - left / total,
  };
}
