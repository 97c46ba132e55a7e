import type { MeasureKey } from '../measures/measures.ts';

/**
 * The form in which measures are worked with: natural logs, so that girths keep their skew and no length falls
 * below nothing. Elbow rest height alone stays in millimetres, since logs make it worse.
 */
export const isLogged = (key: MeasureKey): boolean => key !== 'elbow_rest_height';

/** Worked form of a value in millimetres (kilograms for weight); the value is above 0. */
export const toWorked = (key: MeasureKey, value: number): number => (isLogged(key) ? Math.log(value) : value);

/** Value in millimetres (kilograms for weight) of a worked one. */
export const fromWorked = (key: MeasureKey, worked: number): number =>
  isLogged(key) ? Math.exp(worked) : worked;

/**
 * Standing shoulder height is the sum of three other measures in the survey, so it would make the covariance
 * matrix singular. It is left out of the worked form and read through this sum.
 */
export const DERIVED: Partial<Record<MeasureKey, readonly (readonly [MeasureKey, number])[]>> = {
  acromial_height: [
    ['acromial_height_sitting', 1],
    ['stature', 1],
    ['sitting_height', -1],
  ],
};

/** A multivariate normal of worked values. */
export interface Worked {
  /** Measures in the order of the matrix, the derived one left out. */
  keys: readonly MeasureKey[];
  mean: Float64Array;
  /** Symmetric, row by row. */
  covariance: Float64Array;
}

/** Means and covariances in millimetres (kilograms for weight). */
export interface Moments {
  keys: readonly MeasureKey[];
  mean: Float64Array;
  /** Symmetric, row by row. */
  covariance: Float64Array;
}

/**
 * The worked normal that has given means and covariances in millimetres.
 *
 * @param moments - means above 0 and their covariances, mm and kg
 * @returns worked form; a logged measure is lognormal with that mean and spread
 * @source moments of the lognormal: cov = m n (exp(c) - 1); with a plain partner cov = m c
 */
export function workedOf({ keys, mean, covariance }: Moments): Worked {
  const size = keys.length;
  const logged = keys.map(isLogged);
  const worked = { keys, mean: new Float64Array(size), covariance: new Float64Array(size * size) };
  for (let i = 0; i < size; i += 1) {
    const a = logged[i] ? (mean[i] as number) : 1;
    for (let j = 0; j < size; j += 1) {
      const b = logged[j] ? (mean[j] as number) : 1;
      const relative = (covariance[i * size + j] as number) / (a * b);
      worked.covariance[i * size + j] = logged[i] && logged[j] ? Math.log1p(relative) : relative;
    }
    const own = worked.covariance[i * size + i] as number;
    worked.mean[i] = logged[i] ? Math.log(mean[i] as number) - own / 2 : (mean[i] as number);
  }
  return worked;
}

/**
 * Means and covariances in millimetres of a worked normal; undoes `workedOf`.
 *
 * @param worked - worked form
 * @returns moments, mm and kg
 */
export function momentsOf({ keys, mean, covariance }: Worked): Moments {
  const size = keys.length;
  const logged = keys.map(isLogged);
  const moments = { keys, mean: new Float64Array(size), covariance: new Float64Array(size * size) };
  for (let i = 0; i < size; i += 1) {
    const own = covariance[i * size + i] as number;
    moments.mean[i] = logged[i] ? Math.exp((mean[i] as number) + own / 2) : (mean[i] as number);
  }
  for (let i = 0; i < size; i += 1) {
    for (let j = 0; j < size; j += 1) {
      const c = covariance[i * size + j] as number;
      const a = logged[i] ? (moments.mean[i] as number) : 1;
      const b = logged[j] ? (moments.mean[j] as number) : 1;
      moments.covariance[i * size + j] = a * b * (logged[i] && logged[j] ? Math.expm1(c) : c);
    }
  }
  return moments;
}
