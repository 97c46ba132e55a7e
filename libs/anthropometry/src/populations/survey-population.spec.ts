import { describe, expect, it } from 'vitest';
import { ansur2 } from '../../test/seed.ts';
import { momentsOf } from '../../test/shares.ts';
import { MEASURE_KEYS, type MeasureKey } from '../measures/measures.ts';
import { completeSummary } from './complete-summary.ts';
import { mixOf, mixPopulations, onlyOf } from './mix.ts';
import { summarise } from './summarise.ts';
import { ownPopulation, soldiers2012 } from './survey-population.ts';
import { readSurvey } from './survey.ts';

const reference = readSurvey(ansur2);
const soldiers = soldiers2012(reference);

describe('a survey of one’s own', () => {
  // 600 people drawn from soldiers, each 20 mm longer in the lower leg, stand for the people a workshop measured.
  const measured = ['stature', 'weight_kg', 'popliteal_height', 'elbow_rest_height'] as const;
  const longerMm = 20;
  const tableOf = (group: 'women' | 'men') => {
    const { columns, count } = onlyOf(soldiers, group).draw(600, 8);
    const column = (key: MeasureKey) =>
      Float64Array.from(columns[key] ?? [], (x) => (key === 'popliteal_height' ? x + longerMm : x));
    return { count, measures: new Map<MeasureKey, Float64Array>(measured.map((key) => [key, column(key)])) };
  };
  const groups = { women: tableOf('women'), men: tableOf('men') };
  const summary = completeSummary(summarise({ groups, faults: [] }, 'a table of ours'), reference);
  const own = ownPopulation(readSurvey(summary), {
    id: 'ours',
    name: 'Our visitors',
    source: 'a table of ours',
    licence: 'our own',
  });

  it('is of its own kind, and tells what was read from what was estimated', () => {
    expect(own.kind).toBe('own');
    expect(own.read).toEqual(new Set(measured));
    expect(own.known).toEqual(new Set(MEASURE_KEYS));
  });

  it('tells how many were measured, also where it is mixed with others', () => {
    expect(own.surveyed).toEqual({ women: 600, men: 600 });
    expect(soldiers.surveyed).toEqual({ women: 1986, men: 4082 });
    expect(mixOf(own, soldiers, 0.3).surveyed).toEqual({ women: 600, men: 4082 });
    expect(onlyOf(own, 'men').surveyed).toEqual({ men: 600 });
    // Half of either: 1 / (0.25/600 + 0.25/1986) women.
    const both = [own, soldiers].map((population) => ({ population, share: 0.5 }));
    expect(mixPopulations(both).surveyed?.women).toBeCloseTo(1843, 0);
    const { surveyed: _, ...untold } = soldiers;
    const half = [own, untold].map((population) => ({ population, share: 0.5 }));
    expect(mixPopulations(half).surveyed).toEqual({});
  });

  it.each(['women', 'men'] as const)('has the means and spreads of the %s measured', (group) => {
    const { columns } = onlyOf(own, group).draw(20_000, 1);
    for (const key of measured) {
      const ours = momentsOf(columns[key]);
      const theirs = momentsOf(Float32Array.from(groups[group].measures.get(key) ?? []));
      expect(Math.abs(ours.mean - theirs.mean)).toBeLessThan(0.05 * theirs.sd);
      expect(Math.abs(ours.sd / theirs.sd - 1)).toBeLessThan(0.05);
    }
  });

  it('takes what it did not read with it: longer lower legs, longer thighs', () => {
    const of = (population: typeof own) =>
      momentsOf(onlyOf(population, 'men').draw(20_000, 1).columns.buttock_popliteal_length).mean;
    expect(of(own)).toBeGreaterThan(of(soldiers) + 3);
  });
});
