import { normalCdf } from './normal.ts';

/** Nodes and weights of the 20-point Gauss-Legendre rule on -1..1, positive half. */
const NODES = [
  0.07652652113349734, 0.22778585114164507, 0.37370608871541955, 0.5108670019508271, 0.636053680726515,
  0.7463319064601508, 0.8391169718222189, 0.912234428251326, 0.9639719272779138, 0.9931285991850949,
];
const WEIGHTS = [
  0.15275338713072598, 0.14917298647260382, 0.14209610931838215, 0.1316886384491765, 0.11819453196151831,
  0.10193011981724048, 0.08327674157670474, 0.06267204833410904, 0.04060142980038705, 0.017614007139152264,
];
/** Correlation above which the integral over the angle gets too steep. */
const STEEP = 0.9;
const FAR = 8.5;
const FULL_TURN = 2 * Math.PI;
/** Standard deviations beyond which less than 1 in ten thousand million is left. */
const SURE = 6.5;

function integrate(f: (x: number) => number, from: number, to: number): number {
  if (to === from) return 0;
  const half = (to - from) / 2;
  const middle = (to + from) / 2;
  let sum = 0;
  for (let i = 0; i < NODES.length; i += 1) {
    const offset = half * (NODES[i] as number);
    sum += (WEIGHTS[i] as number) * (f(middle - offset) + f(middle + offset));
  }
  return sum * half;
}

/**
 * Share of a bivariate standard normal distribution with both values below their limits.
 *
 * @param h - limit of the first value
 * @param k - limit of the second value
 * @param correlation - from -1 to 1
 * @returns 0 to 1, absolute error below 1e-9
 * @source Plackett's identity (derivative by the correlation is the density), integrated over the angle by
 *   Gauss-Legendre from no correlation, or from full correlation where that is nearer
 */
export function bivariateNormalCdf(h: number, k: number, correlation: number): number {
  if (h < -FAR || k < -FAR) return 0;
  if (h > FAR) return normalCdf(k);
  if (k > FAR) return normalCdf(h);
  // Near full correlation the sum (or the difference) of the two hardly varies, and often that settles it.
  const sum = (h + k) / Math.sqrt(2 * (1 + correlation));
  if (sum < -SURE) return 0;
  if (sum > SURE && correlation < 0) return apart(h, k);
  if (Math.abs(h - k) > SURE * Math.sqrt(2 * (1 - correlation)) && correlation > 0) {
    return normalCdf(Math.min(h, k));
  }
  if (correlation > 1 - 1e-12) return normalCdf(Math.min(h, k));
  if (correlation < -1 + 1e-12) return apart(h, k);
  const density = (angle: number): number => {
    const cosine = Math.cos(angle);
    return Math.exp(-(h * h + k * k - 2 * h * k * Math.sin(angle)) / (2 * cosine * cosine));
  };
  const angle = Math.asin(correlation);
  if (Math.abs(correlation) < STEEP) {
    return normalCdf(h) * normalCdf(k) + integrate(density, 0, angle) / FULL_TURN;
  }
  // Near full correlation the way from there is short; close to it the density rises from nothing, so it is cut there.
  const [far, start] =
    correlation > 0 ? [Math.PI / 2, normalCdf(Math.min(h, k))] : [-Math.PI / 2, apart(h, k)];
  const first = far + (angle - far) * 0.1;
  const second = far + (angle - far) * 0.4;
  const way =
    integrate(density, far, first) + integrate(density, first, second) + integrate(density, second, angle);
  return Math.min(1, Math.max(0, start + way / FULL_TURN));
}

/** Share below both limits when one value is the other's opposite. */
const apart = (h: number, k: number): number => Math.max(0, normalCdf(h) - normalCdf(-k));
