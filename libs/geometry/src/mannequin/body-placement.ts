import type { Vec3 } from '../parts/part.ts';
import { HIP_FORWARD_MM } from './stance.ts';
import { add, sub, turnAboutX, turnAboutY } from './vector.ts';

/** Where a body frame stands in the room. */
export interface BodyPlacement {
  /** Point of the pressed seat under the rearmost buttock. */
  originMm: Vec3;
  /** Turn about the vertical; 0 looks along +z. */
  facingRad: number;
  /** Slope of the seat, front edge up. */
  tiltRad: number;
}

const ZERO: Vec3 = [0, 0, 0];

/**
 * The frame of a body on a seat.
 *
 * @param seat - hip point on the unpressed seat and facing
 * @param tiltRad - slope of the seat, front edge up
 * @param sinkMm - how far the seat goes down
 * @param slideMm - how far the sitter sits before the back
 */
export function bodyPlacement(
  seat: { hipMm: Vec3; facingRad: number },
  tiltRad: number,
  sinkMm: number,
  slideMm: number,
): BodyPlacement {
  const level = { originMm: ZERO, facingRad: seat.facingRad, tiltRad };
  const back = toRoom(level, [0, 0, slideMm - HIP_FORWARD_MM]);
  return { ...level, originMm: add(add(seat.hipMm, [0, -sinkMm, 0]), back) };
}

/** A direction of the body frame in the room. */
export const turnToRoom = (placement: BodyPlacement, v: Vec3): Vec3 =>
  turnAboutY(turnAboutX(v, ZERO, -placement.tiltRad), ZERO, placement.facingRad);

/** A point of the body frame in the room. */
export const toRoom = (placement: BodyPlacement, p: Vec3): Vec3 =>
  add(placement.originMm, turnToRoom(placement, p));

/** A point of the room in the body frame. */
export const toBody = (placement: BodyPlacement, p: Vec3): Vec3 =>
  turnAboutX(turnAboutY(sub(p, placement.originMm), ZERO, -placement.facingRad), ZERO, placement.tiltRad);
