import type { FitCell, FitSheet, VerdictOutcome } from '@settlewright/anthropometry';
import { describe, expect, it } from '@jest/globals';
import { FitCheckService } from './fit-check.service';
import { verdictsOnly } from './verdicts-only';

const { ruleBook } = new FitCheckService();
const ruleWith = (unit: string) => ruleBook.rules.find((rule) => rule.unit === unit)!.id;

function shown(outcome: Partial<VerdictOutcome>, unit = 'mm') {
  const cell = { ruleId: ruleWith(unit), outcome: { kind: 'verdict', estimated: false, ...outcome } };
  const sheet: FitSheet = {
    rows: [],
    publicRow: { cells: [] },
    piecesAndWays: [cell as FitCell],
    emptyPlaceIds: [],
    counts: { fits: 0, tight: 0, wontFit: 0, notKnown: 0 },
    confidence: 0.9,
    ruleVersion: '1',
  };
  const seen = verdictsOnly(sheet, ruleBook).piecesAndWays[0]!.outcome;
  if (seen.kind !== 'verdict') throw new Error('the verdict was lost');
  return seen;
}

describe('margins for who sees no measures', () => {
  it.each([
    [12.4, 10],
    [12.6, 15],
    [1.2, 0],
    [0, 0],
  ])('round %d mm that are left to %d', (margin, seen) => {
    expect(shown({ verdict: 'fits', margin }).margin).toBe(seen);
  });

  it.each([
    [-0.4, -5],
    [-2.4, -5],
    [-7.6, -10],
    [-12.4, -10],
  ])('round %d mm that are missing to %d, never to none', (margin, seen) => {
    expect(shown({ verdict: 'wontFit', margin }).margin).toBe(seen);
  });

  it('show nothing missing where a hair below the line still counts as inside', () => {
    expect(shown({ verdict: 'tight', margin: -0.06 }).margin).toBe(0);
  });

  it('round both ends of a range', () => {
    const marginRange = { low: -1.3, high: 33.3 };
    expect(shown({ verdict: 'notKnown', margin: 16, marginRange })).toMatchObject({
      margin: 15,
      marginRange: { low: -5, high: 35 },
    });
  });

  it('leave degrees alone', () => {
    expect(shown({ verdict: 'wontFit', margin: -1.5 }, 'deg').margin).toBe(-1.5);
  });

  it('keep what was erased empty', () => {
    const margin = null as unknown as number;
    expect(shown({ verdict: 'fits', margin }).margin).toBeNull();
  });
});
