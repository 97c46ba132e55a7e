import { CholeskyDecomposition, Matrix } from 'ml-matrix';
import { MEASURE_KEYS, type MeasureKey } from '../measures/measures.ts';
import type { BodyWriter, GroupBodies } from './population.ts';
import type { SurveyGroup } from './survey.ts';
import { DERIVED } from './worked.ts';

/** One measure as a row of a triangular product: mean + factors · normals, then out of its log where it has one. */
export interface BodyRow {
  key: MeasureKey;
  mean: number;
  /** One factor for each normal number up to this row's own. */
  factors: Float64Array;
  logged: boolean;
  /** Observed range; values beyond are set to its end. */
  low: number;
  high: number;
}

/** Changes the first normal numbers of a person before the product. */
export interface Bend {
  /** How many numbers it takes and changes in place. */
  dimensions: number;
  change(normals: Float64Array): void;
}

/**
 * Order of the normal numbers: the measures that seats are checked by come first, since the first dimensions of the
 * sequence are the most even and a draw of few measures takes few.
 */
const FIRST: readonly MeasureKey[] = [
  'popliteal_height',
  'elbow_rest_height',
  'thigh_clearance',
  'buttock_popliteal_length',
  'forearm_forearm_breadth',
  'hip_breadth_sitting',
  'stature',
  'weight_kg',
  'sitting_height',
  'abdominal_extension_depth_sitting',
  'buttock_knee_length',
  'knee_height_sitting',
  'bideltoid_breadth',
  'acromial_height_sitting',
  'eye_height_sitting',
  'foot_length',
];

/** The measures given, in the order in which bodies are drawn. */
export function drawOrder(keys: Iterable<MeasureKey>): MeasureKey[] {
  const given = new Set(keys);
  return [...new Set([...FIRST, ...MEASURE_KEYS])].filter((key) => given.has(key));
}

/**
 * Lower triangular factor of a covariance matrix, as rows.
 *
 * @param covariance - row by row; its lower triangle is read
 * @param size - its rows
 * @returns row i with i + 1 factors
 * @throws Error when the matrix is not positive definite
 */
export function factorRows(covariance: Float64Array, size: number): Float64Array[] {
  const matrix = Matrix.zeros(size, size);
  for (let i = 0; i < size; i += 1) {
    for (let j = 0; j <= i; j += 1) {
      const value = covariance[i * size + j] as number;
      matrix.set(i, j, value);
      matrix.set(j, i, value);
    }
  }
  const cholesky = new CholeskyDecomposition(matrix);
  if (!cholesky.isPositiveDefinite()) {
    throw new Error(
      'The covariance matrix is not positive definite; accepted: measures of which none is fixed by others',
    );
  }
  const lower = cholesky.lowerTriangularMatrix;
  return Array.from({ length: size }, (_, i) => Float64Array.from(lower.getRow(i).slice(0, i + 1)));
}

/**
 * People of one sex whose measures are linear in standard normal numbers, in logs where a row says so.
 *
 * @param group - women or men
 * @param rows - row i has i + 1 factors
 * @param bend - changes the first normal numbers, so that a measure keeps a shape that is not normal
 * @returns bodies; standing shoulder height is known where the three measures it follows from are
 */
export function linearBodies(group: SurveyGroup, rows: readonly BodyRow[], bend?: Bend): GroupBodies {
  const places = new Map(rows.map(({ key }, place) => [key, place]));
  const derived = Object.entries(DERIVED) as [MeasureKey, readonly (readonly [MeasureKey, number])[]][];
  const sums = derived.filter(([, parts]) => parts.every(([part]) => places.has(part)));
  return {
    group,
    known: new Set([...places.keys(), ...sums.map(([key]) => key)]),
    writer: (columns) => writerOf(rows, places, new Map(sums), columns, bend),
  };
}

function writerOf(
  rows: readonly BodyRow[],
  places: ReadonlyMap<MeasureKey, number>,
  sums: ReadonlyMap<MeasureKey, readonly (readonly [MeasureKey, number])[]>,
  columns: ReadonlyMap<MeasureKey, Float32Array>,
  bend: Bend | undefined,
): BodyWriter {
  const wanted = [...columns.keys()];
  const summed = wanted.filter((key) => sums.has(key) && !places.has(key));
  const parts = summed.flatMap((key) => (sums.get(key) ?? []).map(([part]) => part));
  const needed = [...new Set([...wanted.filter((key) => places.has(key)), ...parts])]
    .map((key) => places.get(key) as number)
    .sort((a, b) => a - b);
  const values = new Float64Array(rows.length);
  const asked = needed.map((place) => rows[place] as BodyRow);
  // One after another in one array, so that no person's product leaves it.
  const factors = Float64Array.from(asked.flatMap((row) => [...row.factors]));
  const lengths = Uint8Array.from(asked, (row) => row.factors.length);
  const means = Float64Array.from(asked, ({ mean }) => mean);
  const logged = Uint8Array.from(asked, (row) => (row.logged ? 1 : 0));
  const lows = Float64Array.from(asked, ({ low }) => low);
  const highs = Float64Array.from(asked, ({ high }) => high);
  const askedPlaces = Uint8Array.from(needed);
  const filled = asked.map(({ key }) => columns.get(key));
  const totals = summed.map((key) => ({
    column: columns.get(key) as Float32Array,
    parts: (sums.get(key) ?? []).map(([part, factor]) => ({ place: places.get(part) as number, factor })),
  }));
  return {
    dimensions: Math.max(bend?.dimensions ?? 0, (needed.at(-1) ?? -1) + 1),
    write(normals, row) {
      bend?.change(normals);
      let at = 0;
      for (let n = 0; n < means.length; n += 1) {
        let value = means[n] as number;
        const length = lengths[n] as number;
        for (let k = 0; k < length; k += 1) value += (factors[at + k] as number) * (normals[k] as number);
        at += length;
        if (logged[n] === 1) value = Math.exp(value);
        if (value < (lows[n] as number)) value = lows[n] as number;
        else if (value > (highs[n] as number)) value = highs[n] as number;
        values[askedPlaces[n] as number] = value;
        const column = filled[n];
        if (column) column[row] = value;
      }
      for (const { column, parts: of } of totals) {
        let sum = 0;
        for (const { place, factor } of of) sum += factor * (values[place] as number);
        column[row] = sum;
      }
    },
  };
}
