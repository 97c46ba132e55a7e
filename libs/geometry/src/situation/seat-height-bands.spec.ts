import { checkSet, createBodyModel, loadRuleBook, type Sitter } from '@settlewright/anthropometry';
import rules from '@settlewright/seed-data/fit-rules.json' with { type: 'json' };
import survey from '@settlewright/seed-data/populations/ansur2.json' with { type: 'json' };
import { describe, expect, it } from 'vitest';
import { setParameter } from '../pieces/parameters.ts';
import { ARRANGEMENTS } from '../room/arrangements.ts';
import type { SetDocument } from '../room/document.ts';
import { measureSet } from './measure-set.ts';
import { seatHeightNeeds } from './seat-height-bands.ts';

const model = createBodyModel(survey);
const ruleBook = loadRuleBook(rules);

function start(): SetDocument {
  const arrangement = ARRANGEMENTS.find(({ id }) => id === 'facing-benches');
  if (!arrangement) throw new Error('no such arrangement');
  return arrangement.build();
}

function sheetOf(document: SetDocument, people: { placeId: string; poplitealMm: number }[]) {
  const sitters = people.map(({ placeId, poplitealMm }): Sitter => ({
    id: placeId,
    name: placeId,
    kind: 'cast',
    placeId,
    person: {
      bodyData: 'women',
      stature: { mm: 1650, source: 'measured' },
      weightKg: 64,
      measured: { popliteal_height: poplitealMm },
      shoeMm: 25,
      clothing: 'light',
    },
  }));
  const settings = { backPosture: 'dining', trafficBehind: 'none' } as const;
  return checkSet({ situation: measureSet(document, ruleBook), sitters, ruleBook, model, settings });
}

const at = (document: SetDocument, pressedMm: number): SetDocument => {
  const changed = setParameter(document, 'b1', 'pressedSeatHeight', pressedMm);
  if (!changed.ok) throw new Error(changed.error.message);
  return changed.value;
};

describe('seatHeightNeeds', () => {
  it('names heights that the real check confirms at both ends', () => {
    const people = [{ placeId: 'b1:1', poplitealMm: 400 }];
    const document = start();
    const { common } = seatHeightNeeds(document, sheetOf(document, people), 'b1');
    if (!common) throw new Error('expected a common band');
    for (const [mm, verdict] of [
      [common.lowerMm + 1, 'fits'],
      [common.upperMm - 1, 'fits'],
      [common.upperMm + 2, 'tight'],
    ] as const) {
      const cell = sheetOf(at(document, mm), people).rows[0]?.cells.find(
        ({ ruleId }) => ruleId === 'SEAT-02',
      );
      expect(cell?.outcome).toMatchObject({ kind: 'verdict', verdict });
    }
  });

  it('finds nothing in common for very different legs, and says each one’s own', () => {
    const document = start();
    const sheet = sheetOf(document, [
      { placeId: 'b1:1', poplitealMm: 330 },
      { placeId: 'b1:2', poplitealMm: 520 },
    ]);
    const needs = seatHeightNeeds(document, sheet, 'b1');
    expect(needs.common).toBeUndefined();
    expect(needs.bands).toHaveLength(2);
  });

  it('is empty for a bench nobody sits on and for a piece without a seat', () => {
    const document = start();
    const sheet = sheetOf(document, []);
    expect(seatHeightNeeds(document, sheet, 'b1')).toEqual({ bands: [], common: undefined });
    expect(seatHeightNeeds(document, sheet, 't1').bands).toEqual([]);
  });
});
