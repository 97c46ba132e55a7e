import { dimensionsOf, type Tried } from '@settlewright/geometry';
import { describe, expect, it } from 'vitest';
import { DEFAULT_CROWD } from '@/lib/crowd/crowds.ts';
import { startFreedom, freeOf } from './search-form.ts';
import { search, type SearchAsked, type SearchTold } from './search.ts';
import { bay, INCHES, sitters } from './test/show-suggest.tsx';

const dimensions = dimensionsOf(bay);
const height = dimensions.filter(({ id }) => id === 'seat-height').map((one) => startFreedom(one, 'near'));
const asked: SearchAsked = {
  document: bay,
  free: freeOf({ freedoms: height, leftOut: [], crowd: null }, dimensions, INCHES),
  sitters,
  confidence: 0.9,
  crowd: DEFAULT_CROWD,
  known: [],
};

async function heard(question: SearchAsked): Promise<SearchTold[]> {
  const told: SearchTold[] = [];
  let clock = 0;
  await search(
    question,
    (one) => told.push(one),
    () => (clock += 200),
  );
  return told;
}

describe('a search', () => {
  it('speaks of the set as it is first, counts people, and tells each trial once', async () => {
    const told = await heard(asked);
    const [first, last] = [told[0], told.at(-1)];
    expect(first?.suggestion.answers[0]?.tried.distance).toBe(0);
    expect(told.map(({ ended }) => ended).indexOf(true)).toBe(told.length - 1);
    expect(last?.people?.cautions.length).toBeGreaterThan(0);
    expect(last?.counted).toContain('SEAT-02');
    expect(last?.suggestion.answers[0]?.tried.share).toBeGreaterThanOrEqual(0);
    const tried = told.flatMap((one) => one.tried.map(({ values }) => values.join()));
    expect(new Set(tried).size).toBe(tried.length);

    const known: Tried[] = told.flatMap((one) => one.tried);
    const again = await heard({ ...asked, known });
    expect(again.flatMap((one) => one.tried)).toEqual([]);
    expect(again.at(-1)?.suggestion.answers).toEqual(last?.suggestion.answers);
  });

  it('refuses a population that there is not', async () => {
    await expect(heard({ ...asked, crowd: { populationId: 'giants', women: 50 } })).rejects.toThrow('giants');
  });
});
