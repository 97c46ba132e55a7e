import { CholeskyDecomposition, Matrix } from 'ml-matrix';
import type { MeasureKey } from '../measures/measures.ts';
import type { Survey, SurveyGroup } from '../populations/survey.ts';

/**
 * Standing shoulder height is the sum of three other measures in the survey, so it would make the covariance
 * matrix singular. It is left out and read through this sum.
 */
const DERIVED: Partial<Record<MeasureKey, readonly (readonly [MeasureKey, number])[]>> = {
  acromial_height: [
    ['acromial_height_sitting', 1],
    ['stature', 1],
    ['sitting_height', -1],
  ],
};

/** One known value of a person; `noiseSd` is above 0 for a value that was only told. */
export interface Observation {
  key: MeasureKey;
  value: number;
  noiseSd: number;
}

/** A person's measures under one group: a multivariate normal, in the order of the group's matrix. */
export interface Posterior {
  mean: Float64Array;
  covariance: Float64Array;
  logLikelihood: number;
}

interface Factorisation {
  /** Size x observations, row by row. */
  gain: Float64Array;
  covariance: Float64Array;
  /** Inverse of the covariance of the observations. */
  precision: Float64Array;
  logDeterminant: number;
}

/** Conditional prediction within one surveyed group. */
export interface GroupModel {
  size: number;
  condition(observations: readonly Observation[]): Posterior;
  /** Sparse form of one measure in the order of the matrix. */
  rowOf(key: MeasureKey): readonly (readonly [index: number, factor: number])[];
}

/**
 * Builds the multivariate normal of one surveyed group.
 *
 * @param survey - statistics of the population
 * @param group - women or men
 * @returns a model that predicts every measure from any set of known ones; factorisations are kept per set
 * @source conditional normal: mean + K (y - H mean), covariance - K H covariance, K = C H' (H C H' + R)^-1
 */
export function createGroupModel(survey: Survey, group: SurveyGroup): GroupModel {
  const keys = survey.measures.filter((key) => !(key in DERIVED));
  const places = new Map(keys.map((key, index) => [key, index]));
  const size = keys.length;
  const statistics = survey.stats[group];
  const positions = keys.map((key) => survey.measures.indexOf(key));
  const mean = Float64Array.from(keys, (key) => statistics[key].mean);
  const covariance = new Float64Array(size * size);
  for (let i = 0; i < size; i += 1) {
    for (let j = 0; j < size; j += 1) {
      const correlation = survey.correlations[group][positions[i] as number]?.[
        positions[j] as number
      ] as number;
      covariance[i * size + j] =
        correlation * (statistics[keys[i] as MeasureKey].sd * statistics[keys[j] as MeasureKey].sd);
    }
  }

  const rows = new Map(
    survey.measures.map((key) => {
      const parts = DERIVED[key] ?? ([[key, 1]] as const);
      return [key, parts.map(([part, factor]) => [places.get(part) as number, factor] as const)];
    }),
  );
  const rowOf = (key: MeasureKey) => rows.get(key) ?? [];
  const kept = new Map<string, Factorisation>();

  function factorise(observations: readonly Observation[]): Factorisation {
    const name = observations.map(({ key, noiseSd }) => `${key}~${noiseSd}`).join('|');
    const known = kept.get(name);
    if (known) return known;
    const count = observations.length;
    const cross = new Matrix(size, count);
    observations.forEach(({ key }, column) => {
      for (const [index, factor] of rowOf(key)) {
        for (let i = 0; i < size; i += 1) {
          cross.set(i, column, cross.get(i, column) + factor * (covariance[i * size + index] as number));
        }
      }
    });
    const observed = new Matrix(count, count);
    observations.forEach(({ key, noiseSd }, row) => {
      for (let column = row; column < count; column += 1) {
        let sum = row === column ? noiseSd * noiseSd : 0;
        for (const [index, factor] of rowOf(key)) sum += factor * cross.get(index, column);
        observed.set(row, column, sum);
        observed.set(column, row, sum);
      }
    });
    const cholesky = new CholeskyDecomposition(observed);
    if (!cholesky.isPositiveDefinite()) {
      throw new Error(
        `The known measures ${observations.map(({ key }) => key).join(', ')} follow from one another; ` +
          'accepted: measures of which none is fixed by the others',
      );
    }
    const precision = cholesky.solve(Matrix.eye(count));
    const gain = cross.mmul(precision);
    const rest = gain.mmul(cross.transpose());
    const posterior = new Float64Array(size * size);
    for (let i = 0; i < size; i += 1) {
      for (let j = 0; j < size; j += 1) {
        posterior[i * size + j] = (covariance[i * size + j] as number) - rest.get(i, j);
      }
    }
    for (const { key, noiseSd } of observations) {
      const row = rowOf(key);
      if (noiseSd > 0 || row.length > 1) continue;
      const index = (row[0] as readonly [number, number])[0];
      for (let i = 0; i < size; i += 1) {
        posterior[i * size + index] = 0;
        posterior[index * size + i] = 0;
      }
    }
    const factor = cholesky.lowerTriangularMatrix;
    let logDeterminant = 0;
    for (let i = 0; i < count; i += 1) logDeterminant += 2 * Math.log(factor.get(i, i));
    const made: Factorisation = {
      gain: Float64Array.from(gain.to1DArray()),
      covariance: posterior,
      precision: Float64Array.from(precision.to1DArray()),
      logDeterminant,
    };
    kept.set(name, made);
    return made;
  }

  return {
    size,
    rowOf,
    condition(known) {
      const observations = withoutRepeats(known);
      if (observations.length === 0) return { mean, covariance, logLikelihood: 0 };
      const { gain, covariance: posterior, precision, logDeterminant } = factorise(observations);
      const count = observations.length;
      const surprise = observations.map(({ key, value }) =>
        rowOf(key).reduce((rest, [index, factor]) => rest - factor * (mean[index] as number), value),
      );
      const predicted = mean.map((value, i) =>
        surprise.reduce((sum, s, j) => sum + (gain[i * count + j] as number) * s, value),
      );
      for (const { key, value, noiseSd } of observations) {
        const row = rowOf(key);
        if (noiseSd === 0 && row.length === 1) predicted[(row[0] as readonly [number, number])[0]] = value;
      }
      let distance = 0;
      surprise.forEach((a, i) => {
        surprise.forEach((b, j) => {
          distance += a * (precision[i * count + j] as number) * b;
        });
      });
      const logLikelihood = -0.5 * (distance + logDeterminant + count * Math.log(2 * Math.PI));
      return { mean: predicted, covariance: posterior, logLikelihood };
    },
  };
}

/** Leaves out a derived measure whose parts are all measured: it would say the same thing twice. */
function withoutRepeats(observations: readonly Observation[]): readonly Observation[] {
  const exact = new Set(observations.filter(({ noiseSd }) => noiseSd === 0).map(({ key }) => key));
  return observations.filter(({ key }) => !DERIVED[key]?.every(([part]) => exact.has(part)));
}
