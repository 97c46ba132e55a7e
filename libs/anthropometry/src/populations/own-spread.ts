import { CholeskyDecomposition, Matrix } from 'ml-matrix';
import type { MeasureKey } from '../measures/measures.ts';
import { normalQuantile } from '../people/normal.ts';
import { varianceFactor, type SpreadFactors, type SpreadModel } from './spread.ts';
import type { Worked } from './worked.ts';

/** Fewer people than this do not settle how the spread grows with weight; then the reference's growth stands. */
const LEAST_FOR_SPREAD = 400;
/** Steps of the average over people, along weight and along stature at that weight. */
const STEPS = 24;

interface OwnSpread {
  /** As fitted on the people of the survey itself. */
  fitted: SpreadModel;
  /** How many they were. */
  people: number;
  /** Measures that were read; the others were estimated from the reference. */
  read: readonly MeasureKey[];
  /** Worked normal of every measure, the estimated ones among them. */
  worked: Worked;
}

/**
 * How the spread grows in a survey that was completed from a reference: as its own people show where there are enough
 * of them, else as in the reference.
 *
 * The reference's growth is told about the reference's centre, so it is told again about this survey's. What is left
 * over of a read measure is already that of these people, and so its factor averages 1 over them. What was filled in
 * is left over as in the reference, and keeps the reference's factor: people who are heavier than there spread wider.
 * A measure that follows partly from read ones stands between, by the shares of its variance.
 *
 * @param own - the survey and its completed normal, of one group
 * @param theirs - growth in the reference
 * @param reference - worked normal of the reference
 * @returns a model for the completed survey
 */
export function completeSpread(own: OwnSpread, theirs: SpreadModel, reference: Worked): SpreadModel {
  const { fitted, people, read, worked } = own;
  const isFitted = people >= LEAST_FOR_SPREAD;
  const { centre } = fitted;
  const range = isFitted ? overlap(fitted.range, theirs.range) : theirs.range;
  const logs = logsOf(worked);
  const filled = leftOver(
    reference,
    reference.keys.filter((key) => read.includes(key)),
  );
  const sets = theirs.sets.map(({ given, factors }) => {
    const left = leftOver(worked, given);
    const taken: Partial<Record<MeasureKey, SpreadFactors>> = {};
    for (const [key, about] of Object.entries(factors) as [MeasureKey, SpreadFactors][]) {
      const at = worked.keys.indexOf(key);
      const share = Math.min(1, (filled[at] as number) / (left[at] as number));
      const moved = aboutCentre(about, theirs.centre, centre);
      const average = meanOf(logs.map(([s, w]) => varianceFactor({ centre, range, sets: [] }, moved, s, w)));
      const [constant, ...growth] = moved;
      taken[key] = [constant + Math.log(share + (1 - share) / average), ...growth];
    }
    const fittedHere = fitted.sets.find((set) => set.given.join() === given.join())?.factors;
    return { given, factors: { ...taken, ...(isFitted ? fittedHere : {}) } };
  });
  return { centre, range, sets };
}

/** The same factors, both logs counted from another centre. */
function aboutCentre(
  [constant, perStature, perWeight, perSquare]: SpreadFactors,
  from: SpreadModel['centre'],
  to: SpreadModel['centre'],
): SpreadFactors {
  const [s, w] = [to[0] - from[0], to[1] - from[1]];
  return [
    constant + perStature * s + perWeight * w + perSquare * w * w,
    perStature,
    perWeight + 2 * perSquare * w,
    perSquare,
  ];
}

/** Logs of stature and weight of people who stand for all. */
function logsOf({ keys, mean, covariance }: Worked): [stature: number, weight: number][] {
  const [s, w] = [keys.indexOf('stature'), keys.indexOf('weight_kg')];
  const at = (i: number, j: number): number => covariance[i * keys.length + j] as number;
  const slope = at(s, w) / at(w, w);
  const sdWeight = Math.sqrt(at(w, w));
  const sdStature = Math.sqrt(at(s, s) - slope * at(s, w));
  const steps = Array.from({ length: STEPS }, (_, step) => normalQuantile((step + 0.5) / STEPS));
  return steps.flatMap((a) =>
    steps.map((b): [number, number] => [
      (mean[s] as number) + slope * sdWeight * a + sdStature * b,
      (mean[w] as number) + sdWeight * a,
    ]),
  );
}

/** Variances that are left over once some measures are known, in the order of the matrix. */
function leftOver({ keys, covariance }: Worked, known: readonly MeasureKey[]): Float64Array {
  const all = new Matrix(
    keys.map((_, i) => Array.from(covariance.subarray(i * keys.length, (i + 1) * keys.length))),
  );
  const held = known.map((key) => keys.indexOf(key));
  const cross = all.selection(
    keys.map((_, i) => i),
    held,
  );
  const gain = new CholeskyDecomposition(all.selection(held, held)).solve(cross.transpose());
  return Float64Array.from(keys, (_, i) =>
    held.reduce((left, __, j) => left - cross.get(i, j) * gain.get(j, i), all.get(i, i)),
  );
}

/** Where both models were fitted; the first's where they do not meet. */
function overlap(own: SpreadModel['range'], theirs: SpreadModel['range']): SpreadModel['range'] {
  const meet = (at: 0 | 1): readonly [number, number] => {
    const [low, high] = [Math.max(own[at][0], theirs[at][0]), Math.min(own[at][1], theirs[at][1])];
    return low < high ? [low, high] : own[at];
  };
  return [meet(0), meet(1)];
}

const meanOf = (values: readonly number[]): number => values.reduce((sum, x) => sum + x, 0) / values.length;
