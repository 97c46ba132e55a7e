import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { ansur2 } from '../../test/seed.ts';
import { MEASURE_KEYS, type MeasureKey } from '../measures/measures.ts';
import { normalQuantile } from '../people/normal.ts';
import { mixOf, mixPopulations, onlyOf } from './mix.ts';
import type { Draws, Population } from './population.ts';
import { quickQuantile } from './quick-normal.ts';
import { MOST_DIMENSIONS, sobolWalk } from './sobol.ts';
import { soldiers2012 } from './survey-population.ts';
import { readSurvey } from './survey.ts';

const soldiers = soldiers2012(readSurvey(ansur2));

const shareOfWomen = ({ isWoman, count }: Draws) => isWoman.reduce((sum, x) => sum + x, 0) / count;
const columnOf = (draws: Draws, key: MeasureKey) => draws.columns[key] as Float32Array;

const ASKED = [
  'popliteal_height',
  'buttock_popliteal_length',
  'thigh_clearance',
  'elbow_rest_height',
  'forearm_forearm_breadth',
] as const;

/** Shares in points of people whose feet reach, who fit under a table, whose elbows meet a sill, and of all three. */
function shares(population: Population, seed: number): number[] {
  const draws = population.draw(40_000, seed, 0, ASKED);
  const at = (key: MeasureKey, row: number) => columnOf(draws, key)[row] as number;
  const counts = [0, 0, 0, 0, 0];
  for (let row = 0; row < draws.count; row += 1) {
    const feet = at('popliteal_height', row) >= 407;
    const lap = at('buttock_popliteal_length', row) >= 475 && at('thigh_clearance', row) <= 180;
    const sill = Math.abs(at('elbow_rest_height', row) - 240) <= 30;
    const side = at('forearm_forearm_breadth', row) <= 540;
    [feet, lap, sill, side, feet && lap && sill].forEach((pass, n) => {
      if (pass) counts[n] = (counts[n] as number) + 1;
    });
  }
  return counts.map((count) => (100 * count) / draws.count);
}

describe('the quick quantile', () => {
  it('is the normal quantile', () => {
    fc.assert(
      fc.property(fc.integer({ min: 0, max: 2 ** 32 - 1 }), (fraction) => {
        const exact = normalQuantile((fraction + 0.5) / 2 ** 32);
        expect(Math.abs(quickQuantile(fraction) - exact)).toBeLessThan(1e-6 * (1 + Math.abs(exact)));
      }),
    );
    expect(quickQuantile(0)).toBeCloseTo(-quickQuantile(2 ** 32 - 1), 12);
  });
});

describe('the sequence', () => {
  it('has the same number of points in every stretch of every dimension', () => {
    // What a net is: among 256 points from a multiple of 256 on, each 256th of a dimension holds one.
    const walk = sobolWalk(MOST_DIMENSIONS, 7, 512);
    const met = Array.from({ length: MOST_DIMENSIONS }, () => new Set<number>());
    for (let n = 0; n < 256; n += 1) {
      if (n > 0) walk.next();
      walk.point.forEach((x, dimension) => met[dimension]?.add(x >>> 24));
    }
    expect(met.map(({ size }) => size)).toEqual(new Array(MOST_DIMENSIONS).fill(256));
  });

  it('has one point in every cell of two dimensions', () => {
    const walk = sobolWalk(2, 3, 0);
    const cells = new Set<number>();
    for (let n = 0; n < 256; n += 1) {
      if (n > 0) walk.next();
      const [a = 0, b = 0] = walk.point;
      cells.add((a >>> 28) * 16 + (b >>> 28));
    }
    expect(cells.size).toBe(256);
  });

  it('goes on where an earlier walk came to', () => {
    fc.assert(
      fc.property(fc.integer({ min: 0, max: 5000 }), fc.integer({ min: 0, max: 300 }), (from, steps) => {
        const walk = sobolWalk(9, 11, from);
        for (let n = 0; n < steps; n += 1) walk.next();
        expect([...walk.point]).toEqual([...sobolWalk(9, 11, from + steps).point]);
      }),
    );
  });

  it('refuses more dimensions than it has', () => {
    expect(() => sobolWalk(MOST_DIMENSIONS + 1, 0, 0)).toThrow(`dimensions is ${MOST_DIMENSIONS + 1}`);
  });
});

describe('drawing whole people', () => {
  it('gives the same for the same arguments, and others for another seed', () => {
    expect(soldiers.draw(500, 4)).toEqual(soldiers.draw(500, 4));
    expect(columnOf(soldiers.draw(500, 4), 'stature')).not.toEqual(
      columnOf(soldiers.draw(500, 5), 'stature'),
    );
  });

  it('blocks put together are the whole', () => {
    fc.assert(
      fc.property(fc.integer({ min: 1, max: 400 }), fc.integer({ min: 1, max: 5 }), (count, blocks) => {
        const whole = soldiers.draw(count * blocks, 9);
        for (let block = 0; block < blocks; block += 1) {
          const part = soldiers.draw(count, 9, block);
          const [from, to] = [block * count, (block + 1) * count];
          expect(part.isWoman).toEqual(whole.isWoman.slice(from, to));
          for (const key of MEASURE_KEYS) {
            expect(columnOf(part, key)).toEqual(columnOf(whole, key).slice(from, to));
          }
        }
      }),
      { numRuns: 12 },
    );
  });

  it('draws the same people when fewer measures are asked for', () => {
    const whole = soldiers.draw(300, 2);
    const asked = ['thigh_clearance', 'acromial_height', 'head_breadth'] as const;
    const few = soldiers.draw(300, 2, 0, asked);
    expect(Object.keys(few.columns).sort()).toEqual([...asked].sort());
    for (const key of asked) expect(columnOf(few, key)).toEqual(columnOf(whole, key));
  });

  it('keeps everyone within the range of the survey', () => {
    const draws = soldiers.draw(60_000, 1);
    for (const key of MEASURE_KEYS.filter((each) => each !== 'acromial_height')) {
      const { women, men } = ansur2.stats;
      columnOf(draws, key).forEach((value, row) => {
        const { min, max } = (draws.isWoman[row] === 1 ? women : men)[key];
        if (value < min - 0.01 || value > max + 0.01) throw new Error(`${key} of ${value}`);
      });
    }
  });

  it('has standing shoulder height as the sum that it is', () => {
    const draws = soldiers.draw(50, 1);
    const [standing, sitting, stature, height] = (
      ['acromial_height', 'acromial_height_sitting', 'stature', 'sitting_height'] as const
    ).map((key) => columnOf(draws, key)) as [Float32Array, Float32Array, Float32Array, Float32Array];
    standing.forEach((value, row) => {
      const sum = (sitting[row] as number) + (stature[row] as number) - (height[row] as number);
      expect(value).toBeCloseTo(sum, 2);
    });
  });

  it('moves a share by less than 0.3 points from seed to seed at 40,000 people', () => {
    const seeds = Array.from({ length: 12 }, (_, seed) => shares(soldiers, seed));
    const spread = (seeds[0] ?? []).map((_, at) => {
      const values = seeds.map((each) => each[at] as number);
      return Math.max(...values) - Math.min(...values);
    });
    expect(Math.max(...spread)).toBeLessThan(0.3);
  });

  it.each([
    [0, 1, 0, 'count is 0; accepted: whole numbers from 1'],
    [10, 1.5, 0, 'seed is 1.5; accepted: whole numbers'],
    [10, 1, -1, 'block is -1; accepted: whole numbers from 0'],
  ])('refuses %d people, seed %d, block %d', (count, seed, block, message) => {
    expect(() => soldiers.draw(count, seed, block)).toThrow(message);
  });
});

describe('mixes', () => {
  it('hold the share of women asked for', () => {
    for (const share of [0, 0.25, 0.5, 0.8, 1]) {
      expect(shareOfWomen(mixOf(soldiers, soldiers, share).draw(20_000, 3))).toBeCloseTo(share, 3);
    }
  });

  it('of one population with half women are that population', () => {
    expect(mixOf(soldiers, soldiers, 0.5).draw(200, 3)).toEqual(soldiers.draw(200, 3));
  });

  it('say their groups, and count as read what every part read', () => {
    const mix = mixPopulations([
      { population: onlyOf(soldiers, 'women'), share: 0.3 },
      { population: soldiers, share: 0.7 },
    ]);
    expect(mix.groups.map(({ group }) => group)).toEqual(['women', 'men']);
    expect(mix.groups[0]?.share).toBeCloseTo(0.65, 12);
    expect(mix.kind).toBe('survey');
    expect(mix.read.has('stature')).toBe(true);
  });

  it('refuse shares that are no whole, and a sex that nobody has', () => {
    expect(() => mixPopulations([{ population: soldiers, share: 0.4 }])).toThrow('accepted: numbers above 0');
    expect(() => mixOf(soldiers, soldiers, 1.2)).toThrow('share is 1.2; accepted: 0 to 1');
    expect(() => onlyOf(onlyOf(soldiers, 'men'), 'women')).toThrow('has no women');
  });
});
