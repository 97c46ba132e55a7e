import { describe, expect, it } from 'vitest';
import { PLAIN_MAKE } from '../cushions/making/cushion-make.ts';
import { ARRANGEMENTS } from './arrangements.ts';
import { carriedPieces, pastePieces } from './carry-pieces.ts';
import { chooseCushion } from './cushion-choices.ts';
import { diffDocuments } from './diff-documents.ts';
import type { PieceOf, SetDocument } from './document.ts';
import { addPiece, duplicatePiece, removePiece } from './edit-pieces.ts';
import { mergeDocuments } from './merge-documents.ts';
import { middlePlane, mirrorCopies, mirrorPieces } from './mirror-pieces.ts';
import { readSetDocument } from './read-document.ts';

const start = (): SetDocument => ARRANGEMENTS.find(({ id }) => id === 'facing-benches')!.build();
const LEFT_NOTCH = { notches: [{ edge: 'back' as const, fromMm: 30, widthMm: 90, depthMm: 60 }] };
const SEWN = { ...PLAIN_MAKE, closure: 'hand-sewn' as const, closureEdge: 'left' as const };

/** B1 in three cushions, of which the first is notched and sewn shut at its left. */
function chosen(): SetDocument {
  const document = chooseCushion(start(), 'b1/seat-1', {
    shape: LEFT_NOTCH,
    make: SEWN,
    cameraSides: ['left'],
  });
  const pieces = document.pieces.map((piece) =>
    piece.id === 'b1' && piece.kind === 'bench'
      ? {
          ...piece,
          upholstery: {
            ...piece.upholstery,
            joints: { seat: { by: 'positions' as const, atMm: [300, 700] } },
          },
        }
      : piece,
  );
  return { ...document, pieces };
}

describe('choices of cushions in a set', () => {
  it('are read back, and old documents have none', () => {
    expect(readSetDocument(start()).ok).toBe(true);
    expect(start().cushions).toBeUndefined();
    const read = readSetDocument(JSON.parse(JSON.stringify(chosen())));
    expect(read.ok && read.value.cushions).toEqual(chosen().cushions);
  });

  it('go when nothing is chosen any more, and with their piece', () => {
    const none = chooseCushion(chosen(), 'b1/seat-1', {
      shape: undefined,
      make: undefined,
      cameraSides: undefined,
    });
    expect('cushions' in none).toBe(false);
    expect('cushions' in removePiece(chosen(), 'b1')).toBe(false);
  });

  it('are refused of what cannot have them, in words', () => {
    const document = start();
    expect(chooseCushion(document, 't1/seat-1', { notes: 'x' })).toBe(document);
    const read = readSetDocument({ ...document, cushions: { 't1/seat-1': { notes: 'x' } } });
    expect(!read.ok && read.error.fields[0]).toMatchObject({
      path: 'cushions.t1/seat-1',
      code: 'no-such-cushion',
    });
    const strange = readSetDocument({ ...document, cushions: { 'b1/lid-1': {} } });
    expect(strange.ok).toBe(false);
  });

  it('go along with copies and with pieces that are carried to another set', () => {
    const { document, pieceId } = duplicatePiece(chosen(), 'b1');
    expect(document.cushions?.[`${pieceId}/seat-1`]).toEqual(chosen().cushions?.['b1/seat-1']);
    const carried = carriedPieces(chosen(), ['b1']);
    const pasted = pastePieces(start(), carried, true);
    expect(pasted.document.cushions?.[`${pasted.pieceIds[0]}/seat-1`]?.make).toEqual(SEWN);
    expect(readSetDocument(pasted.document).ok).toBe(true);
    expect(carriedPieces(chosen(), ['b2']).cushions).toBeUndefined();
  });

  it('change hands with the piece: first becomes last, left becomes right', () => {
    const plane = middlePlane(chosen(), ['b1'], 'left-right')!;
    const mirrored = mirrorPieces(chosen(), ['b1'], plane);
    expect(mirrored.cushions?.['b1/seat-1']).toBeUndefined();
    expect(mirrored.cushions?.['b1/seat-3']).toMatchObject({
      make: { closureEdge: 'right' },
      shape: { notches: [{ edge: 'back', fromEnd: 'right', fromMm: 30 }] },
      cameraSides: ['right'],
    });
    const bench = mirrored.pieces.find(({ id }) => id === 'b1') as PieceOf<'bench'>;
    const was = chosen().pieces.find(({ id }) => id === 'b1') as PieceOf<'bench'>;
    const seat = bench.upholstery.joints?.seat;
    expect(seat?.by === 'positions' && seat.atMm[1]! - seat.atMm[0]!).toBeCloseTo(400, 4);
    const again = mirrorPieces(mirrored, ['b1'], plane);
    const twice = again.pieces.find(({ id }) => id === 'b1') as PieceOf<'bench'>;
    expect(twice.upholstery.joints).toEqual(was.upholstery.joints);
    expect(again.cushions?.['b1/seat-1']?.make).toEqual(SEWN);
    const copies = mirrorCopies(chosen(), ['b1'], plane);
    expect(copies.document.cushions?.[`${copies.pieceIds[0]}/seat-3`]?.make?.closureEdge).toBe('right');
  });
});

describe('two versions of what was chosen', () => {
  const note = (notes: string) => (document: SetDocument) => chooseCushion(document, 'b1/seat-1', { notes });

  it('come together field by field', () => {
    const mine = note('pre-crush the foam')(start());
    const theirs = chooseCushion(start(), 'b1/seat-1', { make: SEWN });
    expect(diffDocuments(start(), mine, theirs)).toEqual([
      expect.objectContaining({
        label: 'Make of seat cushion 1',
        mark: 'B1',
        changedBy: 'theirs',
        key: 'make',
      }),
      expect.objectContaining({
        label: 'Notes of seat cushion 1',
        mark: 'B1',
        changedBy: 'mine',
        key: 'notes',
      }),
    ]);
    const merged = mergeDocuments(start(), mine, theirs, {});
    expect(merged.ok && merged.value.document.cushions).toEqual({
      'b1/seat-1': { make: SEWN, notes: 'pre-crush the foam' },
    });
  });

  it('ask whose to take where both chose, and give back what one side gave back', () => {
    const both = [note('hero'), note('stunt')].map((change) => change(start())) as [SetDocument, SetDocument];
    const asked = mergeDocuments(start(), ...both, {});
    expect(!asked.ok && asked.error.undecided).toEqual(['cushion:b1/seat-1:notes']);
    const taken = mergeDocuments(start(), ...both, { 'cushion:b1/seat-1:notes': 'mine' });
    expect(taken.ok && taken.value.document.cushions?.['b1/seat-1']?.notes).toBe('hero');
    const base = note('hero')(start());
    const gone = mergeDocuments(base, start(), chooseCushion(base, 'b2/seat-1', { notes: 'wet' }), {});
    expect(gone.ok && gone.value.document.cushions).toEqual({ 'b2/seat-1': { notes: 'wet' } });
  });

  it('keep the choices of a piece that only my side has, and lose those of one that was taken out', () => {
    const added = addPiece(start(), 'bench');
    const mine = chooseCushion(added.document, `${added.pieceId}/seat-1`, { notes: 'spare' });
    const merged = mergeDocuments(start(), mine, start(), {});
    expect(merged.ok && merged.value.document.cushions).toEqual({
      [`${added.pieceId}/seat-1`]: { notes: 'spare' },
    });
    const base = note('hero')(start());
    const without = mergeDocuments(base, removePiece(base, 'b1'), base, {});
    expect(without.ok && without.value.document.cushions).toBeUndefined();
  });

  it('keep both benches that were added under one id, each with its own choices', () => {
    const mine = note('mine')(addPiece(start(), 'bench', { xMm: 9000, zMm: 0, turnDeg: 0 }, 'b9').document);
    const theirs = addPiece(start(), 'bench', { xMm: 0, zMm: 9000, turnDeg: 0 }, 'b9').document;
    const own = chooseCushion(mine, 'b9/seat-1', { notes: 'of mine' });
    const other = chooseCushion(theirs, 'b9/seat-1', { notes: 'of theirs' });
    const merged = mergeDocuments(start(), own, other, {});
    if (!merged.ok) throw new Error(merged.error.message);
    const notes = Object.values(merged.value.document.cushions ?? {}).map((choice) => choice.notes);
    expect(notes.sort()).toEqual(['mine', 'of mine', 'of theirs']);
  });
});
