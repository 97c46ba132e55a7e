import type { Piece } from '../room/document.ts';
import { radians } from '../units/angle.ts';
import type { Vec3 } from './part.ts';

/** Where a piece stands: its origin on the floor and its turn about the vertical. */
export type Placement = Piece['at'];

/**
 * Takes a point from a piece's own frame to the room.
 *
 * @param at - where the piece stands
 * @param point - in the piece's frame, millimetres
 * @returns the same point in the room frame, millimetres
 */
export function toRoom(at: Placement, point: Vec3): Vec3 {
  return placer(at)(point);
}

/**
 * Takes many points from one piece's frame to the room.
 *
 * @param at - where the piece stands
 * @returns `toRoom` for that piece
 */
export function placer(at: Placement): (point: Vec3) => Vec3 {
  const turn = radians(at.turnDeg);
  const [c, s] = [Math.cos(turn), Math.sin(turn)];
  return ([x, y, z]) => [at.xMm + x * c + z * s, y, at.zMm - x * s + z * c];
}

/**
 * Takes a point from the room to a piece's own frame.
 *
 * @param at - where the piece stands
 * @param point - in the room frame, millimetres
 * @returns the same point in the piece's frame, millimetres
 */
export function toPiece(at: Placement, [x, y, z]: Vec3): Vec3 {
  const turn = radians(at.turnDeg);
  const [c, s] = [Math.cos(turn), Math.sin(turn)];
  const [dx, dz] = [x - at.xMm, z - at.zMm];
  return [dx * c - dz * s, y, dx * s + dz * c];
}

/**
 * Brings an angle into -180 (excluded) to 180 degrees.
 *
 * @param turnDeg - any finite angle
 * @returns the same direction
 */
export function normalTurnDeg(turnDeg: number): number {
  const turned = ((turnDeg % 360) + 360) % 360;
  return turned > 180 ? turned - 360 : turned;
}
