import { describe, expect, it } from 'vitest';
import { outsideCheck, type OutsideCheck } from '../../test/outside-check.ts';
import { ansur2, headCounts } from '../../test/seed.ts';
import { momentsOf, percentileOf, shareWithin, type Limit } from '../../test/shares.ts';
import type { MeasureKey } from '../measures/measures.ts';
import { onlyOf } from './mix.ts';
import { soldiers2012 } from './survey-population.ts';
import { readSurvey } from './survey.ts';

const soldiers = soldiers2012(readSurvey(ansur2));
const PEOPLE = 131_072;
const drawn = {
  men: onlyOf(soldiers, 'men').draw(PEOPLE, 2012),
  women: onlyOf(soldiers, 'women').draw(PEOPLE, 2012),
  both: soldiers.draw(PEOPLE, 2012),
};
const groups = ['men', 'women'] as const;
type Group = (typeof groups)[number];
const COUNTED = 'counted in the ANSUR II rows (4,082 men, 1,986 women)';

const points = (check: Pick<OutsideCheck, 'source' | 'what' | 'expected' | 'ours' | 'tolerance'>) =>
  outsideCheck({ ...check, unit: 'points' });
const mm = (check: Pick<OutsideCheck, 'source' | 'what' | 'expected' | 'ours' | 'tolerance'>) =>
  outsideCheck({ ...check, unit: 'mm' });
const column = (group: Group | 'both', key: MeasureKey) => drawn[group].columns[key];
const percentile = (group: Group | 'both', key: MeasureKey, percent: number) =>
  percentileOf(column(group, key), percent);
/** A sum of measures, person by person. */
const sumOf = (group: Group, parts: readonly (readonly [MeasureKey, number])[]) =>
  Float32Array.from({ length: PEOPLE }, (_, row) =>
    parts.reduce((sum, [key, factor]) => sum + factor * (column(group, key)?.[row] ?? NaN), 0),
  );

describe.each(groups)('head counts of %s', (group) => {
  const shares = headCounts.counts.map((count) => {
    const { passed, of } = count[group];
    return {
      ...count,
      counted: (100 * passed) / of,
      ours: shareWithin(drawn[group], count.limits as Limit[]),
    };
  });

  it.each(shares)('$name', ({ name, counted, ours }) => {
    const expected = Number(counted.toFixed(2));
    points({ source: COUNTED, what: `${group}, ${name}`, expected, ours, tolerance: 1.6 });
  });

  it('are met to 0.4 points on average', () => {
    const off = shares.map(({ counted, ours }) => Math.abs(ours - counted));
    expect(off).toHaveLength(41);
    expect(off.reduce((sum, x) => sum + x, 0) / off.length).toBeLessThan(0.4);
  });
});

describe.each<[Group, number[]]>([
  ['men', [90.4, 83.0, 78.5, 72.0, 67.2, 63.6, 62.7, 61.9, 61.2, 57.8, 56.5, 54.3, 52.3]],
  ['women', [90.0, 82.5, 76.8, 71.3, 65.7, 61.8, 61.2, 59.9, 59.0, 55.5, 53.8, 51.9, 49.7]],
])('%s between their 5th and 95th percentile in more and more measures', (group, kept) => {
  const order: readonly MeasureKey[] = [
    'sitting_height',
    'popliteal_height',
    'buttock_popliteal_length',
    'hip_breadth_sitting',
    'elbow_rest_height',
    'thigh_clearance',
    'buttock_knee_length',
    'eye_height_sitting',
    'knee_height_sitting',
    'forearm_forearm_breadth',
    'bideltoid_breadth',
    'abdominal_extension_depth_sitting',
    'foot_length',
  ];
  const limits = order.map((measure): Limit => {
    const { p } = ansur2.stats[group][measure];
    return { measure, low: p[1] ?? null, high: p[7] ?? null };
  });

  it.each(kept.map((expected, at) => [at + 1, expected] as const))('%d measures', (count, expected) => {
    const ours = shareWithin(drawn[group], limits.slice(0, count));
    const what = `${group} within 5 to 95 in ${count} measures from sitting height to foot length`;
    points({ source: COUNTED, what, expected, ours, tolerance: 2.5 });
  });

  it('each measure costs people', () => {
    const all = order.map((_, at) => shareWithin(drawn[group], limits.slice(0, at + 1)));
    expect(all.every((share, at) => at === 0 || share < (all[at - 1] as number))).toBe(true);
  });
});

describe('published drops', () => {
  it('sitting height and leg length, 90 falls to 83', () => {
    const { stats } = ansur2;
    const limits = (['sitting_height', 'popliteal_height'] as const).map((measure): Limit => {
      const { p } = stats.men[measure];
      return { measure, low: p[1] ?? null, high: p[7] ?? null };
    });
    const what = 'men within 5 to 95 in sitting height and leg length';
    points({
      source: 'Bradtmiller',
      what,
      expected: 83,
      ours: shareWithin(drawn.men, limits),
      tolerance: 2.5,
    });
  });

  it.each<[Group, number, number]>([
    ['men', 97, 97.9],
    ['women', 83, 86.2],
  ])('an office chair by height, depth and width, %s', (group, published, rebuilt) => {
    const ours = shareWithin(drawn[group], [
      { measure: 'popliteal_height', low: 355, high: 535 },
      { measure: 'buttock_popliteal_length', low: 430, high: null },
      { measure: 'hip_breadth_sitting', low: null, high: 450 },
    ]);
    const what = `${group}, chair height, depth and width together`;
    points({
      source: 'HFES chair (its width limit is not printed)',
      what,
      expected: published,
      ours,
      tolerance: 4,
    });
    points({ source: COUNTED, what, expected: rebuilt, ours, tolerance: 1.6 });
  });
});

describe.each<[Group, number[], number]>([
  ['men', [97.9, 97.3, 72.9, 69.9, 95.1], 57.5],
  ['women', [61.6, 88.3, 99.4, 91.6, 85.3], 49.1],
])('a bench of 407, 430 deep, for %s', (group, single, joint) => {
  const limits: readonly (readonly [string, Limit])[] = [
    ['feet', { measure: 'popliteal_height', low: 382, high: null }],
    ['depth', { measure: 'buttock_popliteal_length', low: 453, high: null }],
    ['elbows', { measure: 'forearm_forearm_breadth', low: null, high: 610 }],
    ['thighs', { measure: 'thigh_clearance', low: null, high: 187 }],
    ['hips', { measure: 'hip_breadth_sitting', low: null, high: 432 }],
  ];
  it('one by one and together', () => {
    limits.forEach(([name, limit], at) => {
      const ours = shareWithin(drawn[group], [limit]);
      const what = `${group}, bench of 407: ${name}`;
      points({ source: COUNTED, what, expected: single[at] ?? NaN, ours, tolerance: 2 });
    });
    const ours = shareWithin(
      drawn[group],
      limits.map(([, limit]) => limit),
    );
    points({
      source: COUNTED,
      what: `${group}, bench of 407: all five`,
      expected: joint,
      ours,
      tolerance: 2.5,
    });
    // A product of the five would say 46.2 and 42.3.
    expect(ours).toBeGreaterThan(single.reduce((product, share) => (product * share) / 100, 100) + 4);
  });
});

describe('percentiles do not add up', () => {
  it.each<[Group, number, number]>([
    ['men', 1434, 1448],
    ['women', 1326, 1340],
  ])('lower leg and sitting height, %s', (group, counted, stacked) => {
    const parts = ['popliteal_height', 'sitting_height'] as const;
    const together = percentileOf(
      sumOf(
        group,
        parts.map((key) => [key, 1]),
      ),
      95,
    );
    const sum = parts.reduce((total, key) => total + percentile(group, key, 95), 0);
    const what = `${group}, popliteal and sitting height`;
    mm({
      source: COUNTED,
      what: `${what}, 95th of the sum`,
      expected: counted,
      ours: together,
      tolerance: 4,
    });
    mm({ source: COUNTED, what: `${what}, sum of the 95ths`, expected: stacked, ours: sum, tolerance: 4 });
  });

  it.each<[Group, number]>([
    ['men', 423],
    ['women', 413],
  ])('knee before the belly, %s', (group, counted) => {
    const free = sumOf(group, [
      ['buttock_knee_length', 1],
      ['abdominal_extension_depth_sitting', -1],
    ]);
    const what = `${group}, buttock-knee less belly depth, 95th percentile`;
    mm({ source: COUNTED, what, expected: counted, ours: percentileOf(free, 95), tolerance: 4 });
  });

  it('seven stacked segments are far from the stature they should make', () => {
    // Read: the 5ths add up to 1368.9 and the 95ths to 1888.1, while the statures are these.
    const source = 'Robinette and McConville';
    const of = (percent: number) => percentile('women', 'stature', percent);
    mm({ source, what: 'women, stature, 5th percentile', expected: 1525, ours: of(5), tolerance: 15 });
    mm({ source, what: 'women, stature, 95th percentile', expected: 1730.6, ours: of(95), tolerance: 15 });
  });
});

describe('a crowd of as many women as men', () => {
  it.each<[MeasureKey, number, number, number, number, number]>([
    ['stature', 1692.3, 92.1, 1547, 1689, 1844],
    ['sitting_height', 887.5, 46.2, 813, 887, 964],
    ['elbow_rest_height', 238.7, 28.2, 192, 239, 284],
    ['popliteal_height', 409.0, 31.9, 358, 408, 461],
    ['knee_height_sitting', 532.7, 34.9, 477, 533, 590],
    ['buttock_popliteal_length', 494.0, 29.5, 448, 493, 543],
    ['thigh_clearance', 174.2, 16.1, 149, 173, 202],
    ['hip_breadth_sitting', 389.1, 33.0, 338, 387, 446],
    ['forearm_forearm_breadth', 537.4, 62.8, 443, 532, 647],
    ['abdominal_extension_depth_sitting', 242.2, 36.7, 189, 238, 308],
  ])('%s', (key, mean, sd, p5, p50, p95) => {
    const ours = momentsOf(column('both', key));
    const what = `women and men, ${key}`;
    mm({ source: COUNTED, what: `${what}, mean`, expected: mean, ours: ours.mean, tolerance: 0.5 });
    mm({ source: COUNTED, what: `${what}, spread`, expected: sd, ours: ours.sd, tolerance: 0.5 });
    for (const [percent, expected] of [
      [5, p5],
      [50, p50],
      [95, p95],
    ] as const) {
      const at = percentile('both', key, percent);
      mm({ source: COUNTED, what: `${what}, ${percent}th percentile`, expected, ours: at, tolerance: 4 });
    }
  });
});
