import { REFERENCE_SITTER_KG, seatSinkMm } from '@settlewright/anthropometry';
import type { PieceOf } from '../room/document.ts';
import { cushionHeightMm, foamSituation } from './foam-situation.ts';

/** A piece that people sit on. */
export type SeatPiece = PieceOf<'bench'> | PieceOf<'loose-seat'>;

/**
 * Top of the seat cushion before anybody sits on it, at the front edge.
 *
 * @param piece - bench or loose seat
 * @returns millimetres above the floor
 */
export const unpressedSeatTopMm = (piece: SeatPiece): number =>
  piece.deckHeightMm + cushionHeightMm(piece.seatCushion);

/**
 * How far the reference sitter of 77 kg presses the seat cushion down.
 *
 * @param piece - bench or loose seat
 * @returns millimetres; 0 without a cushion
 * @source foam estimator of the anthropometry library
 */
export function referenceSinkMm(piece: SeatPiece): number {
  const situation = foamSituation(piece.seatCushion);
  return situation ? seatSinkMm(situation, REFERENCE_SITTER_KG).sinkMm : 0;
}

/**
 * How high the pressed seat stands over its deck.
 *
 * @param piece - bench or loose seat
 * @returns millimetres
 */
export const pressedRiseMm = (piece: SeatPiece): number =>
  cushionHeightMm(piece.seatCushion) - referenceSinkMm(piece);

/**
 * Seat height at the front edge with the cushion pressed by the reference sitter.
 *
 * @param piece - bench or loose seat
 * @returns millimetres above the floor
 */
export function pressedSeatHeightMm(piece: SeatPiece): number {
  return piece.deckHeightMm + pressedRiseMm(piece);
}

/**
 * Moves the deck so that the pressed seat comes to a height.
 *
 * @param piece - bench or loose seat
 * @param heightMm - wanted pressed seat height above the floor
 * @returns the piece with another deck height, not checked against limits
 */
export function withPressedSeatHeight<P extends SeatPiece>(piece: P, heightMm: number): P {
  return { ...piece, deckHeightMm: heightMm - pressedRiseMm(piece) };
}
