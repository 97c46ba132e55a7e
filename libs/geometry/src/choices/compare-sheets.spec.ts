import {
  checkSet,
  createBodyModel,
  loadRuleBook,
  type FitSheet,
  type Sitter,
} from '@settlewright/anthropometry';
import rules from '@settlewright/seed-data/fit-rules.json' with { type: 'json' };
import survey from '@settlewright/seed-data/populations/ansur2.json' with { type: 'json' };
import { describe, expect, it } from 'vitest';
import { ARRANGEMENTS } from '../room/arrangements.ts';
import type { SetDocument } from '../room/document.ts';
import { measureSet } from '../situation/measure-set.ts';
import { compareSheets } from './compare-sheets.ts';
import { dimensionOf } from './dimensions.ts';

const ruleBook = loadRuleBook(rules);
const model = createBodyModel(survey);

const seated = (id: string, placeId: string, bodyData: 'women' | 'men', percentile: number): Sitter => ({
  id,
  name: id,
  kind: 'mannequin',
  placeId,
  person: model.mannequin({ bodyData, measure: 'stature', percentile }),
});

const SMALL = seated('small', 'b1:1', 'women', 5);
const TALL = seated('tall', 'b2:1', 'men', 95);

const sheetOf = (document: SetDocument, sitters: Sitter[]): FitSheet =>
  checkSet({
    situation: measureSet(document, ruleBook),
    sitters,
    ruleBook,
    model,
    settings: { backPosture: 'dining', trafficBehind: 'none' },
  });

const bay = ARRANGEMENTS.find(({ id }) => id === 'facing-benches')?.build() as SetDocument;
const height = dimensionOf(bay, 'seat-height');
const lower = height?.at(height.value - 60) as SetDocument;

describe('two sheets side by side', () => {
  const compared = compareSheets(sheetOf(bay, [SMALL, TALL]), sheetOf(lower, [SMALL, TALL]));
  const of = (sitterId: string) => compared.sitters.find((one) => one.sitterId === sitterId);

  it('tells that a lower seat helps the small sitter and costs the tall one', () => {
    expect(of('small')?.gains.map(({ ruleId }) => ruleId)).toContain('SEAT-02');
    expect(of('tall')?.losses.map(({ ruleId }) => ruleId)).toContain('SEAT-02');
    expect(of('tall')?.gains.map(({ ruleId }) => ruleId)).not.toContain('SEAT-02');
  });

  it('turns round when the sheets change places', () => {
    const back = compareSheets(sheetOf(lower, [SMALL, TALL]), sheetOf(bay, [SMALL, TALL]));
    for (const { sitterId, gains, losses, kept } of back.sitters) {
      expect(gains.map(({ ruleId }) => ruleId)).toEqual(of(sitterId)?.losses.map(({ ruleId }) => ruleId));
      expect(losses.map(({ ruleId }) => ruleId)).toEqual(of(sitterId)?.gains.map(({ ruleId }) => ruleId));
      expect(kept).toBe(of(sitterId)?.kept);
    }
  });

  it('follows a person to another place, and names who came and who left', () => {
    const [moved, came] = [{ ...SMALL, placeId: 'b2:2' }, seated('came', 'b1:2', 'men', 50)];
    const { sitters, joined, left } = compareSheets(sheetOf(bay, [SMALL, TALL]), sheetOf(bay, [moved, came]));
    expect(sitters.map(({ sitterId }) => sitterId)).toEqual(['small']);
    expect([joined, left]).toEqual([['came'], ['tall']]);
  });

  it('tells a check that is no longer asked as a loss, even one that was missed, and a new one as neither', () => {
    const without: SetDocument = { ...bay, pieces: bay.pieces.filter(({ kind }) => kind !== 'table') };
    const [now, then] = [sheetOf(bay, [SMALL, TALL]), sheetOf(without, [SMALL, TALL])];
    const table = (sheet: FitSheet) =>
      sheet.rows[0]?.cells.flatMap(({ ruleId, outcome }) =>
        ruleId.startsWith('TABLE-') && outcome.kind === 'verdict' ? [ruleId] : [],
      ) ?? [];
    const asked = table(now);
    expect(asked.length).toBeGreaterThan(0);
    expect(table(then)).toEqual([]);
    const [small] = compareSheets(now, then).sitters;
    const gone = small?.losses.filter(({ to }) => to === 'gone').map(({ ruleId }) => ruleId) ?? [];
    expect(gone).toEqual(expect.arrayContaining(asked));
    expect(small?.gains.map(({ ruleId }) => ruleId)).not.toContain(asked[0]);
    const pieces = compareSheets(now, { ...then, piecesAndWays: [] }).pieces;
    expect(pieces.losses.length).toBeGreaterThan(0);
    expect(pieces.losses.every(({ to, after }) => to === 'gone' && after === undefined)).toBe(true);
    const [back] = compareSheets(then, now).sitters;
    expect([...(back?.gains ?? []), ...(back?.losses ?? [])].map(({ ruleId }) => ruleId)).not.toContain(
      asked[0],
    );
  });

  it('finds nothing between a sheet and itself', () => {
    const sheet = sheetOf(bay, [SMALL, TALL]);
    const { sitters, pieces } = compareSheets(sheet, sheet);
    expect([...sitters, pieces].flatMap(({ gains, losses }) => [...gains, ...losses])).toEqual([]);
  });
});
