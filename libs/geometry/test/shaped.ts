import { cushionRunsOf } from '../src/cushions/cushion-runs.ts';
import type { CushionShape } from '../src/cushions/cushion-shape.ts';
import type { Part } from '../src/parts/part.ts';
import { deriveParts } from '../src/pieces/kinds.ts';
import { chooseCushion } from '../src/room/cushion-choices.ts';
import type { PieceOf, SetDocument } from '../src/room/document.ts';
import { addPiece } from '../src/room/edit-pieces.ts';
import { emptySetDocument } from '../src/room/read-document.ts';

/** One bench, 1200 x 450 from the face of its back, alone in a set. */
export function benchAlone(change: Partial<PieceOf<'bench'>> = {}, turnDeg = 0): SetDocument {
  const { document } = addPiece(emptySetDocument(), 'bench', { xMm: 0, zMm: 0, turnDeg });
  const [bench] = document.pieces;
  const piece = {
    ...bench,
    lengthMm: 1200,
    seatDepthMm: 450,
    seatTiltDeg: 0,
    ends: {
      left: { kind: 'open', thicknessMm: 0, heightMm: 0 },
      right: { kind: 'open', thicknessMm: 0, heightMm: 0 },
    },
    upholstery: { ...(bench as PieceOf<'bench'>).upholstery, longestCushionMm: 2000 },
    ...change,
  } as PieceOf<'bench'>;
  return { ...document, pieces: [piece] };
}

/** The set with a shape for the n-th cushion of a kind, from the left as seen from in front. */
export function shaped(
  document: SetDocument,
  kind: 'seat' | 'back',
  shape: CushionShape,
  number = 1,
): SetDocument {
  const run = cushionRunsOf(document).find((one) => one.kind === kind && one.index === number - 1)!;
  return chooseCushion(document, run.key, { shape });
}

/** The parts of its cushions of a kind. */
export const cushionsOf = (document: SetDocument, kind: 'seat' | 'back'): Part[] =>
  deriveParts(document).filter(({ role }) => role === `${kind}-cushion`);

/** A column behind the sitter's left end: 300 x 200 are taken out of the rear corner at the high end of x. */
export const LEFT_REAR_NOTCH: CushionShape = {
  notches: [{ edge: 'back', fromMm: 0, widthMm: 300, depthMm: 200 }],
};
