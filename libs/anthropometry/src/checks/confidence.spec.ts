import { describe, expect, it } from 'vitest';
import { check, person, place, set, sitter } from '../../test/example-set.ts';
import { fitRules, ruleBook } from '../../test/seed.ts';
import { confidenceWords } from './confidence.ts';
import { CONFIDENCE_LIMITS } from './confidence-limits.ts';
import { loadRuleBook } from './rule-book.ts';

describe('the probability a verdict asks for', () => {
  it('is said with its default, the mark of that and since when', () => {
    expect(confidenceWords(0.9, ruleBook)).toBe(
      'A verdict is given at a probability of 0.90 or more; that is the default (shop rule).',
    );
    expect(confidenceWords(0.95, ruleBook, 'set by the workshop on 3 March 2026')).toBe(
      'A verdict is given at a probability of 0.95 or more, set by the workshop on 3 March 2026; the default is 0.90 (shop rule).',
    );
  });

  it.each([0.5, 0.999])('is refused in the rule data at %s', (confidence) => {
    expect(() => loadRuleBook({ ...fitRules, confidence })).toThrow(/confidence/);
  });

  const sheetAt = (confidence?: number) =>
    check(set({ places: [place()] }), [sitter(person())], confidence === undefined ? {} : { confidence });

  it('stands on the sheet', () => {
    expect(sheetAt().confidence).toBe(ruleBook.confidence);
    expect(sheetAt(0.99).confidence).toBe(0.99);
  });

  it('leaves more unknown when more is asked', () => {
    const { lowest, highest } = CONFIDENCE_LIMITS;
    expect(sheetAt(lowest).counts.notKnown).toBeLessThan(sheetAt(highest).counts.notKnown);
  });
});
