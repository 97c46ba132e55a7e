import { describe, expect, it } from 'vitest';
import { joinWords, sayChosen } from './choosing-words.ts';

describe('chosen pieces in words', () => {
  it('are joined as a sentence joins them', () => {
    expect([[], ['B1'], ['B1', 'B2'], ['B1', 'B2', 'T1']].map(joinWords)).toEqual([
      '',
      'B1',
      'B1 and B2',
      'B1, B2 and T1',
    ]);
  });

  it('say which one stays', () => {
    expect(sayChosen([])).toBe('Nothing chosen');
    expect(sayChosen(['B1'])).toBe('B1 chosen');
    expect(sayChosen(['B1', 'T1'])).toBe('B1 and T1 chosen. B1 stays when they line up');
  });
});
