import { describe, it } from 'vitest';
import { outsideCheck } from '../../test/outside-check.ts';
import { ansur2, civilian2015 } from '../../test/seed.ts';
import { momentsOf, percentileOf } from '../../test/shares.ts';
import type { MeasureKey } from '../measures/measures.ts';
import { normalQuantile } from '../people/normal.ts';
import { civilians2015 } from './civilian.ts';
import { onlyOf } from './mix.ts';
import { soldiers2012 } from './survey-population.ts';
import { readSurvey, type SurveyGroup } from './survey.ts';

const of = (population: ReturnType<typeof civilians2015>) => ({
  men: onlyOf(population, 'men').draw(65_536, 5).columns,
  women: onlyOf(population, 'women').draw(65_536, 5).columns,
});
const soldiers = of(soldiers2012(readSurvey(ansur2)));
const civilians = of(civilians2015(civilian2015));
const groups = ['men', 'women'] as const;
/** Two in a hundred. */
const NEAR = 0.02;
const WITHIN_MM = 15;
const KG_PER_LB = 0.45359237;
const MM_PER_IN = 25.4;

const kg = (what: string, source: string, lb: number, ours: number) => {
  const expected = Number((lb * KG_PER_LB).toFixed(2));
  outsideCheck({ source, what, expected, ours, tolerance: Number((NEAR * expected).toFixed(2)), unit: 'kg' });
};
const mm = (what: string, source: string, expected: number, ours: number, tolerance = WITHIN_MM) =>
  outsideCheck({ source, what, expected: Number(expected.toFixed(1)), ours, tolerance, unit: 'mm' });

describe('US adults', () => {
  const report = 'summary of NCHS National Health Statistics Report 122 (2015-16)';
  const release = 'NCHS press release on Series 3 No. 39 (2011-14)';

  it.each<[SurveyGroup, number, number, number, number]>([
    ['men', 197.9, 29.1, 69.25, 195.7],
    ['women', 170.6, 29.6, 63.75, 168.5],
  ])('%s', (group, lb, bmi, heightIn, earlierLb) => {
    const { stature, weight_kg: weight } = civilians[group];
    const { mean } = momentsOf(weight);
    const mass = Float32Array.from(weight ?? [], (x, row) => x / ((stature?.[row] ?? NaN) / 1000) ** 2);
    kg(`civilian ${group}, mean weight`, report, lb, mean);
    const ours = momentsOf(mass).mean;
    const what = `civilian ${group}, mean body mass index`;
    outsideCheck({ source: report, what, expected: bmi, ours, tolerance: 0.3, unit: '' });
    mm(`civilian ${group}, mean stature`, release, heightIn * MM_PER_IN, momentsOf(stature).mean);
    kg(`civilian ${group}, mean weight`, release, earlierLb, mean);
  });

  it('men, mean height', () => {
    mm('civilian men, mean stature', report, 69.1 * MM_PER_IN, momentsOf(civilians.men.stature).mean);
  });

  it.each<[SurveyGroup, number]>([
    ['men', 40.2],
    ['women', 38.6],
  ])('waists of %s come out small: another waist line, and older people', (group, waistIn) => {
    const ours = momentsOf(civilians[group].waist_circumference).mean;
    mm(`civilian ${group}, mean waist (known to come out small)`, report, waistIn * MM_PER_IN, ours, 60);
  });

  it.each<[SurveyGroup, number[], number]>([
    ['men', [1640, 1755, 1870], 71],
    ['women', [1520, 1625, 1730], 64],
  ])('stature of %s, 19 to 65', (group, expected, sd) => {
    const source = 'City University of Hong Kong, Online Anthropometry, chapter 2';
    const { stature } = civilians[group];
    [5, 50, 95].forEach((percent, at) => {
      const ours = percentileOf(stature, percent);
      const printed = expected[at] ?? NaN;
      const tolerance = Math.round(NEAR * printed);
      mm(`US ${group} 19 to 65, stature, ${percent}th percentile`, source, printed, ours, tolerance);
    });
    mm(`US ${group} 19 to 65, spread of stature`, source, sd, momentsOf(stature).sd);
  });

  it.each<[SurveyGroup, [MeasureKey, number][]]>([
    [
      'men',
      [
        ['stature', 2.85],
        ['sitting_height', 1.48],
        ['buttock_popliteal_length', 1.21],
      ],
    ],
    [
      'women',
      [
        ['stature', 2.58],
        ['sitting_height', 1.48],
        ['buttock_popliteal_length', 1.29],
      ],
    ],
  ])('spreads of %s in 1960 to 1962', (group, spreads) => {
    for (const [key, inches] of spreads) {
      const ours = momentsOf(civilians[group][key]).sd;
      mm(
        `US ${group}, spread of ${key}`,
        'NCHS Series 11 No. 8 (1960-62), errata',
        inches * MM_PER_IN,
        ours,
        6,
      );
    }
  });
});

describe('soldiers of 2012 beside other tables', () => {
  const handout = 'Huston 2009, in a University of Rhode Island handout';
  it.each<[SurveyGroup, MeasureKey, number, number, number]>([
    ['men', 'sitting_height', 859, 927, 975],
    ['women', 'sitting_height', 797, 853, 911],
    ['men', 'eye_height_sitting', 743, 800, 855],
    ['women', 'eye_height_sitting', 692, 743, 791],
    ['men', 'buttock_knee_length', 558, 605, 660],
    ['women', 'buttock_knee_length', 531, 578, 628],
    ['men', 'knee_height_sitting', 506, 553, 599],
    ['women', 'knee_height_sitting', 461, 502, 546],
  ])('%s, %s', (group, key, ...printed) => {
    [5, 50, 95].forEach((percent, at) => {
      const ours = percentileOf(soldiers[group][key], percent);
      // Women's buttock-knee length at the 95th is 18 longer than printed.
      mm(`${group}, ${key}, ${percent}th percentile`, handout, printed[at] ?? NaN, ours, 20);
    });
  });

  it('popliteal range of chairs', () => {
    const source = 'human-factors textbook excerpt on chairs';
    const of5 = percentileOf(soldiers.women.popliteal_height, 5);
    const of95 = percentileOf(soldiers.men.popliteal_height, 95);
    mm('women, popliteal height, 5th percentile', source, 360, of5, 20);
    mm('men, popliteal height, 95th percentile', source, 490, of95, 20);
  });

  it('sitting height of German women at the 95th', () => {
    const source = 'KAN body-dimension guide';
    mm(
      'women, sitting height, 95th percentile',
      source,
      905,
      percentileOf(soldiers.women.sitting_height, 95),
    );
  });

  it('the 99th of a normal', () => {
    const source = 'NATICK/TR-89/044 stature, 1755.8 with a spread of 66.8';
    mm('men of 1988, stature, 99th percentile', source, 1911, 1755.8 + normalQuantile(0.99) * 66.8, 1);
  });
});

describe('soldiers of 2012 beside those of 1988', () => {
  const source = 'ANSUR 1988 rows (1,774 men, 2,208 women)';
  it.each<[MeasureKey, number, number]>([
    ['stature', 1755.8, 1629.4],
    ['sitting_height', 913.9, 852.0],
    ['eye_height_sitting', 792.0, 738.7],
    ['acromial_height_sitting', 597.8, 555.5],
    ['elbow_rest_height', 230.6, 220.5],
    ['popliteal_height', 434.1, 389.4],
    ['knee_height_sitting', 558.8, 515.4],
    ['buttock_popliteal_length', 500.4, 481.7],
    ['buttock_knee_length', 616.4, 588.9],
    ['thigh_clearance', 168.2, 158.9],
    ['hip_breadth_sitting', 366.8, 384.5],
    ['abdominal_extension_depth_sitting', 239.1, 222.3],
  ])('%s', (key, ...means) => {
    groups.forEach((group, at) => {
      const ours = momentsOf(soldiers[group][key]).mean;
      mm(
        `${group}, mean ${key}`,
        source,
        means[at] ?? NaN,
        ours,
        key.startsWith('abdominal') ? 16 : WITHIN_MM,
      );
    });
  });
});
