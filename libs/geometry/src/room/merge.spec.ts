import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { parametersOf, setParameter } from '../pieces/parameters.ts';
import { ARRANGEMENTS } from './arrangements.ts';
import { diffDocuments } from './diff-documents.ts';
import type { SetDocument } from './document.ts';
import { addPiece, movePiece, removePiece } from './edit-pieces.ts';
import { mergeDocuments } from './merge-documents.ts';
import { seatSitter } from './seating.ts';

const CAST = { kind: 'cast', castId: '7f3f3e0c-6f0f-4d8e-9a55-0a4f4d6f0b11' } as const;
const OTHER = { kind: 'cast', castId: 'a0b6f0d2-2f1a-4f7e-8f5b-6a1f0a2b3c4d' } as const;

const start = (): SetDocument => {
  const facing = ARRANGEMENTS.find(({ id }) => id === 'facing-benches');
  if (facing === undefined) throw new Error('no such arrangement');
  return facing.build();
};
const set = (document: SetDocument, id: string, key: string, value: number | string): SetDocument => {
  const changed = setParameter(document, id, key, value);
  if (!changed.ok) throw new Error(changed.error.message);
  return changed.value;
};
const merged = (...input: Parameters<typeof mergeDocuments>) => {
  const result = mergeDocuments(...input);
  if (!result.ok) throw new Error(result.error.message);
  return result.value;
};
const value = (document: SetDocument, id: string, key: string) => {
  const piece = document.pieces.find((one) => one.id === id);
  return piece && parametersOf(piece).find((one) => one.key === key)?.value;
};

describe('diffDocuments', () => {
  it('finds nothing between equal versions', () => {
    expect(diffDocuments(start(), start(), start())).toEqual([]);
    const both = set(start(), 'b1', 'lengthMm', 1500);
    expect(diffDocuments(start(), both, set(start(), 'b1', 'lengthMm', 1500))).toEqual([]);
  });

  it('says who changed what, and where both did', () => {
    const mine = set(set(start(), 'b1', 'seatDepthMm', 430), 'b1', 'lengthMm', 1300);
    const theirs = set(set(start(), 'b1', 'seatDepthMm', 460), 't1', 'heightMm', 750);
    expect(diffDocuments(start(), mine, theirs)).toEqual([
      expect.objectContaining({ key: 'at', label: 'Position', changedBy: 'mine' }),
      expect.objectContaining({
        key: 'lengthMm',
        label: 'Length',
        mark: 'B1',
        changedBy: 'mine',
        conflict: false,
      }),
      expect.objectContaining({ key: 'seatDepthMm', base: 444.5, mine: 430, theirs: 460, conflict: true }),
      expect.objectContaining({ key: 'heightMm', mark: 'T1', changedBy: 'theirs', conflict: false }),
    ]);
  });

  it('calls every difference a conflict when the common version is lost', () => {
    const differences = diffDocuments(null, set(start(), 'b1', 'lengthMm', 1300), removePiece(start(), 's1'));
    expect(differences.map(({ id, conflict }) => [id, conflict])).toEqual([
      ['piece:b1:at', true],
      ['piece:b1:lengthMm', true],
      ['piece:s1', true],
    ]);
  });
});

describe('mergeDocuments', () => {
  it('keeps what one side changed', () => {
    const mine = movePiece(set(start(), 'b1', 'lengthMm', 1300), 't1', { xMm: 1000 });
    const theirs = set(start(), 'b2', 'backLeanDeg', 12);
    const { document, unseated, remarked } = merged(start(), mine, theirs, {});
    expect(value(document, 'b1', 'lengthMm')).toBe(1300);
    expect(value(document, 't1', 'at.xMm')).toBe(1000);
    expect(value(document, 'b2', 'backLeanDeg')).toBe(12);
    expect([unseated, remarked]).toEqual([[], []]);
  });

  it('brings the entrance together: set by one side, moved by both, taken away', () => {
    const enter = (document: SetDocument, xMm: number) => ({
      ...document,
      asked: { ...document.asked, entrance: { xMm, zMm: 2200 } },
    });
    const one = enter(start(), -900);
    expect(diffDocuments(start(), one, start())).toEqual([
      expect.objectContaining({
        id: 'asked:entrance',
        label: 'Where people come in',
        base: undefined,
        mine: { xMm: -900, zMm: 2200 },
        changedBy: 'mine',
        conflict: false,
      }),
    ]);
    expect(merged(start(), one, start(), {}).document.asked.entrance).toEqual({ xMm: -900, zMm: 2200 });
    expect(merged(start(), start(), one, {}).document.asked.entrance).toEqual({ xMm: -900, zMm: 2200 });
    const [mine, theirs] = [enter(start(), 0), enter(start(), 400)];
    expect(mergeDocuments(one, mine, theirs, {})).toMatchObject({
      ok: false,
      error: { undecided: ['asked:entrance'] },
    });
    const chosen = merged(one, mine, theirs, { 'asked:entrance': 'mine' });
    expect(chosen.document.asked.entrance).toEqual({ xMm: 0, zMm: 2200 });
    // Taken away here and left alone there: it is gone, and not an empty value.
    expect(merged(one, start(), one, {}).document.asked).not.toHaveProperty('entrance');
  });

  it('chooses nothing by itself', () => {
    const mine = set(start(), 'b1', 'seatDepthMm', 430);
    const theirs = set(start(), 'b1', 'seatDepthMm', 460);
    const result = mergeDocuments(start(), mine, theirs, {});
    expect(result).toMatchObject({
      ok: false,
      error: { code: 'undecided', undecided: ['piece:b1:seatDepthMm'] },
    });
    for (const [side, depth] of [
      ['mine', 430],
      ['theirs', 460],
    ] as const) {
      const { document } = merged(start(), mine, theirs, { 'piece:b1:seatDepthMm': side });
      expect(value(document, 'b1', 'seatDepthMm')).toBe(depth);
    }
  });

  it('asks when one side removed what the other changed', () => {
    const mine = removePiece(start(), 's1');
    const theirs = set(start(), 's1', 'heightMm', 700);
    expect(mergeDocuments(start(), mine, theirs, {}).ok).toBe(false);
    expect(merged(start(), mine, theirs, { 'piece:s1': 'mine' }).document.pieces).toHaveLength(4);
    expect(merged(start(), mine, theirs, { 'piece:s1': 'theirs' }).document.pieces).toHaveLength(5);
    expect(merged(start(), mine, start(), {}).document.pieces).toHaveLength(4);
  });

  it('keeps both of two pieces that were added under one mark', () => {
    const mine = addPiece(start(), 'bench', { xMm: 4000, zMm: 0, turnDeg: 0 });
    const theirs = addPiece(start(), 'bench', { xMm: 8000, zMm: 0, turnDeg: 0 });
    expect(mine.pieceId).toBe(theirs.pieceId);
    const { document, remarked } = merged(start(), mine.document, theirs.document, {});
    expect(
      document.pieces.filter(({ kind }) => kind === 'bench').map(({ mark, at }) => [mark, at.xMm]),
    ).toEqual(
      expect.arrayContaining([
        ['B3', 8000],
        ['B4', 4000],
      ]),
    );
    expect(remarked).toMatchObject([{ from: 'B3', to: 'B4' }]);
  });

  it('merges seating place by place and seats nobody twice', () => {
    const base = seatSitter(start(), 'b1', 1, CAST);
    const mine = seatSitter(base, 'b1', 2, CAST);
    const theirs = seatSitter(seatSitter(base, 'b2', 1, CAST), 'b2', 2, OTHER);
    const { document, unseated } = merged(base, mine, theirs, {});
    expect(document.seating).toEqual(
      expect.arrayContaining([
        { pieceId: 'b1', place: 2, sitter: CAST },
        { pieceId: 'b2', place: 2, sitter: OTHER },
      ]),
    );
    expect(document.seating).toHaveLength(2);
    expect(unseated).toEqual([{ pieceId: 'b2', place: 1, sitter: CAST }]);
  });

  it('reports whoever loses a place that the other side removed', () => {
    const mine = seatSitter(start(), 'b1', 2, CAST);
    const theirs = set(start(), 'b1', 'places.count', 1);
    const { document, unseated } = merged(start(), mine, theirs, {});
    expect(document.seating).toEqual([]);
    expect(unseated).toEqual([{ pieceId: 'b1', place: 2, sitter: CAST }]);
  });

  it('gives the same whichever side is called mine, when nothing conflicts', () => {
    const edits: ((document: SetDocument) => SetDocument)[] = [
      (one) => set(one, 'b1', 'seatDepthMm', 430),
      (one) => set(one, 'b1', 'seatCushion.thicknessMm', 80),
      (one) => set(one, 'b2', 'backHeightMm', 700),
      (one) => set(one, 't1', 'heightMm', 740),
      (one) => movePiece(one, 's1', { xMm: 900 }),
      (one) => removePiece(one, 'w1'),
      (one) => seatSitter(one, 'b1', 1, CAST),
      (one) => ({ ...one, asked: { ...one.asked, backPosture: 'lounge' } }),
      (one) => ({ ...one, knownDifferences: [{ id: 'k1', text: 'Table one inch low' }] }),
    ];
    fc.assert(
      fc.property(fc.shuffledSubarray(edits), fc.nat(edits.length), (chosen, at) => {
        const apply = (list: typeof edits) => list.reduce((one, edit) => edit(one), start());
        const [mine, theirs] = [apply(chosen.slice(0, at)), apply(chosen.slice(at))];
        const key = (document: SetDocument) => ({
          ...document,
          pieces: [...document.pieces].sort((a, b) => (a.id < b.id ? -1 : 1)),
        });
        const together = key(merged(start(), mine, theirs, {}).document);
        expect(key(merged(start(), theirs, mine, {}).document)).toEqual(together);
        expect(together).toEqual(key(apply(chosen)));
      }),
      { numRuns: 60 },
    );
  }, 30_000);
});
