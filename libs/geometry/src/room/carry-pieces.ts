import { copyCushionChoices, withoutLostCushions } from './cushion-choices.ts';
import type { Piece, SetDocument } from './document.ts';
import { freeId, nextMark, shownPiece } from './edit-pieces.ts';
import { footprint } from './footprint.ts';
import { namedPieces } from './named-pieces.ts';
import { emptySetDocument } from './read-document.ts';
import { placeExists } from './seating.ts';

const BESIDE_MM = 300;

/** Pieces put into a set, and what that did to marks and people. */
export interface Pasted {
  document: SetDocument;
  /** Of the pieces as they are in the set now, in the order of what was carried. */
  pieceIds: string[];
  /** Pieces whose mark was taken. */
  remarked: { from: string; to: string }[];
  /** How many people came along, and how many could not. */
  seated: number;
  unseated: number;
}

/**
 * Some pieces of a set with whoever sits on them, as a set of their own.
 *
 * @param document - the set
 * @param pieceIds - unknown ids are passed over
 * @returns a document with these pieces, their seating and what was chosen of their cushions, and nothing else
 */
export function carriedPieces(document: SetDocument, pieceIds: readonly string[]): SetDocument {
  const pieces = namedPieces(document, pieceIds);
  const ids = new Set(pieces.map(({ id }) => id));
  return withoutLostCushions({
    ...emptySetDocument(),
    pieces,
    seating: document.seating.filter(({ pieceId }) => ids.has(pieceId)),
    ...(document.cushions && { cushions: document.cushions }),
  });
}

/**
 * Puts carried pieces into a set: as they stand to each other, to the right of what is there; in an empty set where they
 * stood. A mark or an id that is taken is replaced by a free one.
 *
 * @param document - the set
 * @param carried - as `carriedPieces` makes it
 * @param withPeople - false where the cast is another one: then nobody comes along but mannequins
 * @returns the new set; somebody who sits in it already keeps that place
 */
export function pastePieces(document: SetDocument, carried: SetDocument, withPeople: boolean): Pasted {
  const byMm = shiftBeside(document, carried.pieces);
  const ids = new Map<string, string>();
  const remarked: Pasted['remarked'] = [];
  let set = document;
  for (const piece of carried.pieces) {
    const isTaken = set.pieces.some(({ mark }) => mark === piece.mark);
    const mark = isTaken ? nextMark(set, piece.kind) : piece.mark;
    if (isTaken) remarked.push({ from: piece.mark, to: mark });
    const id = freeId(set, mark);
    ids.set(piece.id, id);
    const at = { ...piece.at, xMm: piece.at.xMm + byMm };
    const copy: Piece = { ...shownPiece(piece), id, mark, locked: false, at };
    set = { ...set, pieces: [...set.pieces, copy] };
    set = copyCushionChoices(set, piece.id, id, carried.cushions);
  }
  const here = new Set(set.seating.flatMap(({ sitter }) => (sitter.kind === 'cast' ? [sitter.castId] : [])));
  const seats = carried.seating.flatMap((seat) => {
    const { sitter } = seat;
    if (sitter.kind === 'cast' && (!withPeople || here.has(sitter.castId))) return [];
    const moved = { ...seat, pieceId: ids.get(seat.pieceId) ?? '' };
    return placeExists(set, moved.pieceId, moved.place) ? [moved] : [];
  });
  return {
    document: { ...set, seating: [...set.seating, ...seats] },
    pieceIds: [...ids.values()],
    remarked,
    seated: seats.length,
    unseated: carried.seating.length - seats.length,
  };
}

function shiftBeside(document: SetDocument, pieces: readonly Piece[]): number {
  if (document.pieces.length === 0 || pieces.length === 0) return 0;
  const xs = (all: readonly Piece[]) => all.flatMap((piece) => footprint(piece).corners.map(([x]) => x));
  return Math.round(Math.max(...xs(document.pieces)) + BESIDE_MM - Math.min(...xs(pieces)));
}
