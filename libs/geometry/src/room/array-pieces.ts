import { toRoom } from '../parts/placement.ts';
import { radians } from '../units/angle.ts';
import type { BoardModule, SetDocument } from './document.ts';
import { movePiece } from './edit-pieces.ts';
import { footprint } from './footprint.ts';
import { namedPieces } from './named-pieces.ts';
import { duplicatePieces } from './piece-groups.ts';

/** A row of the same pieces again and again. */
export interface ArrayRow {
  /** How many stand in the row, the originals with them; at least 2. */
  count: number;
  /** From one to the next, millimetres; 0 or more. */
  pitchMm: number;
  /** Which way the row runs from the originals: 0 to the right, anticlockwise from above. */
  alongDeg: number;
}

/**
 * Copies pieces in a row, each time as they stand to each other. Copies get the next marks, and nobody sits on them.
 *
 * @param document - the set
 * @param pieceIds - unknown ids are passed over
 * @param row - how many, how far apart and which way
 * @returns the new set and the ids of the copies, nearest first
 */
export function arrayPieces(
  document: SetDocument,
  pieceIds: readonly string[],
  { count, pitchMm, alongDeg }: ArrayRow,
): { document: SetDocument; pieceIds: string[] } {
  const originals = namedPieces(document, pieceIds);
  const [wayX, , wayZ] = toRoom({ xMm: 0, zMm: 0, turnDeg: alongDeg }, [1, 0, 0]);
  const copies: string[] = [];
  let set = document;
  for (let n = 1; n < count; n += 1) {
    const made = duplicatePieces(set, pieceIds);
    set = made.document;
    originals.forEach(({ at }, i) => {
      const id = made.pieceIds[i] ?? '';
      const to = { xMm: at.xMm + n * pitchMm * wayX, zMm: at.zMm + n * pitchMm * wayZ };
      set = movePiece(set, id, to);
    });
    copies.push(...made.pieceIds);
  }
  return { document: set, pieceIds: copies };
}

/**
 * How much of a direction pieces take, from end to end.
 *
 * @param document - the set
 * @param pieceIds - unknown ids are passed over
 * @param alongDeg - the direction, as in `ArrayRow`
 * @returns millimetres; 0 where no piece is named
 */
export function lengthAlong(document: SetDocument, pieceIds: readonly string[], alongDeg: number): number {
  const [c, s] = [Math.cos(radians(alongDeg)), -Math.sin(radians(alongDeg))];
  const spots = namedPieces(document, pieceIds)
    .flatMap((piece) => [...footprint(piece).corners])
    .map(([x, z]) => x * c + z * s);
  return spots.length === 0 ? 0 : Math.max(...spots) - Math.min(...spots);
}

/**
 * The pitch that fills a length from the near end of the first to the far end of the last.
 *
 * @param lengthMm - of one, along the row
 * @param endToEndMm - of the row
 * @param count - how many, at least 2
 * @returns millimetres; negative where not even one fits
 */
export const pitchToFill = (lengthMm: number, endToEndMm: number, count: number): number =>
  (endToEndMm - lengthMm) / (count - 1);

/**
 * The smallest pitch of whole boards at which neighbours do not meet.
 *
 * @param lengthMm - of one, along the row
 * @param boards - of the wall
 * @returns how many boards, and the pitch they make, millimetres
 */
export function boardPitch(
  lengthMm: number,
  { faceMm, revealMm }: BoardModule,
): { boards: number; pitchMm: number } {
  const moduleMm = faceMm + revealMm;
  const boards = Math.max(1, Math.ceil(lengthMm / moduleMm - 1e-6));
  return { boards, pitchMm: boards * moduleMm };
}
