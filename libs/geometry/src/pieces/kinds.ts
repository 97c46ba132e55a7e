import { shapesOfPiece } from '../cushions/shapes-of-piece.ts';
import type { Part } from '../parts/part.ts';
import type { Piece, PieceKind, SetDocument } from '../room/document.ts';
import { BENCH } from './bench.ts';
import { BULKHEAD } from './bulkhead.ts';
import type { Envelope, PieceDefinition, SpecSentence } from './kind.ts';
import { LOOSE_SEAT } from './loose-seat.ts';
import { OVERHEAD } from './overhead.ts';
import { SILL } from './sill.ts';
import { TABLE } from './table.ts';

const DEFINITIONS: { readonly [K in PieceKind]: PieceDefinition<K> } = {
  bench: BENCH,
  table: TABLE,
  sill: SILL,
  bulkhead: BULKHEAD,
  overhead: OVERHEAD,
  'loose-seat': LOOSE_SEAT,
};

/** Kinds in the order of a schedule. */
export const PIECE_KINDS: readonly PieceKind[] = [
  'bench',
  'table',
  'sill',
  'bulkhead',
  'loose-seat',
  'overhead',
];

/**
 * The definition of a piece's kind, typed so that it takes that piece.
 *
 * @param kind - kind of piece
 * @returns what the library knows about it
 */
export function definitionOf<K extends PieceKind>(kind: K): PieceDefinition<K> {
  return DEFINITIONS[kind];
}

/**
 * Plain title of a kind of piece, such as "Bench".
 *
 * @param kind - kind of piece
 * @returns the title
 */
export function kindTitle(kind: PieceKind): string {
  return DEFINITIONS[kind].title;
}

// A piece and its own definition always go together; the compiler cannot see that across the union.
function widened(piece: Piece): PieceDefinition<PieceKind> {
  return DEFINITIONS[piece.kind] as unknown as PieceDefinition<PieceKind>;
}

/** Parts of a piece, and what of its set they were made by: the sills of a wall, the shapes of cushions. */
interface KeptParts {
  by: readonly unknown[];
  parts: readonly Part[];
}

const kept = new WeakMap<Piece, KeptParts>();
const NOTHING: readonly unknown[] = [];

function madeBy(piece: Piece, document: SetDocument | undefined): readonly unknown[] {
  if (!document) return NOTHING;
  if (piece.kind === 'bulkhead') return document.pieces.filter(({ kind }) => kind === 'sill');
  return shapesOfPiece(document.cushions, piece.id);
}

/**
 * Boards, panels and cushions of one piece. They are derived once for a piece and kept as long as it is: a piece that
 * did not change gives the very same list again, in whatever set it stands.
 *
 * @param piece - the piece; it is not changed afterwards
 * @param document - the set; when given, boards of a bulkhead are cut around the windows of its sills, and cushions have
 * the shapes that were chosen
 * @returns parts in the room frame
 */
export function derivePieceParts(piece: Piece, document?: SetDocument): readonly Part[] {
  const by = madeBy(piece, document);
  const known = kept.get(piece);
  if (known?.by.length === by.length && known.by.every((one, n) => one === by[n])) return known.parts;
  const parts = widened(piece).parts(piece, document);
  kept.set(piece, { by, parts });
  return parts;
}

/**
 * Parts of all pieces, in the order of the document.
 *
 * @param document - the set
 * @returns parts in the room frame
 */
export function deriveParts(document: SetDocument): Part[] {
  return document.pieces.flatMap((piece) => derivePieceParts(piece, document));
}

/**
 * The box a piece fills.
 *
 * @param piece - the piece
 * @returns its corners in the piece's own frame, millimetres
 */
export function pieceEnvelope(piece: Piece): Envelope {
  return widened(piece).envelope(piece);
}

/**
 * The two sentences that say a piece; numbers are formatted by whoever shows them.
 *
 * @param piece - the piece
 * @returns tokens in reading order; number tokens name a parameter of `parametersOf`
 */
export function specSentence(piece: Piece): SpecSentence {
  return widened(piece).sentence(piece);
}
