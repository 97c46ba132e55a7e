import type { Vec3 } from '../parts/part.ts';
import type { PostureChoice } from '../room/posture-choice.ts';
import type { Figure } from './figure.ts';
import { bendPoint, chestRad, HIP_HEIGHT_MM, shoulderLineMm, waistPivot, type TrunkBend } from './stance.ts';
import { clamp, mix, turnAboutX } from './vector.ts';

const LEAN_FURTHEST_RAD = (20 * Math.PI) / 180;
const SLUMP_FURTHEST_RAD = 0.6;
/** How much lower the eye is when somebody chooses to slump. */
const CHOSEN_SLUMP_MM = 40;

/** Height of the base of the skull, and so of the eye but for a constant, with the head held at an angle. */
function skullLevel(f: Figure, bend: TrunkBend, headRad: number): number {
  const zS = shoulderLineMm(f);
  const neck = bendPoint(f, bend, [0, f.AH + 20, zS - 14]);
  const base = bendPoint(f, bend, [0, f.EH - 0.35 * (f.SH - f.EH), zS]);
  return turnAboutX(base, neck, 0.4 * (headRad - chestRad(bend)))[1];
}

/** The bend that lowers the eye by so much. */
function slumpFor(f: Figure, trunkRad: number, headRad: number, slumpMm: number): number {
  if (!(slumpMm > 0)) return 0;
  const upright = skullLevel(f, { trunkRad, slumpRad: 0 }, headRad);
  let [low, high] = [0, SLUMP_FURTHEST_RAD];
  for (let i = 0; i < 24; i++) {
    const middle = (low + high) / 2;
    if (upright - skullLevel(f, { trunkRad, slumpRad: middle }, headRad) < slumpMm) low = middle;
    else high = middle;
  }
  return (low + high) / 2;
}

/** How far the pelvis moves forward so that a slumped back still rests where the upright one did. */
const pelvisForward = (f: Figure, slumpRad: number): number =>
  Math.sin(slumpRad) * (waistPivot(f)[1] - HIP_HEIGHT_MM);

/**
 * Trunk with the back or upright, head all but level, slumped when that is asked.
 *
 * @param seat - tilt of the seat, lean of the back, top of the back where there is one
 * @param choice - what somebody chose of it
 * @param slumpMm - how much lower the eye is than upright, mm
 * @returns bends in radians; how far the pelvis comes forward of the back, mm
 * @source slump of 40 mm: City University of Hong Kong, Online Anthropometry, chapter 1; its shape by eye
 */
export function trunkFor(
  f: Figure,
  seat: { seatTiltRad: number; backLeanRad: number; backTopMm?: number | undefined },
  choice: PostureChoice['trunk'],
  slumpMm: number,
): { bend: TrunkBend; headRad: number; forwardMm: number } {
  const upright = seat.seatTiltRad;
  const leans = seat.backTopMm !== undefined && choice !== 'upright';
  const trunkRad = upright - (leans ? clamp(seat.backLeanRad, 0, LEAN_FURTHEST_RAD) : 0);
  const headRad = mix(trunkRad, upright, 0.9);
  const slumpRad = slumpFor(f, trunkRad, headRad, choice === 'slumped' ? CHOSEN_SLUMP_MM : slumpMm);
  return { bend: { trunkRad, slumpRad }, headRad, forwardMm: pelvisForward(f, slumpRad) };
}

/** Direction straight up, in the frame of a body on a tilted seat. */
export const upOn = (tiltRad: number): Vec3 => [0, Math.cos(tiltRad), Math.sin(tiltRad)];
