import type { FoamSituation } from './situation.ts';

/** Weight that a bench's pressed seat height is stated for, kilograms. */
export const REFERENCE_SITTER_KG = 77;

/** How far a cushion goes down. */
export interface SeatSink {
  sinkMm: number;
  /** Share of the foam's thickness. */
  strain: number;
  /** True when the load is beyond the foam's 65 % force. */
  bottomsOut: boolean;
}

/** Share of the body weight that rests on the seat: upright, feet on the floor. */
const SEAT_SHARE = 0.78;
/** The part under the seat bones that decides: 70 % of the load on 110 square inches. */
const PATCH_SHARE = 0.7;
const PATCH_SQUARE_INCHES = 110;
/** The round foot of ASTM D3574. */
const FOOT_SQUARE_INCHES = 50;
const FIRST_STRAIN = 0.25;
const LAST_STRAIN = 0.65;
const POUNDS_PER_KG = 1 / 0.45359237;
const NEWTONS_PER_POUND_FORCE = 4.4482216152605;

/** Body weights that press a foam to its 25 % and to its 65 % line, kilograms, and what test sits make of them. */
export interface FoamLoads {
  firstKg: number;
  lastKg: number;
  /** By what the drop is multiplied; 1 without a sit. */
  factor: number;
}

/**
 * Weights at which a slab of foam reaches the two lines its maker states.
 *
 * @param foam - 25 % IFD in newtons and support factor, both > 0
 * @source as `seatSinkMm`
 */
export function foamLoads({ ifd25N, supportFactor, tested }: Omit<FoamSituation, 'thicknessMm'>): FoamLoads {
  const first = ifd25N / NEWTONS_PER_POUND_FORCE / FOOT_SQUARE_INCHES;
  const firstKg = (first * PATCH_SQUARE_INCHES) / (PATCH_SHARE * SEAT_SHARE * POUNDS_PER_KG);
  return { firstKg, lastKg: supportFactor * firstKg, factor: tested?.factor ?? 1 };
}

/**
 * Share of its thickness that a foam goes down.
 *
 * @param loads - of the foam
 * @param weightKg - body weight; finite, >= 0
 * @returns 0 to 0.65
 * @source as `seatSinkMm`
 */
export function strainUnder(loads: FoamLoads, weightKg: number): number {
  return Math.min(LAST_STRAIN, loads.factor * estimated(loads, weightKg));
}

function estimated({ firstKg, lastKg }: FoamLoads, weightKg: number): number {
  if (weightKg > lastKg) return LAST_STRAIN;
  if (weightKg <= firstKg) return (FIRST_STRAIN * weightKg) / firstKg;
  return FIRST_STRAIN + ((LAST_STRAIN - FIRST_STRAIN) * (weightKg - firstKg)) / (lastKg - firstKg);
}

/**
 * How far a slab of new foam on a rigid deck goes down under a sitter, by test sits where there are any. How far to
 * trust it: `sinkBand`.
 *
 * @param foam - thickness in millimetres, 25 % IFD in newtons, support factor; all > 0
 * @param weightKg - body weight; finite, >= 0
 * @returns millimetres the seat goes down, share of the thickness, and whether the foam bottoms out
 * @source stress-strain line through the 25 % and 65 % IFD of ASTM D3574; seat share 0.78 within the 0.65 to 0.85 of
 *   FAA AM 62-1 (1962) and a seat interface study; share and area of the patch are common practice, from memory
 */
export function seatSinkMm(foam: FoamSituation, weightKg: number): SeatSink {
  const loads = foamLoads(foam);
  const strain = strainUnder(loads, weightKg);
  const bottomsOut = weightKg > loads.lastKg || (loads.factor > 1 && strain >= LAST_STRAIN);
  return { sinkMm: strain * foam.thicknessMm, strain, bottomsOut };
}
