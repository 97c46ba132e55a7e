import type { Vec3 } from '../parts/part.ts';
import type { Figure } from './figure.ts';
import { HIP_FORWARD_MM, shoulderLineMm } from './stance.ts';
import { clamp, mix } from './vector.ts';

/** A level section of the trunk. */
export interface TrunkLevel {
  y: number;
  halfWidth: number;
  zFront: number;
  zBack: number;
}

/** Front of the belly before the rearmost buttock; the back of the belt stands 28 before it. */
export const bellyFront = (f: Figure): number => 30 + 0.02 * f.CD + f.AD;
/** Front of the chest before the rearmost buttock. */
export const chestFront = (f: Figure): number => 12 + f.CD;
/** Height of the chest line, where the armholes begin. */
export const chestHeight = (f: Figure): number => mix(0.755, 0.745, f.woman) * f.AH;
/** Half the width of the chest at the armpits. */
export const chestHalf = (f: Figure): number => f.CB / 2 + mix(8, 5, f.woman);
/** Half the width of the waist as it is drawn. */
export const waistHalf = (f: Figure): number => (mix(0.91, 0.87, f.woman) * f.WB) / 2;

/** Level sections of an upright trunk from the seat to the shoulders, lowest first. */
export function trunkLevels(f: Figure): TrunkLevel[] {
  const h = f.HB / 2;
  const A = bellyFront(f);
  const C = chestFront(f);
  const crease = HIP_FORWARD_MM + 0.42 * (A - HIP_FORWARD_MM);
  const top = chestHeight(f);
  const Y = (t: number): number => mix(f.TC, top, t);
  const waist = waistHalf(f);
  const chest = chestHalf(f);
  return [
    { y: 90, halfWidth: h, zFront: crease, zBack: 0 },
    { y: f.TC, halfWidth: 0.97 * h, zFront: mix(crease, A, 0.62), zBack: 2 },
    { y: Y(0.22), halfWidth: mix(f.WB / 2, h, mix(0.3, 0.36, f.woman)), zFront: A, zBack: 25 },
    { y: Y(0.5), halfWidth: waist, zFront: mix(A, C, 0.3), zBack: 39 },
    { y: Y(0.76), halfWidth: mix(waist, chest, 0.62), zFront: mix(A, C, 0.72), zBack: 25 },
    { y: top, halfWidth: chest, zFront: C - 5, zBack: 15 },
    { y: 0.875 * f.AH, halfWidth: f.BA / 2 - 26, zFront: shoulderLineMm(f) + 60, zBack: 14 },
  ];
}

/**
 * How far a point is from the trunk at its own height, outwards from the middle of the section; below 0 inside.
 *
 * @param levels - from `trunkLevels`
 * @param p - in the frame of the upright trunk, millimetres
 */
export function trunkGap(levels: readonly TrunkLevel[], p: Vec3): number {
  let i = 1;
  while (i < levels.length - 1 && levels[i]!.y < p[1]) i++;
  const [low, high] = [levels[i - 1]!, levels[i]!];
  const t = clamp((p[1] - low.y) / (high.y - low.y), 0, 1);
  const half = mix(low.halfWidth, high.halfWidth, t);
  const front = mix(low.zFront, high.zFront, t);
  const back = mix(low.zBack, high.zBack, t);
  const z = p[2] - (front + back) / 2;
  const share = (Math.abs(p[0] / half) ** 2.2 + Math.abs((2 * z) / (front - back)) ** 2.2) ** (1 / 2.2);
  return share < 1e-6 ? -half : Math.hypot(p[0], z) * (1 - 1 / share);
}
