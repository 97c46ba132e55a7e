import { loadRuleBook } from '@settlewright/anthropometry';
import rules from '@settlewright/seed-data/fit-rules.json';
import { describe, expect, it } from 'vitest';
import {
  fineWords,
  isAbout,
  ofHundred,
  overDropWords,
  rangeWords,
  rejectionWords,
  sexWords,
  tenth,
} from './words.ts';

const ruleBook = loadRuleBook(rules);
const share = (value: number) => ({ value, low: value, high: value });

describe('shares in words', () => {
  it.each([
    [0, '0'],
    [0.002, 'fewer than 1'],
    [0.344, '34'],
    [0.998, 'more than 99'],
    [1, '100'],
  ])('%d', (value, words) => expect(ofHundred({ value })).toBe(words));

  it.each([
    [0, false],
    [0.002, false],
    [0.344, true],
    [0.998, false],
  ])('puts “about” before a number alone: %d', (value, about) => expect(isAbout({ value })).toBe(about));

  it('closes a range that rounding closes', () => {
    expect(rangeWords({ low: 0.331, high: 0.334 })).toBe('Counting alone moves it by less than 1');
    expect(rangeWords({ low: 0.33, high: 0.36 })).toBe('33 to 36 by counting alone');
  });

  it.each([
    [{ value: 0.342, low: 0.341, high: 0.343 }, 'About 34.2 in 100 (34.1 to 34.3)'],
    [{ value: 0, low: 0, high: 0.000004 }, 'None in 100'],
    [{ value: 0, low: 0, high: 0.012 }, 'None in 100 (0.0 to 1.2)'],
    [{ value: 0.0001, low: 0.0001, high: 0.0001 }, 'Fewer than 0.1 in 100'],
    [{ value: 0.9999, low: 0.9999, high: 0.9999 }, 'More than 99.9 in 100'],
    [{ value: 1, low: 1, high: 1 }, 'All of 100'],
  ])('tells a large count to a tenth: %o', (value, words) => expect(fineWords(value)).toBe(words));

  it('tells what a drop does where it shows', () => {
    expect(overDropWords({ low: 0.281, high: 0.393 })).toBe('28 to 39 over the drop');
    expect(overDropWords({ low: 0.281, high: 0.284 })).toBeUndefined();
    expect(overDropWords({ low: 0.281, high: 0.284 }, tenth)).toBe('28.1 to 28.4 over the drop');
    expect(overDropWords(undefined)).toBeUndefined();
  });

  it('tells the sexes apart only where there are both', () => {
    expect(sexWords({ mixed: share(0.3), women: share(0.4), men: share(0.2) })).toBe('women 40, men 20');
    expect(sexWords({ mixed: share(0.4), women: share(0.4) })).toBeUndefined();
  });

  it('names the check that turns most away, and the next of the rest', () => {
    const words = rejectionWords(
      { ruleId: 'SEAT-02', lost: 0.4 },
      { ruleId: 'SEAT-04', lost: 0.1 },
      ruleBook,
    );
    expect(words).toBe(
      'Seat height turns away most: 40 in 100. Of those it leaves, seat depth turns away 10 in 100.',
    );
    expect(rejectionWords({ ruleId: 'SEAT-02', lost: 1 }, undefined, ruleBook)).toBe(
      'Seat height turns everybody away.',
    );
    expect(rejectionWords(undefined, undefined, ruleBook)).toBeUndefined();
  });
});
