import { describe, expect, it } from '@jest/globals';
import type { FitCell, FitSheet, VerdictOutcome } from '@settlewright/anthropometry';
import { ARRANGEMENTS, measureSet } from '@settlewright/geometry';
import { FitCheckService } from './fit-check.service';
import { READS_NO_BODY, withoutPerson } from './without-person';

const outcome: VerdictOutcome = {
  kind: 'verdict',
  verdict: 'tight',
  value: 461.5,
  pass: { upper: 417.25 },
  fail: { upper: 442.75 },
  margin: -18.75,
  marginRange: { low: -20.5, high: -17.5 },
  estimated: true,
  probability: { pass: 0, insideFail: 0.25 },
  settleWith: ['popliteal_height'],
  drops: [{ lowMm: 19.25, bestMm: 27.5, highMm: 35.75, bottomsOut: 'no', error: 0.31, sits: 0 }],
  settleBySit: true,
  bodyLedger: [{ label: 'Ottilie Brandt’s back of knee', value: 394.25, kind: 'term' }],
  setLedger: [{ label: 'sinks under Ottilie Brandt', value: 12.5, kind: 'term' }],
};
const cell = (ruleId: string, scope: FitCell['scope'], pieceIds: string[]): FitCell => ({
  id: `${ruleId}|${pieceIds.join()}`,
  ruleId,
  scope,
  pieceIds,
  marks: [],
  outcome,
});
const row = (sitterId: string, name: string, placeId: string): FitSheet['rows'][number] => ({
  sitterId,
  name,
  kind: 'cast',
  placeId,
  mark: 'B1',
  place: 1,
  worst: 'tight',
  cells: [cell('SEAT-02', 'person', ['b1'])],
});
const sheet: FitSheet = {
  rows: [row('p1', 'Ottilie Brandt', 'b1:1'), row('p2', 'Ottilie Brandtner', 'b2:1')],
  publicRow: { cells: [] },
  piecesAndWays: [
    cell('SIDE-01', 'bench', ['b1']),
    cell('SIDE-02', 'bench', ['b1']),
    cell('SIDE-04', 'pair', ['b1', 'b2']),
    cell('SIDE-01', 'bench', ['b2']),
  ],
  emptyPlaceIds: [],
  counts: { fits: 0, tight: 2, wontFit: 0, notKnown: 0 },
  confidence: 0.9,
  ruleVersion: '1',
};
const numbersOf = ({ outcome: said }: FitCell) => JSON.stringify(said).match(/\d+\.\d+/g) ?? [];

describe('a stored sheet without one person', () => {
  const without = withoutPerson(sheet, { id: 'p1', name: 'Ottilie Brandt' }, 'removed sitter 1');

  it('keeps the verdict and no number of the body', () => {
    expect(without.rows[0]).toMatchObject({ name: 'removed sitter 1', worst: 'tight' });
    const [emptied] = without.rows[0]!.cells;
    expect(emptied!.outcome).toMatchObject({ kind: 'verdict', verdict: 'tight', value: null, margin: null });
    expect(numbersOf(emptied!)).toEqual([]);
  });

  it('says the name nowhere, and leaves longer names alone', () => {
    expect(JSON.stringify(without)).not.toMatch(/Ottilie Brandt(?!ner)/);
    expect(without.rows[1]!.name).toBe('Ottilie Brandtner');
  });

  it('empties the shared rules that read the body, and no others', () => {
    expect(without.piecesAndWays.map((shared) => numbersOf(shared).length > 0)).toEqual([
      false,
      true,
      false,
      true,
    ]);
  });

  it('leaves a sheet alone that the person is not on', () => {
    expect(withoutPerson(sheet, { id: 'p9', name: 'Hetty' }, 'removed sitter 2')).toBe(sheet);
  });
});

describe('the rules of pieces and ways', () => {
  const READS_BODIES = ['SIDE-01', 'SIDE-04', 'SIDE-05', 'HEAD-04'];
  const fit = new FitCheckService();
  const document = ARRANGEMENTS.find(({ id }) => id === 'facing-benches')!.build();
  document.asked.appleBoxes = { full: 0, half: 0, quarter: 0, pancake: 0 };
  const seats = measureSet(document).places;
  /** What each rule says of a full set, with everybody but the first of one body. */
  const said = (percentile: number): Map<string, string> => {
    const measure = 'stature' as const;
    const sitter = { kind: 'mannequin' as const, bodyData: 'men' as const, measure, percentile };
    const seating = seats.map(({ pieceId, place }, n) => ({
      pieceId,
      place,
      sitter: { ...sitter, percentile: n === 0 ? 50 : percentile },
    }));
    const { piecesAndWays } = fit.sheetFor({ ...document, seating }, [], null);
    const cellsOf = (id: string) => piecesAndWays.filter(({ ruleId }) => ruleId === id);
    return new Map(piecesAndWays.map(({ ruleId }) => [ruleId, JSON.stringify(cellsOf(ruleId))]));
  };
  const [short, tall] = [said(5), said(95)];

  it('are each said to read a body or not, unless they are clauses of a code', () => {
    const asked = [...short.keys()].filter((id) => fit.ruleBook.rule(id).tier !== 'code');
    expect(asked.toSorted()).toEqual([...READS_NO_BODY, ...READS_BODIES].toSorted());
  });

  it('say the same of other people where they read no body, and something else where they do', () => {
    const changed = [...short.keys()].filter((id) => short.get(id) !== tall.get(id));
    // No corner stands in these benches.
    expect(changed.toSorted()).toEqual(READS_BODIES.filter((id) => id !== 'SIDE-05').toSorted());
  });
});
