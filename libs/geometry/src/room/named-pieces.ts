import type { Piece, SetDocument } from './document.ts';

/** Pieces of a set in the order they are named; ids that are not there are passed over. */
export function namedPieces(document: SetDocument, pieceIds: readonly string[]): Piece[] {
  return pieceIds.flatMap((id) => document.pieces.find((piece) => piece.id === id) ?? []);
}
