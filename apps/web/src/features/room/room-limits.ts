import {
  roomFor,
  roomForPull,
  type Handle,
  type LengthStyle,
  type Piece,
  type RoomFor,
  type RoomLimit,
  type SetDocument,
} from '@settlewright/geometry';
import { showNumber, stepOf, type NumberParameter } from './numbers.ts';

/** Two lengths nearer than this are one, millimetres. */
const SAME_MM = 0.05;

const known = new WeakMap<SetDocument, Map<string, RoomFor>>();

/** The room that the other pieces leave to a number, or to a handle; worked out once for each document. */
export function roomOf(document: SetDocument, pieceId: string, key: string, handle?: Handle): RoomFor {
  const ofSet = known.get(document) ?? new Map<string, RoomFor>();
  known.set(document, ofSet);
  const id = handle?.id ?? `${pieceId} ${key}`;
  const room = ofSet.get(id) ?? (handle ? roomForPull(document, handle) : roomFor(document, pieceId, key));
  ofSet.set(id, room);
  return room;
}

/** A number that goes further than the room it has, and what can be had instead. */
export interface BeyondRoom {
  side: 'most' | 'least';
  limit: RoomLimit;
  /** The last number on the shown steps that still has room. */
  offer: number;
}

/** Whether a value goes beyond the room; undefined while it has room. */
export function beyondRoom(
  parameter: NumberParameter,
  value: number,
  room: RoomFor,
  style: LengthStyle,
): BeyondRoom | undefined {
  const { most, least } = room;
  const step = stepOf(parameter, style);
  if (most && value > most.valueMm + SAME_MM) {
    const offer = Math.floor((most.valueMm + SAME_MM) / step) * step;
    return { side: 'most', limit: most, offer: Math.max(offer, parameter.min) };
  }
  if (least && value < least.valueMm - SAME_MM) {
    const offer = Math.ceil((least.valueMm - SAME_MM) / step) * step;
    return { side: 'least', limit: least, offer: Math.min(offer, parameter.max) };
  }
  return undefined;
}

const CALLED: [RegExp, most: string, least: string][] = [
  [/length|longest/i, 'Longest', 'Shortest'],
  [/depth/i, 'Deepest', 'Shallowest'],
  [/thick|cushion/i, 'Thickest', 'Thinnest'],
  [/width|size|diameter|face|frame|reveal/i, 'Widest', 'Narrowest'],
  [/height|underside/i, 'Highest', 'Lowest'],
];

/** "Longest", "Lowest": how the end of a number is called, by what it measures. */
export function limitWord(parameter: Pick<NumberParameter, 'label'>, side: 'most' | 'least'): string {
  const words = CALLED.find(([called]) => called.test(parameter.label));
  return (side === 'most' ? words?.[1] : words?.[2]) ?? (side === 'most' ? 'Most' : 'Least');
}

/** "then it meets B2", "then its window reaches the edge of W1". */
export function sayBeyond(limit: RoomLimit, piece: Pick<Piece, 'kind'>): string {
  if (limit.beyond === 'meets') return `then it meets ${limit.mark}`;
  return piece.kind === 'sill'
    ? `then its window reaches the edge of ${limit.mark}`
    : `then the window of ${limit.mark} reaches its edge`;
}

/** "Longest here is 3′ 10¼″ (then it meets B2)". */
export function sayLimit(
  parameter: NumberParameter,
  { side, limit, offer }: BeyondRoom,
  piece: Pick<Piece, 'kind'>,
  style: LengthStyle,
): string {
  const word = limitWord(parameter, side);
  return `${word} here is ${showNumber(parameter, style, offer)} (${sayBeyond(limit, piece)})`;
}
