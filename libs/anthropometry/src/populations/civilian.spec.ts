import { spawnSync } from 'node:child_process';
import fs from 'node:fs';
import { fileURLToPath } from 'node:url';
import { describe, expect, it } from 'vitest';
import { CIVILIAN_SHARES } from '../../test/civilian-shares.ts';
import { outsideCheck } from '../../test/outside-check.ts';
import { civilian2015, headCounts } from '../../test/seed.ts';
import { momentsOf, percentileOf, shareWithin, type Limit } from '../../test/shares.ts';
import { civilians2015 } from './civilian.ts';
import { onlyOf } from './mix.ts';

const civilians = civilians2015(civilian2015);
const drawn = {
  men: onlyOf(civilians, 'men').draw(65_536, 2015),
  women: onlyOf(civilians, 'women').draw(65_536, 2015),
};
const groups = ['men', 'women'] as const;

describe.each(groups)('civilian %s on the benches of the head counts', (group) => {
  const source = 'NHANES 2015-16 with resampled ANSUR II residuals';
  it.each(CIVILIAN_SHARES)('%s', (name, men, women) => {
    const count = headCounts.counts.find((each) => each.name === name);
    const ours = shareWithin(drawn[group], count?.limits as Limit[]);
    outsideCheck({
      source,
      what: `share of ${group}, ${name}`,
      expected: group === 'men' ? men : women,
      ours,
      tolerance: 2.5,
      unit: 'points',
    });
  });

  it('are off by half a point on average', () => {
    const off = CIVILIAN_SHARES.map(([name, men, women]) => {
      const { limits } = headCounts.counts.find((each) => each.name === name) ?? { limits: [] };
      return Math.abs(shareWithin(drawn[group], limits as Limit[]) - (group === 'men' ? men : women));
    });
    expect(off.reduce((sum, x) => sum + x, 0) / off.length).toBeLessThan(0.5);
  });
});

describe.each([
  ['men', [1625, 1757, 1873], [61.7, 86.2, 129.3], 1753.1, 76.3, 29.1, 6.2],
  ['women', [1495, 1615, 1724], [50.2, 73.2, 119.9], 1614.4, 70.6, 29.7, 7.7],
] as const)('stature and weight of civilian %s', (group, statures, weights, mean, sd, bmi, bmiSd) => {
  const source = 'NHANES 2015-16, age 20 and more, examination weights';
  const { columns } = drawn[group];
  const bodyMass = Float32Array.from(
    columns.weight_kg ?? [],
    (kg, row) => kg / ((columns.stature?.[row] ?? NaN) / 1000) ** 2,
  );

  it('have the counted percentiles', () => {
    [5, 50, 95].forEach((percent, at) => {
      const what = `${percent}th percentile of ${group}`;
      const [mm, kg] = [statures[at] ?? NaN, weights[at] ?? NaN];
      const stature = percentileOf(columns.stature, percent);
      const weight = percentileOf(columns.weight_kg, percent);
      outsideCheck({
        source,
        what: `stature, ${what}`,
        expected: mm,
        ours: stature,
        tolerance: 3,
        unit: 'mm',
      });
      outsideCheck({
        source,
        what: `weight, ${what}`,
        expected: kg,
        ours: weight,
        tolerance: 0.5,
        unit: 'kg',
      });
    });
  });

  it('have the counted means and spreads', () => {
    const stature = momentsOf(columns.stature);
    const mass = momentsOf(bodyMass);
    const of = (what: string, expected: number, ours: number, tolerance: number, unit: 'mm' | '') => {
      outsideCheck({ source, what: `${what}, ${group}`, expected, ours, tolerance, unit });
    };
    of('mean stature', mean, stature.mean, 1, 'mm');
    of('spread of stature', sd, stature.sd, 1, 'mm');
    of('mean body mass index', bmi, mass.mean, 0.2, '');
    of('spread of body mass index', bmiSd, mass.sd, 0.2, '');
  });
});

it('is what the script makes of the rows', { timeout: 60_000 }, ({ skip }) => {
  const script = fileURLToPath(new URL('../../../../scripts/make-civilian-population.mjs', import.meta.url));
  const { status, stdout, stderr } = spawnSync(process.execPath, [script, '--print'], { encoding: 'utf8' });
  if (status === 2) {
    console.log(`skipped: ${stderr}`);
    skip(stderr);
  }
  const committed = new URL('../../../../seed-data/populations/civilian-2015.json', import.meta.url);
  expect(stdout).toBe(fs.readFileSync(committed, 'utf8'));
});

describe('a civilian file that does not hold together', () => {
  it.each([
    [{ measures: civilian2015.measures.slice(1) }, 'men holds 38, 38, 38, 38 rows; accepted: 37 each'],
    [{ about: { ...civilian2015.about, percentile_keys: [5, 95] } }, 'men has percentiles that fall'],
    [{ women: undefined }, 'women'],
  ])('is refused %#', (change, message) => {
    expect(() => civilians2015({ ...civilian2015, ...change })).toThrow(message);
  });
});
