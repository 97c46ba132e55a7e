const SQRT_TWO_PI = Math.sqrt(2 * Math.PI);
/** Beyond this many standard deviations the tail is summed as a continued fraction. */
const SERIES_LIMIT = 5;

/** Density of the standard normal distribution. */
export function normalDensity(z: number): number {
  return Math.exp(-0.5 * z * z) / SQRT_TWO_PI;
}

/**
 * Standard normal distribution function: the share that lies below z.
 *
 * @param z - any number, infinities included
 * @returns 0 to 1, absolute error below 1e-14
 * @source power series and continued fraction of the error integral, Abramowitz and Stegun 26.2.11 and 26.2.14
 */
export function normalCdf(z: number): number {
  const size = Math.abs(z);
  if (size > 38) return z < 0 ? 0 : 1;
  if (size < SERIES_LIMIT) {
    let term = z;
    let sum = z;
    for (let k = 3; Math.abs(term) > 1e-17 && k < 200; k += 2) {
      term *= (z * z) / k;
      sum += term;
    }
    return 0.5 + normalDensity(z) * sum;
  }
  let fraction = 0;
  for (let k = 40; k >= 1; k -= 1) fraction = k / (size + fraction);
  const tail = normalDensity(size) / (size + fraction);
  return z < 0 ? tail : 1 - tail;
}

/**
 * The value below which the share p of a standard normal distribution lies.
 *
 * @param p - strictly between 0 and 1
 * @returns standard deviations from the mean
 * @throws RangeError when p is not strictly between 0 and 1
 * @source start value after Abramowitz and Stegun 26.2.23, refined by Newton steps on `normalCdf`
 */
export function normalQuantile(p: number): number {
  if (!(p > 0 && p < 1)) throw new RangeError(`p is ${p}; accepted: strictly between 0 and 1`);
  const t = Math.sqrt(-2 * Math.log(Math.min(p, 1 - p)));
  const start =
    t - (2.515517 + t * (0.802853 + t * 0.010328)) / (1 + t * (1.432788 + t * (0.189269 + t * 0.001308)));
  let z = p < 0.5 ? -start : start;
  for (let step = 0; step < 3; step += 1) {
    const error = (normalCdf(z) - p) / normalDensity(z);
    z -= error / (1 + 0.5 * z * error);
  }
  return z;
}

/** Standard deviations from the middle of a normal to either end of a 90 % range. */
export const Z90 = normalQuantile(0.95);
