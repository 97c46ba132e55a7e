import { normalCdf, normalQuantile } from '../people/normal.ts';

/** Percentiles that a summary tabulates. */
export const PERCENTILE_KEYS = [1, 5, 10, 25, 50, 75, 90, 95, 99] as const;

/** Statistics of one column as a summary prints them; units of the column. */
export interface ColumnStatistics {
  n: number;
  mean: number;
  /** With n - 1. */
  sd: number;
  /** Values at `PERCENTILE_KEYS`, type 7. */
  p: number[];
  min: number;
  max: number;
  /** Without the bias of small samples, as the excess kurtosis and the skew of the logs. */
  skew: number;
  /** Excess kurtosis. */
  exkurt: number;
  /** Skew of the natural logs. */
  skew_log: number;
  /** Largest gap between the counted share and the fitted normal's. */
  ks_d: number;
  /** D'Agostino and Pearson's test of normality. */
  normaltest_k2: number;
  normaltest_p: number;
  /** What the normal's 5th and 95th percentile miss the counted ones by. */
  err5: number;
  err95: number;
}

const MOST_PLACES = 60;

/** Rounds to decimals; of two that are equally near the even one. */
export function decimals(x: number, places: number): number {
  const up = x.toFixed(places);
  const [whole = '', rest = ''] = x.toFixed(MOST_PLACES).split('.');
  if (!/^50*$/.test(rest.slice(places))) return plainZero(Number(up));
  const cut = places === 0 ? whole : `${whole}.${rest.slice(0, places)}`;
  return plainZero(Number(/[02468]$/.test(cut) ? cut : up));
}

/** JSON knows no zero with a sign. */
const plainZero = (x: number): number => (x === 0 ? 0 : x);

/** Rounds to significant digits. */
export const digits = (x: number, count: number): number => Number(x.toPrecision(count));

const FIVE_PERCENT = normalQuantile(0.95);

/**
 * Statistics of a column of values above 0.
 *
 * @param values - at least 20 finite values above 0, any order
 * @returns statistics, rounded as they are printed
 */
export function columnStatistics(values: Float64Array): ColumnStatistics {
  const sorted = values.slice().sort();
  const n = sorted.length;
  const { mean, m2, m3, m4 } = centralMoments(sorted);
  const sd = Math.sqrt((m2 * n) / (n - 1));
  const skew = m3 / m2 ** 1.5;
  const kurtosis = m4 / m2 ** 2;
  const logs = centralMoments(sorted.map(Math.log));
  const unbiased = Math.sqrt(n * (n - 1)) / (n - 2);
  const at = (p: number): number => percentileOfSorted(sorted, p);
  const k2 = skewnessZ(skew, n) ** 2 + kurtosisZ(kurtosis, n) ** 2;
  return {
    n,
    mean: decimals(mean, 2),
    sd: decimals(sd, 2),
    p: PERCENTILE_KEYS.map((p) => decimals(at(p), 1)),
    min: sorted[0] as number,
    max: sorted[n - 1] as number,
    skew: decimals(skew * unbiased, 3),
    exkurt: decimals((((n + 1) * (kurtosis - 3) + 6) * (n - 1)) / ((n - 2) * (n - 3)), 3),
    skew_log: decimals((logs.m3 / logs.m2 ** 1.5) * unbiased, 3),
    ks_d: decimals(largestGap(sorted, mean, sd), 4),
    normaltest_k2: decimals(k2, 1),
    normaltest_p: digits(Math.exp(-k2 / 2), 3),
    err5: decimals(mean - FIVE_PERCENT * sd - at(5), 1),
    err95: decimals(mean + FIVE_PERCENT * sd - at(95), 1),
  };
}

/**
 * Percentile of sorted values by linear interpolation.
 *
 * @param sorted - rising, at least one
 * @param p - 0 to 100
 * @returns unit of the values
 * @source type 7 of Hyndman and Fan 1996
 */
export function percentileOfSorted(sorted: Float64Array, p: number): number {
  const place = ((sorted.length - 1) * p) / 100;
  const below = Math.floor(place);
  const low = sorted[below] as number;
  const high = sorted[Math.min(below + 1, sorted.length - 1)] as number;
  return low + (place - below) * (high - low);
}

function centralMoments(values: Float64Array): { mean: number; m2: number; m3: number; m4: number } {
  const n = values.length;
  const mean = values.reduce((sum, x) => sum + x, 0) / n;
  let [m2, m3, m4] = [0, 0, 0];
  for (const x of values) {
    const d = x - mean;
    m2 += d * d;
    m3 += d * d * d;
    m4 += d * d * d * d;
  }
  return { mean, m2: m2 / n, m3: m3 / n, m4: m4 / n };
}

function largestGap(sorted: Float64Array, mean: number, sd: number): number {
  const n = sorted.length;
  let gap = 0;
  sorted.forEach((x, i) => {
    const share = normalCdf((x - mean) / sd);
    gap = Math.max(gap, (i + 1) / n - share, share - i / n);
  });
  return gap;
}

/** @source D'Agostino 1970, transformation of the sample skewness to a standard normal */
function skewnessZ(skew: number, n: number): number {
  const y = skew * Math.sqrt(((n + 1) * (n + 3)) / (6 * (n - 2)));
  const beta = (3 * (n * n + 27 * n - 70) * (n + 1) * (n + 3)) / ((n - 2) * (n + 5) * (n + 7) * (n + 9));
  const w2 = -1 + Math.sqrt(2 * (beta - 1));
  const alpha = Math.sqrt(2 / (w2 - 1));
  return Math.asinh(y / alpha) / Math.sqrt(0.5 * Math.log(w2));
}

/** @source Anscombe and Glynn 1983, transformation of the sample kurtosis to a standard normal */
function kurtosisZ(kurtosis: number, n: number): number {
  const expected = (3 * (n - 1)) / (n + 1);
  const variance = (24 * n * (n - 2) * (n - 3)) / ((n + 1) ** 2 * (n + 3) * (n + 5));
  const x = (kurtosis - expected) / Math.sqrt(variance);
  const root =
    ((6 * (n * n - 5 * n + 2)) / ((n + 7) * (n + 9))) *
    Math.sqrt((6 * (n + 3) * (n + 5)) / (n * (n - 2) * (n - 3)));
  const a = 6 + (8 / root) * (2 / root + Math.sqrt(1 + 4 / (root * root)));
  const denominator = 1 + x * Math.sqrt(2 / (a - 4));
  const third = Math.cbrt((1 - 2 / a) / Math.abs(denominator)) * Math.sign(denominator);
  return (1 - 2 / (9 * a) - third) / Math.sqrt(2 / (9 * a));
}
