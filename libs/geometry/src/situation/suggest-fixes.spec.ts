import {
  checkSet,
  createBodyModel,
  loadRuleBook,
  type FitCell,
  type FitSheet,
  type KnownPerson,
  type Sitter,
} from '@settlewright/anthropometry';
import rules from '@settlewright/seed-data/fit-rules.json' with { type: 'json' };
import survey from '@settlewright/seed-data/populations/ansur2.json' with { type: 'json' };
import { describe, expect, it } from 'vitest';
import { setParameter } from '../pieces/parameters.ts';
import { ARRANGEMENTS } from '../room/arrangements.ts';
import type { SetDocument } from '../room/document.ts';
import { measureSet } from './measure-set.ts';
import { suggestFixes } from './suggest-fixes.ts';

const ruleBook = loadRuleBook(rules);
const model = createBodyModel(survey);
const INCH = 25.4;

/** A small woman known by tape: popliteal height 15 1/2 in, as the shortest sitter of the demonstration. */
const PERSON: KnownPerson = {
  bodyData: 'women',
  stature: { mm: 62 * INCH, source: 'measured' },
  weightKg: 58,
  measured: {
    popliteal_height: 15.5 * INCH,
    buttock_popliteal_length: 18.5 * INCH,
    elbow_rest_height: 9.125 * INCH,
  },
  shoeMm: INCH,
  clothing: 'medium',
};

const sitters: Sitter[] = ['b1:1', 'b2:1'].map((placeId, i) => ({
  id: `s${i}`,
  name: `Sitter ${i + 1}`,
  kind: 'cast',
  placeId,
  person: i === 0 ? PERSON : model.mannequin({ bodyData: 'men', measure: 'stature', percentile: 50 }),
}));

const check = (document: SetDocument): FitSheet =>
  checkSet({
    situation: measureSet(document, ruleBook),
    sitters,
    ruleBook,
    model,
    settings: { backPosture: 'dining', trafficBehind: 'none' },
  });

const cellOf = (sheet: FitSheet, ruleId: string, placeId: string): FitCell => {
  const cell = sheet.rows
    .flatMap(({ cells }) => cells)
    .find((one) => one.ruleId === ruleId && one.placeId === placeId);
  if (cell === undefined) throw new Error(`no cell ${ruleId} ${placeId}`);
  return cell;
};
const verdictOf = (cell: FitCell) =>
  cell.outcome.kind === 'verdict' ? cell.outcome.verdict : cell.outcome.kind;

function bay(...changes: [string, string, number][]): SetDocument {
  const facing = ARRANGEMENTS.find(({ id }) => id === 'facing-benches')?.build();
  if (facing === undefined) throw new Error('no such arrangement');
  return changes.reduce((document, [id, key, value]) => {
    const changed = setParameter(document, id, key, value);
    if (!changed.ok) throw new Error(changed.error.message);
    return changed.value;
  }, facing);
}

describe('suggestFixes', () => {
  const high = bay(['b1', 'pressedSeatHeight', 18.75 * INCH]);
  const cell = cellOf(check(high), 'SEAT-02', 'b1:1');
  const fixes = suggestFixes({ document: high, cell, check });

  it('starts from a seat that is too high', () => expect(verdictOf(cell)).toBe('wontFit'));

  it('offers the bench alone and everything together, at whole eighths', () => {
    expect(fixes.map(({ key, mark }) => [key, mark])).toEqual(
      expect.arrayContaining([
        ['pressedSeatHeight', 'B1'],
        ['pressedSeatHeight', 'B1, B2, T1'],
      ]),
    );
    for (const { toValue } of fixes)
      expect((toValue / INCH) * 8).toBeCloseTo(Math.round((toValue / INCH) * 8), 6);
  });

  it('reaches what it says, and an eighth less does not', () => {
    for (const fix of fixes) {
      const after = cellOf(check(fix.document), 'SEAT-02', 'b1:1');
      expect(verdictOf(after)).toBe(fix.reaches);
      expect(fix.gains.map(({ cellId }) => cellId)).toContain(cell.id);
    }
    const own = fixes.find(({ mark }) => mark === 'B1');
    const less = bay(['b1', 'pressedSeatHeight', (own?.toValue ?? 0) + INCH / 8]);
    expect(verdictOf(cellOf(check(less), 'SEAT-02', 'b1:1'))).not.toBe('fits');
    // By hand: popliteal 15.5 + shoe 1 = 16.5; the pass line ends at cos 5° of it, 16.437 in, for her own sink.
    expect(own?.toValue).toBeLessThan(17 * INCH);
  });

  it('lists as losses exactly the cells that get worse', () => {
    const rank = { wontFit: 0, notKnown: 1, tight: 2, fits: 3 } as const;
    const states = (document: SetDocument) => {
      const sheet = check(document);
      const all = [...sheet.rows.flatMap(({ cells }) => cells), ...sheet.piecesAndWays];
      return new Map(
        all.flatMap((one) => (one.outcome.kind === 'verdict' ? [[one.id, one.outcome.verdict]] : [])),
      );
    };
    const before = states(high);
    for (const fix of fixes) {
      const after = states(fix.document);
      const worse = [...before].filter(([id, was]) => {
        const now = after.get(id);
        return now === undefined || rank[now] < rank[was];
      });
      expect(fix.losses.map(({ cellId }) => cellId).sort()).toEqual(worse.map(([id]) => id).sort());
    }
  });

  it('puts fewer losses first and offers at most five', () => {
    expect(fixes.length).toBeLessThanOrEqual(5);
    const fitting = fixes.filter(({ reaches }) => reaches === 'fits').map(({ losses }) => losses.length);
    expect(fitting).toEqual([...fitting].sort((a, b) => a - b));
  });

  it('moves a table that stands too far over the lap', () => {
    const table = high.pieces.find(({ id }) => id === 't1');
    const near = bay(['t1', 'at.xMm', (table?.at.xMm ?? 0) - 4 * INCH]);
    const belly = cellOf(check(near), 'TABLE-06', 'b1:1');
    expect(verdictOf(belly)).not.toBe('fits');
    const [fix] = suggestFixes({ document: near, cell: belly, check }).filter(({ key }) => key === 'overlap');
    expect(fix).toMatchObject({ mark: 'T1', label: 'Overlap over B1' });
    expect(fix?.fromValue).toBeCloseTo(5.5 * INCH, 6);
    expect(measureSet(fix?.document ?? near).places[0]?.table?.overlapMm).toBeCloseTo(fix?.toValue ?? NaN, 6);
  });

  it('offers nothing for a cell that fits', () => {
    const fine = check(high)
      .rows.flatMap(({ cells }) => cells)
      .find((one) => verdictOf(one) === 'fits');
    expect(fine).toBeDefined();
    if (fine !== undefined) expect(suggestFixes({ document: high, cell: fine, check })).toEqual([]);
  });
});
