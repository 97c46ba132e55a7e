import {
  addPiece,
  derivePieceParts,
  emptySetDocument,
  movePiece,
  movePieces,
  setParameter,
  turnPieces,
  type SetDocument,
  type Vec3,
} from '@settlewright/geometry';
import { describe, expect, it } from 'vitest';
import { carriedIn, drawnPicture, type Carried } from './drawn-picture.ts';
import type { RoomPicture } from './picture.ts';

const bench = addPiece(emptySetDocument(), 'bench', { xMm: 300, zMm: 100, turnDeg: 30 });
const table = addPiece(bench.document, 'table', { xMm: 0, zMm: 900, turnDeg: 0 });
const wall = addPiece(table.document, 'bulkhead', { xMm: 0, zMm: -400, turnDeg: 0 });
const set = wall.document;
const both = [bench.pieceId, table.pieceId];

const firstPart = (document: SetDocument, id: string): Vec3 => {
  const piece = document.pieces.find((one) => one.id === id)!;
  return derivePieceParts(piece, document)[0]!.positionMm;
};
const put = ({ turnRad, xMm, zMm }: Carried, [x, y, z]: Vec3): Vec3 => [
  x * Math.cos(turnRad) + z * Math.sin(turnRad) + xMm,
  y,
  z * Math.cos(turnRad) - x * Math.sin(turnRad) + zMm,
];

describe('what is carried', () => {
  it.each([
    ['shifted', movePieces(set, both, { xMm: 120, zMm: -35 })],
    ['turned together', turnPieces(set, both, 75)],
    ['turned past half a turn', turnPieces(set, both, 200)],
  ])('comes to where its parts are made when %s', (_, next) => {
    const carried = carriedIn(next, set)!;
    expect([...carried.before.keys()]).toEqual(both);
    for (const id of both) {
      const there = put(carried, firstPart(set, id));
      firstPart(next, id).forEach((value, axis) => expect(there[axis]).toBeCloseTo(value, 6));
    }
  });

  it('is no piece of another shape, and no wall', () => {
    const longer = setParameter(set, bench.pieceId, 'lengthMm', 1500);
    if (!longer.ok) throw new Error(longer.error.message);
    expect(carriedIn(longer.value, set)).toBeUndefined();
    expect(carriedIn(movePiece(set, wall.pieceId, { xMm: 50 }), set)).toBeUndefined();
  });

  it('goes one way: a piece that goes another way is made anew', () => {
    const apart = movePiece(movePiece(set, bench.pieceId, { xMm: 400 }), table.pieceId, { zMm: 950 });
    expect([...carriedIn(apart, set)!.before.keys()]).toEqual([bench.pieceId]);
  });
});

describe('a picture of a set in the hand', () => {
  it('has new parts and what was counted', () => {
    const counted = { document: set, parts: [], bodies: [] } as unknown as RoomPicture;
    const next = movePiece(set, table.pieceId, { xMm: 40 });
    const drawn = drawnPicture(next, counted);
    expect(drawn.document).toBe(next);
    expect(drawn.parts.length).toBeGreaterThan(0);
    expect(drawn.bodies).toBe(counted.bodies);
    expect(drawnPicture(set, counted)).toBe(counted);
  });
});
