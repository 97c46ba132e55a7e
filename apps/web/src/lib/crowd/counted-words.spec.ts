import { expect, it } from 'vitest';
import { countedWords, EVERY_PLACE, sharesDiffer } from './counted-words.ts';

it.each([
  [
    { passes: 'fit', checks: ['seat height'], places: EVERY_PLACE },
    'Counted are people who fit seat height, at every place of the set.',
  ],
  [
    { passes: 'atLeastTight', checks: ['seat height', 'seat depth'], places: EVERY_PLACE },
    'Counted are people who are at least tight in seat height and seat depth at once, at every place of the set.',
  ],
  [
    { passes: 'fit', checks: 14, places: EVERY_PLACE },
    'Counted are people who fit all 14 checks that are asked here at once, at every place of the set.',
  ],
] as const)('%o', (counted, words) => expect(countedWords(counted)).toBe(words));

it.each([
  ['whoFits', /“Who fits”/, [/story stick/, /“Suggest dimensions”/]],
  ['stick', /story stick/, [/“Who fits”/, /“Suggest dimensions”/]],
  ['suggest', /“Suggest dimensions”/, [/“Who fits”/, /story stick/]],
] as const)('%s tells of the other pages, not of itself', (here, own, others) => {
  expect(sharesDiffer(here)).not.toMatch(own);
  for (const other of others) expect(sharesDiffer(here)).toMatch(other);
});
