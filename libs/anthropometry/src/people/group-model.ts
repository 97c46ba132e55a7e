import { CholeskyDecomposition, Matrix } from 'ml-matrix';
import type { MeasureKey } from '../measures/measures.ts';
import type { Survey, SurveyGroup } from '../populations/survey.ts';
import { DERIVED, isLogged, toWorked } from '../populations/worked.ts';
import { spreadScale } from './spread-scale.ts';

/** One known value of a person in mm (kg for weight); `noiseSd` is above 0 for a value that was only told. */
export interface Observation {
  key: MeasureKey;
  value: number;
  noiseSd: number;
}

/** A person's worked values under one group: a multivariate normal, in the order of the group's matrix. */
export interface Posterior {
  mean: Float64Array;
  /** Shared by everyone of whom the same measures are known. */
  covariance: Float64Array;
  /** Factors on the standard deviations for this person; absent where the group's spread stands. */
  scale?: Float64Array;
  /** Values that are known as they are, by their place in the matrix; mm and kg. */
  taken: ReadonlyMap<number, number>;
  /** Of the known values in millimetres, so that groups compare. */
  logLikelihood: number;
}

type Row = readonly (readonly [index: number, factor: number])[];

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
  /** Measures in the order of the matrix. */
  keys: readonly MeasureKey[];
  condition(observations: readonly Observation[]): Posterior;
  /** Sparse form of one measure in millimetres, in the order of the matrix. */
  rowOf(key: MeasureKey): Row;
}

/**
 * Builds the worked multivariate normal of one surveyed group.
 *
 * @param survey - statistics of the population
 * @param group - women or men
 * @returns a model that predicts every measure from any set of known ones; factorisations are kept per set
 * @source conditional normal: mean + K (y - H mean), covariance - K H covariance, K = C H' (H C H' + R)^-1
 */
export function createGroupModel(survey: Survey, group: SurveyGroup): GroupModel {
  const { keys, mean, covariance } = survey.worked[group];
  const spread = survey.spread?.[group];
  const size = keys.length;
  const places = new Map(keys.map((key, index) => [key, index]));
  const rows = new Map(
    survey.measures.map((key): [MeasureKey, Row] => {
      const parts = DERIVED[key] ?? ([[key, 1]] as const);
      return [key, parts.map(([part, factor]) => [places.get(part) as number, factor] as const)];
    }),
  );
  const rowOf = (key: MeasureKey): Row => rows.get(key) ?? [];
  const middle = (index: number): number => Math.exp(mean[index] as number);
  /** A sum of lognormals is taken straight about the group's middle. */
  const workedRow = (key: MeasureKey): Row => {
    const row = rowOf(key);
    if (row.length === 1) return row;
    const total = row.reduce((sum, [index, factor]) => sum + factor * middle(index), 0);
    return row.map(([index, factor]) => [index, (factor * middle(index)) / total] as const);
  };
  const expected = (key: MeasureKey): number => {
    const row = rowOf(key);
    if (row.length === 1) return mean[(row[0] as Row[number])[0]] as number;
    return Math.log(row.reduce((sum, [index, factor]) => sum + factor * middle(index), 0));
  };
  const workedNoise = ({ key, noiseSd }: Observation): number =>
    noiseSd === 0 || !isLogged(key) ? noiseSd : noiseSd / Math.exp(expected(key));

  const kept = new Map<string, Factorisation>();
  function factorise(observations: readonly Observation[]): Factorisation {
    const name = observations.map(({ key, noiseSd }) => `${key}~${noiseSd}`).join('|');
    const known = kept.get(name);
    if (known) return known;
    const made = factorised(
      covariance,
      size,
      observations.map((one) => ({ key: one.key, row: workedRow(one.key), noise: workedNoise(one) })),
    );
    kept.set(name, made);
    return made;
  }

  const variancesOf = (observations: readonly Observation[]): Float64Array => {
    const left = observations.length === 0 ? covariance : factorise(observations).covariance;
    return Float64Array.from({ length: size }, (_, i) => left[i * size + i] as number);
  };

  return {
    size,
    keys,
    rowOf,
    condition(known) {
      const observations = withoutRepeats(known);
      if (observations.length === 0) return { mean, covariance, taken: new Map(), logLikelihood: 0 };
      const { gain, covariance: posterior, precision, logDeterminant } = factorise(observations);
      const count = observations.length;
      const surprise = observations.map(({ key, value }) => toWorked(key, value) - expected(key));
      const predicted = mean.map((value, i) =>
        surprise.reduce((sum, s, j) => sum + (gain[i * count + j] as number) * s, value),
      );
      const taken = new Map<number, number>();
      for (const { key, value, noiseSd } of observations) {
        const [first, ...others] = rowOf(key);
        if (noiseSd > 0 || !first || others.length > 0) continue;
        taken.set(first[0], value);
        predicted[first[0]] = toWorked(key, value);
      }
      let distance = 0;
      let stretch = 0;
      surprise.forEach((a, i) => {
        const { key, value } = observations[i] as Observation;
        if (isLogged(key)) stretch += Math.log(value);
        surprise.forEach((b, j) => {
          distance += a * (precision[i * count + j] as number) * b;
        });
      });
      const logLikelihood = -0.5 * (distance + logDeterminant + count * Math.log(2 * Math.PI)) - stretch;
      const scale =
        spread &&
        spreadScale(
          spread,
          keys,
          observations.map(({ key }) => key),
          predicted,
          (some) => variancesOf(observations.filter(({ key }) => some.includes(key))),
        );
      return { mean: predicted, covariance: posterior, taken, logLikelihood, ...(scale ? { scale } : {}) };
    },
  };
}

function factorised(
  covariance: Float64Array,
  size: number,
  observations: readonly { key: MeasureKey; row: Row; noise: number }[],
): Factorisation {
  const count = observations.length;
  const cross = new Matrix(size, count);
  observations.forEach(({ row }, column) => {
    for (const [index, factor] of row) {
      for (let i = 0; i < size; i += 1) {
        cross.set(i, column, cross.get(i, column) + factor * (covariance[i * size + index] as number));
      }
    }
  });
  const observed = new Matrix(count, count);
  observations.forEach(({ row: parts, noise }, row) => {
    for (let column = row; column < count; column += 1) {
      let sum = row === column ? noise * noise : 0;
      for (const [index, factor] of parts) sum += factor * cross.get(index, column);
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
  for (const { row, noise } of observations) {
    if (noise > 0 || row.length > 1) continue;
    const index = (row[0] as Row[number])[0];
    for (let i = 0; i < size; i += 1) {
      posterior[i * size + index] = 0;
      posterior[index * size + i] = 0;
    }
  }
  const factor = cholesky.lowerTriangularMatrix;
  let logDeterminant = 0;
  for (let i = 0; i < count; i += 1) logDeterminant += 2 * Math.log(factor.get(i, i));
  return {
    gain: Float64Array.from(gain.to1DArray()),
    covariance: posterior,
    precision: Float64Array.from(precision.to1DArray()),
    logDeterminant,
  };
}

/**
 * A derived measure whose parts are all measured says the same thing twice and is left out; one of which a single part
 * is missing is that part.
 */
function withoutRepeats(observations: readonly Observation[]): readonly Observation[] {
  const exact = new Map(
    observations.filter(({ noiseSd }) => noiseSd === 0).map(({ key, value }) => [key, value]),
  );
  return observations.flatMap((one) => {
    const parts = DERIVED[one.key];
    const missing = parts?.filter(([part]) => !exact.has(part));
    if (!parts || !missing || missing.length > 1) return [one];
    const [last] = missing;
    if (!last) return [];
    const rest = parts.reduce((sum, [part, factor]) => sum - factor * (exact.get(part) ?? 0), one.value);
    const value = rest / last[1];
    return value > 0 ? [{ ...one, key: last[0], value }] : [one];
  });
}
