import type { Parameter } from '../pieces/kind.ts';
import { derivePieceParts } from '../pieces/kinds.ts';
import { parametersOf, setParameter } from '../pieces/parameters.ts';
import { standsInWall, windowLeavesWall } from '../pieces/wall-window.ts';
import type { Piece, SetDocument } from '../room/document.ts';
import type { Result } from '../units/result.ts';
import { boxesMeet, convexParts, reachIntoEachOther, type ConvexPart } from './convex-part.ts';

/** How far a number goes before the piece comes upon another. */
export interface RoomLimit {
  /** The last value at which the pieces only touch, millimetres. */
  valueMm: number;
  /** The piece that stops it. */
  pieceId: string;
  mark: string;
  /** What lies beyond: the two reach into each other, or a window is no longer inside its wall. */
  beyond: 'meets' | 'leaves';
}

/** Limits that the other pieces of the set give to a number; left out where none is in the way. */
export interface RoomFor {
  most?: RoomLimit;
  least?: RoomLimit;
}

/** Makes the set with another value of a number. */
type Change = (document: SetDocument, value: number) => Result<SetDocument, unknown>;

/** Pieces that share no more than this only touch, millimetres. */
const TOUCHING_MM = 0.01;
const PRECISION_MM = 0.001;
/** Numbers that carry a piece up and down; all others make it grow about what it covers already. */
const LIFTING = new Set([
  'table heightMm',
  'sill heightMm',
  'overhead undersideMm',
  'bench pressedSeatHeight',
  'loose-seat pressedSeatHeight',
]);
/** The thinnest two parts are 6 mm each: what passes through another is seen at one of these steps. */
const LIFT_STEP_MM = 10;

/**
 * How far a length of a piece may go before the piece meets another one, or a window leaves its wall.
 *
 * Where two pieces reach into each other already, the limit is the nearest value at which they do not; pieces that
 * no value of this number parts say nothing.
 *
 * @param document - the set
 * @param pieceId - the piece whose number is asked about
 * @param key - a length of `parametersOf`; positions and angles have no such limits
 * @param change - how the number is changed; about the middle of the piece when left out
 * @returns the nearest limits on both sides, within those of the piece itself
 */
export function roomFor(
  document: SetDocument,
  pieceId: string,
  key: string,
  change: Change = (set, value) => setParameter(set, pieceId, key, value),
): RoomFor {
  const piece = document.pieces.find((one) => one.id === pieceId);
  const parameter = piece && parametersOf(piece).find((one) => one.key === key);
  if (piece === undefined || parameter?.kind !== 'length' || key.startsWith('at.')) return {};
  const now = Number(parameter.value);
  const blockedAt = obstaclesTo(document, piece, parameter, change);
  const lifts = LIFTING.has(`${piece.kind} ${key}`);
  const blockedNow = blockedAt(now);
  const stops = (value: number) => blockedAt(value).find((other) => !blockedNow.includes(other));

  const limits: { side: 'most' | 'least'; limit: RoomLimit }[] = [];
  for (const [side, end] of [
    ['most', parameter.max],
    ['least', parameter.min],
  ] as const) {
    const edge = firstWhere((value) => stops(value) !== undefined, now, end, lifts);
    const other = edge && stops(edge.to);
    if (edge && other) limits.push({ side, limit: limitAt(edge.from, other, piece) });
  }
  for (const other of blockedNow) {
    const free = (value: number) => !blockedAt(value).includes(other);
    const ways = (['most', 'least'] as const).flatMap((side) => {
      // What must shrink to be free again is now too large: the free value is the most it may have.
      const edge = firstWhere(free, now, side === 'most' ? parameter.min : parameter.max, lifts);
      return edge === undefined ? [] : [{ side, limit: limitAt(edge.to, other, piece) }];
    });
    ways.sort((a, b) => Math.abs(a.limit.valueMm - now) - Math.abs(b.limit.valueMm - now));
    limits.push(...ways.slice(0, 1));
  }

  const nearest = (side: 'most' | 'least') => {
    const sign = side === 'most' ? 1 : -1;
    return limits
      .flatMap((one) => (one.side === side ? [one.limit] : []))
      .sort((a, b) => sign * (a.valueMm - b.valueMm))[0];
  };
  const [most, least] = [nearest('most'), nearest('least')];
  return { ...(most && { most }), ...(least && { least }) };
}

function limitAt(valueMm: number, other: Piece, piece: Piece): RoomLimit {
  const beyond = standsInWall(piece, other) ? 'leaves' : 'meets';
  return { valueMm, pieceId: other.id, mark: other.mark, beyond };
}

/**
 * The first value on the way from one to another where something is so: `from` is the last one found where it is not,
 * `to` the first where it is, at most a thousandth of a millimetre apart.
 */
function firstWhere(
  isSo: (value: number) => boolean,
  start: number,
  end: number,
  stepwise: boolean,
): { from: number; to: number } | undefined {
  const steps = stepwise ? Math.ceil(Math.abs(end - start) / LIFT_STEP_MM) : 1;
  let from = start;
  for (let n = 1; n <= steps; n += 1) {
    let to = start + ((end - start) * n) / steps;
    if (!isSo(to)) {
      from = to;
      continue;
    }
    while (Math.abs(to - from) > PRECISION_MM) {
      const middle = (from + to) / 2;
      if (isSo(middle)) to = middle;
      else from = middle;
    }
    return { from, to };
  }
  return undefined;
}

/** Which other pieces are in the way at a value of the number. */
function obstaclesTo(
  document: SetDocument,
  piece: Piece,
  parameter: Parameter,
  change: Change,
): (value: number) => readonly Piece[] {
  // Who sits where is of no matter here, and costs time to keep in order.
  const bare = { ...document, seating: [] };
  const pieceAt = (value: number): Piece => {
    const changed = change(bare, value);
    return (changed.ok && changed.value.pieces.find((one) => one.id === piece.id)) || piece;
  };
  // A wall is taken with the openings it has; a window and its own wall are compared as such.
  const solid = (one: Piece) => derivePieceParts(one, document).flatMap(convexParts);
  const swept = around(
    [parameter.min, Number(parameter.value), parameter.max].flatMap((v) => solid(pieceAt(v))),
  );
  const others = document.pieces
    .filter((other) => other.id !== piece.id)
    .map((other) => ({
      other,
      inWall: standsInWall(piece, other),
      parts: solid(other).filter((part) => boxesMeet(part, swept, TOUCHING_MM)),
    }))
    .filter(({ inWall, parts }) => inWall || parts.length > 0);
  const known = new Map<number, readonly Piece[]>();
  return (value) => {
    const found = known.get(value);
    if (found) return found;
    const changed = pieceAt(value);
    const parts = solid(changed);
    const blocked = others
      .filter(({ other, inWall, parts: theirs }) =>
        inWall
          ? windowLeavesWall(changed, other)
          : parts.some((one) => theirs.some((two) => reachIntoEachOther(one, two, TOUCHING_MM))),
      )
      .map(({ other }) => other);
    known.set(value, blocked);
    return blocked;
  };
}

function around(parts: readonly ConvexPart[]): Pick<ConvexPart, 'minMm' | 'maxMm'> {
  const low = (n: 0 | 1 | 2) => Math.min(...parts.map(({ minMm }) => minMm[n]));
  const high = (n: 0 | 1 | 2) => Math.max(...parts.map(({ maxMm }) => maxMm[n]));
  return { minMm: [low(0), low(1), low(2)], maxMm: [high(0), high(1), high(2)] };
}
