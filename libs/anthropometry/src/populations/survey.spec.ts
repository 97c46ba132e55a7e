import { CholeskyDecomposition, Matrix } from 'ml-matrix';
import { describe, expect, it } from 'vitest';
import { ansur2, headCounts, model } from '../../test/seed.ts';
import type { MeasureKey } from '../measures/measures.ts';
import { probabilityBetween } from '../people/estimate.ts';
import { normalQuantile } from '../people/normal.ts';
import { readSurvey } from './survey.ts';

interface Limit {
  measure: MeasureKey;
  low: number | null;
  high: number | null;
}
interface Count {
  name: string;
  limits: Limit[];
  men: { passed: number; of: number };
  women: { passed: number; of: number };
}
// Outside check: people counted in the survey's rows, seed-data/populations/ansur2-head-counts.json.
const counts = headCounts.counts as Count[];
/** The rows hold whole millimetres. */
const HALF = 0.5;
const lowOf = ({ low }: Limit) => (low === null ? -Infinity : low - HALF);
const highOf = ({ high }: Limit) => (high === null ? Infinity : high + HALF);
const WITHIN_POINTS = 2.5;

const groups = ['men', 'women'] as const;
const crowd = (group: (typeof groups)[number]) =>
  model.predict({ bodyData: group, measured: {}, shoeMm: 0, clothing: 'medium' });

describe.each(groups)('head counts, %s', (group) => {
  const single = counts.filter(({ limits }) => limits.length === 1);
  const joint = counts.filter(({ limits }) => limits.length > 1);

  it.each(single.map((count) => [count.name, count] as const))('%s', (_, count) => {
    const [limit] = count.limits as [Limit];
    const share = probabilityBetween(crowd(group).estimate(limit.measure), lowOf(limit), highOf(limit));
    const { passed, of } = count[group];
    expect(Math.abs(100 * (share - passed / of))).toBeLessThan(WITHIN_POINTS);
  });

  it('has joint ones that a product of single shares would miss', () => {
    expect(joint.length).toBeGreaterThan(5);
  });

  it.each(joint.map((count) => [count.name, count] as const))('%s', (_, count) => {
    const share = sampledShare(group, count.limits);
    const { passed, of } = count[group];
    expect(Math.abs(100 * (share - passed / of))).toBeLessThan(WITHIN_POINTS);
  });
});

/** Share of a quasi-random sample of bodies within all limits; the sequence is always the same. */
function sampledShare(group: 'men' | 'women', limits: readonly Limit[]): number {
  const [joint] = crowd(group).joint(limits.map(({ measure }) => [[measure, 1] as const]));
  if (!joint) throw new Error('no joint distribution');
  const factor = new CholeskyDecomposition(new Matrix(joint.covariances)).lowerTriangularMatrix;
  const bases = [2, 3, 5, 7, 11];
  const draws = 8000;
  let passed = 0;
  for (let n = 1; n <= draws; n += 1) {
    const z = limits.map((_, i) => normalQuantile(halton(n, bases[i] as number)));
    const inside = limits.every((limit, i) => {
      let value = joint.means[i] as number;
      for (let j = 0; j <= i; j += 1) value += factor.get(i, j) * (z[j] as number);
      return value >= lowOf(limit) && value <= highOf(limit);
    });
    if (inside) passed += 1;
  }
  return passed / draws;
}

function halton(index: number, base: number): number {
  let result = 0;
  let fraction = 1;
  for (let i = index; i > 0; i = Math.floor(i / base)) {
    fraction /= base;
    result += fraction * (i % base);
  }
  return result;
}

describe('readSurvey', () => {
  it('makes full symmetric matrices of the upper triangles', () => {
    const survey = readSurvey(ansur2);
    const { women } = survey.correlations;
    const [stature, knee] = [
      survey.measures.indexOf('stature'),
      survey.measures.indexOf('knee_height_sitting'),
    ];
    expect(women[stature]?.[knee]).toBe(0.8768);
    expect(women[knee]?.[stature]).toBe(0.8768);
    expect(women.every((row, i) => row[i] === 1)).toBe(true);
  });

  it.each([
    [
      'a missing measure',
      (copy: typeof ansur2) => delete (copy.stats.men as { stature?: unknown }).stature,
      'stats.men.stature',
    ],
    [
      'a short correlation row',
      (copy: typeof ansur2) => copy.corr.women[3]?.pop(),
      'corr.women[3] holds 37 values',
    ],
    ['percentiles that fall', (copy: typeof ansur2) => copy.stats.men.span.p.reverse(), 'stats.men.span.p'],
  ])('refuses %s', (_, spoil, message) => {
    const copy = structuredClone(ansur2);
    spoil(copy);
    expect(() => readSurvey(copy)).toThrow(message);
  });
});
