import { createBodyModel, checkSet, loadRuleBook, type FitSheet } from '@settlewright/anthropometry';
import rules from '@settlewright/seed-data/fit-rules.json' with { type: 'json' };
import summary from '@settlewright/seed-data/populations/ansur2.json' with { type: 'json' };
import { describe, expect, it } from 'vitest';
import type { SetDocument } from '../room/document.ts';
import { ARRANGEMENTS } from '../room/arrangements.ts';
import { measureSet } from '../situation/measure-set.ts';
import { castMap, type CastMap } from './cast-map.ts';
import { dimensionOf } from './dimensions.ts';

const model = createBodyModel(summary);
const ruleBook = loadRuleBook(rules);
const bay = ARRANGEMENTS.find(({ id }) => id === 'facing-benches')?.build() as SetDocument;
const height = dimensionOf(bay, 'seat-height');
const values = [380, 420, 460];

/** One woman at a place; the second value takes her place away. */
const check = (document: SetDocument, noBody = false): FitSheet =>
  checkSet({
    situation: measureSet(document, ruleBook),
    sitters: [
      {
        id: 'one',
        name: 'One',
        kind: 'mannequin',
        placeId: 'b1:2',
        person: model.mannequin({ bodyData: 'women', measure: 'stature', percentile: 50 }),
        ...(noBody ? { noBody: true } : {}),
      },
    ],
    ruleBook,
    model,
    settings: { backPosture: 'dining', trafficBehind: 'none' },
  });

function documentAt(first: number, second: number): SetDocument | undefined {
  const set = height?.at(first);
  if (second === 0) return set;
  return (
    set && {
      ...set,
      pieces: set.pieces.map((piece) =>
        piece.id === 'b1' && piece.kind === 'bench' ? { ...piece, places: { by: 'count', count: 1 } } : piece,
      ),
    }
  );
}

function run(steps: Generator<number, CastMap, void>): CastMap {
  for (;;) {
    const step = steps.next();
    if (step.done) return step.value;
  }
}

describe('a map of two numbers', () => {
  const shown = new Set(['SEAT-02']);
  const map = run(castMap({ across: values, up: [0, 1], documentAt, check, shown }));

  it('never serves somebody whose place is gone', () => {
    const [there, gone] = map.regions[0]?.states ?? [];
    expect(there).toContain('served');
    expect(gone).toEqual(['lost', 'lost', 'lost']);
    expect(map.regions[0]?.rooms[1]?.every((room) => room < 0)).toBe(true);
  });

  it('knows no room where nobody is behind the name, and blames no check for it', () => {
    const removed = (set: SetDocument) => check(set, true);
    const [region] = run(castMap({ across: values, up: [0], documentAt, check: removed, shown })).regions;
    expect(new Set(region?.states.flat())).toEqual(new Set(['notKnown']));
    expect(region?.rooms.flat().every((room) => room < 0)).toBe(true);
    expect(region).not.toHaveProperty('blockedBy');
  });

  it('leaves out whoever no moving check asks', () => {
    const other = new Set(['SEAT-05']);
    expect(run(castMap({ across: values, up: [0], documentAt, check, shown: other })).regions).toEqual([]);
  });
});
