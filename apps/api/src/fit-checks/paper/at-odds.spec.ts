import { conflictsIn, type FitCell } from '@settlewright/anthropometry';
import { describe, expect, it } from '@jest/globals';
import { FitCheckService } from '../fit-check.service';
import type { ShownCell } from '../shown-sheet';
import { headWords, noteWords, sideLines } from './at-odds';
import type { FitSheetPaper } from './fit-sheet-paper';

const { ruleBook } = new FitCheckService();
const common = { pieceIds: ['b1'], marks: ['B1'] };
const height: FitCell = {
  ...common,
  id: 'ACC-01/b1',
  ruleId: 'ACC-01',
  scope: 'bench',
  outcome: { kind: 'clause', clause: '903.5', value: 460, inside: true, parts: [], limits: {} },
};
/** As a member sees it who may not see measures. */
const feet: ShownCell = {
  ...common,
  id: 'SEAT-02/s1',
  ruleId: 'SEAT-02',
  scope: 'person',
  sitterId: 's1',
  outcome: { kind: 'verdict', verdict: 'wontFit', margin: -25.4, estimated: false },
};
const input = { ruleBook, style: { system: 'feet-inches', roundTo: 8 } } as unknown as FitSheetPaper;

describe('rules at odds on the fit sheet', () => {
  const found = conflictsIn<ShownCell>(
    { rows: [{ cells: [feet] }], publicRow: { cells: [] }, piecesAndWays: [height] },
    ruleBook,
  );
  const [one] = found;

  it('are found in a sheet of verdicts alone', () => {
    expect(found.map(({ conflict }) => conflict.id)).toEqual(['accessible-height']);
  });

  it('say what they are about, both purposes with what each rule says, and the source of the numbers', () => {
    if (!one) throw new Error('One conflict is expected.');
    expect(headWords(one)).toBe('B1. A bench kept accessible is also sat on by short people.');
    const lines = one.sides.map((side) =>
      sideLines(input, side).map((line) =>
        typeof line === 'string' ? line : line.map(({ text }) => text).join(''),
      ),
    );
    expect(lines[0]?.[0]).toBe('A seat as high as a wheelchair helps to move across.');
    expect(lines[0]?.[1]).toMatch(/, ACC-01: inside clause 903\.5$/);
    expect(lines[1]?.[1]).toMatch(/, SEAT-02: −1″ won’t fit$/);
    expect(noteWords(input, one)).toMatch(/^From the lowest accessible seat, 17″, .* 2010 ADA Standards/);
    expect(noteWords(input, one)).toContain('(worked out');
  });
});
