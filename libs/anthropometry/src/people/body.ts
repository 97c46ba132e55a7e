import { MEASURE_KEYS, type MeasureKey } from '../measures/measures.ts';
import type { Draws } from '../populations/population.ts';
import type { WeightedPosterior } from './body-moments.ts';
import { samplePerson } from './sample.ts';
import { skewOf } from './shifted-lognormal.ts';
import type { Estimate, KnownPerson, Linear } from './person.ts';

/** Measures with their factors; the list form of a linear combination without a constant. */
export type Combination = readonly (readonly [key: MeasureKey, factor: number])[];

/** Means, covariances and third central moments of several linear combinations under one group. */
export interface JointComponent {
  weight: number;
  means: number[];
  covariances: number[][];
  /** Of each combination by itself. */
  thirds: number[];
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
   * @returns mixture of shifted lognormals in millimetres (kilograms for weight alone)
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
  /**
   * People as this one may be: known values as they are, the others drawn together.
   *
   * @param count - people, 1 or more
   * @param seed - whole number; the same people for the same seed
   * @returns columns in millimetres (kilograms for weight)
   * @throws RangeError when count or seed is out of range
   */
  sample(count: number, seed: number): Draws;
}

/** A combination in the order of a group's matrix; a derived measure that was taken is a constant. */
interface SparseRow {
  constant: number;
  parts: readonly (readonly [index: number, factor: number])[];
}

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
    const parts: [number, number][] = [];
    let constant = 0;
    for (const [key, factor] of combination) {
      if (factor === 0) continue;
      const row = part.group.rowOf(key);
      const taken = row.length > 1 ? person.measured[key] : undefined;
      if (taken !== undefined) constant += factor * taken;
      else for (const [index, share] of row) parts.push([index, share * factor]);
    }
    return { constant, parts };
  };
  const meanOf = ({ moments }: WeightedPosterior, { constant, parts }: SparseRow): number => {
    let sum = constant;
    for (const [index, factor] of parts) sum += factor * moments.mean(index);
    return sum;
  };
  const covarianceOf = ({ moments }: WeightedPosterior, a: SparseRow, b: SparseRow): number => {
    if (person.exact) return 0;
    let sum = 0;
    for (const [i, u] of a.parts) {
      for (const [j, v] of b.parts) sum += u * v * moments.covariance(i, j);
    }
    return sum;
  };
  const thirdOf = ({ moments }: WeightedPosterior, { parts }: SparseRow): number => {
    let sum = 0;
    for (let a = 0; a < parts.length; a += 1) {
      const [i, u] = parts[a] as SparseRow['parts'][number];
      for (let b = 0; b <= a; b += 1) {
        const [j, v] = parts[b] as SparseRow['parts'][number];
        for (let c = 0; c <= b; c += 1) {
          const [k, w] = parts[c] as SparseRow['parts'][number];
          const ways = a === c ? 1 : a === b || b === c ? 3 : 6;
          sum += ways * u * v * w * moments.third(i, j, k);
        }
      }
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
      const thirds = rows.map((row, i) => (covariances[i]?.[i] === 0 ? 0 : thirdOf(part, row)));
      return { weight: part.weight, means, covariances, thirds };
    });

  const bests = new Map<MeasureKey, number>();
  const mean = (key: MeasureKey): number => {
    const known = bests.get(key);
    if (known !== undefined) return known;
    let sum = 0;
    for (const part of parts) sum += part.weight * meanOf(part, sparse(part, [[key, 1]]));
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
        components: joint([combination]).map(({ weight, means, covariances, thirds }) => {
          const variance = covariances[0]?.[0] as number;
          return {
            weight,
            mean: constant + (means[0] as number),
            sd: Math.sqrt(variance),
            skew: skewOf(variance, thirds[0] as number),
          };
        }),
        measured: combination.every(([key, factor]) => factor === 0 || isMeasured(key)),
      };
    },
    joint,
    mean,
    means: () =>
      Object.fromEntries(MEASURE_KEYS.map((key) => [key, mean(key)])) as Record<MeasureKey, number>,
    isMeasured,
    sample(count, seed) {
      const fixed = MEASURE_KEYS.filter(isMeasured).map((key) => [key, mean(key)] as const);
      return samplePerson(parts, new Map(fixed), count, seed);
    },
  };
}
