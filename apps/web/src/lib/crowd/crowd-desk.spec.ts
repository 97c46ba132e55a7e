import type { PlaceSituation } from '@settlewright/anthropometry';
import { ARRANGEMENTS, dimensionOf, measureSet, type SetDocument } from '@settlewright/geometry';
import { describe, expect, it } from 'vitest';
import { createCrowdDesk } from './crowd-desk.ts';
import { CROWDS, DEFAULT_CROWD, crowdWords } from './crowds.ts';
import { peopleOf } from './crowd-people.ts';

const bay = ARRANGEMENTS.find(({ id }) => id === 'facing-benches')?.build() as SetDocument;
const height = dimensionOf(bay, 'seat-height');
const placesAt = (value: number): PlaceSituation[] =>
  measureSet(height?.at(value) as SetDocument).places.slice(0, 1);

const ask = (women: number) => ({
  crowd: { ...DEFAULT_CROWD, women },
  count: 4000,
  ticked: { ruleIds: ['SEAT-02'] },
});

describe('a crowd that is asked', () => {
  const desk = createCrowdDesk();

  it('fits a low seat less and a high one less than one in between, and tells who it is', async () => {
    const values = [330, 420, 560];
    const { points, told } = await desk.answer('curve', {
      ...ask(50),
      values,
      placesAt: values.map(placesAt),
    });
    const [low, middle, high] = points.map(({ fits }) => fits ?? 0);
    expect(middle).toBeGreaterThan(low ?? 1);
    expect(middle).toBeGreaterThan(high ?? 1);
    expect(points.every(({ fits, atLeastTight }) => (fits ?? 1) <= (atLeastTight ?? 0))).toBe(true);
    expect(told.cautions.length).toBeGreaterThan(0);
  });

  it('gives the mix of women and men that was asked for', async () => {
    const shares = await Promise.all(
      [0, 50, 100].map(async (women) => {
        const { all } = await desk.answer('shares', { ...ask(women), places: placesAt(440) });
        return all.kind === 'shares' ? all.fits.mixed.value : -1;
      }),
    );
    const [men, both, women] = shares as [number, number, number];
    expect(men).toBeGreaterThan(women);
    expect(both).toBeCloseTo((men + women) / 2, 1);
  });

  it('says the same again, whatever was asked between', async () => {
    const first = await desk.answer('shares', { ...ask(50), places: placesAt(420) });
    await desk.answer('shares', { ...ask(50), places: placesAt(500) });
    expect(await desk.answer('shares', { ...ask(50), places: placesAt(420) })).toEqual(first);
  });

  it('agrees with the curve point by point on a map', async () => {
    const [across, up] = [[400, 440], [1]];
    const map = await desk.answer('map', { ...ask(50), across, up, placesAt: [across.map(placesAt)] });
    const curve = await desk.answer('curve', { ...ask(50), values: across, placesAt: across.map(placesAt) });
    expect(map.fits[0]).toEqual(curve.points.map(({ fits }) => fits));
  });

  it('gives no number where no ticked check has anything to say', async () => {
    const nothing = { ...ask(50), ticked: { ruleIds: [] } };
    const places = placesAt(420);
    const { points } = await desk.answer('curve', { ...nothing, values: [1], placesAt: [places] });
    expect(points).toEqual([{ value: 1 }]);
    const map = await desk.answer('map', { ...nothing, across: [1], up: [1], placesAt: [[places]] });
    expect(map.fits).toEqual([[null]]);
    expect((await desk.answer('shares', { ...nothing, places })).all.kind).toBe('silent');
  });

  it('knows every population in the list by its own name, and no other', async () => {
    for (const { id, only } of CROWDS) {
      const people = await peopleOf({ populationId: id, women: 50 });
      expect(people.id).toContain(id);
      expect(people.groups.map(({ group }) => group)).toEqual(only ? [only] : ['women', 'men']);
    }
    await expect(peopleOf({ populationId: 'giants', women: 50 })).rejects.toThrow('giants');
  });
});

describe('the range of a share', () => {
  it('counts in how few were measured, as the server does', async () => {
    const crowd = { populationId: 'us-soldiers-2012', women: 0 };
    const { all } = await createCrowdDesk().answer('shares', { ...ask(0), crowd, places: placesAt(440) });
    if (all.kind !== 'shares') throw new Error(`no shares: ${all.kind}`);
    const { value, low, high } = all.fits.mixed;
    // 4,000 drawn after 4,082 surveyed men.
    const expected = 2 * 1.96 * Math.sqrt(value * (1 - value) * (1 / 4000 + 1 / 4082));
    expect((high - low) / expected).toBeCloseTo(1, 1);
  });
});

describe('words for a crowd', () => {
  it('names the one sex that a population holds, whatever the mix', () => {
    expect(crowdWords({ populationId: 'german', women: 50 })).toBe('German adults, men');
  });

  it.each([
    [50, 'US adults 2015–16, men and women equally'],
    [0, 'US adults 2015–16, men'],
    [100, 'US adults 2015–16, women'],
    [60, 'US adults 2015–16, 60 in 100 women'],
  ])('%i women', (women, words) => expect(crowdWords({ ...DEFAULT_CROWD, women })).toBe(words));
});
