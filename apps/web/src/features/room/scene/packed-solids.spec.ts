import { addPiece, derivePieceParts, emptySetDocument, movePiece } from '@settlewright/geometry';
import { describe, expect, it } from 'vitest';
import { joinSolids, solidsOf } from './packed-solids.ts';
import type { SeatPrint } from './seat-print.ts';
import { mergeParts } from './solids.ts';

const bench = addPiece(emptySetDocument(), 'bench', { xMm: 0, zMm: 0, turnDeg: 0 });
const { document, pieceId: tableId } = addPiece(bench.document, 'table', { xMm: 0, zMm: 900, turnDeg: 0 });
const partsOf = (set: typeof document) => set.pieces.map((piece) => derivePieceParts(piece, set));

const print: SeatPrint = {
  origin: [0, 400, 200],
  up: [0, 1, 0],
  stretches: [{ from: [0, 480, 100], to: [0, 480, 300], radii: [80, 80] }],
  backs: [],
};

describe('solids of pieces', () => {
  it('are kept for a piece that another one moved past', () => {
    const next = movePiece(document, tableId, { xMm: 50 });
    const [benchBefore, tableBefore] = partsOf(document).map((parts) => solidsOf(parts));
    const [benchAfter, tableAfter] = partsOf(next).map((parts) => solidsOf(parts));
    expect(benchAfter).toBe(benchBefore);
    expect(tableAfter?.positions).not.toEqual(tableBefore?.positions);
  });

  it('are made again for other sitters, and kept under the same', () => {
    const [parts = []] = partsOf(document);
    const free = solidsOf(parts, []);
    const pressed = solidsOf(parts, [print]);
    expect(pressed.positions).not.toEqual(free.positions);
    expect(solidsOf(parts, [print])).toBe(pressed);
    expect(solidsOf(parts, [{ ...print }])).not.toBe(pressed);
    expect(solidsOf(parts, []).positions).toEqual(free.positions);
  });

  it('joined are those of all parts at once', () => {
    const joined = joinSolids(partsOf(document).map((parts) => solidsOf(parts)));
    const merged = mergeParts(partsOf(document).flat());
    for (const [list, numbers] of Object.entries(merged)) {
      const packed = joined[list as keyof typeof joined];
      expect(packed.length).toBe(numbers.length);
      const off = Array.from(numbers, (value, n) => Math.abs(value - packed[n]!));
      expect(Math.max(0, ...off)).toBeLessThan(0.01);
    }
  });
});
