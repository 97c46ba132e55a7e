import { parametersOf, setParameter } from '../pieces/parameters.ts';
import type { Piece, SetDocument } from '../room/document.ts';
import { SEAT_AND_TABLES, type Dimension } from './dimension.ts';
import { DIMENSION_KINDS, type DimensionKind } from './dimension-kinds.ts';
import { tableOverlaps } from './table-overlap.ts';

/**
 * The numbers of a set that can be chosen: for all pieces that have one and are not locked, and for each piece alone where there are
 * several.
 *
 * @param document - the set
 * @returns dimensions, seats first; none for an empty set. Lengths in millimetres, angles in degrees, firmness in newtons
 */
export function dimensionsOf(document: SetDocument): Dimension[] {
  const found = DIMENSION_KINDS.flatMap((kind) => {
    const pieces = document.pieces.filter((piece) => !piece.locked && valueOf(piece, kind) !== undefined);
    if (pieces.length === 0) return [];
    const together = dimension(document, kind, pieces, []);
    const alone = pieces.length > 1 ? pieces.map((piece) => dimension(document, kind, [piece], [])) : [];
    return kind.id === 'seat-height'
      ? [together, ...withTables(document, kind, pieces), ...alone]
      : [together, ...alone];
  });
  return [...found, ...tableOverlaps(document)];
}

/**
 * One dimension of a set by its id.
 *
 * @param document - the set
 * @param id - as `dimensionsOf` names it
 * @returns the dimension; `undefined` when the set has no such number now
 */
export const dimensionOf = (document: SetDocument, id: string): Dimension | undefined =>
  dimensionsOf(document).find((one) => one.id === id);

/**
 * The dimension that one number of a piece is.
 *
 * @param document - the set
 * @param pieceId - the piece
 * @param key - key of the number, as `parametersOf` names it
 * @returns the id of the piece's own dimension; `undefined` when the number is none
 */
export function dimensionIdOf(document: SetDocument, pieceId: string, key: string): string | undefined {
  const piece = document.pieces.find(({ id }) => id === pieceId);
  const kind = piece && DIMENSION_KINDS.find((one) => keyOf(piece, one) === key);
  if (!piece || !kind || valueOf(piece, kind) === undefined) return undefined;
  if (piece.locked) return undefined;
  const having = document.pieces.filter((one) => !one.locked && valueOf(one, kind) !== undefined);
  return having.length > 1 ? `${kind.id}|${pieceId}` : kind.id;
}

function withTables(document: SetDocument, kind: DimensionKind, seats: readonly Piece[]): Dimension[] {
  const tables = document.pieces.filter((piece) => piece.kind === 'table' && !piece.locked);
  if (tables.length === 0) return [];
  return [{ ...dimension(document, kind, seats, tables), id: SEAT_AND_TABLES }];
}

interface Mover {
  piece: Piece;
  key: string;
  from: number;
}

function dimension(
  document: SetDocument,
  kind: DimensionKind,
  pieces: readonly Piece[],
  tables: readonly Piece[],
): Dimension {
  const lead = pieces[0] as Piece;
  const movers: Mover[] = [
    ...pieces.map((piece) => ({ piece, key: keyOf(piece, kind), from: valueOf(piece, kind) as number })),
    ...tables.flatMap((piece) =>
      piece.kind === 'table' ? [{ piece, key: 'heightMm', from: piece.heightMm }] : [],
    ),
  ];
  const value = valueOf(lead, kind) as number;
  const all =
    pieces.length > 1 ||
    document.pieces.filter((one) => !one.locked && valueOf(one, kind) !== undefined).length === 1;
  return {
    id: all ? kind.id : `${kind.id}|${lead.id}`,
    label: kind.label,
    unit: kind.unit,
    pieceIds: movers.map(({ piece }) => piece.id),
    marks: pieces.map(({ mark }) => mark),
    tableMarks: tables.map(({ mark }) => mark),
    value,
    ...range(movers, value, kind.reach),
    ruleId: kind.ruleId,
    at: (wanted, on = document) => moved(on, movers, wanted - value),
  };
}

/** The reach about the present value, cut where a piece meets its limit. */
function range(movers: readonly Mover[], value: number, reach: number): { min: number; max: number } {
  let min = value - reach;
  let max = value + reach;
  for (const { piece, key, from } of movers) {
    const limits = parametersOf(piece).find((one) => one.key === key);
    if (limits === undefined) continue;
    min = Math.max(min, limits.min - from + value);
    max = Math.min(max, limits.max - from + value);
  }
  return { min: Math.min(min, value), max: Math.max(max, value) };
}

function moved(document: SetDocument, movers: readonly Mover[], by: number): SetDocument | undefined {
  let set = document;
  for (const { piece, key, from } of movers) {
    const next = setParameter(set, piece.id, key, from + by);
    if (!next.ok) return undefined;
    set = next.value;
  }
  return set;
}

const keyOf = (piece: Piece, kind: DimensionKind): string =>
  kind.of.find(([of]) => of === piece.kind)?.[1] ?? '';

function valueOf(piece: Piece, kind: DimensionKind): number | undefined {
  const key = keyOf(piece, kind);
  if (key === '') return undefined;
  const value = parametersOf(piece).find((one) => one.key === key)?.value;
  return typeof value === 'number' ? value : undefined;
}
