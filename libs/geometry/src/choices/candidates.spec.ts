import {
  checkSet,
  createBodyModel,
  loadRuleBook,
  type FitSheet,
  type Sitter,
} from '@settlewright/anthropometry';
import rules from '@settlewright/seed-data/fit-rules.json' with { type: 'json' };
import survey from '@settlewright/seed-data/populations/ansur2.json' with { type: 'json' };
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { ARRANGEMENTS } from '../room/arrangements.ts';
import type { SetDocument } from '../room/document.ts';
import { measureSet } from '../situation/measure-set.ts';
import { answersOf, createTrials, worseOf } from './candidates.ts';
import { dimensionsOf } from './dimensions.ts';
import type { Dimension } from './dimension.ts';
import { costOf } from './suggest-dimensions.ts';

const ruleBook = loadRuleBook(rules);
const model = createBodyModel(survey);

const SITTERS: Sitter[] = (
  [
    ['small', 'b1:1', 'women', 1],
    ['middling', 'b1:2', 'women', 60],
    ['tall', 'b2:1', 'men', 99],
  ] as const
).map(([id, placeId, bodyData, percentile]) => ({
  id,
  name: id,
  kind: 'mannequin',
  placeId,
  person: model.mannequin({ bodyData, measure: 'stature', percentile }),
}));

const check = (document: SetDocument): FitSheet =>
  checkSet({
    situation: measureSet(document, ruleBook),
    sitters: SITTERS,
    ruleBook,
    model,
    settings: { backPosture: 'dining', trafficBehind: 'none' },
  });

const bay = ARRANGEMENTS.find(({ id }) => id === 'facing-benches')?.build() as SetDocument;
const sheet = check(bay);
const costAgainst = (after: FitSheet): number =>
  costOf({ values: [], ...answersOf(sheet, after), worse: worseOf(sheet, after), distance: 0 });

describe('what a choice costs when something disappears', () => {
  it('is never less without a seat', () => {
    fc.assert(
      fc.property(fc.subarray(sheet.rows), (rows) => {
        expect(costAgainst({ ...sheet, rows })).toBeGreaterThanOrEqual(costAgainst(sheet));
      }),
    );
  });

  it('is never less when checks fall silent, for people and for pieces', () => {
    const every = [...sheet.rows.flatMap(({ cells }) => cells), ...sheet.piecesAndWays];
    fc.assert(
      fc.property(fc.subarray(every), (silent) => {
        const quiet = new Set(silent);
        const after: FitSheet = {
          ...sheet,
          rows: sheet.rows.map((row) => ({
            ...row,
            cells: row.cells.map((cell) =>
              quiet.has(cell) ? { ...cell, outcome: { kind: 'doesNotApply', reason: 'no table' } } : cell,
            ),
          })),
          piecesAndWays: sheet.piecesAndWays.filter((cell) => !quiet.has(cell)),
        };
        expect(costAgainst(after)).toBeGreaterThanOrEqual(costAgainst(sheet));
      }),
    );
  });

  it('counts a place and every verdict of it that are gone with a bench', () => {
    const [height] = dimensionsOf(bay) as [Dimension];
    const benches: Dimension = {
      ...height,
      id: 'benches',
      value: 2,
      min: 1,
      max: 2,
      at: (value, on = bay) =>
        value > 1 ? on : { ...on, pieces: on.pieces.filter(({ mark }) => mark !== 'B2') },
    };
    const trials = createTrials({
      document: bay,
      dimensions: [benches],
      free: [{ dimensionId: 'benches', min: 1, max: 2, step: 1 }],
      check,
    });
    const [both, one] = [trials.at([2]), trials.at([1])];
    if (!both || !one) throw new Error('the bay cannot be so');
    const gone = one.misses.filter(({ sitterId, gone: isGone }) => sitterId === 'tall' && isGone);
    const asked = sheet.rows
      .find(({ sitterId }) => sitterId === 'tall')
      ?.cells.filter(({ outcome }) => outcome.kind === 'verdict');
    expect(asked?.length).toBeGreaterThan(0);
    expect(gone).toHaveLength(1 + (asked?.length ?? 0));
    expect(gone.filter(({ ruleId }) => ruleId === undefined)).toHaveLength(1);
    expect(costOf(one)).toBeGreaterThan(costOf(both));
    expect(both.misses.filter(({ gone: isGone }) => isGone)).toEqual([]);
  });

  it('counts a good answer about pieces that is gone as worse', () => {
    const good = sheet.piecesAndWays.filter(
      ({ outcome }) => outcome.kind === 'verdict' && outcome.verdict === 'fits',
    );
    expect(good.length).toBeGreaterThan(0);
    expect(worseOf(sheet, sheet)).toBe(0);
    expect(worseOf(sheet, { ...sheet, piecesAndWays: [] })).toBeGreaterThanOrEqual(good.length);
  });
});
