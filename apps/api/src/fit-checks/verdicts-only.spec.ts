import type { FitCell, FitSheet, VerdictOutcome } from '@settlewright/anthropometry';
import { describe, expect, it } from '@jest/globals';
import { FitCheckService } from './fit-check.service';
import { verdictsOnly } from './verdicts-only';

const { ruleBook } = new FitCheckService();
const ruleWith = (unit: string) => ruleBook.rules.find((rule) => rule.unit === unit)!.id;

function shown(outcome: Partial<VerdictOutcome>, unit = 'mm', ruleId = ruleWith(unit)) {
  const cell = { ruleId, outcome: { kind: 'verdict', estimated: false, ...outcome } };
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
    [24, 0],
    [25.4, 25.4],
    [50.7, 25.4],
    [0, 0],
    [76.3, 76.2],
    [400, 76.2],
  ])('give %d mm that are left as at least %d', (margin, seen) => {
    expect(shown({ verdict: 'fits', margin }).margin).toBeCloseTo(seen, 9);
  });

  it.each([
    [-0.4, -25.4],
    [-25.4, -25.4],
    [-26, -50.8],
    [-200, -203.2],
  ])('give %d mm that are missing as at most %d, never as none', (margin, seen) => {
    expect(shown({ verdict: 'wontFit', margin }).margin).toBeCloseTo(seen, 9);
  });

  it('show nothing missing where a hair below the line still counts as inside', () => {
    expect(shown({ verdict: 'tight', margin: -0.06 }).margin).toBe(0);
  });

  it('round both ends of a range outwards, and give none where room is only at least so much', () => {
    const marginRange = { low: -1.3, high: 33.3 };
    const seen = shown({ verdict: 'notKnown', margin: 16, marginRange });
    expect(seen.margin).toBe(0);
    expect(seen.marginRange?.low).toBeCloseTo(-25.4, 9);
    expect(seen.marginRange?.high).toBeCloseTo(50.8, 9);
    expect(shown({ verdict: 'fits', margin: 200, marginRange: { low: 150, high: 250 } })).not.toHaveProperty(
      'marginRange',
    );
  });

  it('leave what reads nobody’s body as it is', () => {
    expect(shown({ verdict: 'tight', margin: 12.34 }, 'mm', 'SEAT-06').margin).toBe(12.34);
  });

  it('tell two people whose measures lie within an inch by nothing', () => {
    const seen = [31, 36, 42, 49].map((margin) => shown({ verdict: 'fits', margin }).margin);
    expect(new Set(seen).size).toBe(1);
  });

  it('leave degrees alone', () => {
    expect(shown({ verdict: 'wontFit', margin: -1.5 }, 'deg').margin).toBe(-1.5);
  });

  it('say nothing of how far a cushion goes down, from which a weight could be reckoned', () => {
    const drop = { lowMm: 19, bestMm: 27, highMm: 35, bottomsOut: 'no' as const, error: 0.3, sits: 0 };
    const doubtful = {
      margin: 16,
      marginRange: { low: 7.9, high: 24.1 },
      drops: [drop],
      settleBySit: true as const,
    };
    const seen = shown({ verdict: 'tight', ...doubtful });
    expect(Object.keys(seen).toSorted()).toEqual(['estimated', 'kind', 'margin', 'marginRange', 'verdict']);
    expect(seen.marginRange).toEqual({ low: 0, high: 25.4 });
  });

  it('keep what was erased empty', () => {
    const margin = null as unknown as number;
    expect(shown({ verdict: 'fits', margin }).margin).toBeNull();
  });
});
