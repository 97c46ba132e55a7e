/**
 * A distribution given by mean, spread and skewness: a lognormal moved along its axis, turned round where the skew
 * is to the left, and the normal where there is none. It is exact for one measure that is lognormal.
 */
export interface Shape {
  mean: number;
  sd: number;
  /** Root of exp(sigma^2) - 1 with the sign of the skew; 0 for a normal. */
  bend: number;
  /** Spread of the logs, with the sign of the skew. */
  sigma: number;
}

/** Below this the normal differs by less than a millionth of a standard deviation. */
const STRAIGHT = 1e-7;

/**
 * The shape with a given mean, spread and skewness.
 *
 * @param mean - any unit
 * @param sd - same unit; >= 0
 * @param skew - third standardised moment
 * @returns the shape
 * @source skew of the lognormal: t^3 + 3 t with t^2 = exp(sigma^2) - 1, solved by the hyperbolic sine
 */
export function shapeOf(mean: number, sd: number, skew: number): Shape {
  const bend = 2 * Math.sinh(Math.asinh(skew / 2) / 3);
  if (sd === 0 || Math.abs(bend) < STRAIGHT) return { mean, sd, bend: 0, sigma: 0 };
  return { mean, sd, bend, sigma: Math.sign(bend) * Math.sqrt(Math.log1p(bend * bend)) };
}

/**
 * Standard normal number that stands for a value: the share below the value is the normal's share below it.
 *
 * @param shape - its spread above 0
 * @param x - value, infinities included
 * @returns standard deviations; infinite beyond the end of the shape
 */
export function standardOf({ mean, sd, bend, sigma }: Shape, x: number): number {
  const u = (x - mean) / sd;
  if (bend === 0) return u;
  const stretched = bend * u;
  if (stretched <= -1) return bend > 0 ? -Infinity : Infinity;
  return Math.log1p(stretched) / sigma + sigma / 2;
}

/** The value that a standard normal number stands for; undoes `standardOf`. */
export function valueAt({ mean, sd, bend, sigma }: Shape, z: number): number {
  if (bend === 0) return mean + z * sd;
  return mean + (sd / bend) * Math.expm1(sigma * z - (sigma * sigma) / 2);
}

/**
 * Correlation of the standard normal numbers under two values (a Gaussian copula) that gives these their correlation.
 *
 * @param a - first shape
 * @param b - second shape
 * @param r - correlation of the values, -1 to 1
 * @returns -1 to 1; exact for two lognormals
 * @source covariance of two lognormals: exp(rho s t) - 1
 */
export function standardCorrelation(a: Shape, b: Shape, r: number): number {
  const one = a.bend === 0 ? 1 : a.bend / a.sigma;
  const other = b.bend === 0 ? 1 : b.bend / b.sigma;
  const product = a.sigma * b.sigma;
  let rho = r * one * other;
  if (product !== 0) {
    const together = r * a.bend * b.bend;
    rho = together <= -1 ? Math.sign(r) : Math.log1p(together) / product;
  }
  return Math.max(-1, Math.min(1, rho));
}

/** More than any shape of a body has; what is beyond is left of rounding. */
const MOST_SKEW = 3;

/**
 * Third standardised moment.
 *
 * @param variance - square millimetres
 * @param third - third central moment, cubic millimetres
 * @returns 0 where nothing varies
 */
export function skewOf(variance: number, third: number): number {
  if (variance <= 0) return 0;
  return Math.max(-MOST_SKEW, Math.min(MOST_SKEW, third / variance ** 1.5));
}
