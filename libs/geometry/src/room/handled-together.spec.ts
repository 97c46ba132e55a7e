import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { anyPiece } from '../../test/arbitrary-pieces.ts';
import { measureSet } from '../../test/measured.ts';
import { setParameter } from '../pieces/parameters.ts';
import { toRoom } from '../parts/placement.ts';
import { placeFrames } from '../pieces/place-frames.ts';
import { ARRANGEMENTS } from './arrangements.ts';
import { arrayPieces, boardPitch, lengthAlong, pitchToFill } from './array-pieces.ts';
import { carriedPieces, pastePieces } from './carry-pieces.ts';
import { diffDocuments } from './diff-documents.ts';
import type { Piece, SetDocument } from './document.ts';
import { removePiece } from './edit-pieces.ts';
import { groupPieces, ungroupPieces } from './groups.ts';
import { mergeDocuments } from './merge-documents.ts';
import { middlePlane, mirrorCopies, mirrorPieces, wallPlane } from './mirror-pieces.ts';
import { removePieces } from './piece-groups.ts';
import { emptySetDocument, readSetDocument } from './read-document.ts';
import { choosePosture, seatSitter } from './seating.ts';

const CAST = { kind: 'cast', castId: '7f3f3e0c-6f0f-4d8e-9a55-0a4f4d6f0b11' } as const;

const arrangement = (id: string): SetDocument => {
  const build = ARRANGEMENTS.find((one) => one.id === id)?.build;
  if (!build) throw new Error(id);
  return build();
};
const pieceOf = (document: SetDocument, id: string): Piece => {
  const piece = document.pieces.find((one) => one.id === id);
  if (!piece) throw new Error(id);
  return piece;
};
const changed = (document: SetDocument, id: string, patch: object): SetDocument => ({
  ...document,
  pieces: document.pieces.map((one) => (one.id === id ? { ...one, ...patch } : one)),
});

describe('a mirror', () => {
  const plane = fc.record({
    xMm: fc.integer({ min: -5000, max: 5000 }),
    zMm: fc.integer({ min: -5000, max: 5000 }),
    alongDeg: fc.integer({ min: -180, max: 180 }),
  });

  it('held up twice changes nothing', () => {
    fc.assert(
      fc.property(anyPiece, plane, (piece, about) => {
        const set = { ...emptySetDocument(), pieces: [piece] };
        const twice = mirrorPieces(mirrorPieces(set, [piece.id], about), [piece.id], about);
        const [back] = twice.pieces;
        const { at, ...rest } = piece;
        expect(back).toMatchObject(rest);
        expect(back?.at.xMm).toBeCloseTo(at.xMm, 4);
        expect(back?.at.zMm).toBeCloseTo(at.zMm, 4);
        expect(Math.cos((((back?.at.turnDeg ?? 0) - at.turnDeg) * Math.PI) / 180)).toBeCloseTo(1, 9);
      }),
    );
  });

  it('turns a left bench into a right one, with its ends, and people keep their seats as seen', () => {
    const open = { kind: 'open', thicknessMm: 0, heightMm: 0 };
    const arm = { kind: 'arm', thicknessMm: 50, heightMm: 240 };
    const set = changed(arrangement('bench-window'), 'b1', { ends: { left: open, right: arm } });
    const seated = choosePosture(seatSitter(set, 'b1', 1, CAST), 'b1', 1, {
      arms: 'sill-left',
      nudge: { leftMm: 20, aheadMm: 5 },
    });
    const about = { xMm: 1000, zMm: 0, alongDeg: 90 };
    const [was] = placeFrames(pieceOf(seated, 'b1'), seated);
    const mirrored = mirrorPieces(seated, ['b1'], about);
    const bench = pieceOf(mirrored, 'b1');
    expect(bench).toMatchObject({ ends: { left: arm, right: open }, at: { turnDeg: -90 } });
    expect(mirrored.seating).toEqual([
      {
        pieceId: 'b1',
        place: 2,
        sitter: CAST,
        posture: { arms: 'sill-right', nudge: { leftMm: -20, aheadMm: 5 } },
      },
    ]);
    const now = placeFrames(bench, mirrored).find(({ place }) => place === 2);
    expect(now?.hipMm[0]).toBeCloseTo(2000 - (was?.hipMm[0] ?? 0), 6);
    expect(now?.hipMm[2]).toBeCloseTo(was?.hipMm[2] ?? 0, 6);
  });

  it('measures a whole mirrored set as before', () => {
    const set = arrangement('banquette');
    const ids = set.pieces.map(({ id }) => id);
    const about = middlePlane(set, ids, 'left-right');
    const there = measureSet(mirrorPieces(set, ids, about ?? { xMm: 0, zMm: 0, alongDeg: 0 }));
    const gap = (situation: typeof there) =>
      situation.places.map(({ table }) => Math.round(table?.overlapMm ?? 0) + 0).sort((a, b) => a - b);
    expect(gap(there)).toEqual(gap(measureSet(set)));
  });

  it('makes copies about a wall, and leaves locked pieces where they are', () => {
    const set = arrangement('banquette');
    const wall = pieceOf(set, 'w1');
    if (wall.kind !== 'bulkhead') throw new Error('no wall');
    const { document, pieceIds } = mirrorCopies(set, ['b1', 't1'], wallPlane(wall, 'along'));
    expect(document.pieces.length).toBe(set.pieces.length + 2);
    // The bench stands with its back at the wall: its twin stands behind the wall, back to back.
    const twin = pieceOf(document, pieceIds[0] ?? '');
    expect(twin.at).toMatchObject({ zMm: -wall.thicknessMm, turnDeg: 180 });
    expect(twin.mark).toBe('B2');
    const locked = changed(set, 't1', { locked: true });
    const mirrored = mirrorPieces(locked, ['t1', 't2'], { xMm: 0, zMm: 0, alongDeg: 0 });
    expect(pieceOf(mirrored, 't1')).toEqual(pieceOf(locked, 't1'));
    expect(pieceOf(mirrored, 't2').at.zMm).toBeCloseTo(-pieceOf(set, 't2').at.zMm, 6);
  });
});

describe('a row of copies', () => {
  it('stands at the pitch along the wall', () => {
    const set = arrangement('bench-window');
    const wall = pieceOf(set, 'w2');
    const row = { count: 4, pitchMm: 500, alongDeg: wall.at.turnDeg };
    const { document, pieceIds } = arrayPieces(set, ['t1'], row);
    expect(pieceIds).toHaveLength(3);
    pieceIds.forEach((id, i) => {
      const [xMm, , zMm] = toRoom({ ...pieceOf(set, 't1').at, turnDeg: wall.at.turnDeg }, [
        500 * (i + 1),
        0,
        0,
      ]);
      expect(pieceOf(document, id).at.xMm).toBeCloseTo(xMm, 6);
      expect(pieceOf(document, id).at.zMm).toBeCloseTo(zMm, 6);
    });
    expect(readSetDocument(document).ok).toBe(true);
  });

  it('fills a length from end to end, and takes whole boards', () => {
    const set = arrangement('banquette');
    const length = lengthAlong(set, ['t1'], 0);
    expect(length).toBeCloseTo(1219.2, 6);
    const pitch = pitchToFill(length, 6000, 4);
    expect(3 * pitch + length).toBeCloseTo(6000, 6);
    expect(boardPitch(1219.2, { faceMm: 85, revealMm: 5 })).toEqual({ boards: 14, pitchMm: 1260 });
    expect(boardPitch(180, { faceMm: 85, revealMm: 5 })).toEqual({ boards: 2, pitchMm: 180 });
  });
});

describe('pieces carried to another set', () => {
  const seated = () => seatSitter(arrangement('banquette'), 'b1', 2, CAST);

  it('come with their people, with new marks where those are taken', () => {
    const carried = carriedPieces(seated(), ['b1', 't1']);
    const pasted = pastePieces(arrangement('bench-window'), carried, true);
    expect(pasted.remarked).toEqual([
      { from: 'B1', to: 'B2' },
      { from: 'T1', to: 'T2' },
    ]);
    expect(pasted).toMatchObject({ seated: 1, unseated: 0, pieceIds: ['b2', 't2'] });
    expect(pasted.document.seating).toEqual([{ pieceId: 'b2', place: 2, sitter: CAST }]);
    expect(readSetDocument(pasted.document).ok).toBe(true);
  });

  it('leave people behind where the cast is another, or somebody sits already', () => {
    const carried = carriedPieces(seated(), ['b1']);
    expect(pastePieces(emptySetDocument(), carried, false)).toMatchObject({ seated: 0, unseated: 1 });
    expect(pastePieces(seated(), carried, true)).toMatchObject({ seated: 0, unseated: 1 });
    expect(pastePieces(emptySetDocument(), carried, true).document.pieces[0]?.at).toEqual(
      pieceOf(seated(), 'b1').at,
    );
  });
});

describe('a group', () => {
  const grouped = () => groupPieces(arrangement('banquette'), ' Left half ', ['t1', 'l1', 'nobody']);

  it('holds pieces until they are gone', () => {
    const { document, groupId } = grouped();
    expect(document.groups).toEqual([{ id: groupId, name: 'Left half', pieceIds: ['t1', 'l1'] }]);
    expect(readSetDocument(document).ok).toBe(true);
    expect(removePiece(document, 't1').groups?.[0]?.pieceIds).toEqual(['l1']);
    expect(removePieces(document, ['t1', 'l1']).groups).toBeUndefined();
    expect(ungroupPieces(document, groupId)).toEqual(arrangement('banquette'));
    const stale = { ...document, pieces: document.pieces.filter(({ id }) => id !== 't1') };
    expect(readSetDocument(stale)).toMatchObject({ ok: false, error: { code: 'invalid' } });
  });

  it('is compared and merged', () => {
    const base = arrangement('banquette');
    const { document: mine, groupId } = grouped();
    expect(diffDocuments(base, mine, base)).toEqual([
      expect.objectContaining({ kind: 'group', label: 'Group “Left half”', changedBy: 'mine' }),
    ]);
    const theirs = removePiece(base, 'l1');
    const merge = mergeDocuments(base, mine, theirs, {});
    expect(merge).toMatchObject({
      ok: true,
      value: { document: { groups: [{ id: groupId, pieceIds: ['t1'] }] } },
    });
  });
});

describe('what is hidden or locked', () => {
  it('stays measured, and is compared and merged', () => {
    const base = arrangement('bench-window');
    const hidden = changed(base, 't1', { hidden: true });
    expect(measureSet(hidden)).toEqual(measureSet(base));
    expect(diffDocuments(base, hidden, base)).toEqual([
      expect.objectContaining({ key: 'hidden', label: 'Hidden', changedBy: 'mine' }),
    ]);
    const shown = mergeDocuments(hidden, base, hidden, {});
    expect(shown.ok && shown.value.document).toEqual(base);
  });

  it('is not taken out or shaped', () => {
    const set = changed(arrangement('bench-window'), 't1', { locked: true });
    expect(removePiece(set, 't1')).toBe(set);
    expect(removePieces(set, ['t1'])).toBe(set);
    const error = { message: 'T1 is locked; unlock it to change it.' };
    expect(setParameter(set, 't1', 'heightMm', 750)).toMatchObject({ ok: false, error });
  });
});
