import type { FitCell } from '@settlewright/anthropometry';
import { parametersOf, setParameter } from '../pieces/parameters.ts';
import type { Piece, PieceKind, SetDocument } from '../room/document.ts';
import { movePiece } from '../room/edit-pieces.ts';
import { measureSet } from './measure-set.ts';

/** One number that can be moved to help a cell. */
export interface Lever {
  pieceId: string;
  mark: string;
  key: string;
  label: string;
  unit: 'mm' | 'deg' | '';
  fromValue: number;
  stepSize: number;
  /** How far from the present value to look. */
  reach: number;
  /** The set with the number at a value; undefined where that cannot be. */
  at(value: number): SetDocument | undefined;
}

const SHORT_REACH_MM = 152.4;
const LONG_REACH_MM = 914.4;
const ANGLE_STEP_DEG = 0.5;
const ANGLE_REACH_DEG = 10;
const COUNT_REACH = 3;

type Move = readonly [kind: PieceKind, key: string];

const SEAT_UP: Move = ['bench', 'pressedSeatHeight'];
const CHAIR_UP: Move = ['loose-seat', 'pressedSeatHeight'];
const TABLE_UP: Move = ['table', 'heightMm'];
const SILL_UP: Move = ['sill', 'heightMm'];
const OVERLAP: Move = ['table', 'overlap'];
const BENCH_LONG: Move = ['bench', 'lengthMm'];
const PLACES: Move[] = [
  ['bench', 'places.count'],
  ['bench', 'places.widthMm'],
];

/** Which numbers can help a rule, by the start of its id; the first match counts. */
const MOVES: readonly (readonly [string, readonly Move[]])[] = [
  ['SEAT-01', [SEAT_UP, CHAIR_UP, ['bench', 'together']]],
  ['SEAT-02', [SEAT_UP, CHAIR_UP, ['bench', 'together']]],
  [
    'SEAT-03',
    [
      ['bench', 'seatDepthMm'],
      ['loose-seat', 'seatDepthMm'],
      ['bench', 'backCushion.thicknessMm'],
    ],
  ],
  [
    'SEAT-04',
    [
      ['bench', 'seatDepthMm'],
      ['loose-seat', 'seatDepthMm'],
      ['bench', 'backCushion.thicknessMm'],
    ],
  ],
  ['SEAT-05', [...PLACES, BENCH_LONG, ['loose-seat', 'widthMm']]],
  ['SEAT-06', [['bench', 'seatTiltDeg']]],
  [
    'SEAT-07',
    [
      ['bench', 'kick.depthMm'],
      ['bench', 'lipMm'],
    ],
  ],
  [
    'BACK-01',
    [
      ['bench', 'backLeanDeg'],
      ['bench', 'seatTiltDeg'],
      ['loose-seat', 'backLeanDeg'],
    ],
  ],
  ['BACK-02', [['bench', 'lumbar.apexMm']]],
  ['BACK-04', [['bench', 'lumbar.recessMm']]],
  [
    'BACK',
    [
      ['bench', 'backHeightMm'],
      ['loose-seat', 'backHeightMm'],
    ],
  ],
  ['SILL-03', [['sill', 'depthMm']]],
  ['SILL-04', [['sill', 'depthMm'], ...PLACES]],
  ['SILL', [SILL_UP, SEAT_UP]],
  ['TABLE-01', [TABLE_UP, SEAT_UP, ['table', 'topThicknessMm'], ['table', 'apron.heightMm']]],
  ['TABLE-02', [TABLE_UP, ['table', 'topThicknessMm'], ['table', 'apron.heightMm']]],
  ['TABLE-05', [TABLE_UP, SEAT_UP, CHAIR_UP]],
  ['TABLE-06', [OVERLAP, ['bench', 'seatDepthMm']]],
  ['TABLE-08', [['table', 'lengthMm']]],
  ['TABLE-09', [['table', 'widthMm']]],
  [
    'TABLE-10',
    [
      ['table', 'lengthMm'],
      ['table', 'base.insetMm'],
    ],
  ],
  ['TABLE', [OVERLAP]],
  [
    'SIDE-04',
    [
      ['bench', 'gap'],
      ['bench', 'seatDepthMm'],
    ],
  ],
  ['SIDE', [BENCH_LONG, ...PLACES]],
  ['EGRESS-01', [['table', 'lengthMm']]],
  ['HEAD-03', [['overhead', 'undersideMm']]],
  // Where a lens stands and what a riser lifts is chosen for a shot, not built.
  ['HEAD-04', []],
  ['HEAD-05', []],
  ['HEAD', [['overhead', 'undersideMm'], SEAT_UP]],
  ['ACC-01', [SEAT_UP]],
  ['ACC-02', [['bench', 'seatDepthMm'], BENCH_LONG]],
  ['ACC-03', [['bench', 'backHeightMm'], BENCH_LONG]],
  ['ACC-05', [TABLE_UP]],
  [
    'ACC-06',
    [TABLE_UP, ['table', 'topThicknessMm'], ['table', 'apron.heightMm'], ['table', 'apron.insetMm']],
  ],
];

/**
 * The numbers of a set that can be moved to help a cell.
 *
 * @param document - the set
 * @param cell - the cell of the fit sheet
 * @param stepMm - rounding step of lengths
 * @returns levers, most natural first; empty for a rule that no single number helps
 */
export function leversFor(document: SetDocument, cell: FitCell, stepMm: number): Lever[] {
  const moves = MOVES.find(([start]) => cell.ruleId.startsWith(start))?.[1] ?? [];
  const pieces = piecesOf(document, cell);
  return moves.flatMap(([kind, key]) =>
    pieces
      .filter((piece) => piece.kind === kind && !piece.locked)
      .flatMap((piece) => leverOf(document, cell, piece, key, stepMm) ?? []),
  );
}

/** Pieces that take part in a cell: those it names, and the table, sills and beam of its place. */
function piecesOf(document: SetDocument, cell: FitCell): Piece[] {
  const ids = new Set(cell.pieceIds);
  if (cell.placeId !== undefined) {
    const place = measureSet(document).places.find(({ placeId }) => placeId === cell.placeId);
    for (const near of [
      place,
      place?.table,
      place?.overhead,
      place?.overheadAhead,
      ...(place?.sills ?? []),
    ]) {
      if (near !== undefined) ids.add(near.pieceId);
    }
  }
  return document.pieces.filter((piece) => ids.has(piece.id));
}

function leverOf(
  document: SetDocument,
  cell: FitCell,
  piece: Piece,
  key: string,
  stepMm: number,
): Lever | undefined {
  const named = { pieceId: piece.id, mark: piece.mark, key };
  const length = { unit: 'mm', stepSize: stepMm, reach: SHORT_REACH_MM } as const;
  if (key === 'overlap') return overlapLever(document, cell, piece, { ...named, ...length });
  if (key === 'gap') return gapLever(document, cell, piece, { ...named, ...length });
  if (key === 'together') return togetherLever(document, piece, { ...named, ...length });
  const parameter = parametersOf(piece).find((one) => one.key === key);
  if (parameter === undefined || typeof parameter.value !== 'number') return undefined;
  const long = key === 'lengthMm' || key === 'widthMm';
  const size =
    parameter.kind === 'angle'
      ? ({ unit: 'deg', stepSize: ANGLE_STEP_DEG, reach: ANGLE_REACH_DEG } as const)
      : parameter.kind === 'count'
        ? ({ unit: '', stepSize: 1, reach: COUNT_REACH } as const)
        : { ...length, reach: long ? LONG_REACH_MM : SHORT_REACH_MM };
  return {
    ...named,
    ...size,
    label: parameter.label,
    fromValue: parameter.value,
    at(value) {
      const set = setParameter(document, piece.id, key, value);
      return set.ok ? set.value : undefined;
    },
  };
}

type Named = Pick<Lever, 'pieceId' | 'mark' | 'key' | 'unit' | 'stepSize' | 'reach'>;

/** Moves a table towards a sitter or away. */
function overlapLever(document: SetDocument, cell: FitCell, table: Piece, named: Named): Lever | undefined {
  const { places } = measureSet(document);
  const place = places.find(
    ({ placeId, table: near }) =>
      near?.pieceId === table.id && (cell.placeId === undefined || placeId === cell.placeId),
  );
  const seat = document.pieces.find(({ id }) => id === place?.pieceId);
  const from = place?.table?.overlapMm;
  if (seat === undefined || from === undefined) return undefined;
  return {
    ...named,
    label: `Overlap over ${seat.mark}`,
    fromValue: from,
    at: (value) => movedAhead(document, table, seat.at.turnDeg, from - value),
  };
}

/** Moves the second of two facing benches back or forward. */
function gapLever(document: SetDocument, cell: FitCell, bench: Piece, named: Named): Lever | undefined {
  const pair = measureSet(document).facing.find(({ pieceIds }) =>
    pieceIds.every((id) => cell.pieceIds.includes(id)),
  );
  if (pair === undefined || pair.pieceIds[1] !== bench.id) return undefined;
  return {
    ...named,
    label: `Gap between ${pair.marks[0]} and ${pair.marks[1]}`,
    fromValue: pair.gapMm,
    at: (value) => movedAhead(document, bench, bench.at.turnDeg, pair.gapMm - value),
  };
}

/** Raises or lowers all benches, and the tables with them. */
function togetherLever(document: SetDocument, bench: Piece, named: Named): Lever | undefined {
  const seats = document.pieces.filter(({ kind, locked }) => kind === 'bench' && !locked);
  const tables = document.pieces.filter(({ kind, locked }) => kind === 'table' && !locked);
  const from = heightOf(bench);
  if (from === undefined || tables.length + seats.length < 2) return undefined;
  return {
    ...named,
    mark: [...seats, ...tables].map(({ mark }) => mark).join(', '),
    key: 'pressedSeatHeight',
    label: tables.length > 0 ? 'Seats, and tables with them' : 'Seats of all benches',
    fromValue: from,
    at: (value) =>
      [...seats, ...tables].reduce<SetDocument | undefined>((moved, piece) => {
        const height = heightOf(piece);
        if (moved === undefined || height === undefined) return undefined;
        const key = piece.kind === 'table' ? 'heightMm' : 'pressedSeatHeight';
        const set = setParameter(moved, piece.id, key, height + value - from);
        return set.ok ? set.value : undefined;
      }, document),
  };
}

function heightOf(piece: Piece): number | undefined {
  const key = piece.kind === 'table' ? 'heightMm' : 'pressedSeatHeight';
  const value = parametersOf(piece).find((one) => one.key === key)?.value;
  return typeof value === 'number' ? value : undefined;
}

function movedAhead(document: SetDocument, piece: Piece, turnDeg: number, byMm: number): SetDocument {
  const turn = (turnDeg * Math.PI) / 180;
  return movePiece(document, piece.id, {
    xMm: piece.at.xMm + Math.sin(turn) * byMm,
    zMm: piece.at.zMm + Math.cos(turn) * byMm,
  });
}
