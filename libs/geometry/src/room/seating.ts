import { placeFrames } from '../pieces/place-frames.ts';
import type { SetDocument, SitterRef } from './document.ts';
import type { PostureChoice } from './posture-choice.ts';

/**
 * Sits somebody at a place, or clears it. A person who already sits elsewhere moves.
 *
 * @param document - the set
 * @param pieceId - bench or loose seat
 * @param place - counted from 1; a place that does not exist changes nothing
 * @param sitter - cast member or mannequin; null clears the place
 * @returns the new set
 */
export function seatSitter(
  document: SetDocument,
  pieceId: string,
  place: number,
  sitter: SitterRef | null,
): SetDocument {
  const others = document.seating.filter(
    (seat) => !(seat.pieceId === pieceId && seat.place === place) && !isSamePerson(seat.sitter, sitter),
  );
  const piece = document.pieces.find((one) => one.id === pieceId);
  const exists = piece !== undefined && placeFrames(piece, document).some((frame) => frame.place === place);
  if (!exists) return document;
  return { ...document, seating: sitter === null ? others : [...others, { pieceId, place, sitter }] };
}

/**
 * Chooses how the sitter of a place sits, or goes back to what the place suggests.
 *
 * @param document - the set
 * @param pieceId - bench or loose seat
 * @param place - counted from 1; a place where nobody sits changes nothing
 * @param posture - what is chosen; null for the suggested posture
 * @returns the new set
 */
export function choosePosture(
  document: SetDocument,
  pieceId: string,
  place: number,
  posture: PostureChoice | null,
): SetDocument {
  const seating = document.seating.map((seat) =>
    seat.pieceId === pieceId && seat.place === place
      ? { pieceId, place, sitter: seat.sitter, ...(posture && { posture }) }
      : seat,
  );
  return { ...document, seating };
}

/**
 * Drops seating at places that no longer exist, after a piece was shortened, moved or removed.
 *
 * @param document - the set
 * @returns the same object when everybody still has a place
 */
export function withoutLostSeats(document: SetDocument): SetDocument {
  const seating = document.seating.filter((seat) => placeExists(document, seat.pieceId, seat.place));
  return seating.length === document.seating.length ? document : { ...document, seating };
}

/**
 * Whether a place is there.
 *
 * @param document - the set
 * @param pieceId - any piece id
 * @param place - counted from 1
 * @returns true when somebody could sit there
 */
export function placeExists(document: SetDocument, pieceId: string, place: number): boolean {
  const piece = document.pieces.find((one) => one.id === pieceId);
  if (piece === undefined) return false;
  if (piece.kind === 'bench' && piece.places.by === 'count') return place <= piece.places.count;
  return placeFrames(piece, document).some((frame) => frame.place === place);
}

function isSamePerson(one: SitterRef, other: SitterRef | null): boolean {
  return one.kind === 'cast' && other?.kind === 'cast' && one.castId === other.castId;
}
