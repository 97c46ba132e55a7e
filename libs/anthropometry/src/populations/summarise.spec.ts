import { beforeAll, describe, expect, it } from 'vitest';
import { rawSurvey } from '../../test/raw-survey.ts';
import { ansur2 } from '../../test/seed.ts';
import { createBodyModel } from '../people/body-model.ts';
import type { MeasureKey } from '../measures/measures.ts';
import { completeSummary } from './complete-summary.ts';
import { fillGaps } from './fill-gaps.ts';
import { readPeople, type PeopleTable } from './survey-rows.ts';
import { readSurvey } from './survey.ts';
import { summarise } from './summarise.ts';
import type { Worked } from './worked.ts';

const reference = readSurvey(ansur2);
const raw = rawSurvey();
const groups = ['men', 'women'] as const;

/** People drawn from the survey's model, as a table that someone might bring. */
function broughtTable(keys: readonly MeasureKey[], count = 300): PeopleTable {
  const crowd = { bodyData: 'mixed', measured: {}, shoeMm: 0, clothing: 'medium' } as const;
  const { columns, isWoman } = createBodyModel(ansur2).predict(crowd).sample(count, 7);
  return {
    sex: { name: 'sex', values: Array.from(isWoman, (woman) => (woman ? 'F' : 'm')) },
    measures: Object.fromEntries(
      keys.map((key) => [
        key,
        {
          name: key,
          values: Array.from(columns[key] as Float32Array, (x) => x.toFixed(1)),
          unit: key === 'weight_kg' ? ('kg' as const) : ('mm' as const),
        },
      ]),
    ),
  };
}
const FEW = ['stature', 'weight_kg', 'sitting_height', 'popliteal_height'] as const;

describe.skipIf(!raw)('the shipped summary', () => {
  // Outside check: the 6,068 rows of the ANSUR II public file give what was published of them, to the printed digit.
  let people: ReturnType<typeof readPeople>;
  let made: ReturnType<typeof summarise>;
  const shipped = ansur2 as unknown as ReturnType<typeof summarise>;
  beforeAll(() => {
    people = readPeople(raw as PeopleTable);
    made = summarise(people, 'rows');
  });

  it('reads every row', () => {
    expect(people.faults).toEqual([]);
    expect([people.groups.men.count, people.groups.women.count]).toEqual([4082, 1986]);
    expect(made.measures).toHaveLength(27);
  });

  it.each(groups)('holds the statistics of the rows, %s', (group) => {
    for (const key of [...made.measures, 'age'] as const) {
      expect([key, shipped.stats[group][key]]).toEqual([key, made.stats[group][key]]);
    }
    made.measures.forEach((a, i) =>
      made.measures.slice(i).forEach((b, offset) => {
        const [row, column] = [shipped.measures.indexOf(a), shipped.measures.indexOf(b)];
        const r = shipped.corr[group][Math.min(row, column)]?.[Math.abs(row - column)];
        expect([a, b, r]).toEqual([a, b, made.corr[group][i]?.[offset]]);
      }),
    );
  });

  it.each(groups)('holds the regressions of the rows, %s', (group) => {
    for (const block of ['reg_stature', 'reg_stature_weight', 'reg_stature_lnweight'] as const) {
      expect(shipped[block][group]).toMatchObject(made[block][group]);
    }
  });

  it('holds the logs and the growth of the spread of the rows', () => {
    expect(shipped.log).toEqual(made.log);
    expect(shipped.spread).toEqual(made.spread);
  });
});

describe('the regressions as they were printed', () => {
  // Outside check: ANSUR II on stature, computed apart from this code: intercept, slope, residual spread, share
  // explained, then residual spread and share with weight too.
  it.each([
    ['men', 'popliteal_height', -107.0, 0.3056, 13.3, 0.71, 12.5, 0.75],
    ['men', 'sitting_height', 205.8, 0.4057, 22.4, 0.61, 22.3, 0.61],
    ['men', 'eye_height_sitting', 158.0, 0.3681, 21.5, 0.58, 21.5, 0.58],
    ['men', 'elbow_rest_height', 116.3, 0.0733, 28.2, 0.03, 26.9, 0.12],
    ['men', 'buttock_popliteal_length', -32.9, 0.3051, 17.7, 0.58, 17.5, 0.59],
    ['men', 'buttock_knee_length', -9.0, 0.357, 18.4, 0.64, 15.9, 0.73],
    ['men', 'knee_height_sitting', -83.8, 0.3633, 12.7, 0.79, 12.4, 0.8],
    ['men', 'hip_breadth_sitting', 96.3, 0.1612, 28.1, 0.13, 14.1, 0.78],
    ['men', 'thigh_clearance', 80.6, 0.0569, 15.1, 0.06, 8.4, 0.71],
    ['men', 'forearm_forearm_breadth', 303.3, 0.1575, 49.8, 0.04, 27.0, 0.72],
    ['men', 'abdominal_extension_depth_sitting', 116.7, 0.0786, 36.9, 0.02, 18.1, 0.76],
    ['women', 'popliteal_height', -94.1, 0.2962, 14.0, 0.65, 13.1, 0.69],
    ['women', 'sitting_height', 215.8, 0.3935, 21.3, 0.58, 21.3, 0.58],
    ['women', 'eye_height_sitting', 181.1, 0.3479, 20.6, 0.54, 20.6, 0.54],
    ['women', 'elbow_rest_height', 155.7, 0.0471, 26.1, 0.01, 26.0, 0.02],
    ['women', 'buttock_popliteal_length', -47.0, 0.3267, 19.6, 0.53, 18.5, 0.59],
    ['women', 'buttock_knee_length', -27.9, 0.3798, 21.6, 0.56, 17.2, 0.72],
    ['women', 'knee_height_sitting', -90.9, 0.3698, 13.0, 0.77, 12.6, 0.78],
    ['women', 'hip_breadth_sitting', 92.2, 0.1883, 30.4, 0.14, 18.1, 0.7],
    ['women', 'thigh_clearance', 52.9, 0.0706, 13.3, 0.1, 7.6, 0.71],
    ['women', 'forearm_forearm_breadth', 187.4, 0.1888, 39.2, 0.09, 23.9, 0.66],
    ['women', 'abdominal_extension_depth_sitting', 90.5, 0.0855, 31.0, 0.03, 16.9, 0.71],
  ] as const)('%s, %s', (group, key, intercept, slope, sd, share, sdToo, shareToo) => {
    const [a = 0, b = 0, left = 0, r2 = 0] = ansur2.reg_stature[group][key];
    const [, , , leftToo = 0, r2Too = 0] = ansur2.reg_stature_weight[group][key];
    // The shipped figures have a digit more; half a unit of the printed one apart is the same figure.
    const half = (places: number) => 0.5 / 10 ** places + 1e-9;
    expect(Math.abs(a - intercept)).toBeLessThanOrEqual(half(1));
    expect(Math.abs(b - slope)).toBeLessThanOrEqual(half(4));
    expect(Math.abs(left - sd)).toBeLessThanOrEqual(half(1));
    expect(Math.abs(leftToo - sdToo)).toBeLessThanOrEqual(half(1));
    expect(Math.abs(r2 - share)).toBeLessThanOrEqual(half(2));
    expect(Math.abs(r2Too - shareToo)).toBeLessThanOrEqual(half(2));
  });
});

describe('a table that someone brings', () => {
  it('is read in its own units', () => {
    const table = broughtTable(FEW);
    const inches: PeopleTable = structuredClone(table);
    inches.decimalComma = true;
    for (const [key, unit, per] of [
      ['stature', 'in', 25.4],
      ['weight_kg', 'lb', 0.45359237],
      ['sitting_height', 'cm', 10],
      ['popliteal_height', 'm', 1000],
    ] as const) {
      const { name, values } = table.measures[key] as NonNullable<(typeof table.measures)['stature']>;
      const changed = values.map((text) => (Number(text) / per).toFixed(6).replace('.', ','));
      inches.measures[key] = { name, unit, values: changed };
    }
    const [a, b] = [readPeople(table, reference), readPeople(inches, reference)];
    expect(b.faults).toEqual(a.faults);
    for (const key of FEW) {
      b.groups.women.measures.get(key)?.forEach((x, row) => {
        expect(Math.abs(x - (a.groups.women.measures.get(key)?.[row] ?? 0))).toBeLessThan(0.001);
      });
    }
  });

  it('names what it could not read, and leaves those rows out', () => {
    const table = broughtTable(FEW, 200);
    const spoil = (key: MeasureKey, row: number, text: string) => {
      (table.measures[key]?.values as string[])[row] = text;
    };
    spoil('stature', 3, '175.3');
    spoil('weight_kg', 5, '');
    spoil('sitting_height', 5, '9e2');
    (table.sex.values as string[])[9] = 'x';
    const { faults, groups: read } = readPeople(table, reference);
    expect(faults).toEqual([
      { row: 4, field: 'stature', read: '175.3', accepted: '881 to 3190 mm' },
      { row: 6, field: 'weight_kg', read: '', accepted: '14 to 369 kg' },
      { row: 6, field: 'sitting_height', read: '9e2', accepted: '469 to 1660 mm' },
      { row: 10, field: 'sex', read: 'x', accepted: 'f, w, female, woman, women, m, male, man, men' },
    ]);
    expect(read.men.count + read.women.count).toBe(197);
  });

  it('refuses a unit of the wrong kind and too few people', () => {
    const table = broughtTable(FEW, 200);
    const wrong = structuredClone(table);
    (wrong.measures.stature as { unit: string }).unit = 'kg';
    expect(() => readPeople(wrong)).toThrow('stature: unit is kg; accepted for stature: mm, cm, m, in');
    expect(() => summarise(readPeople(broughtTable(FEW, 40)), 'few')).toThrow('accepted: 30 or more');
    expect(() => summarise(readPeople(broughtTable(['stature'], 200)), 'no weight')).toThrow(
      'weight_kg is missing',
    );
  });

  it('is completed from the reference, what is estimated marked', () => {
    const whole = completeSummary(summarise(readPeople(broughtTable(FEW, 3000)), 'ours'), reference);
    expect(whole.read).toEqual([...FEW]);
    expect(whole.estimated).toHaveLength(37);
    const survey = readSurvey(JSON.parse(JSON.stringify(whole)));
    expect([...survey.read]).toEqual([...FEW]);
    // The people were drawn from the reference, so what is filled in is the reference again.
    for (const group of groups) {
      for (const key of [
        'knee_height_sitting',
        'thigh_clearance',
        'elbow_rest_height',
        'acromial_height',
      ] as const) {
        const [ours, theirs] = [survey.stats[group][key], reference.stats[group][key]];
        expect(Math.abs(ours.mean - theirs.mean)).toBeLessThan(0.1 * theirs.sd);
        expect(Math.abs(ours.sd / theirs.sd - 1)).toBeLessThan(0.06);
      }
    }
  });
});

describe('filling gaps', () => {
  const part = (worked: Worked, keys: readonly MeasureKey[]): Worked => {
    const places = keys.map((key) => worked.keys.indexOf(key));
    const size = worked.keys.length;
    return {
      keys,
      mean: Float64Array.from(places, (i) => worked.mean[i] as number),
      covariance: Float64Array.from(
        places.flatMap((i) => places.map((j) => worked.covariance[i * size + j] as number)),
      ),
    };
  };

  it.each(groups)('gives the reference back from a part of itself, %s', (group) => {
    const { worked, estimated } = fillGaps(reference.worked[group], part(reference.worked[group], FEW));
    expect(estimated).toHaveLength(36);
    worked.covariance.forEach((c, at) => {
      expect(c).toBeCloseTo(reference.worked[group].covariance[at] as number, 9);
    });
    worked.mean.forEach((m, at) => expect(m).toBeCloseTo(reference.worked[group].mean[at] as number, 9));
  });

  it('moves what follows from a measure along with it', () => {
    const known = part(reference.worked.men, ['stature']);
    known.mean[0] = Math.log(1656);
    const { worked } = fillGaps(reference.worked.men, known);
    // 0.3056 x 1656 - 107.0: the survey's line.
    const place = worked.keys.indexOf('popliteal_height');
    expect(Math.abs(Math.exp(worked.mean[place] as number) - 399.1)).toBeLessThan(1);
  });

  it('refuses a measure that the reference lacks', () => {
    const known = { ...part(reference.worked.men, ['stature']), keys: ['acromial_height' as const] };
    expect(() => fillGaps(reference.worked.men, known)).toThrow('acromial_height is not in the reference');
  });
});
