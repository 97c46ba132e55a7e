import type { MeasureKey } from '../src/measures/measures.ts';
import type { Draws } from '../src/populations/population.ts';

/** A limit of the head counts; null is open. */
export interface Limit {
  measure: MeasureKey;
  low: number | null;
  high: number | null;
}

/** Counted rows hold whole millimetres, so a person drawn within half a millimetre of a limit counts as on it. */
const HALF = 0.5;

/** Share of drawn people, in percent, who are within all limits. */
export function shareWithin({ columns, count }: Draws, limits: readonly Limit[]): number {
  let passed = 0;
  for (let row = 0; row < count; row += 1) {
    const within = limits.every(({ measure, low, high }) => {
      const value = columns[measure]?.[row] ?? NaN;
      return value >= (low ?? -Infinity) - HALF && value < (high ?? Infinity) + HALF;
    });
    if (within) passed += 1;
  }
  return (100 * passed) / count;
}

/** Percentile of a column, straight between its values. */
export function percentileOf(column: Float32Array | undefined, percent: number): number {
  const sorted = Float64Array.from(column ?? []).sort();
  const at = (percent / 100) * (sorted.length - 1);
  const below = sorted[Math.floor(at)] ?? NaN;
  return below + (at - Math.floor(at)) * ((sorted[Math.ceil(at)] ?? NaN) - below);
}

/** Mean and spread of a column. */
export function momentsOf(column: Float32Array | undefined): { mean: number; sd: number } {
  const values = Float64Array.from(column ?? []);
  const mean = values.reduce((sum, x) => sum + x, 0) / values.length;
  const sd = Math.sqrt(values.reduce((sum, x) => sum + (x - mean) ** 2, 0) / (values.length - 1));
  return { mean, sd };
}
