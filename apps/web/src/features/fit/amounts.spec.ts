import { describe, expect, it } from 'vitest';
import { marginText, outcomeWords } from './amounts.ts';
import { sheet } from './test/show-sheet.tsx';
import { closedLedger, marginSum } from './sums.ts';
import { shortName } from '@/lib/short-name.ts';

const INCHES = { system: 'feet-inches', roundTo: 8 } as const;
const MM = { system: 'millimetres', roundTo: 8 } as const;
const INCH = 25.4;
const outcomes = sheet.rows.flatMap((row) =>
  row.cells.flatMap(({ outcome }) => (outcome.kind === 'verdict' ? [outcome] : [])),
);
const around = (margin: number, half: number) => ({
  margin,
  marginRange: { low: margin - half, high: margin + half },
});

describe('margins', () => {
  it('carry a sign, and no range when nothing was predicted', () => {
    expect(marginText({ margin: 1.75 * INCH }, 'mm', INCHES)).toEqual({ margin: '+1¾″', range: undefined });
    expect(marginText({ margin: -0.875 * INCH }, 'mm', INCHES).margin).toBe('−⅞″');
    expect(marginText({ margin: -1.5 }, 'deg', INCHES).margin).toBe('−1.5°');
    expect(marginText({ margin: 4 }, 'deg', INCHES).margin).toBe('+4°');
  });

  it('never say that nothing is missing where something is', () => {
    expect(marginText({ margin: -0.4 }, 'mm', INCHES)).toEqual({ margin: 'just short', range: undefined });
    expect(marginText({ margin: -0.4 }, 'mm', MM).margin).toBe('just short');
    expect(marginText({ margin: -0.6 }, 'mm', MM).margin).toBe('−1\u202fmm');
    // Within a tenth of a millimetre it is on the line, and the verdict is the better one.
    expect(marginText({ margin: -0.06 }, 'mm', INCHES).margin).toBe('+0″');
    expect(marginText(around(-0.8, 1), 'mm', INCHES).margin).toBe('just short');
    expect(marginText(around(-0.8, 3), 'mm', INCHES)).toEqual({ margin: '+0″', range: '± ⅛' });
    const { marginRange: _range, ...sure } = outcomes[0]!;
    const said = outcomeWords({ ...sure, verdict: 'wontFit', margin: -0.4, estimated: false }, 'mm', INCHES);
    expect(said).toBe('won’t fit, just short');
  });

  it('are as fine as they are known: half inches from ¾″ each way on', () => {
    expect(marginText(around(1.3 * INCH, 0.7 * INCH), 'mm', INCHES)).toEqual({
      margin: '+1¼″',
      range: '± ¾',
    });
    expect(marginText(around(1.3 * INCH, 0.8 * INCH), 'mm', INCHES)).toEqual({
      margin: '+1½″',
      range: '± 1',
    });
    expect(marginText(around(33, 20), 'mm', MM)).toEqual({ margin: '+30\u202fmm', range: '± 20' });
  });

  it('say that the number went with the person', () => {
    expect(marginText({ margin: null }, 'mm', INCHES)).toEqual({ margin: 'removed', range: undefined });
  });

  it('are said aloud as they are shown', () => {
    const said = outcomeWords(
      { ...outcomes[0]!, verdict: 'tight', estimated: true, ...around(1.3 * INCH, 0.8 * INCH) },
      'mm',
      INCHES,
    );
    expect(said).toBe('tight, estimated, plus one and one half inches, give or take one inch');
  });
});

describe('sums', () => {
  it('close to the last figure shown', () => {
    const term = (label: string, inches: number) => ({ label, value: inches * INCH, kind: 'term' as const });
    const lines = [
      term('deck', 15.055),
      term('cushion', 3.805),
      { label: 'seat', value: 18.86 * INCH, kind: 'total' as const },
    ];
    const shown = closedLedger(lines, 'mm', INCHES).map(({ value }) => value / INCH);
    expect(shown[2]).toBeCloseTo(18.875);
    expect((shown[0] ?? 0) + (shown[1] ?? 0)).toBeCloseTo(shown[2] ?? 0);
  });

  it('lead from the fail line to the margin in every cell of a real sheet that is known finely', () => {
    const sums = outcomes.flatMap(({ marginRange, ...outcome }) => {
      const sum = marginSum({ ...outcome, ...(marginRange ? { marginRange } : {}) }, 'mm', INCHES);
      const isFine = !marginRange || marginRange.high - marginRange.low < 1.5 * INCH;
      return sum && isFine ? [{ sum, margin: outcome.margin }] : [];
    });
    expect(sums.length).toBeGreaterThan(3);
    for (const { sum, margin } of sums) {
      const steps = (mm: number) => Math.round((mm * 8) / INCH);
      expect(sum.closes).toBe(true);
      expect(steps(sum.from.shown) - steps(sum.take.shown)).toBe(steps(margin));
    }
  });
});

it('keeps the short form of a mannequin', () => {
  expect(shortName('Hetty Vance')).toBe('Hetty');
  expect(shortName('Woman, 5th in stature')).toBe('Woman, 5th');
});
