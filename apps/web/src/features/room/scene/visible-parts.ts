import type { Part, Piece, SetDocument } from '@settlewright/geometry';
import type { SceneView } from './views';

function stands(piece: Piece, letter: SceneView): boolean {
  if (piece.hidden) return false;
  // A lens sees what a camera on that spot would.
  if (letter === 'lens') return true;
  if (letter === 'D') return piece.kind !== 'overhead';
  if (piece.kind !== 'bulkhead' || letter === 'C') return true;
  // A wall that turns its back to the viewer would hide the room behind it.
  const turn = (piece.at.turnDeg * Math.PI) / 180;
  const [x, z] = [Math.sin(turn), Math.cos(turn)];
  return letter === 'A' ? z > -0.5 : letter === 'B' ? x < 0.5 : x + z > -0.3;
}

/** Pieces that are drawn in a view. */
export const visiblePieces = (document: SetDocument, letter: SceneView): Piece[] =>
  document.pieces.filter((piece) => stands(piece, letter));

/** Parts that are drawn in a view. */
export function visibleParts(document: SetDocument, parts: readonly Part[], letter: SceneView): Part[] {
  const visible = new Set(visiblePieces(document, letter).map(({ id }) => id));
  return parts.filter(({ pieceId }) => visible.has(pieceId));
}
