import {
  checkSet,
  createBodyModel,
  loadRuleBook,
  seatSinkMm,
  type FitSheet,
  type KnownPerson,
  type Sitter,
} from '@settlewright/anthropometry';
import rules from '@settlewright/seed-data/fit-rules.json' with { type: 'json' };
import survey from '@settlewright/seed-data/populations/ansur2.json' with { type: 'json' };
import { describe, expect, it } from 'vitest';
import { poseMannequin } from '../mannequin/pose.ts';
import { benchLayout } from '../pieces/bench-layout.ts';
import { parametersOf } from '../pieces/parameters.ts';
import { placeFramesOf } from '../pieces/place-frames.ts';
import { ARRANGEMENTS } from '../room/arrangements.ts';
import type { PieceOf, SetDocument } from '../room/document.ts';
import { newPiece } from '../room/edit-pieces.ts';
import { measureSet } from '../situation/measure-set.ts';
import type { TapeLine } from './tape-line.ts';
import { tapeLines, type TapeBody } from './tape-lines.ts';

const model = createBodyModel(survey);
const ruleBook = loadRuleBook(rules);
const built = (id: string): SetDocument => ARRANGEMENTS.find((a) => a.id === id)!.build();

const PEOPLE: KnownPerson[] = [1520, 1850].map((mm, i) => ({
  bodyData: i === 0 ? 'women' : 'men',
  stature: { mm, source: 'measured' },
  weightKg: i === 0 ? 52 : 96,
  measured: {},
  shoeMm: 25,
  clothing: 'light',
}));

/** A set with people at its first places: sheet, posed bodies and tapes. */
function seated(document: SetDocument, selected?: string) {
  const situation = measureSet(document, ruleBook);
  const frames = placeFramesOf(document);
  const sitters: Sitter[] = PEOPLE.map((person, i) => ({
    id: `s${i}`,
    name: ['Una', 'Bram'][i]!,
    kind: 'cast',
    placeId: frames[i]!.placeId,
    person,
  }));
  const settings = { backPosture: 'dining', trafficBehind: 'none' } as const;
  const sheet: FitSheet = checkSet({ situation, sitters, ruleBook, model, settings });
  const bodies: TapeBody[] = sitters.map(({ placeId, person }, i) => {
    const place = situation.places.find((p) => p.placeId === placeId)!;
    const body = model.predict(person);
    const sinkMm = place.foam ? seatSinkMm(place.foam, body.weightKg).sinkMm : 0;
    const input = { means: body.means(), shoeMm: person.shoeMm, frame: frames[i]!, situation: place, sinkMm };
    return { placeId, pose: poseMannequin(input) };
  });
  return { sheet, bodies, situation, tapes: tapeLines(document, sheet, selected, bodies) };
}

const span = ({ fromMm, toMm }: TapeLine): number => Math.hypot(...fromMm.map((v, i) => toMm[i]! - v));
const gaps = (tapes: TapeLine[]): TapeLine[] => tapes.filter(({ kind }) => kind === 'gap');

describe('tapes of a selected piece', () => {
  it.each(ARRANGEMENTS.filter(({ id }) => id !== 'empty').map(({ id }) => id))(
    'in %s are as long as they say',
    (id) => {
      const document = built(id);
      const { sheet } = seated(document);
      for (const piece of document.pieces) {
        const own = tapeLines(document, sheet, piece.id).filter(({ kind }) => kind === 'dimension');
        expect(own.length).toBeGreaterThan(0);
        const parameters = new Map(parametersOf(piece).map((p) => [p.key, p.value]));
        for (const tape of own) {
          expect(span(tape), `${piece.mark} ${tape.name}`).toBeCloseTo(tape.valueMm, 6);
          expect(parameters.get(tape.parameterKey!)).toBe(tape.valueMm);
          expect(tape.describes).toContain(piece.mark);
        }
      }
    },
  );

  it('are fixed when the piece is locked', () => {
    const document = structuredClone(built('bench-window'));
    document.pieces.forEach((piece) => (piece.locked = true));
    const { tapes } = seated(document, document.pieces[0]!.id);
    const own = tapes.filter(({ kind }) => kind !== 'gap');
    expect(own.length).toBeGreaterThan(0);
    for (const tape of own) expect(tape).toMatchObject({ kind: 'fixed' });
    expect(own.some(({ parameterKey }) => parameterKey !== undefined)).toBe(false);
  });

  it('are absent when nothing is selected', () => {
    expect(seated(built('bench-window')).tapes.every(({ kind }) => kind === 'gap')).toBe(true);
  });
});

describe('gaps', () => {
  const document = built('bench-window');
  const { sheet, bodies, situation, tapes } = seated(document);

  it('belong to cells of the sheet, carry their verdict, have ids of their own and are as long as they say', () => {
    const cells = new Map(
      [...sheet.rows.flatMap((row) => row.cells), ...sheet.piecesAndWays].map((c) => [c.id, c]),
    );
    expect(new Set(tapes.map(({ id }) => id)).size).toBe(tapes.length);
    for (const tape of gaps(tapes)) {
      const cell = cells.get(tape.cellId!);
      expect(cell?.outcome).toMatchObject({ kind: 'verdict', verdict: tape.verdict });
      expect(span(tape), tape.describes).toBeCloseTo(Math.abs(tape.valueMm), 6);
      expect([...tape.fromMm, ...tape.toMm].every(Number.isFinite)).toBe(true);
    }
  });

  it('show the gap under a heel that hangs, from the floor up', () => {
    const una = bodies[0]!.pose;
    expect(una.heelGapMm).toBeGreaterThan(10);
    const tape = tapes.find(({ name }) => name === 'under heel')!;
    expect(tape.valueMm).toBe(una.heelGapMm);
    expect(tape.fromMm[1]).toBe(0);
    expect(tape.describes).toContain('Una');
  });

  it('measure thigh room as underside less pressed seat less thigh clearance', () => {
    for (const { placeId, pose } of bodies) {
      const place = situation.places.find((p) => p.placeId === placeId)!;
      const cell = sheet.rows
        .find((row) => row.placeId === placeId)!
        .cells.find((c) => c.ruleId === 'TABLE-01')!;
      if (cell.outcome.kind !== 'verdict' || !place.table) throw new Error('a table is expected here');
      const tape = tapes.find(({ cellId }) => cellId === cell.id)!;
      expect(tape.valueMm).toBeCloseTo(cell.outcome.value - pose.means.thigh_clearance!, 3);
      expect(tape.toMm[1]).toBeCloseTo(place.table.undersideMm, 6);
    }
  });

  it('keep their lengths when the whole set is moved and turned', () => {
    const turned = structuredClone(document);
    for (const piece of turned.pieces) {
      const { xMm, zMm, turnDeg } = piece.at;
      piece.at = { xMm: zMm + 700, zMm: -xMm - 300, turnDeg: turnDeg + 90 };
    }
    const there = seated(turned).tapes;
    expect(there.map(({ id }) => id)).toEqual(tapes.map(({ id }) => id));
    there.forEach((tape, i) => expect(tape.valueMm).toBeCloseTo(tapes[i]!.valueMm, 4));
  });

  it('without bodies show only what the set alone tells', () => {
    const names = tapeLines(document, sheet).map(({ name }) => name);
    expect(names).toContain('seat');
    expect(names).not.toContain('over thigh');
    expect(names).not.toContain('under heel');
  });

  it('leave out what a sheet of verdicts alone does not say', () => {
    const document = built('facing-benches');
    const { sheet, bodies, tapes } = seated(document);
    const silent = structuredClone(sheet);
    for (const { outcome } of [...silent.rows.flatMap(({ cells }) => cells), ...silent.piecesAndWays]) {
      if (outcome.kind === 'verdict') delete (outcome as { value?: number }).value;
    }
    const shown = gaps(tapeLines(document, silent, undefined, bodies));
    expect(shown.length).toBeGreaterThan(0);
    expect(shown.length).toBeLessThan(gaps(tapes).length);
    for (const { id, valueMm } of shown) expect(valueMm, id).toSatisfy(Number.isFinite);
  });

  it('show the room to stand up in under what hangs before the seat, and the sight past a sill at its far edge', () => {
    const under = structuredClone(document);
    const bench = under.pieces.find((p) => p.kind === 'bench')!;
    under.pieces.push({
      ...newPiece('overhead', 'o1', 'O1', bench.at),
      lengthMm: 4000,
      depthMm: 3000,
      undersideMm: 1950,
    });
    const { sheet: sheetUnder, tapes: there } = seated(under);
    const named = (name: string) => there.find((tape) => tape.name === name)!;
    const standing = named('to stand up in');
    expect([standing.fromMm[1], standing.toMm[1], standing.valueMm]).toEqual([0, 1950, 1950]);
    const past = named('eye over far edge');
    const over = there.find(({ cellId }) => cellId === past.cellId!.replace('SILL-06', 'SILL-05'))!;
    expect(past.valueMm).toBeCloseTo(over.valueMm, 6);
    const sills = measureSet(under).places.flatMap(({ sills: beside }) => beside);
    const apart = Math.hypot(past.fromMm[0] - over.fromMm[0], past.fromMm[2] - over.fromMm[2]);
    expect(sills.map(({ usableDepthMm }) => Math.round(usableDepthMm))).toContain(Math.round(apart));
    expect(sheetUnder.rows.flatMap(({ cells }) => cells).some(({ id }) => id === standing.cellId)).toBe(true);
  });

  it('between facing benches run from seat front to seat front', () => {
    const facing = built('facing-benches');
    const tape = seated(facing).tapes.find(({ name }) => name === 'seat to seat')!;
    const bench = facing.pieces.find((p): p is PieceOf<'bench'> => p.kind === 'bench')!;
    expect(tape.fromMm[1]).toBeCloseTo(benchLayout(bench).seatTopFrontMm, 6);
    expect(span(tape)).toBeCloseTo(measureSet(facing).facing[0]!.gapMm, 6);
  });
});
