import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { boardRun, snapToBoards } from '../parts/boards.ts';
import { toPiece, toRoom } from '../parts/placement.ts';
import { benchLayout } from '../pieces/bench-layout.ts';
import { parametersOf, setParameter } from '../pieces/parameters.ts';
import { PIECE_KINDS, specSentence } from '../pieces/kinds.ts';
import { pressedSeatHeightMm } from '../pieces/seat-sink.ts';
import { measureSet } from '../situation/measure-set.ts';
import { alignPieces } from './align-pieces.ts';
import { ARRANGEMENTS } from './arrangements.ts';
import type { PieceOf, SetDocument } from './document.ts';
import { addPiece, duplicatePiece, movePiece, newPiece, nextMark, removePiece } from './edit-pieces.ts';
import { footprint } from './footprint.ts';
import { emptySetDocument, MAX_DOCUMENT_BYTES, readSetDocument } from './read-document.ts';
import { seatSitter } from './seating.ts';
import { snapPiece } from './snap-piece.ts';

const CAST = { kind: 'cast', castId: '7f3f3e0c-6f0f-4d8e-9a55-0a4f4d6f0b11' } as const;
const HERE = { xMm: 0, zMm: 0, turnDeg: 0 };

const bayOf = (): SetDocument => {
  const facing = ARRANGEMENTS.find(({ id }) => id === 'facing-benches');
  if (facing === undefined) throw new Error('no such arrangement');
  return facing.build();
};
const pieceOf = (document: SetDocument, id: string) => {
  const piece = document.pieces.find((one) => one.id === id);
  if (piece === undefined) throw new Error(`no piece ${id}`);
  return piece;
};

describe('arrangements', () => {
  it.each(ARRANGEMENTS.map((one) => [one.id, one] as const))('%s is a sound document', (_, { build }) => {
    const document = build();
    expect(readSetDocument(JSON.parse(JSON.stringify(document)))).toEqual({ ok: true, value: document });
    expect(build()).toEqual(document);
  });

  it('start with sane sizes: seat 18 in pressed, 17 1/2 in deep, table 29 in, overlap 1 1/2 in', () => {
    for (const { build } of ARRANGEMENTS) {
      const document = build();
      for (const piece of document.pieces) {
        if (piece.kind === 'bench') expect(pressedSeatHeightMm(piece)).toBeCloseTo(457.2, 6);
        if (piece.kind === 'bench') expect(piece.seatDepthMm).toBe(444.5);
        if (piece.kind === 'table') expect(piece.heightMm).toBe(736.6);
      }
      for (const { table, mark } of measureSet(document).places) {
        if (table !== undefined && mark.startsWith('B')) expect(table.overlapMm).toBeCloseTo(38.1, 6);
      }
    }
  });
});

describe('readSetDocument', () => {
  const read = (change: (document: SetDocument) => unknown) => {
    const result = readSetDocument(change(bayOf()));
    return result.ok ? undefined : result.error;
  };

  it.each([[null], ['text'], [[]], [7]])('refuses %j', (json) =>
    expect(readSetDocument(json)).toMatchObject({ ok: false, error: { code: 'not-a-document' } }),
  );

  it('refuses a newer layout without touching it, and one it does not know', () => {
    expect(read((one) => ({ ...one, schemaVersion: 2 }))?.code).toBe('newer-layout');
    expect(read((one) => ({ ...one, schemaVersion: 'one' }))?.code).toBe('unknown-layout');
  });

  it('names the field, what was read and what is accepted', () => {
    const error = read((one) => ({ ...one, pieces: [{ ...one.pieces[0], lengthMm: 99999 }] }));
    expect(error).toMatchObject({
      code: 'invalid',
      fields: [{ path: 'pieces.0.lengthMm', code: 'too_big' }],
    });
    expect(error?.fields[0]?.message).toMatch(/12000.*99999/);
  });

  it('refuses unknown keys, values that are not finite, and a broken discriminator', () => {
    expect(read((one) => ({ ...one, extra: 1 }))?.code).toBe('invalid');
    expect(read((one) => ({ ...one, pieces: [{ ...one.pieces[0], lengthMm: NaN }] }))?.code).toBe('invalid');
    expect(read((one) => ({ ...one, pieces: [{ ...one.pieces[0], kind: 'sofa' }] }))?.code).toBe('invalid');
  });

  it('refuses ids and marks that repeat', () => {
    const twice = (key: 'id' | 'mark') =>
      read((one) => ({
        ...one,
        pieces: one.pieces.map((piece, i) => (i === 1 ? { ...piece, [key]: one.pieces[0]?.[key] } : piece)),
      }));
    expect(twice('id')?.fields).toMatchObject([{ path: 'pieces.1.id', code: 'duplicate' }]);
    expect(twice('mark')?.fields).toMatchObject([{ path: 'pieces.1.mark', code: 'duplicate' }]);
  });

  it('refuses a seat that is not there, a place or a person twice', () => {
    const seating = (...seats: [string, number][]) =>
      read((one) => ({
        ...one,
        seating: seats.map(([pieceId, place]) => ({ pieceId, place, sitter: CAST })),
      }));
    expect(seating(['b1', 3])?.fields[0]).toMatchObject({ path: 'seating.0', code: 'no-such-place' });
    expect(seating(['t1', 1])?.fields[0]?.code).toBe('no-such-place');
    expect(seating(['b1', 1], ['b2', 1])?.fields[0]).toMatchObject({ path: 'seating.1.sitter.castId' });
    expect(seating(['b1', 1], ['b1', 1])?.fields[0]?.path).toBe('seating.1');
    expect(seating(['b1', 1])).toBeUndefined();
  });

  it('refuses more than 300 pieces and more than 1 MB', () => {
    const many = (n: number, note: string) => ({
      ...emptySetDocument(),
      pieces: Array.from({ length: n }, (_, i) => ({
        ...newPiece('table', `t${i}`, `T${i + 1}`, HERE),
        note,
      })),
    });
    expect(readSetDocument(many(300, '')).ok).toBe(true);
    expect(readSetDocument(many(301, ''))).toMatchObject({ ok: false, error: { code: 'invalid' } });
    const big = readSetDocument(many(300, 'ø'.repeat(1700)));
    expect(big).toMatchObject({ ok: false, error: { code: 'too-large' } });
    expect(JSON.stringify(many(300, 'ø'.repeat(1700))).length).toBeLessThan(MAX_DOCUMENT_BYTES);
  });
});

describe('editing pieces', () => {
  it('gives the next mark of each kind', () => {
    const document = bayOf();
    expect(PIECE_KINDS.map((kind) => nextMark(document, kind))).toEqual(['B3', 'T2', 'S2', 'W2', 'L1', 'O1']);
  });

  it('adds pieces that make a sound document, beside what is there', () => {
    const document = PIECE_KINDS.reduce((set, kind) => addPiece(set, kind).document, bayOf());
    expect(document.pieces).toHaveLength(5 + PIECE_KINDS.length);
    expect(readSetDocument(document).ok).toBe(true);
    const boxes = document.pieces.map((piece) => footprint(piece).corners.map(([x]) => x));
    const right = Math.max(...boxes.slice(0, 5).flat());
    for (const xs of boxes.slice(5)) expect(Math.min(...xs)).toBeGreaterThan(right);
  });

  it('leaves the document it was given as it was', () => {
    const document = bayOf();
    const before = JSON.stringify(document);
    addPiece(document, 'bench');
    removePiece(document, 'b1');
    movePiece(document, 'b1', { xMm: 5 });
    setParameter(document, 'b1', 'lengthMm', 2000);
    expect(JSON.stringify(document)).toBe(before);
  });

  it('takes the seating of a piece with it', () => {
    const seated = seatSitter(bayOf(), 'b1', 1, CAST);
    expect(removePiece(seated, 'b1').seating).toEqual([]);
    expect(removePiece(seated, 'b2').seating).toHaveLength(1);
  });

  it('copies a piece with a new id and mark and nobody on it', () => {
    const { document, pieceId } = duplicatePiece(seatSitter(bayOf(), 'b1', 1, CAST), 'b1');
    expect(pieceOf(document, pieceId)).toMatchObject({ mark: 'B3', lengthMm: 1219.2 });
    expect(document.seating).toHaveLength(1);
    expect(readSetDocument(document).ok).toBe(true);
  });

  it('does not move a locked piece', () => {
    const document = bayOf();
    const locked = { ...document, pieces: document.pieces.map((piece) => ({ ...piece, locked: true })) };
    expect(movePiece(locked, 't1', { xMm: 9 })).toEqual(locked);
  });

  it('seats a person once, and nobody where no place is', () => {
    const moved = seatSitter(seatSitter(bayOf(), 'b1', 1, CAST), 'b2', 2, CAST);
    expect(moved.seating).toEqual([{ pieceId: 'b2', place: 2, sitter: CAST }]);
    expect(seatSitter(moved, 'b2', 7, CAST)).toBe(moved);
    expect(seatSitter(moved, 'b2', 2, null).seating).toEqual([]);
  });

  it('lines pieces up with the first', () => {
    const lined = alignPieces(bayOf(), ['b1', 'b2', 't1'], 'back');
    const backs = ['b1', 'b2', 't1'].map((id) => {
      const zs = footprint(pieceOf(lined, id)).corners.map(([, z]) => z);
      return Math.min(...zs);
    });
    for (const back of backs) expect(back).toBeCloseTo(backs[0] ?? NaN, 6);
  });
});

describe('parameters', () => {
  it('cover every number of every sentence', () => {
    for (const kind of PIECE_KINDS) {
      const piece = newPiece(kind, 'x', 'B1', HERE);
      const keys = parametersOf(piece).map(({ key }) => key);
      const { main, more } = specSentence(piece);
      for (const token of [...main, ...more]) if (token.kind === 'number') expect(keys).toContain(token.key);
    }
  });

  it('say the curve of a back, as far as it is asked', () => {
    const bench = newPiece('bench', 'x', 'B1', HERE);
    const said = (lumbar?: { apexMm: number; recessMm: number }, backHeightMm = 600) =>
      specSentence({ ...bench, backHeightMm, ...(lumbar && { lumbar }) })
        .more.map((token) => (token.kind === 'number' ? `[${token.key}]` : token.text))
        .join('');
    const both =
      'back fullest [lumbar.apexMm] over the pressed seat and giving way [lumbar.recessMm] for the pelvis';
    expect(said({ apexMm: 180, recessMm: 25 })).toContain(`front up, ${both} below it, [places.count]`);
    expect(said({ apexMm: 0, recessMm: 25 })).toContain(
      ', back giving way [lumbar.recessMm] for the pelvis, ',
    );
    expect(said({ apexMm: 180, recessMm: 0 })).toContain(
      ', back fullest [lumbar.apexMm] over the pressed seat, ',
    );
    for (const flat of [said(), said({ apexMm: 0, recessMm: 0 }), said({ apexMm: 180, recessMm: 25 }, 0)]) {
      expect(flat).not.toContain('lumbar');
    }
  });

  it('take both limits and say what was read beyond them', () => {
    for (const kind of PIECE_KINDS) {
      const { document, pieceId } = addPiece(emptySetDocument(), kind);
      for (const parameter of parametersOf(pieceOf(document, pieceId))) {
        if (parameter.kind === 'choice') continue;
        const { key, min, max } = parameter;
        expect(Number.isFinite(min) && Number.isFinite(max), key).toBe(true);
        for (const value of [min, max]) {
          const taken = setParameter(document, pieceId, key, value);
          expect(taken.ok, `${kind} ${key} ${value}`).toBe(true);
          if (taken.ok) expect(readSetDocument(taken.value).ok, `${kind} ${key} ${value}`).toBe(true);
        }
        for (const value of [min - 1, max + 1, NaN]) {
          const refused = setParameter(document, pieceId, key, value);
          expect(refused).toMatchObject({ ok: false, error: { key, min, max } });
        }
      }
    }
  });

  it('read back what was set', () => {
    for (const kind of PIECE_KINDS) {
      const { document, pieceId } = addPiece(emptySetDocument(), kind);
      for (const { key, kind: sort, min, max, choices } of parametersOf(pieceOf(document, pieceId))) {
        const value =
          sort === 'choice' ? (choices?.at(-1)?.value ?? '') : sort === 'count' ? min : (min + max) / 2;
        const set = setParameter(document, pieceId, key, value);
        if (!set.ok) throw new Error(set.error.message);
        const now = parametersOf(pieceOf(set.value, pieceId)).find((one) => one.key === key);
        if (typeof value === 'number') expect(now?.value, key).toBeCloseTo(value, 6);
        else expect(now?.value, key).toBe(value);
      }
    }
  });

  it('keep the pressed seat where it is when the cushion changes', () => {
    const { document, pieceId } = addPiece(emptySetDocument(), 'bench');
    const thin = setParameter(document, pieceId, 'seatCushion.thicknessMm', 50);
    expect(thin.ok && pressedSeatHeightMm(pieceOf(thin.value, pieceId) as PieceOf<'bench'>)).toBeCloseTo(
      457.2,
      6,
    );
  });

  it('let a bench grow away from the wall it stands at', () => {
    const longer = setParameter(bayOf(), 'b1', 'lengthMm', 1500);
    if (!longer.ok) throw new Error(longer.error.message);
    const zs = footprint(pieceOf(longer.value, 'b1')).corners.map(([, z]) => z);
    expect([Math.min(...zs), Math.max(...zs)]).toEqual([expect.closeTo(0, 6), expect.closeTo(1500, 6)]);
    const free = setParameter(removePiece(bayOf(), 'w1'), 'b1', 'lengthMm', 1500);
    expect(free.ok && pieceOf(free.value, 'b1').at).toEqual(pieceOf(bayOf(), 'b1').at);
  });

  it('do not move or shape a locked piece', () => {
    const document = bayOf();
    const locked = { ...document, pieces: document.pieces.map((piece) => ({ ...piece, locked: true })) };
    expect(setParameter(locked, 't1', 'at.xMm', 5)).toMatchObject({ ok: false, error: { key: 'at.xMm' } });
    expect(setParameter(locked, 't1', 'heightMm', 750).ok).toBe(false);
  });

  it('unseat whoever sat at a place that is gone', () => {
    const seated = seatSitter(bayOf(), 'b1', 2, CAST);
    const one = setParameter(seated, 'b1', 'places.count', 1);
    expect(one.ok && one.value.seating).toEqual([]);
  });

  it('refuse a key or a piece that is not there', () => {
    expect(setParameter(bayOf(), 'b1', 'colour', 1)).toMatchObject({ ok: false, error: { key: 'colour' } });
    expect(setParameter(bayOf(), 'zz', 'lengthMm', 1).ok).toBe(false);
    expect(setParameter(bayOf(), 'b1', 'base', 'air')).toMatchObject({ ok: false, error: { key: 'base' } });
  });
});

describe('boards', () => {
  it('make a run of n · module − reveal', () => {
    // 24 boards of 3 1/8 in with 1/8 in reveals: 24 × 82.55 − 3.175.
    const boards = { faceMm: 79.375, revealMm: 3.175 };
    expect(snapToBoards(1980, boards)).toEqual({ lengthMm: expect.closeTo(1978.025, 6), boards: 24 });
    const run = boardRun(1978.025, boards);
    expect(run).toHaveLength(24);
    for (const { widthMm } of run) expect(widthMm).toBeCloseTo(79.375, 6);
  });

  it('fill any length, ripping only the end boards, both alike', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 200, max: 9000, noNaN: true }),
        fc.double({ min: 40, max: 190, noNaN: true }),
        fc.double({ min: 0, max: 10, noNaN: true }),
        (length, faceMm, revealMm) => {
          const run = boardRun(length, { faceMm, revealMm });
          for (const { widthMm } of run.slice(1, -1)) expect(widthMm).toBeCloseTo(faceMm, 6);
          expect(run[0]?.widthMm).toBeCloseTo(run.at(-1)?.widthMm ?? NaN, 6);
          expect(run[0]?.centreMm).toBeCloseTo(-(run.at(-1)?.centreMm ?? NaN), 6);
        },
      ),
    );
  });
});

describe('placement', () => {
  it('comes back from the room unchanged', () => {
    const mm = fc.double({ min: -9000, max: 9000, noNaN: true });
    fc.assert(
      fc.property(
        mm,
        mm,
        fc.double({ min: -360, max: 360, noNaN: true }),
        mm,
        mm,
        (xMm, zMm, turnDeg, x, z) => {
          const at = { xMm, zMm, turnDeg };
          const [bx, by, bz] = toPiece(at, toRoom(at, [x, 7, z]));
          expect([bx, by, bz]).toEqual([expect.closeTo(x, 6), 7, expect.closeTo(z, 6)]);
        },
      ),
    );
  });

  it('turns anticlockwise seen from above: what looks to the viewer looks right after 90°', () => {
    const [x, , z] = toRoom({ xMm: 0, zMm: 0, turnDeg: 90 }, [0, 0, 1]);
    expect([x, z]).toEqual([expect.closeTo(1, 9), expect.closeTo(0, 9)]);
  });
});

describe('snapping', () => {
  const wall = newPiece('bulkhead', 'w1', 'W1', HERE);
  const bench = newPiece('bench', 'b1', 'B1', { xMm: 0, zMm: 900, turnDeg: 0 });
  const table = newPiece('table', 't1', 'T1', { xMm: 0, zMm: 3000, turnDeg: 0 });
  const document = { ...emptySetDocument(), pieces: [wall, bench, table] };

  it('puts the back of a bench against a wall and straightens it', () => {
    const { at, snappedTo } = snapPiece(document, 'b1', { xMm: 412, zMm: 31, turnDeg: 4 });
    expect(at).toMatchObject({ zMm: 0, turnDeg: 0 });
    expect(snappedTo).toContain('W1');
  });

  it('puts a table over the seat of a bench', () => {
    const front = benchLayout(bench).frontZMm + 900;
    const { at, snappedTo } = snapPiece(document, 't1', { xMm: 9, zMm: front + 381 - 30, turnDeg: 0 });
    expect(snappedTo).toContain('over the seat of B1');
    expect(at.zMm).toBeCloseTo(front - 38.1 + 381, 6);
    expect(at.xMm).toBeCloseTo(0, 6);
  });

  it('leaves a piece alone where nothing is near', () => {
    const far = { xMm: 9000, zMm: 9000, turnDeg: 37 };
    expect(snapPiece(document, 'b1', far)).toEqual({ at: far });
  });

  it('stays where it has snapped', () => {
    const first = snapPiece(document, 'b1', { xMm: 412, zMm: 31, turnDeg: 4 });
    const { at } = snapPiece(document, 'b1', first.at);
    for (const key of ['xMm', 'zMm', 'turnDeg'] as const) expect(at[key]).toBeCloseTo(first.at[key], 6);
  });
});
