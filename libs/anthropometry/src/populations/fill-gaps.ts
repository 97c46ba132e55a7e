import { CholeskyDecomposition, Matrix } from 'ml-matrix';
import type { MeasureKey } from '../measures/measures.ts';
import type { Worked } from './worked.ts';

/** A whole body of which part was estimated. */
export interface Filled {
  worked: Worked;
  /** Measures that the known ones did not hold. */
  estimated: MeasureKey[];
}

/**
 * Fills in the measures that a population lacks: each follows from the known ones as it does in the reference, and
 * what is left over keeps the reference's spread.
 *
 * @param reference - worked normal of every measure
 * @param known - worked normal of some of these measures in another population
 * @returns worked normal in the order of the reference, and which measures were estimated
 * @throws Error when a known measure is not in the reference, or the known ones follow from one another
 * @source law of total covariance: mean + B (known - mean), C(B|A) + B known B', B = C(BA) C(AA)^-1
 */
export function fillGaps(reference: Worked, known: Worked): Filled {
  const size = reference.keys.length;
  const held = known.keys.map((key) => {
    const place = reference.keys.indexOf(key);
    if (place < 0) throw new Error(`${key} is not in the reference; accepted: ${reference.keys.join(', ')}`);
    return place;
  });
  const count = held.length;
  const within = matrixOf(reference.covariance, size);
  const here = matrixOf(known.covariance, count);
  // Rounding leaves the two halves of a reference of many measures apart in the last digit.
  const own = symmetric(within.selection(held, held));
  const cholesky = new CholeskyDecomposition(own);
  if (!cholesky.isPositiveDefinite()) {
    throw new Error(
      `The known measures ${known.keys.join(', ')} follow from one another in the reference; ` +
        'accepted: measures of which none is fixed by the others',
    );
  }
  const every = reference.keys.map((_, i) => i);
  const cross = within.selection(every, held);
  // One row per measure; the rows of the known measures are those of the unit matrix.
  const gain = cholesky.solve(cross.transpose()).transpose();
  held.forEach((place, column) => {
    for (let j = 0; j < count; j += 1) gain.set(place, j, j === column ? 1 : 0);
  });
  const leftOver = Matrix.sub(within, gain.mmul(cross.transpose()));
  for (const place of held) {
    for (let j = 0; j < size; j += 1) {
      leftOver.set(place, j, 0);
      leftOver.set(j, place, 0);
    }
  }
  const covariance = Matrix.add(leftOver, gain.mmul(here).mmul(gain.transpose()));
  const mean = Float64Array.from(reference.mean, (start, i) =>
    held.reduce(
      (sum, place, j) =>
        sum + gain.get(i, j) * ((known.mean[j] as number) - (reference.mean[place] as number)),
      start,
    ),
  );
  held.forEach((place, j) => {
    mean[place] = known.mean[j] as number;
  });
  return {
    worked: { keys: reference.keys, mean, covariance: Float64Array.from(symmetric(covariance).to1DArray()) },
    estimated: reference.keys.filter((key) => !known.keys.includes(key)),
  };
}

const matrixOf = (values: Float64Array, size: number): Matrix =>
  new Matrix(Array.from({ length: size }, (_, i) => Array.from(values.subarray(i * size, (i + 1) * size))));

const symmetric = (matrix: Matrix): Matrix => Matrix.add(matrix, matrix.transpose()).mul(0.5);
