import { describe, expect, it } from 'vitest';
import { ansur2, model } from '../../test/seed.ts';
import { createBodyModel } from '../people/body-model.ts';
import { quantile } from '../people/estimate.ts';
import { normalQuantile } from '../people/normal.ts';
import type { KnownPerson } from '../people/person.ts';
import { completeSummary } from './complete-summary.ts';
import { sobolWalk } from './sobol.ts';
import { summarise } from './summarise.ts';
import type { GroupColumns } from './survey-rows.ts';
import { readSurvey, type SurveyGroup } from './survey.ts';

const FRACTIONS = 4294967296;
const reference = readSurvey(ansur2);
const groups = ['men', 'women'] as const;

const person = (bodyData: SurveyGroup, stature: number, weight: number): KnownPerson => ({
  bodyData,
  measured: { stature, weight_kg: weight },
  shoeMm: 0,
  clothing: 'light',
});

/** People of the reference's own model, all of them heavier than its people are by a quarter. */
function heavier(group: SurveyGroup, count: number): GroupColumns {
  const { keys, mean, covariance } = reference.worked[group];
  const middle = (key: 'stature' | 'weight_kg'): [number, number] => {
    const at = keys.indexOf(key);
    return [mean[at] as number, Math.sqrt(covariance[at * keys.length + at] as number)];
  };
  const [s, sd] = middle('stature');
  const [w, wd] = middle('weight_kg');
  const columns = { stature: new Float64Array(count), weight_kg: new Float64Array(count) };
  const hip = new Float64Array(count);
  const walk = sobolWalk(3, 5, 0);
  for (let row = 0; row < count; row += 1) {
    const [a, b, c] = Array.from(walk.point, (x) => (x + 0.5) / FRACTIONS) as [number, number, number];
    const stature = Math.exp(s + sd * normalQuantile(a));
    const weight = Math.exp(w + 0.25 + wd * normalQuantile(b));
    columns.stature[row] = stature;
    columns.weight_kg[row] = weight;
    hip[row] = quantile(model.predict(person(group, stature, weight)).estimate('hip_breadth_sitting'), c);
    walk.next();
  }
  return { count, measures: new Map([...Object.entries(columns), ['hip_breadth_sitting', hip]]) as never };
}

describe.each([
  ['too few people to settle it', 300],
  ['enough people to settle it', 800],
])('a survey of heavier people drawn from the known model, %s', (_words, count) => {
  const people = { men: heavier('men', count), women: heavier('women', count) };
  const own = createBodyModel(completeSummary(summarise({ groups: people, faults: [] }, 'drawn'), reference));

  // One measure that was read, one that was filled in: both spread as they do in the model they were drawn from.
  it.each(
    groups.flatMap((group) =>
      (['hip_breadth_sitting', 'thigh_clearance'] as const).map((key) => [group, key] as const),
    ),
  )('%s, %s spreads about stature and weight as it does there', (group, key) => {
    const { stature, weight_kg: weight } = reference.stats[group];
    const sdOf = (of: typeof model, kg: number): number => {
      const [component] = of.predict(person(group, stature.mean, kg)).estimate(key).components;
      return component?.sd ?? 0;
    };
    for (const by of [1.1, 1.28, 1.45]) {
      const ratio = sdOf(own, weight.mean * by) / sdOf(model, weight.mean * by);
      expect([by, Math.abs(Math.log(ratio)) < 0.1 ? 'alike' : ratio]).toEqual([by, 'alike']);
    }
  });
});
