import { MEASURE_KEYS, type MeasureKey } from '../measures/measures.ts';
import type { GroupModel, Posterior } from './group-model.ts';
import type { Estimate, KnownPerson, Linear } from './person.ts';

/** Measures with their factors; the list form of a linear combination without a constant. */
export type Combination = readonly (readonly [key: MeasureKey, factor: number])[];

/** Means and covariances of several linear combinations under one group. */
export interface JointComponent {
  weight: number;
  means: number[];
  covariances: number[][];
}

/** What is believed of one person's measures. */
export interface Body {
  readonly person: KnownPerson;
  /** Best value of the weight, kilograms. */
  readonly weightKg: number;
  /**
   * What is believed of a measure, or of a linear combination of measures.
   *
   * @param x - measure, or combination with its constant in millimetres
   * @returns mixture of normals in millimetres (kilograms for weight alone)
   */
  estimate(x: MeasureKey | Linear): Estimate;
  /** Several combinations together, with their correlation. */
  joint(combinations: readonly Combination[]): JointComponent[];
  /** Best value of one measure, millimetres (kilograms for weight). */
  mean(key: MeasureKey): number;
  /** Best value of every measure. */
  means(): Record<MeasureKey, number>;
  /** True when the value was taken from the person (or the person is a percentile mannequin). */
  isMeasured(key: MeasureKey): boolean;
}

/** One group's belief with its share. */
export interface WeightedPosterior {
  weight: number;
  group: GroupModel;
  posterior: Posterior;
}

type SparseRow = readonly (readonly [number, number])[];

/** Below this variance, in square millimetres, only rounding of the matrix algebra is left. */
const ROUNDING_VARIANCE = 1e-6;

/**
 * Puts the beliefs of one or two groups into a body.
 *
 * @param person - what is known
 * @param parts - one entry per group, weights adding to 1
 * @returns the body
 */
export function bodyFrom(person: KnownPerson, parts: readonly WeightedPosterior[]): Body {
  const isMeasured = (key: MeasureKey): boolean =>
    person.exact === true ||
    person.measured[key] !== undefined ||
    (key === 'stature' && person.stature?.source === 'measured') ||
    (key === 'weight_kg' && person.weightKg !== undefined);

  const sparse = (part: WeightedPosterior, combination: Combination): SparseRow => {
    const row: [number, number][] = [];
    for (const [key, factor] of combination) {
      if (factor === 0) continue;
      for (const [index, share] of part.group.rowOf(key)) row.push([index, share * factor]);
    }
    return row;
  };
  const meanOf = (part: WeightedPosterior, row: SparseRow): number => {
    let sum = 0;
    for (const [index, weight] of row) sum += weight * (part.posterior.mean[index] as number);
    return sum;
  };
  const covarianceOf = (part: WeightedPosterior, a: SparseRow, b: SparseRow): number => {
    if (person.exact) return 0;
    let sum = 0;
    for (const [i, u] of a) {
      for (const [j, v] of b) sum += u * v * (part.posterior.covariance[i * part.group.size + j] as number);
    }
    return sum;
  };

  const joint = (combinations: readonly Combination[]): JointComponent[] =>
    parts.map((part) => {
      const rows = combinations.map((x) => sparse(part, x));
      const size = rows.length;
      const means = rows.map((row) => meanOf(part, row));
      const covariances = rows.map(() => new Array<number>(size).fill(0));
      for (let i = 0; i < size; i += 1) {
        for (let j = i; j < size; j += 1) {
          const covariance = covarianceOf(part, rows[i] as SparseRow, rows[j] as SparseRow);
          (covariances[i] as number[])[j] = covariance;
          (covariances[j] as number[])[i] = covariance;
        }
      }
      for (let i = 0; i < size; i += 1) {
        if ((covariances[i]?.[i] as number) >= ROUNDING_VARIANCE) continue;
        for (let j = 0; j < size; j += 1) {
          (covariances[i] as number[])[j] = 0;
          (covariances[j] as number[])[i] = 0;
        }
      }
      return { weight: part.weight, means, covariances };
    });

  const bests = new Map<MeasureKey, number>();
  const mean = (key: MeasureKey): number => {
    const known = bests.get(key);
    if (known !== undefined) return known;
    let sum = 0;
    for (const part of parts) sum += part.weight * meanOf(part, part.group.rowOf(key));
    bests.set(key, sum);
    return sum;
  };

  return {
    person,
    get weightKg() {
      return mean('weight_kg');
    },
    estimate(x) {
      const combination: Combination =
        typeof x === 'string' ? [[x, 1]] : (Object.entries(x.weights) as [MeasureKey, number][]);
      const constant = typeof x === 'string' ? 0 : x.constant;
      return {
        components: joint([combination]).map(({ weight, means, covariances }) => ({
          weight,
          mean: constant + (means[0] as number),
          sd: Math.sqrt(covariances[0]?.[0] as number),
        })),
        measured: combination.every(([key, factor]) => factor === 0 || isMeasured(key)),
      };
    },
    joint,
    mean,
    means: () =>
      Object.fromEntries(MEASURE_KEYS.map((key) => [key, mean(key)])) as Record<MeasureKey, number>,
    isMeasured,
  };
}
