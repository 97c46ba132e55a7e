import { expect, it } from '@jest/globals';
import { revisionLetter } from './letters';

it.each([
  [1, 'A'],
  [3, 'C'],
  [26, 'Z'],
  [27, 'AA'],
  [52, 'AZ'],
  [53, 'BA'],
  [702, 'ZZ'],
  [703, 'AAA'],
])('numbers revision %i as %s', (ordinal, letter) => {
  expect(revisionLetter(ordinal)).toBe(letter);
});
