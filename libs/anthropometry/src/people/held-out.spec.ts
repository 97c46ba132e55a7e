import { beforeAll, describe, expect, it } from 'vitest';
import { rawSurvey } from '../../test/raw-survey.ts';
import { ansur2 } from '../../test/seed.ts';
import { TAPE_MEASURE_KEYS, type MeasureKey } from '../measures/measures.ts';
import { completeSummary } from '../populations/complete-summary.ts';
import { summarise } from '../populations/summarise.ts';
import {
  readPeople,
  type GroupColumns,
  type PeopleTable,
  type ReadPeople,
} from '../populations/survey-rows.ts';
import { readSurvey, type SurveyGroup } from '../populations/survey.ts';
import { createBodyModel } from './body-model.ts';
import { probabilityBetween } from './estimate.ts';
import type { KnownPerson } from './person.ts';

const raw = rawSurvey();
const FOLDS = 10;
const KNOWN = [
  ['stature'],
  ['stature', 'weight_kg'],
  ['stature', 'weight_kg', 'elbow_rest_height'],
] as const satisfies readonly (readonly MeasureKey[])[];
const groups = ['men', 'women'] as const;

/** Which people lie within the 90 % range that was made without them, by group, known measures and measure. */
const inside = new Map<string, Uint8Array>();
const nameOf = (group: SurveyGroup, known: readonly MeasureKey[], key: MeasureKey) =>
  [group, known.join('+'), key].join(', ');

function foldOf(columns: GroupColumns, keep: (row: number) => boolean): GroupColumns {
  const measures = new Map(
    [...columns.measures].map(([key, values]) => [key, values.filter((_, row) => keep(row))]),
  );
  return { count: measures.get('stature')?.length ?? 0, measures };
}

// Outside check: the rows of the ANSUR II public file. Every person is predicted by a model that was made of the
// other nine tenths.
describe.skipIf(!raw)('people who took no part in the model', () => {
  let people: ReadPeople;

  beforeAll(() => {
    people = readPeople(raw as PeopleTable);
    const reference = readSurvey(ansur2);
    for (let fold = 0; fold < FOLDS; fold += 1) {
      const others = {
        men: foldOf(people.groups.men, (row) => row % FOLDS !== fold),
        women: foldOf(people.groups.women, (row) => row % FOLDS !== fold),
      };
      const model = createBodyModel(
        completeSummary(summarise({ groups: others, faults: [] }, 'rows'), reference),
      );
      for (const group of groups) {
        const { measures, count } = people.groups[group];
        const at = (key: MeasureKey, row: number) => measures.get(key)?.[row] as number;
        for (let row = fold; row < count; row += FOLDS) {
          for (const known of KNOWN) {
            const person: KnownPerson = {
              bodyData: group,
              measured: Object.fromEntries(known.map((key) => [key, at(key, row)])),
              shoeMm: 0,
              clothing: 'light',
            };
            const body = model.predict(person);
            for (const key of measures.keys()) {
              if ((known as readonly MeasureKey[]).includes(key)) continue;
              const name = nameOf(group, known, key);
              let hits = inside.get(name);
              if (!hits) inside.set(name, (hits = new Uint8Array(count)));
              const share = probabilityBetween(body.estimate(key), -Infinity, at(key, row));
              hits[row] = share >= 0.05 && share <= 0.95 ? 1 : 0;
            }
          }
        }
      }
    }
  }, 600_000);

  const shareIn = (hits: Uint8Array, rows: readonly number[]) =>
    rows.reduce((sum, row) => sum + (hits[row] as number), 0) / rows.length;

  it.each(groups)('%s lie within the range of nine tenths, 88 to 92 in 100', (group) => {
    const all = Array.from({ length: people.groups[group].count }, (_, row) => row);
    const cells = [...inside].filter(([name]) => name.startsWith(`${group},`));
    expect(cells).toHaveLength(26 + 25 + 24);
    const shares = cells.map(([name, hits]) => [name, shareIn(hits, all)] as const);
    shares.sort(([, a], [, b]) => a - b);
    console.info(`90 % range, ${group}:`, shares[0], shares.at(-1));
    expect(shares.filter(([, share]) => share < 0.88 || share > 0.92)).toEqual([]);
  });

  it.each(groups)('%s do so in each extreme tenth, 86 to 94 in 100 once weight is known', (group) => {
    const { measures, count } = people.groups[group];
    const stature = measures.get('stature') as Float64Array;
    const weight = measures.get('weight_kg') as Float64Array;
    const bmi = weight.map((kg, row) => kg / (stature[row] as number) ** 2);
    const shares: (readonly [string, number])[] = [];
    for (const [what, values] of [
      ['stature', stature],
      ['weight', weight],
      ['BMI', bmi],
    ] as const) {
      const order = Array.from(values.keys()).sort((a, b) => (values[a] as number) - (values[b] as number));
      const tenth = Math.floor(count / 10);
      for (const [end, rows] of [
        ['least', order.slice(0, tenth)],
        ['most', order.slice(-tenth)],
      ] as const) {
        for (const known of KNOWN.slice(1)) {
          for (const key of TAPE_MEASURE_KEYS) {
            const hits = inside.get(nameOf(group, known, key));
            if (hits) shares.push([`${nameOf(group, known, key)}, ${end} ${what}`, shareIn(hits, rows)]);
          }
        }
      }
    }
    shares.sort(([, a], [, b]) => a - b);
    console.info(`extreme tenths, ${group}:`, shares[0], shares.at(-1));
    expect(shares).toHaveLength(6 * (13 + 12));
    expect(shares.filter(([, share]) => share < 0.86 || share > 0.94)).toEqual([]);
  });
});
