import type { Piece, SetDocument } from './document.ts';
import { movePiece } from './edit-pieces.ts';
import { footprint } from './footprint.ts';
import { namedPieces } from './named-pieces.ts';

/** What pieces are lined up by, in the room seen from above: left is −x, front is towards the viewer. */
export type AlignEdge = 'left' | 'right' | 'front' | 'back' | 'middle-across' | 'middle-along';

/** A direction of the room: from left to right, or from back to front. */
export type RoomAxis = 'across' | 'along';

interface Stretch {
  low: number;
  high: number;
}

/**
 * Lines pieces up with the first one named. Locked pieces stay.
 *
 * @param document - the set
 * @param pieceIds - the reference first, then what moves; unknown ids are passed over
 * @param edge - which side of their footprints to bring in line
 * @returns the new set; the same object where all are in line already
 */
export function alignPieces(
  document: SetDocument,
  pieceIds: readonly string[],
  edge: AlignEdge,
): SetDocument {
  const [first, ...others] = namedPieces(document, pieceIds);
  if (first === undefined) return document;
  const axis = edge === 'front' || edge === 'back' || edge === 'middle-along' ? 'along' : 'across';
  const target = lineOf(first, axis, edge);
  return others.reduce((set, piece) => moved(set, piece, axis, target - lineOf(piece, axis, edge)), document);
}

/**
 * Leaves the same gap between neighbours, in the order in which they stand. The row keeps its length from end to end, and
 * the first piece named keeps its place. Locked pieces stay where they are and do not count, unless named first.
 *
 * @param document - the set
 * @param pieceIds - the piece that stays, then the others; unknown ids are passed over
 * @param axis - the direction of the row
 * @returns the new set; the same object where fewer than three can be spaced, or stand so already
 */
export function spacePieces(document: SetDocument, pieceIds: readonly string[], axis: RoomAxis): SetDocument {
  const row = spaceable(document, pieceIds)
    .map((piece) => ({ piece, ...stretchOf(piece, axis) }))
    .sort((a, b) => a.low + a.high - (b.low + b.high));
  const firstId = pieceIds.find((id) => row.some(({ piece }) => piece.id === id));
  if (row.length < 3) return document;
  const [from, to] = [Math.min(...row.map(({ low }) => low)), Math.max(...row.map(({ high }) => high))];
  const filled = row.reduce((sum, { low, high }) => sum + high - low, 0);
  const gap = (to - from - filled) / (row.length - 1);
  let next = from;
  const shifts = row.map(({ piece, low, high }) => {
    const by = next - low;
    next += high - low + gap;
    return { piece, by };
  });
  const back = shifts.find(({ piece }) => piece.id === firstId)?.by ?? 0;
  return shifts.reduce((set, { piece, by }) => moved(set, piece, axis, by - back), document);
}

/**
 * Which of some pieces take part when a row is spaced: the first named, and all that are not locked.
 *
 * @param document - the set
 * @param pieceIds - the piece that stays, then the others; unknown ids are passed over
 * @returns the pieces, in the order named
 */
export function spaceable(document: SetDocument, pieceIds: readonly string[]): Piece[] {
  return namedPieces(document, pieceIds).filter((piece, n) => n === 0 || !piece.locked);
}

/** A move of less is what arithmetic leaves over, millimetres. */
const LEAST_MOVE_MM = 1e-7;

function moved(document: SetDocument, { id, at, locked }: Piece, axis: RoomAxis, byMm: number): SetDocument {
  if (locked || Math.abs(byMm) < LEAST_MOVE_MM) return document;
  return movePiece(document, id, axis === 'along' ? { zMm: at.zMm + byMm } : { xMm: at.xMm + byMm });
}

function stretchOf(piece: Piece, axis: RoomAxis): Stretch {
  const values = footprint(piece).corners.map(([x, z]) => (axis === 'along' ? z : x));
  return { low: Math.min(...values), high: Math.max(...values) };
}

function lineOf(piece: Piece, axis: RoomAxis, edge: AlignEdge): number {
  const { low, high } = stretchOf(piece, axis);
  if (edge === 'left' || edge === 'back') return low;
  return edge === 'right' || edge === 'front' ? high : (low + high) / 2;
}
