import { definitionOf, kindTitle } from '../pieces/kinds.ts';
import { normalTurnDeg, toRoom } from '../parts/placement.ts';
import { footprint } from './footprint.ts';
import type { Piece, PieceKind, SetDocument } from './document.ts';
import { copyCushionChoices, withoutLostCushions } from './cushion-choices.ts';
import { withoutLostDimensions } from '../measuring/edit-dimensions.ts';
import { withoutLostMembers } from './groups.ts';
import { withoutLostSeats } from './seating.ts';

const DUPLICATE_GAP_MM = 50;
const HIGHEST_MARK = 999;

/**
 * The next free mark of a kind: B1, B2 … for benches, T for tables, S sills, W bulkheads, O beams, L loose seats.
 *
 * @param document - the set
 * @param kind - kind of piece
 * @returns one more than the highest number in use, or the lowest free one when that would have four digits
 */
export function nextMark(document: SetDocument, kind: PieceKind): string {
  const { letter } = definitionOf(kind);
  const used = document.pieces
    .filter((piece) => piece.mark.startsWith(letter))
    .map((piece) => Number(piece.mark.slice(letter.length)))
    .filter(Number.isInteger);
  let next = Math.max(0, ...used) + 1;
  if (next > HIGHEST_MARK) next = 1;
  while (used.includes(next)) next += 1;
  return `${letter}${next}`;
}

/**
 * A new piece at its starting sizes, not yet in a set.
 *
 * @param kind - kind of piece
 * @param id - unique in the set, at most 40 characters
 * @param mark - unique in the set
 * @param at - where it stands
 * @returns the piece
 */
export function newPiece<K extends PieceKind>(kind: K, id: string, mark: string, at: Piece['at']) {
  return definitionOf(kind).create({
    id,
    mark,
    name: kindTitle(kind),
    at,
    accessible: false,
    locked: false,
    note: '',
  });
}

/**
 * Adds a piece at its starting sizes.
 *
 * @param document - the set
 * @param kind - kind of piece
 * @param at - where it stands; beside the other pieces when left out
 * @param id - identifier; made from the mark when left out
 * @returns the new set and the piece's id
 */
export function addPiece(
  document: SetDocument,
  kind: PieceKind,
  at?: Piece['at'],
  id?: string,
): { document: SetDocument; pieceId: string } {
  const mark = nextMark(document, kind);
  const pieceId = id ?? freeId(document, mark);
  const piece = newPiece(kind, pieceId, mark, at ?? { xMm: 0, zMm: 0, turnDeg: 0 });
  const placed = at === undefined && document.pieces.length > 0 ? besideOthers(document, piece) : piece;
  return { document: { ...document, pieces: [...document.pieces, placed] }, pieceId };
}

/**
 * Takes a piece out, and whoever sat on it. A locked piece stays.
 *
 * @param document - the set
 * @param pieceId - the piece; an unknown id changes nothing
 * @returns the new set
 */
export function removePiece(document: SetDocument, pieceId: string): SetDocument {
  const pieces = document.pieces.filter((piece) => piece.id !== pieceId || piece.locked);
  if (pieces.length === document.pieces.length) return document;
  return withoutLostParts({ ...document, pieces });
}

/**
 * A set without what hung on pieces that are no longer there: seats, members of groups, dimension lines, choices of cushions.
 *
 * @param document - the set
 */
export const withoutLostParts = (document: SetDocument): SetDocument =>
  withoutLostCushions(withoutLostDimensions(withoutLostMembers(withoutLostSeats(document))));

/**
 * Adds a copy of a piece beside it, with the next mark and nobody seated.
 *
 * @param document - the set
 * @param pieceId - the piece to copy; an unknown id changes nothing
 * @param id - identifier of the copy; made from its mark when left out
 * @returns the new set and the copy's id (the given id when nothing was copied)
 */
export function duplicatePiece(
  document: SetDocument,
  pieceId: string,
  id?: string,
): { document: SetDocument; pieceId: string } {
  const piece = document.pieces.find((one) => one.id === pieceId);
  if (piece === undefined) return { document, pieceId };
  const mark = nextMark(document, piece.kind);
  const copyId = id ?? freeId(document, mark);
  const { x0, x1 } = footprint(piece);
  const [xMm, , zMm] = toRoom(piece.at, [x1 - x0 + DUPLICATE_GAP_MM, 0, 0]);
  const copy = { ...shownPiece(piece), id: copyId, mark, locked: false, at: { ...piece.at, xMm, zMm } };
  const copied = copyCushionChoices({ ...document, pieces: [...document.pieces, copy] }, piece.id, copyId);
  return { document: withoutLostSeats(copied), pieceId: copyId };
}

/**
 * Moves and turns a piece; what is left out stays. A locked piece stays where it is.
 *
 * @param document - the set
 * @param pieceId - the piece; an unknown id changes nothing
 * @param to - new position in the room, millimetres, and turn in degrees
 * @returns the new set
 */
export function movePiece(document: SetDocument, pieceId: string, to: Partial<Piece['at']>): SetDocument {
  const pieces = document.pieces.map((piece) => {
    if (piece.id !== pieceId || piece.locked) return piece;
    const at = { ...piece.at, ...to };
    return { ...piece, at: { ...at, turnDeg: normalTurnDeg(at.turnDeg) } };
  });
  return withoutLostSeats({ ...document, pieces });
}

/**
 * An id made from a mark: `b3`, or `b3-2` when that is taken.
 *
 * @param document - the set
 * @param mark - mark of the piece
 * @returns an id no piece of the set has
 */
export function freeId(document: SetDocument, mark: string): string {
  const taken = new Set(document.pieces.map((piece) => piece.id));
  const base = mark.toLowerCase();
  let id = base;
  for (let n = 2; taken.has(id); n += 1) id = `${base}-${n}`;
  return id;
}

/**
 * A piece that is drawn.
 *
 * @param piece - any piece
 * @returns the piece without the mark that hides it
 */
export function shownPiece<P extends Piece>(piece: P): P {
  const { hidden: _, ...shown } = piece;
  return shown as P;
}

/** To the right of everything that is already there. */
function besideOthers(document: SetDocument, piece: Piece): Piece {
  const right = Math.max(...document.pieces.flatMap((one) => footprint(one).corners.map(([x]) => x)));
  const { x0 } = footprint(piece);
  return { ...piece, at: { ...piece.at, xMm: Math.round(right + 300 - x0) } };
}
