import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { outsideCheck } from '../../test/outside-check.ts';
import { bivariateNormalCdf } from './bivariate.ts';
import { normalCdf, normalQuantile } from './normal.ts';

describe('normalCdf', () => {
  // Abramowitz and Stegun, Handbook of Mathematical Functions, table 26.1 and 26.2.
  it.each([
    [0, 0.5],
    [1, 0.841344746068543],
    [1.96, 0.975002104851779],
    [2.58, 0.995059984242229],
    [4, 0.999968328758167],
    [-3, 0.00134989803163],
  ])('at %f', (z, share) => {
    expect(normalCdf(z)).toBeCloseTo(share, 12);
  });

  it('has tails that add to one, far out as well', () => {
    fc.assert(
      fc.property(fc.double({ min: -12, max: 12, noNaN: true }), (z) => {
        expect(normalCdf(z) + normalCdf(-z)).toBeCloseTo(1, 13);
      }),
    );
    // -log10 of the tail at 10 standard deviations: Abramowitz and Stegun, table 26.2.
    expect(-Math.log10(normalCdf(-10))).toBeCloseTo(23.11805, 4);
  });

  it('is undone by the quantile', () => {
    fc.assert(
      fc.property(fc.double({ min: 1e-6, max: 1 - 1e-6, noNaN: true }), (p) => {
        expect(normalCdf(normalQuantile(p))).toBeCloseTo(p, 12);
      }),
    );
  });

  it('refuses a share that is not between 0 and 1', () => {
    expect(() => normalQuantile(1)).toThrow('p is 1; accepted: strictly between 0 and 1');
  });
});

describe('bivariateNormalCdf', () => {
  const z = 1.6448536269514722;

  // Shares computed from the bivariate normal distribution for two measures of one person.
  it.each([
    [0, 0.81, 0.9025],
    [0.2, 0.8123, 0.9052],
    [0.432, 0.8208, 0.9103],
    [0.5, 0.8245, 0.9122],
    [0.8, 0.8495, 0.9248],
    [0.9, 0.8637, 0.9319],
    [1, 0.9, 0.95],
  ])('two measures correlated by %f', (correlation, bothWithin, bothBelow) => {
    const f = (h: number, k: number) => bivariateNormalCdf(h, k, correlation);
    const within = f(z, z) - f(z, -z) - f(-z, z) + f(-z, -z);
    const source = 'bivariate normal distribution, tabled';
    const both = { source, tolerance: 0.0001, unit: '' as const };
    const what = `two measures correlated by ${correlation}`;
    outsideCheck({ ...both, what: `${what}, both within 5 to 95`, expected: bothWithin, ours: within });
    outsideCheck({ ...both, what: `${what}, both below 95`, expected: bothBelow, ours: f(z, z) });
  });

  it('at the middle follows the arc sine', () => {
    // Sheppard 1899: a quarter plus the arc sine of the correlation over a full turn.
    for (let r = -0.999; r < 1; r += 0.037) {
      expect(bivariateNormalCdf(0, 0, r)).toBeCloseTo(0.25 + Math.asin(r) / (2 * Math.PI), 9);
    }
  });

  it('agrees with a fine sum of the conditional distribution', () => {
    const limit = fc.double({ min: -4, max: 4, noNaN: true });
    const correlation = fc.double({ min: -0.9999, max: 0.9999, noNaN: true });
    fc.assert(
      fc.property(limit, limit, correlation, (h, k, r) => {
        expect(bivariateNormalCdf(h, k, r)).toBeCloseTo(bySummation(h, k, r), 6);
      }),
      { numRuns: 60 },
    );
  });
});

/** Midpoint sum, written for this test alone. */
function bySummation(h: number, k: number, r: number): number {
  const steps = 40_000;
  const from = -9;
  const width = (h - from) / steps;
  let sum = 0;
  for (let i = 0; i < steps; i += 1) {
    const x = from + (i + 0.5) * width;
    const density = Math.exp(-0.5 * x * x) / Math.sqrt(2 * Math.PI);
    sum += density * normalCdf((k - r * x) / Math.sqrt(1 - r * r)) * width;
  }
  return sum;
}
