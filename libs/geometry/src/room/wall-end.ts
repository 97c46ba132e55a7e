import { toPiece, toRoom } from '../parts/placement.ts';
import type { Piece, SetDocument } from './document.ts';

/** An end this near the face of a bulkhead stands at it, millimetres. */
const AT_WALL_MM = 20;

/**
 * Keeps the end of a piece that stands at a wall where it is when the length changes.
 *
 * @param document - the set before the change
 * @param before - the piece before the change
 * @param after - the same piece with another length, about the same middle
 * @returns the piece moved along itself; unmoved when neither or both of its ends stand at a wall
 */
export function withWallEndKept(document: SetDocument, before: Piece, after: Piece): Piece {
  if (!('lengthMm' in before) || !('lengthMm' in after) || before.kind === 'bulkhead') return after;
  const [left, right] = [-1, 1].map((sign) => standsAtWall(document, before, (sign * before.lengthMm) / 2));
  if (left === right) return after;
  const by = ((after.lengthMm - before.lengthMm) / 2) * (left === true ? 1 : -1);
  const [xMm, , zMm] = toRoom(after.at, [by, 0, 0]);
  return { ...after, at: { ...after.at, xMm: tidy(xMm), zMm: tidy(zMm) } };
}

/** Without the last digits that turning by a right angle adds. */
const tidy = (mm: number) => Math.round(mm * 1e6) / 1e6;

function standsAtWall(document: SetDocument, piece: Piece, endXMm: number): boolean {
  const end = toRoom(piece.at, [endXMm, 0, 0]);
  const inwards = toRoom(piece.at, [0, 0, 0]);
  return document.pieces.some((wall) => {
    if (wall.kind !== 'bulkhead') return false;
    const [x, , z] = toPiece(wall.at, end);
    const [, , middle] = toPiece(wall.at, inwards);
    // A wall along the piece, at its back, is no wall at its end.
    const across = Math.abs(middle - z) > Math.abs(endXMm) / 2;
    return across && Math.abs(z) <= AT_WALL_MM && Math.abs(x) <= wall.lengthMm / 2;
  });
}
