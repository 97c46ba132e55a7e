import type { FitCell, FitSheet, Verdict } from '@settlewright/anthropometry';
import { describe, expect, it } from 'vitest';
import { pricedPairs } from './pair-costs.ts';
import { ruleBook } from './test/show-stick.tsx';

type Said = Partial<Record<string, Verdict | 'silent'>>;

const cell = (ruleId: string, sitterId: string, said: Verdict | 'silent') =>
  ({
    id: `${ruleId}|${sitterId}`,
    ruleId,
    sitterId,
    marks: ['B1'],
    outcome: said === 'silent' ? { kind: 'doesNotApply' } : { kind: 'verdict', verdict: said },
  }) as unknown as FitCell;

/** A sheet with what is said of each sitter. */
const sheet = (people: Record<string, Said>): FitSheet =>
  ({
    rows: Object.entries(people).map(([name, said]) => ({
      sitterId: name,
      name,
      cells: Object.entries(said).map(([ruleId, word]) => cell(ruleId, name, word ?? 'silent')),
    })),
    piecesAndWays: [],
  }) as unknown as FitSheet;

const pair = (across: number) => ({ across, up: 0, served: 0, share: undefined });
const costOf = (before: Said, after: Said) => {
  const [priced] = pricedPairs([pair(1)], sheet({ Ada: before }), () => sheet({ Ada: after }), ruleBook);
  return { costs: priced?.costs, turnedAway: priced?.turnedAway, lesser: priced?.lesser };
};

describe('what a pair of values costs', () => {
  it('names whom it turns away, by which checks, once each', () => {
    const now: Said = { 'SEAT-02': 'fits', 'TABLE-01': 'tight', 'SEAT-05': 'fits' };
    expect(costOf(now, { 'SEAT-02': 'wontFit', 'TABLE-01': 'notKnown', 'SEAT-05': 'tight' })).toEqual({
      costs: ['Ada, seat height and thigh room'],
      turnedAway: 1,
      lesser: 1,
    });
  });

  it('counts what is no longer answered as turned away, but not of whom it was short or not known', () => {
    expect(costOf({ 'SEAT-02': 'fits' }, { 'SEAT-02': 'silent' })).toMatchObject({ turnedAway: 1 });
    for (const now of ['wontFit', 'notKnown'] as const) {
      expect(costOf({ 'SEAT-02': now }, { 'SEAT-02': 'silent' })).toEqual({
        costs: [],
        turnedAway: 0,
        lesser: 1,
      });
    }
  });

  it('has nothing to say of gains', () => {
    expect(costOf({ 'SEAT-02': 'wontFit' }, { 'SEAT-02': 'fits' })).toEqual({
      costs: [],
      turnedAway: 0,
      lesser: 0,
    });
  });

  it('puts the pair that turns the fewest away first, and leaves out what cannot be built', () => {
    const before = sheet({ Ada: { 'SEAT-02': 'fits' }, Bo: { 'SEAT-02': 'tight' } });
    const after: Record<number, FitSheet> = {
      1: sheet({ Ada: { 'SEAT-02': 'wontFit' }, Bo: { 'SEAT-02': 'wontFit' } }),
      2: sheet({ Ada: { 'SEAT-02': 'fits' }, Bo: { 'SEAT-02': 'wontFit' } }),
    };
    const priced = pricedPairs([pair(1), pair(2), pair(3)], before, ({ across }) => after[across], ruleBook);
    expect(priced.map(({ across, turnedAway }) => [across, turnedAway])).toEqual([
      [2, 1],
      [1, 2],
    ]);
  });
});
