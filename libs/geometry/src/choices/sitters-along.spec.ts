import type { FitCell, FitSheet, Verdict } from '@settlewright/anthropometry';
import { describe, expect, it } from 'vitest';
import { sittersAlong } from './sitters-along.ts';

/** A sheet of one sitter by rule; a rule that is left out is not asked. */
const sheetOf = (said: Record<string, Verdict>): FitSheet =>
  ({
    rows: [
      {
        sitterId: 'hetty',
        placeId: 'b1:1',
        name: 'Hetty Vance',
        cells: Object.entries(said).map(
          ([ruleId, verdict]) => ({ id: ruleId, ruleId, outcome: { kind: 'verdict', verdict } }) as FitCell,
        ),
      },
    ],
    piecesAndWays: [],
  }) as unknown as FitSheet;

const MOVING = new Set(['SEAT-02', 'TABLE-01']);

describe('everybody by every check that a dimension moves', () => {
  it('takes the worst answer, and counts what is short, not known or gone', () => {
    const present = sheetOf({ 'SEAT-02': 'wontFit', 'TABLE-01': 'fits', 'BACK-01': 'wontFit' });
    const sheets = [
      present,
      sheetOf({ 'SEAT-02': 'tight', 'TABLE-01': 'fits', 'BACK-01': 'wontFit' }),
      sheetOf({ 'SEAT-02': 'fits', 'TABLE-01': 'notKnown' }),
      sheetOf({ 'SEAT-02': 'fits' }),
    ];
    const [hetty] = sittersAlong(present, sheets, MOVING);
    expect(hetty?.states).toEqual(['wontFit', 'tight', 'notKnown', 'gone']);
    expect(hetty?.missed).toEqual([1, 0, 1, 1]);
  });

  it('leaves out of whom no such check is asked', () => {
    const present = sheetOf({ 'BACK-01': 'fits' });
    expect(sittersAlong(present, [present], MOVING)).toEqual([]);
  });
});
