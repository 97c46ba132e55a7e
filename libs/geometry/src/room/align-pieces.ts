import type { Piece, SetDocument } from './document.ts';
import { footprint } from './footprint.ts';
import { movePiece } from './edit-pieces.ts';

/** What pieces are lined up by, in the room seen from above: left is −x, front is towards the viewer. */
export type AlignEdge = 'left' | 'right' | 'front' | 'back' | 'middle-across' | 'middle-along';

/**
 * Lines pieces up with the first one named. Locked pieces stay.
 *
 * @param document - the set
 * @param pieceIds - the reference first, then what moves; unknown ids are passed over
 * @param edge - which side of their footprints to bring in line
 * @returns the new set
 */
export function alignPieces(
  document: SetDocument,
  pieceIds: readonly string[],
  edge: AlignEdge,
): SetDocument {
  const [first, ...others] = pieceIds.flatMap((id) => document.pieces.find((piece) => piece.id === id) ?? []);
  if (first === undefined) return document;
  const target = lineOf(first, edge);
  return others.reduce((set, piece) => {
    const by = target - lineOf(piece, edge);
    const { xMm, zMm } = piece.at;
    const alongZ = edge === 'front' || edge === 'back' || edge === 'middle-along';
    return movePiece(set, piece.id, alongZ ? { zMm: zMm + by } : { xMm: xMm + by });
  }, document);
}

function lineOf(piece: Piece, edge: AlignEdge): number {
  const { corners } = footprint(piece);
  const xs = corners.map(([x]) => x);
  const zs = corners.map(([, z]) => z);
  switch (edge) {
    case 'left':
      return Math.min(...xs);
    case 'right':
      return Math.max(...xs);
    case 'back':
      return Math.min(...zs);
    case 'front':
      return Math.max(...zs);
    case 'middle-across':
      return (Math.min(...xs) + Math.max(...xs)) / 2;
    case 'middle-along':
      return (Math.min(...zs) + Math.max(...zs)) / 2;
  }
}
