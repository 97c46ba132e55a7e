import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { ansur2, model } from '../../test/seed.ts';
import { MEASURE_KEYS, TAPE_MEASURE_KEYS, type MeasureKey } from '../measures/measures.ts';
import { bestValue, probabilityBetween, quantile, range90 } from './estimate.ts';
import type { BodyData, KnownPerson } from './person.ts';

const known = (bodyData: BodyData, change: Partial<KnownPerson> = {}): KnownPerson => ({
  bodyData,
  measured: {},
  shoeMm: 25,
  clothing: 'medium',
  ...change,
});
const tall = (bodyData: BodyData, mm: number, source: 'measured' | 'told' = 'measured'): KnownPerson =>
  known(bodyData, { stature: { mm, source } });
const only = (person: KnownPerson, key: MeasureKey) => {
  const [component] = model.predict(person).estimate(key).components;
  if (!component) throw new Error('no component');
  return component;
};

/** Coefficients as the survey's rows gave them by least squares. */
type Coefficients = Record<'men' | 'women', Record<string, number[]>>;
const byStature = ansur2.reg_stature as unknown as Coefficients;
const byStatureAndWeight = ansur2.reg_stature_weight as unknown as Coefficients;

describe.each(['men', 'women'] as const)('%s, conditional on what is known', (group) => {
  // Outside check: straight lines fitted to the survey's 6,068 rows. The engine works in logs, so its lines curve a
  // little and its spread grows with the size: within one spread of the middle they differ by part of the residual.
  const middle = ansur2.stats[group];
  const around = [-1, 0, 1];

  it.each(Object.keys(byStature[group]) as MeasureKey[])(
    '%s on stature is the regression of the rows',
    (key) => {
      const [intercept = 0, slope = 0, residual = 0] = byStature[group][key] ?? [];
      for (const z of around) {
        const stature = middle.stature.mean + z * middle.stature.sd;
        const { mean, sd } = only(tall(group, stature), key);
        expect(Math.abs(mean - (intercept + slope * stature))).toBeLessThan(0.02 * residual);
        expect(Math.abs(sd / residual - 1)).toBeLessThan(z === 0 ? 0.02 : 0.1);
      }
    },
  );

  it.each(Object.keys(byStatureAndWeight[group]) as MeasureKey[])(
    '%s on stature and weight is the regression of the rows',
    (key) => {
      const [intercept = 0, perMm = 0, perKg = 0, residual = 0] = byStatureAndWeight[group][key] ?? [];
      for (const z of around) {
        const stature = middle.stature.mean + z * middle.stature.sd;
        const weightKg = middle.weight_kg.mean + z * middle.weight_kg.sd;
        const { mean } = only({ ...tall(group, stature), weightKg }, key);
        const line = intercept + perMm * stature + perKg * weightKg;
        expect(Math.abs(mean - line)).toBeLessThan(0.15 * residual);
      }
      const { sd } = only({ ...tall(group, middle.stature.mean), weightKg: middle.weight_kg.mean }, key);
      expect(Math.abs(sd / residual - 1)).toBeLessThan(0.06);
    },
  );
});

describe('a person known by height', () => {
  it('a woman of 1600: back of knee 379.8, 90 in 100 between 356.8 and 402.8', () => {
    // 0.2962 x 1600 - 94.1 = 379.8; 1.645 x 14.0 either side, from the survey's regression table.
    const estimate = model.predict(tall('women', 1600)).estimate('popliteal_height');
    expect(bestValue(estimate)).toBeCloseTo(379.8, 0);
    // A spread that grows with the size is a little less for her than the table's, which is for women of all heights.
    expect(Math.abs(range90(estimate).low - 356.8)).toBeLessThan(1);
    expect(Math.abs(range90(estimate).high - 402.8)).toBeLessThan(1);
    expect(estimate.measured).toBe(false);
  });

  it('two people 280 apart differ by 103 in seated eye height, not by 128 as a plain ratio has it', () => {
    const eye = (mm: number) => model.predict(tall('men', mm)).mean('eye_height_sitting');
    expect(eye(1900) - eye(1620)).toBeCloseTo(103, 0);
  });

  it('a told height is taken 21 (men) or 12 (women) lower and widens the spread', () => {
    // Survey: residual 13.3 and a spread of 24 in the telling give about 15.2 when put together in quadrature.
    const told = only(tall('men', 1756.21 + 21, 'told'), 'popliteal_height');
    const measured = only(tall('men', 1756.21), 'popliteal_height');
    // The mean of a lognormal moves by a hair with its spread.
    expect(told.mean).toBeCloseTo(measured.mean, 0);
    expect(told.sd).toBeGreaterThan(measured.sd + 1);
    expect(told.sd).toBeLessThan(15.3);
    const women = only(tall('women', 1628.47 + 12, 'told'), 'popliteal_height');
    expect(women.mean).toBeCloseTo(only(tall('women', 1628.47), 'popliteal_height').mean, 0);
  });

  it('elbow rest height hardly follows from stature, so its range is as wide as the survey’s', () => {
    const { sd } = only(tall('women', 1600), 'elbow_rest_height');
    expect(sd).toBeCloseTo(26.1, 0);
  });
});

describe('several measures together', () => {
  // Means, spreads and correlations of the survey; the 95th percentiles of the sums counted from its rows.
  it.each([
    ['men', 1348.1, 51.5, 1434],
    ['women', 1244.8, 47.5, 1326],
  ] as const)('sitting on a knee-high seat, %s: spreads do not simply add', (group, mean, sd, counted) => {
    const estimate = model
      .predict(known(group))
      .estimate({ constant: 0, weights: { popliteal_height: 1, sitting_height: 1 } });
    expect(estimate.components[0]?.mean).toBeCloseTo(mean, 0);
    expect(estimate.components[0]?.sd).toBeCloseTo(sd, 0);
    expect(Math.abs(quantile(estimate, 0.95) - counted)).toBeLessThan(4);
  });

  it.each([
    ['men', 363.3, 38.0, 423],
    ['women', 360.9, 32.5, 413],
  ] as const)('knee before the belly, %s', (group, mean, sd, counted) => {
    const estimate = model
      .predict(known(group))
      .estimate({ constant: 0, weights: { buttock_knee_length: 1, abdominal_extension_depth_sitting: -1 } });
    expect(estimate.components[0]?.mean).toBeCloseTo(mean, 0);
    expect(estimate.components[0]?.sd).toBeCloseTo(sd, 0);
    expect(Math.abs(quantile(estimate, 0.95) - counted)).toBeLessThan(4);
  });

  it('standing shoulder height is read from the three measures it is made of', () => {
    const body = model.predict(tall('men', 1800));
    const sum = body.mean('acromial_height_sitting') + body.mean('stature') - body.mean('sitting_height');
    expect(body.mean('acromial_height')).toBeCloseTo(sum, 9);
    const given = model.predict(known('men', { measured: { acromial_height: 1480 } }));
    expect(given.mean('acromial_height')).toBeCloseTo(1480, 6);
    expect(given.mean('stature')).toBeGreaterThan(model.predict(known('men')).mean('stature'));
  });
});

describe('measures that say the same thing twice', () => {
  it('are read once', () => {
    const measured = { acromial_height: 1450, acromial_height_sitting: 605, sitting_height: 915 };
    const body = model.predict({ ...tall('men', 1756), measured });
    expect(body.mean('acromial_height_sitting')).toBe(605);
    expect(body.mean('popliteal_height')).toBeGreaterThan(400);
  });
});

describe('unknown sex', () => {
  it('a crowd of both has the mean and spread of the mixture', () => {
    // 50/50 crowd of the survey: shoulder breadth 480.4, spread 42.9.
    const estimate = model.predict(known('mixed')).estimate('bideltoid_breadth');
    const mean = bestValue(estimate);
    const variance = estimate.components.reduce(
      (sum, c) => sum + c.weight * (c.sd ** 2 + (c.mean - mean) ** 2),
      0,
    );
    expect(mean).toBeCloseTo(480.4, 0);
    expect(Math.sqrt(variance)).toBeCloseTo(42.9, 0);
  });

  it('weighs the sexes by how likely the known height is under each', () => {
    const shareOfMen = (mm: number) =>
      model.predict(tall('mixed', mm)).estimate('stature').components[1]?.weight ?? 0;
    expect(shareOfMen(1850)).toBeGreaterThan(0.97);
    expect(shareOfMen(1530)).toBeLessThan(0.03);
    // Ratio of the two densities at 1700, from the survey's means and spreads of the logs.
    const density = (x: number, mean: number, sd: number) =>
      Math.exp(-0.5 * ((Math.log(x) - mean) / sd) ** 2) / sd;
    const men = density(1700, 7.470155, 0.039024);
    const women = density(1700, 7.394622, 0.039432);
    expect(shareOfMen(1700)).toBeCloseTo(men / (men + women), 6);
  });
});

describe('percentile mannequins', () => {
  it('a woman, 5th in stature, is 1525 tall and has the conditional mean of the rest', () => {
    const person = model.mannequin({ bodyData: 'women', measure: 'stature', percentile: 5 });
    const body = model.predict(person);
    expect(body.mean('stature')).toBe(1525);
    expect(body.mean('popliteal_height')).toBeCloseTo(only(tall('women', 1525), 'popliteal_height').mean, 9);
    const estimate = body.estimate('elbow_rest_height');
    expect(estimate.measured).toBe(true);
    expect(range90(estimate).high - range90(estimate).low).toBe(0);
  });

  it('tabulated percentiles are the head counts of the survey', () => {
    expect(model.percentile('women', 'popliteal_height', 5)).toBeCloseTo(350, 9);
    expect(model.percentile('men', 'abdominal_extension_depth_sitting', 95)).toBeCloseTo(320, 9);
  });

  it('a percentile never falls as p rises', () => {
    const p = fc.double({ min: 0.01, max: 99.99, noNaN: true });
    const group = fc.constantFrom<BodyData>('women', 'men', 'mixed');
    fc.assert(
      fc.property(p, p, group, fc.constantFrom(...MEASURE_KEYS), (a, b, bodyData, key) => {
        const [low, high] = [Math.min(a, b), Math.max(a, b)];
        expect(model.percentile(bodyData, key, high)).toBeGreaterThanOrEqual(
          model.percentile(bodyData, key, low) - 1e-9,
        );
      }),
    );
  });

  it('refuses a percentile outside 0 to 100', () => {
    expect(() => model.percentile('men', 'stature', 100)).toThrow('percentile is 100');
  });
});

describe('knowing more', () => {
  const value = fc.double({ min: 0.9, max: 1.1, noNaN: true });
  const some = fc.uniqueArray(fc.constantFrom(...TAPE_MEASURE_KEYS), { maxLength: 5 });
  // The derived one is a sum whose parts may trade places.
  const single = MEASURE_KEYS.filter((key) => key !== 'acromial_height');
  const size = fc.option(
    fc.record({ mm: fc.integer({ min: 1500, max: 2000 }), kg: fc.integer({ min: 45, max: 140 }) }),
  );

  it('never widens a spread, taken as a share of the size', () => {
    fc.assert(
      fc.property(
        some,
        fc.constantFrom(...TAPE_MEASURE_KEYS),
        fc.constantFrom(...single),
        value,
        size,
        (keys, more, asked, factor, sized) => {
          const take = (list: readonly MeasureKey[]) =>
            known('men', {
              ...(sized
                ? { stature: { mm: sized.mm, source: 'measured' as const }, weightKg: sized.kg }
                : {}),
              measured: Object.fromEntries(
                list.map((key) => [key, model.percentile('men', key, 50) * factor]),
              ),
            });
          const share = ({ mean, sd }: { mean: number; sd: number }) =>
            asked === 'elbow_rest_height' ? sd : sd / mean;
          const before = share(only(take(keys), asked));
          const after = share(only(take([...keys, more]), asked));
          expect(after).toBeLessThanOrEqual(before * (1 + 1e-9));
        },
      ),
    );
  });

  it('a measured value is the value, and its probabilities are 0 or 1', () => {
    fc.assert(
      fc.property(
        fc.constantFrom(...TAPE_MEASURE_KEYS),
        fc.double({ min: 100, max: 900, noNaN: true }),
        (key, mm) => {
          const estimate = model.predict(known('women', { measured: { [key]: mm } })).estimate(key);
          expect(bestValue(estimate)).toBe(mm);
          expect(estimate.measured).toBe(true);
          expect(probabilityBetween(estimate, mm, mm)).toBe(1);
          expect(probabilityBetween(estimate, mm + 0.001, Infinity)).toBe(0);
        },
      ),
    );
  });

  it('a quantile never falls as p rises', () => {
    const estimate = model.predict(tall('mixed', 1690, 'told')).estimate('sitting_height');
    const p = fc.double({ min: 0.001, max: 0.999, noNaN: true });
    fc.assert(
      fc.property(p, p, (a, b) => {
        const [low, high] = [Math.min(a, b), Math.max(a, b)];
        expect(quantile(estimate, high)).toBeGreaterThanOrEqual(quantile(estimate, low) - 1e-9);
      }),
    );
  });
});

describe('what it refuses', () => {
  it.each([
    [known('men', { weightKg: -3 }), 'weightKg is -3; accepted: a number above 0'],
    [tall('men', Number.NaN), 'stature.mm is NaN; accepted: a number above 0'],
    [known('men', { measured: { popliteal_height: 0 } }), 'measured.popliteal_height is 0'],
  ])('names the field %#', (person, message) => {
    expect(() => model.predict(person)).toThrow(message);
  });
});
