import { parametersOf, setParameter } from '../pieces/parameters.ts';
import type { Piece, PieceKind, SetDocument } from '../room/document.ts';
import { movePiece } from '../room/edit-pieces.ts';
import { measureSet } from '../situation/measure-set.ts';
import { MM_PER_INCH } from '../units/length-style.ts';

/** One number of a set that can be chosen, with every piece that moves along. */
export interface Dimension {
  /** Stable within a set: the kind of number, and the piece where it is one piece's alone. */
  id: string;
  label: string;
  unit: 'mm' | 'deg' | 'N';
  /** The first of the pieces shows the value; the others keep their difference to it. */
  pieceIds: string[];
  marks: string[];
  /** Marks of tables that go up and down with the seats. */
  tableMarks: string[];
  /** The present value. */
  value: number;
  /** Values that make sense to look at, inside the limits of every piece that moves. */
  min: number;
  max: number;
  /** Rule whose bands are shown first. */
  ruleId: string;
  /** The set with the number at a value; `undefined` where a piece cannot be so. */
  at(value: number): SetDocument | undefined;
}

interface Kind {
  id: string;
  label: string;
  of: readonly (readonly [kind: PieceKind, key: string])[];
  unit: Dimension['unit'];
  ruleId: string;
  /** How far from the present value to look, in the unit. */
  reach: number;
}

const HAND = 6 * MM_PER_INCH;

const KINDS: readonly Kind[] = [
  {
    id: 'seat-height',
    label: 'Seat height, pressed',
    of: [
      ['bench', 'pressedSeatHeight'],
      ['loose-seat', 'pressedSeatHeight'],
    ],
    unit: 'mm',
    ruleId: 'SEAT-02',
    reach: HAND,
  },
  {
    id: 'seat-depth',
    label: 'Seat depth',
    of: [
      ['bench', 'seatDepthMm'],
      ['loose-seat', 'seatDepthMm'],
    ],
    unit: 'mm',
    ruleId: 'SEAT-04',
    reach: HAND,
  },
  {
    id: 'seat-tilt',
    label: 'Seat tilt',
    of: [['bench', 'seatTiltDeg']],
    unit: 'deg',
    ruleId: 'SEAT-06',
    reach: 6,
  },
  {
    id: 'back-lean',
    label: 'Back lean',
    of: [
      ['bench', 'backLeanDeg'],
      ['loose-seat', 'backLeanDeg'],
    ],
    unit: 'deg',
    ruleId: 'BACK-01',
    reach: 12,
  },
  {
    id: 'back-height',
    label: 'Back height',
    of: [
      ['bench', 'backHeightMm'],
      ['loose-seat', 'backHeightMm'],
    ],
    unit: 'mm',
    ruleId: 'BACK-03',
    reach: 1.5 * HAND,
  },
  {
    id: 'seat-firmness',
    label: 'Seat foam firmness',
    of: [['bench', 'seatCushion.foam.ifd25N']],
    unit: 'N',
    ruleId: 'SEAT-02',
    reach: 100,
  },
  {
    id: 'place-width',
    label: 'Width of a place',
    of: [['bench', 'places.widthMm']],
    unit: 'mm',
    ruleId: 'SEAT-05',
    reach: HAND,
  },
  {
    id: 'bench-length',
    label: 'Bench length',
    of: [['bench', 'lengthMm']],
    unit: 'mm',
    ruleId: 'SEAT-05',
    reach: 2 * HAND,
  },
  {
    id: 'table-height',
    label: 'Table height',
    of: [['table', 'heightMm']],
    unit: 'mm',
    ruleId: 'TABLE-05',
    reach: HAND,
  },
  {
    id: 'table-apron',
    label: 'Apron height',
    of: [['table', 'apron.heightMm']],
    unit: 'mm',
    ruleId: 'TABLE-01',
    reach: HAND,
  },
  {
    id: 'table-top',
    label: 'Top thickness',
    of: [['table', 'topThicknessMm']],
    unit: 'mm',
    ruleId: 'TABLE-01',
    reach: 40,
  },
  {
    id: 'sill-height',
    label: 'Sill height',
    of: [['sill', 'heightMm']],
    unit: 'mm',
    ruleId: 'SILL-01',
    reach: HAND,
  },
  {
    id: 'sill-depth',
    label: 'Sill depth',
    of: [['sill', 'depthMm']],
    unit: 'mm',
    ruleId: 'SILL-03',
    reach: HAND,
  },
  {
    id: 'headroom',
    label: 'Underside overhead',
    of: [['overhead', 'undersideMm']],
    unit: 'mm',
    ruleId: 'HEAD-02',
    reach: 2 * HAND,
  },
];

const WITH_TABLES = 'seat-and-tables';
const OVERLAP = 'table-overlap';

/**
 * The numbers of a set that can be chosen: for all pieces that have one, and for each piece alone where there are
 * several.
 *
 * @param document - the set
 * @returns dimensions, seats first; none for an empty set. Lengths in millimetres, angles in degrees, firmness in newtons
 */
export function dimensionsOf(document: SetDocument): Dimension[] {
  const found = KINDS.flatMap((kind) => {
    const pieces = document.pieces.filter((piece) => valueOf(piece, kind) !== undefined);
    if (pieces.length === 0) return [];
    const together = dimension(document, kind, pieces, []);
    const alone = pieces.length > 1 ? pieces.map((piece) => dimension(document, kind, [piece], [])) : [];
    return kind.id === 'seat-height'
      ? [together, ...withTables(document, kind, pieces), ...alone]
      : [together, ...alone];
  });
  return [...found, ...overlaps(document)];
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

function withTables(document: SetDocument, kind: Kind, seats: readonly Piece[]): Dimension[] {
  const tables = document.pieces.filter((piece) => piece.kind === 'table');
  if (tables.length === 0) return [];
  return [{ ...dimension(document, kind, seats, tables), id: WITH_TABLES }];
}

interface Mover {
  piece: Piece;
  key: string;
  from: number;
}

function dimension(
  document: SetDocument,
  kind: Kind,
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
    pieces.length > 1 || document.pieces.filter((one) => valueOf(one, kind) !== undefined).length === 1;
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
    at: (wanted) => moved(document, movers, wanted - value),
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

const keyOf = (piece: Piece, kind: Kind): string => kind.of.find(([of]) => of === piece.kind)?.[1] ?? '';

function valueOf(piece: Piece, kind: Kind): number | undefined {
  const key = keyOf(piece, kind);
  if (key === '') return undefined;
  const value = parametersOf(piece).find((one) => one.key === key)?.value;
  return typeof value === 'number' ? value : undefined;
}

/** How far each table stands over its seats: a table with diners on both sides grows, one with one side moves. */
function overlaps(document: SetDocument): Dimension[] {
  const { places, tables } = measureSet(document);
  return document.pieces.flatMap((piece): Dimension[] => {
    if (piece.kind !== 'table') return [];
    const seated = places.filter(({ table }) => table?.pieceId === piece.id);
    const [nearest] = seated;
    const edges = tables.find(({ pieceId }) => pieceId === piece.id)?.edges ?? [];
    const seat = document.pieces.find(({ id }) => id === nearest?.pieceId);
    if (nearest?.table === undefined || seat === undefined) return [];
    const value = Math.min(...seated.map(({ table }) => table?.overlapMm ?? Infinity));
    const bothSides = edges.filter(({ placeIds }) => placeIds.length > 0).length > 1;
    if (!bothSides && piece.locked) return [];
    return [
      {
        id: `${OVERLAP}|${piece.id}`,
        label: 'Table over the seat front',
        unit: 'mm',
        pieceIds: [piece.id],
        marks: [piece.mark],
        tableMarks: [],
        value,
        min: value - HAND,
        max: value + HAND,
        ruleId: 'TABLE-06',
        at: (wanted) =>
          bothSides
            ? grown(document, piece.id, piece.widthMm + 2 * (wanted - value))
            : towards(document, piece, seat.at.turnDeg, value - wanted),
      },
    ];
  });
}

function grown(document: SetDocument, tableId: string, widthMm: number): SetDocument | undefined {
  const set = setParameter(document, tableId, 'widthMm', widthMm);
  return set.ok ? set.value : undefined;
}

function towards(document: SetDocument, table: Piece, turnDeg: number, byMm: number): SetDocument {
  const turn = (turnDeg * Math.PI) / 180;
  return movePiece(document, table.id, {
    xMm: table.at.xMm + Math.sin(turn) * byMm,
    zMm: table.at.zMm + Math.cos(turn) * byMm,
  });
}
