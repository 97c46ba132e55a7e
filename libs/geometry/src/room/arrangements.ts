import { snapToBoards } from '../parts/boards.ts';
import { benchLayout } from '../pieces/bench-layout.ts';
import { pieceEnvelope } from '../pieces/kinds.ts';
import { BOARDS } from '../pieces/starting-sizes.ts';
import { pressedSeatHeightMm, withPressedSeatHeight } from '../pieces/seat-sink.ts';
import type { Piece, PieceKind, PieceOf, SetDocument } from './document.ts';
import { newPiece } from './edit-pieces.ts';
import { emptySetDocument } from './read-document.ts';

/** A layout to start a set from. */
export interface Arrangement {
  id: 'bench-window' | 'facing-benches' | 'u-booth' | 'banquette' | 'empty';
  title: string;
  words: string;
  build(): SetDocument;
}

const PLACE_MM = 609.6;
const OVERLAP_MM = 38.1;
const SILL_HEIGHT_MM = 685.8;
const SILL_DEPTH_MM = 76.2;
/** Room the knees of the first sitter need beyond the front of the other leg. */
const CORNER_MM = 228.6;

/** Layouts a new set can start from, in the order they are offered. */
export const ARRANGEMENTS: readonly Arrangement[] = [
  {
    id: 'bench-window',
    title: 'Bench at a window',
    words: 'Two places and a table, a window sill at the elbow.',
    build: benchAtWindow,
  },
  {
    id: 'facing-benches',
    title: 'Facing benches',
    words: 'Two benches across a table, a window at the end.',
    build: facingBenches,
  },
  {
    id: 'u-booth',
    title: 'U-shaped booth',
    words: 'Five places round three sides of a table.',
    build: uBooth,
  },
  {
    id: 'banquette',
    title: 'Banquette',
    words: 'A long bench against a wall, two tables, chairs opposite.',
    build: banquette,
  },
  { id: 'empty', title: 'Empty', words: 'Nothing yet; add pieces one by one.', build: emptySetDocument },
];

/** A new piece with some of its sizes set. */
function piece<K extends PieceKind>(
  kind: K,
  mark: string,
  at: [number, number, number],
  sizes: Partial<PieceOf<K>> = {},
): PieceOf<K> {
  const [xMm, zMm, turnDeg] = at;
  return { ...newPiece(kind, mark.toLowerCase(), mark, { xMm, zMm, turnDeg }), ...sizes };
}

function setOf(pieces: Piece[], asked: Partial<SetDocument['asked']> = {}): SetDocument {
  const empty = emptySetDocument();
  return { ...empty, pieces, asked: { ...empty.asked, ...asked } };
}

const benchFront = (bench: PieceOf<'bench'>) => benchLayout(bench).frontZMm;
const benchFace = (bench: PieceOf<'bench'>) => benchLayout(bench).faceZMm;
const wallLength = (mm: number) => snapToBoards(mm, BOARDS).lengthMm;

function bench(mark: string, at: [number, number, number], lengthMm: number): PieceOf<'bench'> {
  const start = piece('bench', mark, at, { lengthMm });
  return withPressedSeatHeight(start, pressedSeatHeightMm(newPiece('bench', 'b', 'B1', start.at)));
}

/** A wall with a window along the x axis, the bench at right angles to it and its end at the wall. */
function benchAtWindow(): SetDocument {
  const length = 2 * PLACE_MM;
  const b1 = bench('B1', [0, length / 2, 90], length);
  const [face, front] = [benchFace(b1), benchFront(b1)];
  const width = 762;
  const far = front - OVERLAP_MM + width;
  const wall = wallLength(far + 400);
  return setOf([
    b1,
    piece('table', 'T1', [front - OVERLAP_MM + width / 2, length / 2, 90], {
      lengthMm: length,
      widthMm: width,
    }),
    windowSill('S1', face, far),
    piece('bulkhead', 'W1', [wall / 2 - 88.9, 0, 0], { lengthMm: wall }),
    piece('bulkhead', 'W2', [0, wallLength(length + 300) / 2, 90], { lengthMm: wallLength(length + 300) }),
  ]);
}

function facingBenches(): SetDocument {
  const length = 2 * PLACE_MM;
  const b1 = bench('B1', [0, length / 2, 90], length);
  const [face, front] = [benchFace(b1), benchFront(b1)];
  const width = 762;
  const far = 2 * front + width - 2 * OVERLAP_MM;
  const wall = wallLength(far + 2 * 88.9);
  return setOf([
    b1,
    bench('B2', [far, length / 2, -90], length),
    piece('table', 'T1', [far / 2, length / 2, 90], { lengthMm: length, widthMm: width }),
    windowSill('S1', face, far - face),
    piece('bulkhead', 'W1', [far / 2, 0, 0], { lengthMm: wall }),
  ]);
}

/** A sill along the wall on the x axis, between two backs, with a window over its middle. */
function windowSill(mark: string, fromX: number, toX: number): PieceOf<'sill'> {
  return piece('sill', mark, [(fromX + toX) / 2, 0, 0], {
    lengthMm: toX - fromX,
    heightMm: SILL_HEIGHT_MM,
    depthMm: SILL_DEPTH_MM,
    opening: { widthMm: Math.min(914.4, toX - fromX - 203.2), heightMm: 762, frameMm: 50.8 },
  });
}

function uBooth(): SetDocument {
  const probe = bench('B1', [0, 0, 0], 1200);
  const front = benchFront(probe);
  // The side benches stop where the tilted seat of the rear bench is farthest out.
  const meeting = pieceEnvelope(probe).maxMm[2];
  const between = PLACE_MM + 2 * CORNER_MM;
  const side = 2 * PLACE_MM + CORNER_MM;
  const places: PieceOf<'bench'>['places'] = { by: 'width', widthMm: PLACE_MM };
  const rear = between + 2 * front;
  const plain = (leg: PieceOf<'bench'>): PieceOf<'bench'> => ({
    ...leg,
    places,
    ends: {
      left: { kind: 'open', thicknessMm: 0, heightMm: 0 },
      right: { kind: 'open', thicknessMm: 0, heightMm: 0 },
    },
  });
  const tableLength = side - 50.8 + OVERLAP_MM;
  const wall = wallLength(rear + 160);
  return setOf([
    plain(bench('B1', [0, 0, 0], rear)),
    plain(bench('B2', [-rear / 2, meeting + side / 2, 90], side)),
    plain(bench('B3', [rear / 2, meeting + side / 2, -90], side)),
    piece('table', 'T1', [0, front - OVERLAP_MM + tableLength / 2, 90], {
      lengthMm: tableLength,
      widthMm: between + 2 * OVERLAP_MM,
      base: { kind: 'columns', count: 1, diameterMm: 101.6, footLengthMm: 254, footHeightMm: 38.1 },
    }),
    piece('bulkhead', 'W1', [0, 0, 0], { lengthMm: wall }),
  ]);
}

function banquette(): SetDocument {
  const length = 5 * PLACE_MM;
  const b1: PieceOf<'bench'> = {
    ...bench('B1', [0, 0, 0], length),
    places: { by: 'width', widthMm: PLACE_MM },
  };
  const front = benchFront(b1);
  const width = 762;
  const tables = [-1.5, 1.5].map((places, i) =>
    piece('table', `T${i + 1}`, [places * PLACE_MM, front - OVERLAP_MM + width / 2, 0], {
      lengthMm: 2 * PLACE_MM,
      widthMm: width,
    }),
  );
  const seats = [-2, -1, 1, 2].map((places, i) => {
    const seat = piece('loose-seat', `L${i + 1}`, [places * PLACE_MM, 0, 180]);
    return { ...seat, at: { ...seat.at, zMm: front - OVERLAP_MM + width + seat.seatDepthMm } };
  });
  return setOf(
    [b1, ...tables, ...seats, piece('bulkhead', 'W1', [0, 0, 0], { lengthMm: wallLength(length + 400) })],
    { trafficBehind: 'edge-past' },
  );
}
