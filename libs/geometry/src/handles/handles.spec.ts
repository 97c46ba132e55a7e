import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { anyBench, anyPiece } from '../../test/arbitrary-pieces.ts';
import { cross, dot, length, scale, sub } from '../mannequin/vector.ts';
import type { Part, Vec3 } from '../parts/part.ts';
import { pieceEnvelope, derivePieceParts } from '../pieces/kinds.ts';
import { parametersOf } from '../pieces/parameters.ts';
import type { Piece, PieceKind, SetDocument } from '../room/document.ts';
import { newPiece } from '../room/edit-pieces.ts';
import { emptySetDocument } from '../room/read-document.ts';
import type { Handle } from './handle.ts';
import { valueUnder } from './on-ray.ts';
import { pieceHandles, pullHandle, roomForPull } from './piece-handles.ts';
import { snapPull } from './snap-pull.ts';

const setOf = (...pieces: Piece[]): SetDocument => ({ ...emptySetDocument(), pieces });
const KINDS: PieceKind[] = ['bench', 'table', 'sill', 'bulkhead', 'overhead', 'loose-seat'];

function handleOf(piece: Piece, key: string, side?: Handle['side']): Handle {
  const found = pieceHandles(piece).find((one) => one.key === key && (!side || one.side === side));
  if (!found) throw new Error(`${piece.mark} has no handle ${key} ${side ?? ''}`);
  return found;
}

function pulled(piece: Piece, handle: Handle, value: number, others: Piece[] = []): Piece {
  const changed = pullHandle(setOf(piece, ...others), handle, value);
  if (!changed.ok) throw new Error(changed.error.message);
  const after = changed.value.pieces[0];
  if (!after) throw new Error('the piece is gone');
  return after;
}

/** The half of a part's size in a direction. */
function corners({ solid, positionMm, rotationRad }: Part): Vec3[] {
  const [sx, , cy, sy, cx] = [
    Math.sin(rotationRad[0]),
    0,
    Math.cos(rotationRad[1]),
    Math.sin(rotationRad[1]),
    Math.cos(rotationRad[0]),
  ];
  const place = ([x, y, z]: Vec3): Vec3 => {
    const [ty, tz] = [y * cx - z * sx, y * sx + z * cx];
    return [positionMm[0] + x * cy + tz * sy, positionMm[1] + ty, positionMm[2] - x * sy + tz * cy];
  };
  if (solid.shape === 'box') {
    const [x, y, z] = scale(solid.sizeMm, 0.5);
    return [-x, x].flatMap((a) => [-y, y].flatMap((b) => [-z, z].map((c) => place([a, b, c]))));
  }
  return [positionMm];
}

/** How far the parts of a piece reach in a direction. */
const reach = (piece: Piece, along: Vec3): number =>
  Math.max(
    ...derivePieceParts(piece)
      .flatMap(corners)
      .map((corner) => dot(corner, along)),
  );

describe('handles of a piece', () => {
  it.each(KINDS)('of a %s stand at its numbers, each with a name of its own', (kind) => {
    const handles = pieceHandles(newPiece(kind, 'p1', 'P1', { xMm: 100, zMm: -50, turnDeg: 30 }));
    expect(handles.length).toBeGreaterThan(3);
    expect(new Set(handles.map(({ id }) => id)).size).toBe(handles.length);
    for (const handle of handles) expect(length(handle.along)).toBeCloseTo(1, 9);
  });

  it('are none for a locked piece', () => {
    expect(
      pieceHandles({ ...newPiece('table', 't1', 'T1', { xMm: 0, zMm: 0, turnDeg: 0 }), locked: true }),
    ).toEqual([]);
  });

  it('go the way they point by what their number grows, whatever the piece', () => {
    fc.assert(
      fc.property(anyPiece, fc.double({ min: -20, max: 20, noNaN: true }), (piece, by) => {
        for (const handle of pieceHandles(piece)) {
          // A cushion sinks more the thicker it is: its own test follows.
          if (handle.kind === 'angle' || handle.key === 'seatCushion.thicknessMm') continue;
          const value = handle.value + by;
          if (value < handle.min || value > handle.max) continue;
          const changed = pullHandle(setOf(piece), handle, value);
          if (!changed.ok) continue;
          const after = changed.value.pieces[0] as Piece;
          const now = pieceHandles(after).find(({ id }) => id === handle.id);
          if (!now) continue;
          const way = dot(sub(now.atMm, handle.atMm), handle.along);
          expect(way, handle.id).toBeCloseTo(by / handle.perMm, 4);
        }
      }),
    );
  });

  it.each([
    ['bench', 'lengthMm', 'left'],
    ['bench', 'lengthMm', 'right'],
    ['table', 'lengthMm', 'left'],
    ['table', 'widthMm', 'back'],
    ['sill', 'lengthMm', 'right'],
    ['bulkhead', 'lengthMm', 'left'],
    ['bulkhead', 'heightMm', undefined],
    ['bulkhead', 'thicknessMm', undefined],
    ['overhead', 'depthMm', 'front'],
    ['overhead', 'undersideMm', undefined],
    ['overhead', 'thicknessMm', undefined],
    ['loose-seat', 'widthMm', 'left'],
    ['loose-seat', 'seatDepthMm', undefined],
    ['table', 'heightMm', undefined],
    ['bench', 'backHeightMm', undefined],
  ] as const)('pull the parts of a %s along: %s %s', (kind, key, side) => {
    const piece = newPiece(kind, 'p1', 'P1', { xMm: 700, zMm: -300, turnDeg: 90 });
    const handle = handleOf(piece, key, side);
    const after = pulled(piece, handle, handle.value + 40);
    expect(reach(after, handle.along) - reach(piece, handle.along)).toBeCloseTo(40, 3);
    if (handle.farStays) {
      const back = scale(handle.along, -1);
      expect(reach(after, back)).toBeCloseTo(reach(piece, back), 3);
    }
  });

  it('leave the far end where it is, also where the near end stands at a wall', () => {
    const wall = newPiece('bulkhead', 'w1', 'W1', { xMm: -900, zMm: 0, turnDeg: 90 });
    const bench = newPiece('bench', 'b1', 'B1', { xMm: 0, zMm: -200, turnDeg: 0 });
    const at = { ...bench.at, xMm: -900 + 1800 / 2 };
    const long = { ...bench, lengthMm: 1800, at } as Piece;
    const after = pulled(long, handleOf(long, 'lengthMm', 'left'), 1700, [wall]);
    expect(after.at.xMm + 850).toBeCloseTo(900, 6);
  });

  it('turn the back of a bench about its top by the angle that was pulled', () => {
    fc.assert(
      fc.property(anyBench, fc.double({ min: 0, max: 30, noNaN: true }), (bench, value) => {
        if (bench.backHeightMm === 0) return;
        const handle = handleOf(bench, 'backLeanDeg');
        const board = (piece: Piece) =>
          derivePieceParts(piece).find(({ role }) => role === 'back-board')?.rotationRad[0] ?? NaN;
        const after = pulled(bench, handle, value);
        const turned = ((board(bench) - board(after)) * 180) / Math.PI;
        expect(turned).toBeCloseTo(value - handle.value, 6);
      }),
    );
  });
});

describe('a line of sight', () => {
  const bench = newPiece('bench', 'b1', 'B1', { xMm: 0, zMm: 0, turnDeg: 40 });

  it('that passes the line of a handle gives the value there', () => {
    fc.assert(
      fc.property(anyPiece, fc.double({ min: -300, max: 300, noNaN: true }), (piece, way) => {
        for (const handle of pieceHandles(piece).filter(({ kind }) => kind === 'length')) {
          const point = sub(handle.atMm, scale(handle.along, -way));
          const aside = cross(handle.along, Math.abs(handle.along[1]) > 0.9 ? [1, 0, 0] : [0, 1, 0]);
          const direction = scale(aside, 1 / length(aside));
          const value = valueUnder(handle, { origin: sub(point, scale(direction, 2000)), direction });
          expect(value).toBeCloseTo(handle.value + way * handle.perMm, 4);
        }
      }),
    );
  });

  it('that runs along the line gives none', () => {
    const handle = handleOf(bench, 'seatDepthMm');
    expect(valueUnder(handle, { origin: [0, 0, 0], direction: scale(handle.along, -1) })).toBeUndefined();
  });

  it.each([5, 12, 20])(
    'square to the side of a bench gives a lean of %d degrees where the back then is',
    (lean) => {
      const handle = handleOf(bench, 'backLeanDeg');
      const [pivot, at] = [handle.pivotMm as Vec3, handle.atMm];
      const arm = sub(at, pivot);
      const turn = ((lean - handle.value) * Math.PI) / 180;
      const point: Vec3 = sub(
        pivot,
        sub(scale(arm, -Math.cos(turn)), scale(handle.along, length(arm) * Math.sin(turn))),
      );
      const across = cross(scale(arm, 1 / length(arm)), handle.along);
      const value = valueUnder(handle, { origin: sub(point, scale(across, 3000)), direction: across });
      expect(value).toBeCloseTo(lean, 6);
    },
  );
});

describe('a pull snaps', () => {
  const bench = { ...newPiece('bench', 'b1', 'B1', { xMm: 0, zMm: 0, turnDeg: 0 }), lengthMm: 1200 } as Piece;
  const table = {
    ...newPiece('table', 't1', 'T1', { xMm: 1300, zMm: 300, turnDeg: 0 }),
    lengthMm: 1000,
  } as Piece;
  const wall = newPiece('bulkhead', 'w1', 'W1', { xMm: 0, zMm: 0, turnDeg: 0 });
  const right = handleOf(bench, 'lengthMm', 'right');
  const how = { step: 3.175, within: 30 };

  it('to the end of another piece before anything else', () => {
    // The near end of the table lies at 800, the left end of the bench stays at -600.
    expect(snapPull(setOf(bench, table, wall), right, 1390, how)).toEqual({
      value: 1400,
      snappedTo: 'end of T1',
    });
  });

  it('to a board joint of the wall behind where no piece is near', () => {
    const found = snapPull(setOf(bench, wall), right, 1270, { ...how, within: 60 });
    expect(found.snappedTo).toMatch(/^board line of W1$/);
    const after = pulled(bench, right, found.value);
    const end = after.at.xMm + found.value / 2;
    const boards = derivePieceParts(wall).filter(({ role }) => role === 'wall-board');
    const edges = boards.map(
      ({ positionMm, solid }) => positionMm[0] - (solid.shape === 'box' ? solid.sizeMm[0] / 2 : 0),
    );
    expect(Math.min(...edges.map((edge) => Math.abs(edge - end)))).toBeLessThan(1e-6);
  });

  it('to a wall of whole boards', () => {
    const found = snapPull(setOf(wall), handleOf(wall, 'lengthMm', 'left'), 1990, { ...how, within: 120 });
    expect(found.snappedTo).toMatch(/^\d+ whole boards$/);
    const widths = derivePieceParts(pulled(wall, handleOf(wall, 'lengthMm', 'left'), found.value))
      .filter(({ role }) => role === 'wall-board')
      .map(({ solid }) => (solid.shape === 'box' ? solid.sizeMm[0] : 0));
    expect(Math.max(...widths) - Math.min(...widths)).toBeLessThan(1e-6);
  });

  it('to a top or a seat in its height', () => {
    const low = { ...table, heightMm: 700 } as Piece;
    const height = handleOf(low, 'heightMm');
    const top = pieceEnvelope(bench).maxMm[1];
    expect(snapPull(setOf(low, bench), height, top + 4, how)).toEqual({ value: top, snappedTo: 'top of B1' });
  });

  it('to whole steps alone when asked, and else keeps to them', () => {
    const free = snapPull(setOf(bench, table), right, 1391, { step: 3.175 / 2, within: 0 });
    expect(free.snappedTo).toBeUndefined();
    expect(free.value / (3.175 / 2)).toBeCloseTo(Math.round(free.value / (3.175 / 2)), 9);
    expect(Math.abs(free.value - 1391)).toBeLessThanOrEqual(3.175 / 4);
  });

  it('never beyond the limits of the number, and says so', () => {
    fc.assert(
      fc.property(anyPiece, fc.double({ min: -1e5, max: 1e5, noNaN: true }), (piece, wanted) => {
        for (const handle of pieceHandles(piece)) {
          const { value, limit } = snapPull(setOf(piece, bench, wall), handle, wanted, how);
          expect(value).toBeGreaterThanOrEqual(handle.min);
          expect(value).toBeLessThanOrEqual(handle.max);
          expect(limit).toBe(wanted >= handle.max ? 'most' : wanted <= handle.min ? 'least' : undefined);
          expect(parametersOf(piece).some(({ key }) => key === handle.key)).toBe(true);
        }
      }),
    );
  });

  it('and knows the room that the bay leaves to the end that is pulled', () => {
    const stop = newPiece('bulkhead', 'w2', 'W2', { xMm: 1000, zMm: 0, turnDeg: -90 });
    const set = setOf(bench, stop);
    const { most } = roomForPull(set, right);
    expect(most).toMatchObject({ mark: 'W2', beyond: 'meets' });
    expect(most?.valueMm).toBeCloseTo(1600, 1);
    // The other end has nothing in its way.
    expect(roomForPull(set, handleOf(bench, 'lengthMm', 'left')).most).toBeUndefined();
  });
});
