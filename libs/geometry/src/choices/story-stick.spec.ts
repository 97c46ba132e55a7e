import {
  checkSet,
  createBodyModel,
  loadRuleBook,
  type FitSheet,
  type KnownPerson,
  type LimitLines,
  type Sitter,
  type VerdictOutcome,
} from '@settlewright/anthropometry';
import rules from '@settlewright/seed-data/fit-rules.json' with { type: 'json' };
import survey from '@settlewright/seed-data/populations/ansur2.json' with { type: 'json' };
import { describe, expect, it } from 'vitest';
import { pressedSeatHeightMm } from '../pieces/seat-sink.ts';
import { ARRANGEMENTS } from '../room/arrangements.ts';
import type { SetDocument } from '../room/document.ts';
import { emptySetDocument } from '../room/read-document.ts';
import { measureSet } from '../situation/measure-set.ts';
import { seatHeightNeeds } from '../situation/seat-height-bands.ts';
import type { Dimension } from './dimension.ts';
import { dimensionIdOf, dimensionOf, dimensionsOf } from './dimensions.ts';
import { stickValues, storyStick, type StoryStick } from './story-stick.ts';

const ruleBook = loadRuleBook(rules);
const model = createBodyModel(survey);
const INCH = 25.4;

const MEASURED: KnownPerson = {
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
const TOLD: KnownPerson = { ...MEASURED, measured: {}, stature: { mm: 1700, source: 'told' } };

const sitters: Sitter[] = [MEASURED, TOLD].map((person, i) => ({
  id: `s${i}`,
  name: `Sitter ${i + 1}`,
  kind: 'cast',
  placeId: `b${i + 1}:1`,
  person,
}));

const check = (document: SetDocument, who = sitters): FitSheet =>
  checkSet({
    situation: measureSet(document, ruleBook),
    sitters: who,
    ruleBook,
    model,
    settings: { backPosture: 'dining', trafficBehind: 'none' },
  });

function cellOf(sheet: FitSheet, ruleId: string): VerdictOutcome {
  const outcome = sheet.rows[0]?.cells.find((cell) => cell.ruleId === ruleId)?.outcome;
  if (outcome?.kind !== 'verdict') throw new Error(`no verdict by ${ruleId}`);
  return outcome;
}

const bay = (): SetDocument => {
  const found = ARRANGEMENTS.find(({ id }) => id === 'facing-benches');
  if (!found) throw new Error('the arrangement of facing benches is gone');
  return found.build();
};

const named = (document: SetDocument, id: string): Dimension => {
  const found = dimensionOf(document, id);
  if (!found)
    throw new Error(
      `no dimension ${id} among ${dimensionsOf(document)
        .map((one) => one.id)
        .join(', ')}`,
    );
  return found;
};

function run(steps: Generator<number, StoryStick, void>): StoryStick {
  for (;;) {
    const step = steps.next();
    if (step.done) return step.value;
  }
}

const stickOf = (dimension: Dimension, ruleId?: string): StoryStick =>
  run(
    storyStick({
      dimension,
      values: stickValues(dimension, INCH / 2),
      check,
      ...(ruleId === undefined ? {} : { ruleId }),
    }),
  );

describe('a sitter whom nobody is behind', () => {
  it('has a row that is not known anywhere, without stretches of just anybody', () => {
    const removed = (document: SetDocument) =>
      check(
        document,
        sitters.map((one, n) => (n === 0 ? { ...one, noBody: true as const } : one)),
      );
    const dimension = named(bay(), 'seat-height');
    const values = stickValues(dimension, INCH);
    const [first, other] = run(storyStick({ dimension, values, check: removed, ruleId: 'SEAT-02' })).rows;
    expect(new Set(first?.states)).toEqual(new Set(['notKnown']));
    expect(first).toMatchObject({ fits: [], tight: [], surelyTight: [], perhapsTight: [] });
    expect(other?.tight).not.toEqual([]);
  });
});

describe('dimensions of a set', () => {
  it('moves all benches together and keeps what sets them apart', () => {
    const start = bay();
    const raised = start.pieces.map((piece) =>
      piece.kind === 'bench' && piece.mark === 'B2'
        ? { ...piece, deckHeightMm: piece.deckHeightMm + 20 }
        : piece,
    );
    const document = { ...start, pieces: raised };
    const all = named(document, 'seat-height');
    const set = all.at(all.value + 10);
    const heights = (one: SetDocument | undefined) =>
      (one?.pieces ?? []).flatMap((piece) => (piece.kind === 'bench' ? [pressedSeatHeightMm(piece)] : []));
    expect(all.marks).toEqual(['B1', 'B2']);
    expect(heights(set).map((mm, i) => mm - (heights(document)[i] as number))).toEqual([
      expect.closeTo(10, 6),
      expect.closeTo(10, 6),
    ]);
  });

  it('takes tables along when asked, and one bench alone when asked', () => {
    const document = bay();
    const before = document.pieces.find(({ kind }) => kind === 'table');
    const after = named(document, 'seat-and-tables')
      .at(named(document, 'seat-and-tables').value - INCH)
      ?.pieces.find(({ kind }) => kind === 'table');
    if (before?.kind !== 'table' || after?.kind !== 'table') throw new Error('the table is gone');
    expect(after.heightMm).toBeCloseTo(before.heightMm - INCH, 6);
    const alone = named(document, `seat-height|${document.pieces.find(({ kind }) => kind === 'bench')?.id}`);
    expect(alone.marks).toHaveLength(1);
  });

  it('widens a table with diners on both sides by twice the overlap', () => {
    const document = bay();
    const table = document.pieces.find(({ kind }) => kind === 'table');
    const overlap = named(document, `table-overlap|${table?.id}`);
    const after = overlap.at(overlap.value + 20);
    const overlapOf = (set: SetDocument) =>
      measureSet(set).places.map(({ table: over }) => over?.overlapMm ?? 0);
    expect(after && overlapOf(after).map((mm, i) => mm - (overlapOf(document)[i] as number))).toEqual(
      overlapOf(document).map(() => expect.closeTo(20, 6)),
    );
  });

  it('finds the dimension that a number of a piece is', () => {
    const document = bay();
    const [bench, table] = ['B1', 'T1'].map(
      (mark) => document.pieces.find((piece) => piece.mark === mark)?.id ?? '',
    );
    const own = dimensionIdOf(document, bench ?? '', 'pressedSeatHeight');
    expect(named(document, own ?? '').marks).toEqual(['B1']);
    expect(named(document, dimensionIdOf(document, table ?? '', 'heightMm') ?? '').marks).toEqual(['T1']);
    expect(dimensionIdOf(document, bench ?? '', 'places.count')).toBeUndefined();
    expect(dimensionIdOf(document, 'gone', 'heightMm')).toBeUndefined();
  });

  it('says nothing of an empty set and keeps inside every limit', () => {
    expect(dimensionsOf(emptySetDocument())).toEqual([]);
    for (const dimension of dimensionsOf(bay())) {
      for (const value of [dimension.value, dimension.min, dimension.max]) {
        const set = dimension.at(value);
        const now = set && dimensionOf(set, dimension.id)?.value;
        expect(now, `${dimension.id} at ${value}`).toBeCloseTo(value, 3);
      }
    }
  });
});

describe('a story stick of the seat height', () => {
  const document = bay();
  const stick = stickOf(named(document, 'seat-height'), 'SEAT-02');

  it('finds the bands that the lines of the sheet give', () => {
    const [row] = stick.rows;
    const needs = seatHeightNeeds(document, check(document), 'b1').bands[0]!;
    // A stick's bands go by best values; those of the seat height are drawn in by what the cushion leaves open.
    const whole = ({ lower, upper }: LimitLines) => ({
      from: expect.closeTo(lower! - needs.drawnInMm, 3),
      to: expect.closeTo(upper! + needs.drawnInMm, 3),
    });
    expect(needs.drawnInMm).toBeGreaterThan(0);
    expect(row?.fits).toEqual([whole(needs.fits)]);
    expect(row?.tight).toEqual([whole(needs.tight)]);
  });

  it('has the range of the cushion for a measured sitter and a wider one for one who was told', () => {
    const [measured, told] = stick.rows;
    const [band] = told?.tight ?? [];
    const { drops } = cellOf(check(document), 'SEAT-02');
    const { lowMm, bestMm, highMm } = drops![0]!;
    const [whole, perhaps] = [measured?.tight[0], measured?.perhapsTight[0]];
    expect(perhaps?.to).toBeCloseTo((whole?.to ?? 0) + highMm - bestMm, 1);
    expect(perhaps?.from).toBeCloseTo((whole?.from ?? 0) - (bestMm - lowMm), 1);
    expect(told?.estimated).toBe(true);
    expect(told?.perhapsTight[0]?.from).toBeLessThan((band?.from ?? 0) - 5);
    expect(told?.surelyTight[0]?.from ?? Infinity).toBeGreaterThan((band?.from ?? 0) + 5);
  });

  it('holds in common only what every verdict of a told sitter passes, though the best guess passes more', () => {
    const { values, rows, allFit, allTight } = stick;
    const passes = (i: number) => rows.every(({ states }) => ['fits', 'tight'].includes(states[i] ?? 'gone'));
    const inAll = values.map((value) => allTight.some(({ from, to }) => from <= value && value <= to));
    expect(inAll).toEqual(values.map((_, i) => passes(i)));
    const guessed = values.filter((value) =>
      rows.every(({ tight }) => tight.some(({ from, to }) => from <= value && value <= to)),
    );
    expect(inAll.filter(Boolean).length).toBeLessThan(guessed.length);
    for (const { from, to } of allFit) {
      for (const [i, value] of values.entries()) {
        if (value >= from && value <= to)
          expect(rows.map(({ states }) => states[i])).toEqual(['fits', 'fits']);
      }
    }
  });

  it('is good nowhere where a check or a seat is gone', () => {
    const height = named(document, 'seat-height');
    const start = stickOf(height);
    const cut: Dimension = {
      ...height,
      at: (value, on) => {
        const set = height.at(value, on);
        if (!set || value <= height.value + 1) return set;
        return { ...set, pieces: set.pieces.filter(({ mark }) => mark !== 'B2') };
      },
    };
    const { rows, ruleIds, allTight } = stickOf(cut);
    expect(ruleIds).toContain('SEAT-05');
    expect(rows).toHaveLength(start.rows.length);
    for (const [i, value] of start.values.entries()) {
      if (value > height.value + 1) expect(rows[1]?.states[i]).toBe('gone');
      else expect(rows[1]?.states[i]).not.toBe('gone');
    }
    expect(rows[1]?.perhapsTight.every(({ to }) => to <= height.value + 1)).toBe(true);
    expect(allTight.every(({ to }) => to <= height.value + 1)).toBe(true);
  });

  it('agrees with the sheet at every value', () => {
    for (const [i, value] of stick.values.entries()) {
      const sheet = check(stick.dimension.at(value) as SetDocument);
      const cell = sheet.rows[0]?.cells.find(({ ruleId }) => ruleId === 'SEAT-02');
      expect(stick.rows[0]?.states[i]).toBe(cell?.outcome.kind === 'verdict' ? cell.outcome.verdict : 'gone');
    }
  });

  it('names every rule that the height moves and no other', () => {
    expect(stick.ruleIds).toContain('TABLE-05');
    expect(stick.ruleIds).toContain('SEAT-02');
    expect(stick.ruleIds).not.toContain('SEAT-04');
    expect(stick.ruleIds).not.toContain('SEAT-05');
  });

  it('shows the clause of a bench that is marked accessible', () => {
    const marked = {
      ...document,
      pieces: document.pieces.map((piece) => (piece.mark === 'B1' ? { ...piece, accessible: true } : piece)),
    };
    const [clause] = stickOf(named(marked, 'seat-height')).clauses;
    expect(clause?.ruleId).toBe('ACC-01');
    expect(clause?.inside).toHaveLength(1);
  });
});
