import { describe, expect, it } from 'vitest';
import { model } from '../../test/seed.ts';
import type { MeasureKey } from '../measures/measures.ts';
import { bestValue, quantile } from './estimate.ts';
import type { KnownPerson, Linear } from './person.ts';

const heavy: KnownPerson = {
  bodyData: 'women',
  stature: { mm: 1620, source: 'told' },
  weightKg: 92,
  measured: { popliteal_height: 385 },
  shoeMm: 25,
  clothing: 'medium',
};

describe('people drawn as one person may be', () => {
  const COUNT = 40_000;
  const body = model.predict(heavy);
  const { columns, isWoman } = body.sample(COUNT, 3);

  it('keeps what is known, and is the same for the same seed', () => {
    expect(new Set(columns.weight_kg)).toEqual(new Set([92]));
    expect(new Set(columns.popliteal_height)).toEqual(new Set([385]));
    expect(new Set(columns.stature).size).toBeGreaterThan(1000);
    expect(Math.min(...isWoman)).toBe(1);
    expect(body.sample(50, 3).columns).toEqual(body.sample(50, 3).columns);
    expect(body.sample(50, 4).columns.stature).not.toEqual(body.sample(50, 3).columns.stature);
  });

  // What the estimates say exactly, the drawn people say by counting.
  it.each([
    { constant: 0, weights: { abdominal_extension_depth_sitting: 1 } },
    { constant: 40, weights: { elbow_rest_height: 1 } },
    { constant: 0, weights: { acromial_height: 1 } },
    { constant: -25, weights: { buttock_knee_length: 1, abdominal_extension_depth_sitting: -1 } },
    { constant: 0, weights: { elbow_rest_height: 0.8517, acromial_height_sitting: 0.1483 } },
    { constant: 0, weights: { thigh_clearance: 1, hip_breadth_sitting: 1, elbow_rest_height: -1 } },
  ] as Linear[])('agree with the estimate of $weights', (asked) => {
    const values = new Float64Array(COUNT).fill(asked.constant);
    for (const [key, factor] of Object.entries(asked.weights) as [MeasureKey, number][]) {
      columns[key]?.forEach((x, row) => {
        values[row] = (values[row] as number) + factor * x;
      });
    }
    const mean = values.reduce((sum, x) => sum + x, 0) / COUNT;
    const [m2, m3] = [2, 3].map((power) => values.reduce((sum, x) => sum + (x - mean) ** power, 0) / COUNT);
    const estimate = body.estimate(asked);
    const [{ sd, skew } = { sd: 0, skew: 0 }] = estimate.components;
    expect(Math.abs(mean - bestValue(estimate))).toBeLessThan(0.01 * sd);
    expect(Math.abs(Math.sqrt(m2 as number) / sd - 1)).toBeLessThan(0.01);
    expect(Math.abs((m3 as number) / (m2 as number) ** 1.5 - skew)).toBeLessThan(0.04);
    values.sort();
    for (const p of [0.05, 0.95]) {
      expect(Math.abs((values[Math.round(p * COUNT)] as number) - quantile(estimate, p))).toBeLessThan(
        0.03 * sd,
      );
    }
  });

  it('is of either sex where the sex is not known', () => {
    const either = model.predict({ ...heavy, bodyData: 'mixed', measured: {} });
    const drawn = either.sample(20_000, 1);
    const share = drawn.isWoman.reduce((sum, woman) => sum + woman, 0) / 20_000;
    expect(share).toBeCloseTo(either.estimate('stature').components[0]?.weight ?? 0, 2);
    const hips = (drawn.columns.hip_breadth_sitting as Float32Array).reduce((sum, x) => sum + x, 0) / 20_000;
    expect(Math.abs(hips - either.mean('hip_breadth_sitting'))).toBeLessThan(0.5);
  });

  it('does not vary for a percentile mannequin', () => {
    const mannequin = model.predict(model.mannequin({ bodyData: 'men', measure: 'stature', percentile: 5 }));
    expect(new Set(mannequin.sample(20, 1).columns.thigh_clearance).size).toBe(1);
  });
});

describe('age', () => {
  const man: KnownPerson = {
    bodyData: 'men',
    stature: { mm: 1760, source: 'measured' },
    weightKg: 85,
    measured: {},
    shoeMm: 25,
    clothing: 'medium',
  };
  const at = (change: Partial<KnownPerson>) => model.predict({ ...man, ...change });

  it('moves the belly 0.8 a year beyond 30, up to the oldest of the survey', () => {
    // Survey's rows: belly depth +0.8 mm a year for men of the same stature and weight, sitting height -0.25.
    const belly = (age?: number) => at(age ? { age } : {}).mean('abdominal_extension_depth_sitting');
    expect(belly(25)).toBe(belly());
    expect(belly(50) - belly()).toBeCloseTo(16, 9);
    expect(belly(80)).toBeCloseTo(belly(58), 9);
    expect(at({ age: 50 }).mean('sitting_height') - at({}).mean('sitting_height')).toBeCloseTo(-5, 9);
    expect(at({ age: 50 }).mean('popliteal_height')).toBe(at({}).mean('popliteal_height'));
  });

  it('moves nothing that was taken, and nobody of unknown weight', () => {
    expect(at({ age: 50, measured: { sitting_height: 920 } }).mean('sitting_height')).toBe(920);
    const { weightKg: _, ...light } = man;
    const mean = (person: KnownPerson) => model.predict(person).mean('abdominal_extension_depth_sitting');
    expect(mean({ ...light, age: 50 })).toBe(mean(light));
  });

  it('is seen in the people drawn', () => {
    const belly = (age: number) =>
      at({ age })
        .sample(2000, 1)
        .columns.abdominal_extension_depth_sitting?.reduce((sum, x) => sum + x, 0) ?? 0;
    expect((belly(50) - belly(20)) / 2000).toBeCloseTo(16, 2);
  });

  it('is seen in the shoulder height that follows from the sitting height', () => {
    const older = at({ age: 50 });
    const { columns } = older.sample(4000, 1);
    const meanOf = (key: MeasureKey) => (columns[key]?.reduce((sum, x) => sum + x, 0) ?? 0) / 4000;
    expect(meanOf('acromial_height')).toBeCloseTo(older.mean('acromial_height'), 0);
    expect(meanOf('acromial_height')).toBeCloseTo(
      meanOf('acromial_height_sitting') + meanOf('stature') - meanOf('sitting_height'),
      2,
    );
  });

  it('leaves a shoulder height that was taken', () => {
    const { columns } = at({ age: 50, measured: { acromial_height: 1445 } }).sample(20, 1);
    expect(new Set(columns.acromial_height)).toEqual(new Set([1445]));
  });

  it('is refused when it is no age', () => {
    expect(() => at({ age: -4 })).toThrow('age is -4; accepted: a number above 0');
  });
});

describe('a shoulder height taken standing', () => {
  it('is the height over the seat once stature and sitting height are taken', () => {
    const measured = { stature: 1760, sitting_height: 920, acromial_height: 1445 };
    const body = model.predict({ bodyData: 'men', measured, shoeMm: 25, clothing: 'medium' });
    expect(body.mean('acromial_height_sitting')).toBeCloseTo(605, 9);
    expect(body.estimate('acromial_height').components[0]).toMatchObject({ mean: 1445, sd: 0 });
  });
});
