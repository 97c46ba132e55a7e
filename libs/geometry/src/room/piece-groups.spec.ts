import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { anyPiece } from '../../test/arbitrary-pieces.ts';
import { alignPieces, spacePieces, type AlignEdge, type RoomAxis } from './align-pieces.ts';
import { ARRANGEMENTS } from './arrangements.ts';
import type { Piece, SetDocument } from './document.ts';
import { footprint } from './footprint.ts';
import { duplicatePieces, movePieces, removePieces, turnPieces } from './piece-groups.ts';
import { emptySetDocument, readSetDocument } from './read-document.ts';
import { seatSitter } from './seating.ts';

const CAST = { kind: 'cast', castId: '7f3f3e0c-6f0f-4d8e-9a55-0a4f4d6f0b11' } as const;

const banquette = (): SetDocument => ARRANGEMENTS.find(({ id }) => id === 'banquette')!.build();
const pieceOf = (document: SetDocument, id: string): Piece => document.pieces.find((one) => one.id === id)!;
const along = (piece: Piece, axis: RoomAxis) => {
  const values = footprint(piece).corners.map(([x, z]) => (axis === 'across' ? x : z));
  return { low: Math.min(...values), high: Math.max(...values) };
};
const withLocked = (document: SetDocument, id: string): SetDocument => ({
  ...document,
  pieces: document.pieces.map((one) => (one.id === id ? { ...one, locked: true } : one)),
});

/** A set of three to six pieces of any kind anywhere. */
const anySet = fc.array(anyPiece, { minLength: 3, maxLength: 6 }).map((pieces) => ({
  ...emptySetDocument(),
  pieces: pieces.map((piece, n): Piece => ({ ...piece, id: `p${n}`, mark: `B${n + 1}` })),
}));
const idsOf = (document: SetDocument) => document.pieces.map(({ id }) => id);

describe('several pieces', () => {
  it('move by the same way, but for those that are locked', () => {
    const document = withLocked(banquette(), 't2');
    const moved = movePieces(document, ['t1', 't2', 'l1', 'nobody'], { xMm: 10, zMm: -20 });
    for (const id of ['t1', 'l1']) {
      const { xMm, zMm } = pieceOf(document, id).at;
      expect(pieceOf(moved, id).at).toMatchObject({ xMm: xMm + 10, zMm: zMm - 20 });
    }
    expect(pieceOf(moved, 't2')).toEqual(pieceOf(document, 't2'));
    expect(pieceOf(moved, 'b1')).toEqual(pieceOf(document, 'b1'));
  });

  it('turn about their common middle: a quarter swaps what lay across with what lay along', () => {
    const document = banquette();
    const turned = turnPieces(document, ['t1', 't2'], 90);
    // The tables stand left and right of x = 0 at one depth; turned, they stand one behind the other.
    const [a, b] = [pieceOf(turned, 't1').at, pieceOf(turned, 't2').at];
    expect([a.xMm, b.xMm]).toEqual([expect.closeTo(0, 6), expect.closeTo(0, 6)]);
    const apart = pieceOf(document, 't2').at.xMm - pieceOf(document, 't1').at.xMm;
    expect(a.zMm - b.zMm).toBeCloseTo(apart, 6);
    expect(a.turnDeg).toBe(90);
  });

  it('come back when they are turned back, and keep their distances meanwhile', () => {
    fc.assert(
      fc.property(anySet, fc.integer({ min: -180, max: 180 }), (document, byDeg) => {
        const ids = idsOf(document);
        const turned = turnPieces(document, ids, byDeg);
        const apart = (set: SetDocument) =>
          Math.hypot(
            pieceOf(set, 'p0').at.xMm - pieceOf(set, 'p1').at.xMm,
            pieceOf(set, 'p0').at.zMm - pieceOf(set, 'p1').at.zMm,
          );
        expect(apart(turned)).toBeCloseTo(apart(document), 6);
        for (const piece of turnPieces(turned, ids, -byDeg).pieces) {
          const { at } = pieceOf(document, piece.id);
          expect(piece.at.xMm).toBeCloseTo(at.xMm, 6);
          expect(piece.at.zMm).toBeCloseTo(at.zMm, 6);
        }
      }),
    );
  });

  it('are taken out with whoever sat there', () => {
    const document = seatSitter(banquette(), 'b1', 1, CAST);
    const left = removePieces(document, ['b1', 't1']);
    expect(idsOf(left)).toEqual(idsOf(document).filter((id) => id !== 'b1' && id !== 't1'));
    expect(left.seating).toEqual([]);
    expect(removePieces(document, ['nobody'])).toBe(document);
  });

  it('are copied as they stand to each other, clear of themselves', () => {
    const document = seatSitter(withLocked(banquette(), 't1'), 'b1', 1, CAST);
    const ids = ['b1', 't1', 't2'];
    const { document: copied, pieceIds } = duplicatePieces(document, ids);
    expect(pieceIds.map((id) => pieceOf(copied, id).mark)).toEqual(['B2', 'T3', 'T4']);
    const right = Math.max(...ids.map((id) => along(pieceOf(document, id), 'across').high));
    const [first = '', ...rest] = pieceIds;
    const by = pieceOf(copied, first).at.xMm - pieceOf(document, 'b1').at.xMm;
    rest.forEach((id, n) => {
      const original = pieceOf(document, ids[n + 1] ?? '');
      expect(pieceOf(copied, id).at).toMatchObject({ zMm: original.at.zMm, turnDeg: original.at.turnDeg });
      expect(pieceOf(copied, id).at.xMm - original.at.xMm).toBeCloseTo(by, 6);
    });
    for (const id of pieceIds) expect(along(pieceOf(copied, id), 'across').low).toBeGreaterThan(right);
    expect(copied.seating).toHaveLength(1);
    expect(readSetDocument(copied).ok).toBe(true);
  });
});

describe('lining up', () => {
  const EDGES: [AlignEdge, RoomAxis, (stretch: { low: number; high: number }) => number][] = [
    ['left', 'across', ({ low }) => low],
    ['right', 'across', ({ high }) => high],
    ['back', 'along', ({ low }) => low],
    ['front', 'along', ({ high }) => high],
    ['middle-across', 'across', ({ low, high }) => (low + high) / 2],
    ['middle-along', 'along', ({ low, high }) => (low + high) / 2],
  ];

  it.each(EDGES)(
    'brings pieces of any kind to the first at %s, and moves no other way',
    (edge, axis, read) => {
      fc.assert(
        fc.property(anySet, (document) => {
          const lined = alignPieces(document, idsOf(document), edge);
          const line = read(along(pieceOf(document, 'p0'), axis));
          expect(pieceOf(lined, 'p0')).toEqual(pieceOf(document, 'p0'));
          const other = axis === 'across' ? 'zMm' : 'xMm';
          for (const piece of lined.pieces) {
            expect(read(along(piece, axis))).toBeCloseTo(line, 6);
            expect(piece.at[other]).toBe(pieceOf(document, piece.id).at[other]);
          }
        }),
        { numRuns: 30 },
      );
    },
  );

  it('leaves what is locked where it is', () => {
    const document = withLocked(banquette(), 'l2');
    const lined = alignPieces(document, ['l1', 'l2', 'l3'], 'left');
    expect(pieceOf(lined, 'l2')).toEqual(pieceOf(document, 'l2'));
    expect(pieceOf(lined, 'l3').at.xMm).toBeCloseTo(pieceOf(document, 'l1').at.xMm, 6);
  });
});

describe('spacing evenly', () => {
  /** Gaps of a set between neighbours, in the order in which they stood before. */
  const gapsOf = (before: SetDocument, after: SetDocument, ids: readonly string[], axis: RoomAxis) => {
    const middle = (id: string) => {
      const { low, high } = along(pieceOf(before, id), axis);
      return low + high;
    };
    const row = [...ids].sort((a, b) => middle(a) - middle(b)).map((id) => along(pieceOf(after, id), axis));
    return row.slice(1).map(({ low }, n) => low - (row[n]?.high ?? 0));
  };

  it.each(['across', 'along'] as const)(
    'leaves the same gap everywhere %s; the first named stays',
    (axis) => {
      fc.assert(
        fc.property(anySet, fc.nat(), (document, n) => {
          const all = idsOf(document);
          const first = all[n % all.length] ?? '';
          const ids = [first, ...all.filter((id) => id !== first)];
          const spaced = spacePieces(document, ids, axis);
          expect(pieceOf(spaced, first)).toEqual(pieceOf(document, first));
          const gaps = gapsOf(document, spaced, ids, axis);
          for (const gap of gaps) expect(gap).toBeCloseTo(gaps[0] ?? NaN, 5);
        }),
      );
    },
  );

  it('keeps the ends of the row where an end stays, and the gap by hand', () => {
    // Chairs at −1219.2, −609.6, 609.6 and 1219.2, each 431.8 wide: 2438.4 from first to last, 812.8 a step.
    const document = banquette();
    const spaced = spacePieces(document, ['l1', 'l2', 'l3', 'l4'], 'across');
    expect(['l1', 'l2', 'l3', 'l4'].map((id) => pieceOf(spaced, id).at.xMm)).toEqual(
      [-1219.2, -406.4, 406.4, 1219.2].map((x) => expect.closeTo(x, 6)),
    );
    // With the second as the one that stays, the whole row goes with it.
    const other = spacePieces(document, ['l2', 'l1', 'l3', 'l4'], 'across');
    expect(['l1', 'l2', 'l3', 'l4'].map((id) => pieceOf(other, id).at.xMm)).toEqual(
      [-1422.4, -609.6, 203.2, 1016].map((x) => expect.closeTo(x, 6)),
    );
  });

  it('passes over what is locked, and needs three that can take part', () => {
    const document = withLocked(banquette(), 'l2');
    const spaced = spacePieces(document, ['l1', 'l2', 'l3', 'l4'], 'across');
    expect(pieceOf(spaced, 'l2')).toEqual(pieceOf(document, 'l2'));
    expect(pieceOf(spaced, 'l3').at.xMm).toBeCloseTo(0, 6);
    expect(spacePieces(document, ['l1', 'l2', 'l3'], 'across')).toBe(document);
    expect(spacePieces(document, ['l1', 'l4'], 'across')).toBe(document);
  });
});
