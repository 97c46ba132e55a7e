import { normalCdf, normalDensity } from './normal.ts';

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

function integrate(f: (x: number) => number, from: number, to: number): number {
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
 *   Gauss-Legendre; near full correlation the conditional distribution is integrated instead
 */
export function bivariateNormalCdf(h: number, k: number, correlation: number): number {
  if (h < -FAR || k < -FAR) return 0;
  if (h > FAR) return normalCdf(k);
  if (k > FAR) return normalCdf(h);
  if (correlation > 1 - 1e-12) return normalCdf(Math.min(h, k));
  if (correlation < -1 + 1e-12) return Math.max(0, normalCdf(h) - normalCdf(-k));
  if (Math.abs(correlation) < STEEP) {
    const density = (angle: number): number => {
      const cosine = Math.cos(angle);
      return Math.exp(-(h * h + k * k - 2 * h * k * Math.sin(angle)) / (2 * cosine * cosine));
    };
    return normalCdf(h) * normalCdf(k) + integrate(density, 0, Math.asin(correlation)) / (2 * Math.PI);
  }
  return conditionalIntegral(h, k, correlation);
}

function conditionalIntegral(h: number, k: number, correlation: number): number {
  const rest = Math.sqrt(1 - correlation * correlation);
  const f = (x: number): number => normalDensity(x) * normalCdf((k - correlation * x) / rest);
  // The second factor falls from 1 to 0 around this point, over a few times `rest`.
  const step = k / correlation;
  const reach = (7 * rest) / Math.abs(correlation);
  const cuts = [-FAR, -4, 0, 4, step - reach, step - reach / 3, step, step + reach / 3, step + reach, h]
    .filter((x) => x >= -FAR && x <= h)
    .sort((a, b) => a - b);
  let sum = 0;
  for (let i = 1; i < cuts.length; i += 1) sum += integrate(f, cuts[i - 1] as number, cuts[i] as number);
  return Math.min(1, Math.max(0, sum));
}
