import type { MeasureKey } from '../measures/measures.ts';
import { DERIVED, isLogged, workedOf, type Worked } from './worked.ts';

/** Statistics of worked values, as a summary's `log` block holds them. */
export interface LogStatistics {
  measures: readonly MeasureKey[];
  /** Measures that were not taken in logs. */
  plain: readonly MeasureKey[];
  mean: readonly number[];
  sd: readonly number[];
  /** Correlations, upper triangle with the diagonal, row after row. */
  upper: readonly number[];
}

/**
 * The worked normal of one group: as counted in logs where the summary holds it, by matching moments elsewhere.
 *
 * @param measures - in the order of the correlations
 * @param stats - mean and spread in mm and kg
 * @param correlations - full matrix in mm and kg
 * @param log - what was counted in logs
 * @returns worked normal without derived measures
 */
export function workedOfSurvey(
  measures: readonly MeasureKey[],
  stats: Record<MeasureKey, { mean: number; sd: number }>,
  correlations: readonly (readonly number[])[],
  log: LogStatistics | undefined,
): Worked {
  const keys = measures.filter((key) => !(key in DERIVED));
  const places = keys.map((key) => measures.indexOf(key));
  const size = keys.length;
  const covariance = new Float64Array(size * size);
  keys.forEach((a, i) =>
    keys.forEach((b, j) => {
      const r = correlations[places[i] as number]?.[places[j] as number] as number;
      covariance[i * size + j] = r * stats[a].sd * stats[b].sd;
    }),
  );
  const worked = workedOf({ keys, mean: Float64Array.from(keys, (key) => stats[key].mean), covariance });
  if (log) putCounted(worked, log);
  return worked;
}

/** Puts counted statistics in place of matched ones; between the two kinds the matched correlation stands. */
function putCounted({ keys, mean, covariance }: Worked, log: LogStatistics): void {
  const size = keys.length;
  const matched = Float64Array.from(keys, (_, i) => Math.sqrt(covariance[i * size + i] as number));
  const sds = matched.slice();
  const counted = log.measures.map((key) =>
    isLogged(key) === !log.plain.includes(key) ? keys.indexOf(key) : -1,
  );
  counted.forEach((place, i) => {
    if (place < 0) return;
    mean[place] = log.mean[i] as number;
    sds[place] = log.sd[i] as number;
  });
  for (let i = 0; i < size; i += 1) {
    for (let j = 0; j < size; j += 1) {
      const scale =
        ((sds[i] as number) * (sds[j] as number)) / ((matched[i] as number) * (matched[j] as number));
      covariance[i * size + j] = (covariance[i * size + j] as number) * scale;
    }
  }
  let next = 0;
  for (let row = 0; row < counted.length; row += 1) {
    for (let column = row; column < counted.length; column += 1) {
      const r = log.upper[next] as number;
      next += 1;
      const [i, j] = [counted[row] as number, counted[column] as number];
      if (i < 0 || j < 0) continue;
      covariance[i * size + j] = r * (sds[i] as number) * (sds[j] as number);
      covariance[j * size + i] = covariance[i * size + j] as number;
    }
  }
}
