import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { normalCdf, normalDensity } from './normal.ts';
import { shapeOf, standardCorrelation, standardOf, valueAt, type Shape } from './shifted-lognormal.ts';

/** Moments of a shape by a fine sum over the standard normal. */
function momentsBySum(shape: Shape): { mean: number; sd: number; skew: number } {
  const step = 0.001;
  const zs = Array.from({ length: 18001 }, (_, i) => -9 + i * step);
  const over = (f: (x: number) => number) =>
    zs.reduce((sum, z) => sum + f(valueAt(shape, z)) * normalDensity(z) * step, 0);
  const mean = over((x) => x);
  const variance = over((x) => (x - mean) ** 2);
  return { mean, sd: Math.sqrt(variance), skew: over((x) => (x - mean) ** 3) / variance ** 1.5 };
}

describe('a shape by its moments', () => {
  it.each([0, 1e-5, 0.1, 0.5, 1, -0.4, -1])('has the skew %f that was asked', (skew) => {
    const found = momentsBySum(shapeOf(400, 25, skew));
    expect(found.mean).toBeCloseTo(400, 6);
    expect(found.sd).toBeCloseTo(25, 6);
    expect(found.skew).toBeCloseTo(skew, 4);
  });

  it('is the lognormal itself for the moments of one', () => {
    // Moments of exp(5.5 + 0.145 z) as in Johnson, Kotz and Balakrishnan, Continuous Univariate Distributions 1, ch. 14.
    const w = Math.exp(0.145 ** 2);
    const mean = Math.exp(5.5) * Math.sqrt(w);
    const shape = shapeOf(mean, mean * Math.sqrt(w - 1), (w + 2) * Math.sqrt(w - 1));
    for (const z of [-3, -1.645, 0, 1.645, 3]) {
      expect(valueAt(shape, z)).toBeCloseTo(Math.exp(5.5 + 0.145 * z), 8);
      expect(standardOf(shape, Math.exp(5.5 + 0.145 * z))).toBeCloseTo(z, 8);
    }
  });

  it('rises, and its share below a value comes back', () => {
    const skew = fc.double({ min: -2, max: 2, noNaN: true });
    const z = fc.double({ min: -4, max: 4, noNaN: true });
    fc.assert(
      fc.property(skew, z, z, (asked, a, b) => {
        const shape = shapeOf(250, 30, asked);
        expect(valueAt(shape, Math.max(a, b))).toBeGreaterThanOrEqual(valueAt(shape, Math.min(a, b)));
        expect(normalCdf(standardOf(shape, valueAt(shape, a)))).toBeCloseTo(normalCdf(a), 7);
      }),
    );
  });

  it('ends where its tail ends', () => {
    const [right, left] = [shapeOf(0, 1, 1), shapeOf(0, 1, -1)];
    expect(standardOf(right, -10)).toBe(-Infinity);
    expect(standardOf(right, Infinity)).toBe(Infinity);
    expect(standardOf(left, 10)).toBe(Infinity);
    expect(standardOf(left, -Infinity)).toBe(-Infinity);
  });
});

describe('the correlation under two shapes', () => {
  it('is that of the logs for two lognormals', () => {
    const lognormal = (s: number) => {
      const w = Math.exp(s * s);
      const mean = Math.sqrt(w);
      return shapeOf(mean, mean * Math.sqrt(w - 1), (w + 2) * Math.sqrt(w - 1));
    };
    const [s, t, rho] = [0.15, 0.05, 0.62];
    const r = Math.expm1(rho * s * t) / Math.sqrt(Math.expm1(s * s) * Math.expm1(t * t));
    expect(standardCorrelation(lognormal(s), lognormal(t), r)).toBeCloseTo(rho, 9);
  });

  it('of a value and its opposite is -1', () => {
    const [a, b] = [shapeOf(10, 3, 0.5), shapeOf(-10, 3, -0.5)];
    expect(standardCorrelation(a, b, -1)).toBeCloseTo(-1, 9);
    expect(standardCorrelation(shapeOf(1, 1, 0), shapeOf(2, 3, 0), 0.4)).toBe(0.4);
  });
});
