import { normalTurnDeg, toRoom } from '../parts/placement.ts';
import type { Piece, SetDocument } from './document.ts';
import { duplicatePiece, movePiece, withoutLostParts } from './edit-pieces.ts';
import { footprint } from './footprint.ts';
import { namedPieces } from './named-pieces.ts';

const COPY_GAP_MM = 50;

/** Middle of a piece's footprint in the room. */
function middleOf(piece: Piece): { xMm: number; zMm: number } {
  const { x0, x1, z0, z1 } = footprint(piece);
  const [xMm, , zMm] = toRoom(piece.at, [(x0 + x1) / 2, 0, (z0 + z1) / 2]);
  return { xMm, zMm };
}

/**
 * Moves several pieces by the same way. Locked pieces stay.
 *
 * @param document - the set
 * @param pieceIds - what moves; unknown ids are passed over
 * @param by - the way in the room's axes, millimetres
 * @returns the new set
 */
export function movePieces(
  document: SetDocument,
  pieceIds: readonly string[],
  by: { xMm: number; zMm: number },
): SetDocument {
  return namedPieces(document, pieceIds).reduce(
    (set, { id, at }) => movePiece(set, id, { xMm: at.xMm + by.xMm, zMm: at.zMm + by.zMm }),
    document,
  );
}

/**
 * Turns several pieces together about their common middle, the mean of the middles of their footprints, so that
 * turning back brings every piece back. Locked pieces stay and do not count.
 *
 * @param document - the set
 * @param pieceIds - what turns; unknown ids are passed over
 * @param byDeg - anticlockwise seen from above
 * @returns the new set; the same object when nothing can turn
 */
export function turnPieces(document: SetDocument, pieceIds: readonly string[], byDeg: number): SetDocument {
  const turned = namedPieces(document, pieceIds).filter((piece) => !piece.locked);
  if (turned.length === 0) return document;
  const middles = turned.map(middleOf);
  const mean = (values: number[]) => values.reduce((sum, value) => sum + value, 0) / values.length;
  const about = { xMm: mean(middles.map(({ xMm }) => xMm)), zMm: mean(middles.map(({ zMm }) => zMm)) };
  return turned.reduce((set, { id, at }) => {
    const [xMm, , zMm] = toRoom({ ...about, turnDeg: byDeg }, [at.xMm - about.xMm, 0, at.zMm - about.zMm]);
    return movePiece(set, id, { xMm, zMm, turnDeg: normalTurnDeg(at.turnDeg + byDeg) });
  }, document);
}

/**
 * Takes several pieces out, and whoever sat on them. Locked pieces stay.
 *
 * @param document - the set
 * @param pieceIds - unknown ids are passed over
 * @returns the new set
 */
export function removePieces(document: SetDocument, pieceIds: readonly string[]): SetDocument {
  const pieces = document.pieces.filter((piece) => piece.locked || !pieceIds.includes(piece.id));
  if (pieces.length === document.pieces.length) return document;
  return withoutLostParts({ ...document, pieces });
}

/**
 * Copies several pieces as they stand to each other, to the right of where they stand, with the next marks and nobody
 * seated. One piece alone is copied beside itself.
 *
 * @param document - the set
 * @param pieceIds - unknown ids are passed over
 * @returns the new set and the ids of the copies, in the order of the originals
 */
export function duplicatePieces(
  document: SetDocument,
  pieceIds: readonly string[],
): { document: SetDocument; pieceIds: string[] } {
  const originals = namedPieces(document, pieceIds);
  const xs = originals.flatMap((piece) => footprint(piece).corners.map(([x]) => x));
  const byMm = Math.max(...xs) - Math.min(...xs) + COPY_GAP_MM;
  const copies: string[] = [];
  const copied = originals.reduce((set, original) => {
    const one = duplicatePiece(set, original.id);
    copies.push(one.pieceId);
    const { xMm, zMm } = original.at;
    return originals.length === 1
      ? one.document
      : movePiece(one.document, one.pieceId, { xMm: xMm + byMm, zMm });
  }, document);
  return { document: copied, pieceIds: copies };
}
