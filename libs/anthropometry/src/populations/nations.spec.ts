import { describe, expect, it } from 'vitest';
import { outsideCheck } from '../../test/outside-check.ts';
import { ansur2, nations } from '../../test/seed.ts';
import { momentsOf, percentileOf } from '../../test/shares.ts';
import { MEASURE_KEYS, type MeasureKey } from '../measures/measures.ts';
import { mixOf, onlyOf } from './mix.ts';
import { nationalPopulations } from './nations.ts';
import type { SurveyGroup } from './survey.ts';
import { readSurvey } from './survey.ts';

const populations = nationalPopulations(nations, readSurvey(ansur2));
const named = (id: string) => {
  const found = populations.find((population) => population.id === id);
  if (!found) throw new Error(id);
  return found;
};
const drawn = new Map(
  populations.flatMap((population) =>
    population.groups.map(({ group }) => [
      `${population.id} ${group}`,
      onlyOf(population, group).draw(32_768, 7),
    ]),
  ),
);
const columnOf = (id: string, group: SurveyGroup, key: MeasureKey) =>
  drawn.get(`${id} ${group}`)?.columns[key];

const inputs = nations.populations.flatMap(({ id, men, women }) =>
  (
    [
      ['men', men],
      ['women', women],
    ] as const
  ).flatMap(([group, sizes]) =>
    Object.entries(sizes).map(
      ([key, size]) => [id, group, key as MeasureKey, size as (number | null)[]] as const,
    ),
  ),
);

describe('what was read', () => {
  it.each(inputs)('%s %s, %s, has its middle and its spread', (id, group, key, [, p50, , sd]) => {
    const { mean, sd: ours } = momentsOf(columnOf(id, group, key));
    expect(Math.abs(mean - (p50 ?? NaN))).toBeLessThan(0.5);
    if (typeof sd === 'number') expect(Math.abs(ours / sd - 1)).toBeLessThan(0.02);
  });
});

describe('printed sizes that did not go in', () => {
  const course = 'City University of Hong Kong, Online Anthropometry, chapter 2';
  const guide = 'KAN body-dimension guide, from Flügel et al. 1986';
  // The middle and the spread go in; where the spread was printed, the outer percentiles did not.
  const outer = inputs.filter(([, , , [, , , sd]]) => typeof sd === 'number');

  it.each(outer)('%s %s, %s, 5th and 95th percentile', (id, group, key, [p5, , p95]) => {
    const column = columnOf(id, group, key);
    for (const [percent, expected] of [
      [5, p5],
      [95, p95],
    ] as const) {
      outsideCheck({
        source: course,
        what: `${named(id).name}, ${group}, ${key}, ${percent}th percentile`,
        expected: expected ?? NaN,
        ours: percentileOf(column, percent),
        tolerance: 8,
        unit: 'mm',
      });
    }
  });

  it('British women, sitting height, which follows from the other measures', () => {
    const ours = percentileOf(columnOf('british', 'women', 'sitting_height'), 5);
    outsideCheck({
      source: course,
      what: 'British, women, sitting height, 5th percentile',
      expected: 795,
      ours,
      tolerance: 15,
      unit: 'mm',
    });
  });

  it('Germans, stature less sitting height', () => {
    const stature = columnOf('german', 'men', 'stature');
    const sitting = columnOf('german', 'men', 'sitting_height');
    const leg = stature?.map((value, row) => value - (sitting?.[row] ?? NaN));
    for (const [percent, expected] of [
      [5, 742],
      [50, 812],
      [95, 886],
    ] as const) {
      const what = `German men, stature less sitting height, ${percent}th percentile`;
      outsideCheck({
        source: guide,
        what,
        expected,
        ours: percentileOf(leg, percent),
        tolerance: 16,
        unit: 'mm',
      });
    }
  });
});

describe('national groups', () => {
  it('are estimated, know every measure, and count as read what both sexes were read in', () => {
    for (const population of populations) {
      expect(population.kind).toBe('estimated');
      expect(population.known).toEqual(new Set(MEASURE_KEYS));
    }
    expect(named('japanese').read).toEqual(new Set(['stature', 'hip_breadth_sitting']));
    expect(named('british').read.has('sitting_height')).toBe(false);
    expect(named('hong-kong').read.has('popliteal_height')).toBe(true);
  });

  it('hold no Germans but men', () => {
    expect(named('german').groups).toEqual([{ group: 'men', share: 1 }]);
    expect(() => mixOf(named('german'), named('german'), 0.5)).toThrow('has no women');
  });

  it('keep the ties between measures: long legs go with long thighs', () => {
    const [a, b] = (['popliteal_height', 'buttock_popliteal_length'] as const).map((key) =>
      columnOf('hong-kong', 'women', key),
    );
    const [one, other] = [momentsOf(a), momentsOf(b)];
    const products = a?.map((value, row) => (value - one.mean) * ((b?.[row] ?? NaN) - other.mean));
    expect(momentsOf(products).mean / (one.sd * other.sd)).toBeGreaterThan(0.55);
  });

  it('are refused where a source or a spread is missing', () => {
    const [first] = nations.populations;
    const one = (change: object) => () =>
      nationalPopulations({ ...nations, populations: [{ ...first, ...change }] }, readSurvey(ansur2));
    expect(one({ source: 'hearsay' })).toThrow('british.source is hearsay; accepted: course, guide');
    expect(one({ men: { stature: [null, 1740, null, null] } })).toThrow('british.men.stature has no spread');
    expect(one({ men: { stature: [1, 2] } })).toThrow('National groups: populations.0.men.stature');
  });
});
