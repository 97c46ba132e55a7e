import { boardRun } from '../parts/boards.ts';
import { normalTurnDeg, toPiece } from '../parts/placement.ts';
import { benchLayout } from '../pieces/bench-layout.ts';
import { radians } from '../units/angle.ts';
import type { Piece, SetDocument } from './document.ts';
import { footprint } from './footprint.ts';

/** A piece that is nearer than this to a line jumps to it, millimetres. */
const SNAP_MM = 60;
/** Turns this near to square with a neighbour become square. */
const SQUARE_DEG = 8;
/** Turns this near to a multiple of 15° take it. */
const STEP_TURN_DEG = 2.5;
/** Only pieces this near are looked at, millimetres. */
const NEARBY_MM = 600;
/** A table snaps over the seat of a bench by 1 1/2 in as well as edge to edge. */
const TABLE_OVER_SEAT_MM = 38.1;
const BOARD_SNAP_MM = 20;
const WHOLE_TURNS_DEG = 15;

/** Where a piece comes to stand, and what it lined up with. */
export interface Snapped {
  at: Piece['at'];
  /** Words such as "face of W1, end of B2"; left out when nothing was near. */
  snappedTo?: string;
}

/** A move along one level direction that brings two lines together. */
interface SnapMove {
  direction: readonly [number, number];
  byMm: number;
  cost: number;
  words: string;
}

interface Range {
  low: number;
  high: number;
}

/**
 * Where a piece comes to stand when it is dragged somewhere: against walls, at the faces and ends of other
 * pieces, over a seat, on the board lines of a wall.
 *
 * @param document - the set
 * @param pieceId - the piece that is moved
 * @param wanted - where the pointer puts it: millimetres and degrees
 * @returns the place to use; the wanted one when nothing is near
 */
export function snapPiece(document: SetDocument, pieceId: string, wanted: Piece['at']): Snapped {
  const moved = document.pieces.find((piece) => piece.id === pieceId);
  if (moved === undefined) return { at: wanted };
  const others = document.pieces.filter((piece) => piece.id !== pieceId && piece.kind !== 'overhead');
  const turned = { ...moved, at: { ...wanted, turnDeg: snappedTurn(wanted, others) } };
  const moves = others.flatMap((other) => movesTo(turned, other)).sort((a, b) => a.cost - b.cost);
  const first = moves[0];
  const square = (move: SnapMove) =>
    first !== undefined &&
    Math.abs(move.direction[0] * first.direction[0] + move.direction[1] * first.direction[1]) < 0.1;
  const chosen = first === undefined ? [] : [first, ...moves.filter(square).slice(0, 1)];
  const at = chosen.reduce(
    (place, { direction, byMm }) => ({
      ...place,
      xMm: place.xMm + direction[0] * byMm,
      zMm: place.zMm + direction[1] * byMm,
    }),
    turned.at,
  );
  return chosen.length === 0 ? { at } : { at, snappedTo: chosen.map(({ words }) => words).join(', ') };
}

/** Turns to the nearest quarter of the nearest other piece, or to the nearest 15° of the room. */
function snappedTurn(wanted: Piece['at'], others: Piece[]): number {
  const near = [...others].sort((a, b) => away(a, wanted) - away(b, wanted)).slice(0, 3);
  const quarters = near.flatMap(({ at }) => [0, 90, 180, 270].map((quarter) => at.turnDeg + quarter));
  const step = Math.round(wanted.turnDeg / WHOLE_TURNS_DEG) * WHOLE_TURNS_DEG;
  const off = (turn: number) => Math.abs(normalTurnDeg(turn - wanted.turnDeg));
  const square = quarters.filter((turn) => off(turn) <= SQUARE_DEG).sort((a, b) => off(a) - off(b));
  const best = square[0] ?? (off(step) <= STEP_TURN_DEG ? step : undefined);
  return normalTurnDeg(best ?? wanted.turnDeg);
}

const away = (piece: Piece, at: Piece['at']) => Math.hypot(piece.at.xMm - at.xMm, piece.at.zMm - at.zMm);

/** Every move that lines the piece up with one other piece, in the other's own frame. */
function movesTo(piece: Piece, other: Piece): SnapMove[] {
  const turn = normalTurnDeg((piece.at.turnDeg - other.at.turnDeg) * 4) / 4;
  if (Math.abs(turn) > 0.5) return [];
  const corners = footprint(piece).corners.map(([x, z]) => toPiece(other.at, [x, 0, z]));
  const own = { x: rangeOf(corners.map(([x]) => x)), z: rangeOf(corners.map(([, , z]) => z)) };
  const { x0, x1, z0, z1 } = footprint(other);
  const front = other.kind === 'bench' ? benchLayout(other).frontZMm : z1;
  const theirs = { x: { low: x0, high: x1 }, z: { low: z0, high: front } };
  const angle = radians(other.at.turnDeg);
  const along = [Math.cos(angle), -Math.sin(angle)] as const;
  const ahead = [Math.sin(angle), Math.cos(angle)] as const;
  const faces = other.kind === 'bulkhead' ? 'face' : 'front';
  const moves = [
    ...lineUp(own.x, theirs.x, apart(own.z, theirs.z), along, `end of ${other.mark}`),
    ...lineUp(own.z, theirs.z, apart(own.x, theirs.x), ahead, `${faces} of ${other.mark}`),
  ];
  if (piece.kind === 'table' && other.kind === 'bench' && apart(own.x, theirs.x) < 0) {
    const byMm = front - TABLE_OVER_SEAT_MM - own.z.low;
    if (Math.abs(byMm) <= SNAP_MM) {
      moves.push({
        direction: ahead,
        byMm,
        cost: Math.abs(byMm) * 0.5,
        words: `over the seat of ${other.mark}`,
      });
    }
  }
  if (other.kind === 'bulkhead' && other.boardDirection === 'vertical' && apart(own.z, theirs.z) < SNAP_MM) {
    moves.push(...toBoardLines(own.x, other, along));
  }
  return moves;
}

/** Edge to edge when the pieces are side by side, flush or centred when they are near. */
function lineUp(
  own: Range,
  theirs: Range,
  apartMm: number,
  direction: readonly [number, number],
  words: string,
): SnapMove[] {
  if (apartMm > NEARBY_MM) return [];
  const middle = (range: Range) => (range.low + range.high) / 2;
  const lines: [number, number, string][] = [
    [theirs.low - own.low, 1.2, `in line with the ${words}`],
    [theirs.high - own.high, 1.2, `in line with the ${words}`],
    [middle(theirs) - middle(own), 1.4, `middle of ${words.slice(words.lastIndexOf(' ') + 1)}`],
  ];
  if (apartMm < 0) {
    lines.push([theirs.high - own.low, 1, words], [theirs.low - own.high, 1, words]);
  }
  return lines
    .filter(([byMm]) => Math.abs(byMm) <= SNAP_MM)
    .map(([byMm, weight, said]) => ({ direction, byMm, cost: Math.abs(byMm) * weight, words: said }));
}

/** Brings either end of a piece to the nearest joint between two boards of a wall. */
function toBoardLines(
  own: Range,
  wall: Extract<Piece, { kind: 'bulkhead' }>,
  direction: readonly [number, number],
): SnapMove[] {
  const joints = boardRun(wall.lengthMm, wall.boards).map(({ centreMm, widthMm }) => centreMm - widthMm / 2);
  return [own.low, own.high].flatMap((end) => {
    const [byMm] = joints.map((joint) => joint - end).sort((a, b) => Math.abs(a) - Math.abs(b));
    if (byMm === undefined || Math.abs(byMm) > BOARD_SNAP_MM) return [];
    return [{ direction, byMm, cost: SNAP_MM + Math.abs(byMm), words: `board line of ${wall.mark}` }];
  });
}

const rangeOf = (values: number[]): Range => ({ low: Math.min(...values), high: Math.max(...values) });

/** Gap between two ranges; negative when they overlap. */
const apart = (a: Range, b: Range) => Math.max(a.low - b.high, b.low - a.high);
