import { describe, expect, it } from 'vitest';
import { addPiece, movePiece } from '../room/edit-pieces.ts';
import type { SetDocument } from '../room/document.ts';
import { emptySetDocument } from '../room/read-document.ts';
import { survey } from '../situation/survey.ts';
import { deriveParts, derivePieceParts } from './kinds.ts';

function room() {
  const bench = addPiece(emptySetDocument(), 'bench', { xMm: 0, zMm: 0, turnDeg: 0 });
  const table = addPiece(bench.document, 'table', { xMm: 0, zMm: 900, turnDeg: 0 });
  const wall = addPiece(table.document, 'bulkhead', { xMm: 0, zMm: 0, turnDeg: 0 });
  const sill = addPiece(wall.document, 'sill', { xMm: 0, zMm: 0, turnDeg: 0 });
  return {
    document: sill.document,
    ids: { bench: bench.pieceId, table: table.pieceId, wall: wall.pieceId, sill: sill.pieceId },
  };
}

const partsOf = (document: SetDocument, id: string) =>
  derivePieceParts(
    document.pieces.find((piece) => piece.id === id)!,
    document,
  );

const aside = { xMm: 40, zMm: 900, turnDeg: 0 };

describe('parts that are kept', () => {
  it('are the very same for every piece that another one moved past', () => {
    const { document, ids } = room();
    const next = movePiece(document, ids.table, aside);
    for (const id of [ids.bench, ids.wall, ids.sill]) {
      expect(partsOf(next, id)).toBe(partsOf(document, id));
    }
    expect(partsOf(next, ids.table)).not.toEqual(partsOf(document, ids.table));
    const before = new Set(deriveParts(document));
    const anew = deriveParts(next).filter((part) => !before.has(part));
    expect(new Set(anew.map(({ pieceId }) => pieceId))).toEqual(new Set([ids.table]));
  });

  it('follow the windows of a wall', () => {
    const { document, ids } = room();
    const next = movePiece(document, ids.sill, { ...aside, zMm: 0 });
    expect(partsOf(next, ids.wall)).not.toEqual(partsOf(document, ids.wall));
    const wall = document.pieces.find(({ id }) => id === ids.wall)!;
    const fresh = structuredClone(next);
    expect(partsOf(next, ids.wall)).toEqual(partsOf(fresh, ids.wall));
    expect(derivePieceParts(wall)).not.toEqual(partsOf(document, ids.wall));
  });

  it('are measured once', () => {
    const { document, ids } = room();
    const next = movePiece(document, ids.table, aside);
    const of = (set: SetDocument, id: string) => survey(set).pieces.find(({ piece }) => piece.id === id);
    expect(of(next, ids.bench)).toBe(of(document, ids.bench));
    expect(of(next, ids.table)).not.toBe(of(document, ids.table));
  });
});
