import type { FoamSituation } from './situation.ts';

/** Weight that a bench's pressed seat height is stated for, kilograms. */
export const REFERENCE_SITTER_KG = 77;

/** How far a cushion goes down. */
export interface SeatSink {
  sinkMm: number;
  /** Share of the foam's thickness. */
  strain: number;
  /** True when the load is beyond the 65 % force of the foam, or of one of its layers. */
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

/** Body weights that press a layer to its 25 % and to its 65 % line, kilograms. */
interface LayerLoads {
  /** Of the cushion's thickness. */
  share: number;
  firstKg: number;
  lastKg: number;
}

/** A cushion as springs one on another, and what test sits make of it. */
export interface FoamLoads {
  layers: readonly LayerLoads[];
  /** Part of the thickness that a wrap loses under anybody. */
  wrapLost: number;
  /** Part of the thickness that is lost at most. */
  most: number;
  /** The least weight that makes a layer bottom out, kilograms. */
  lastKg: number;
  /** By what the drop is multiplied; 1 without a sit. */
  factor: number;
}

/**
 * Weights at which the foam of a cushion reaches the two lines its maker states. Layers bear the same load, one on
 * another, so that each goes down by its own firmness.
 *
 * @param foam - 25 % IFD in newtons and support factor, both > 0; layers and wrap as shares
 * @source as `seatSinkMm`; springs in series
 */
export function foamLoads(foam: Omit<FoamSituation, 'thicknessMm'>): FoamLoads {
  const { ifd25N, supportFactor, layers = [{ share: 1, ifd25N }], wrap, tested } = foam;
  const ofFoam = 1 - (wrap?.share ?? 0);
  const wrapLost = wrap ? wrap.share * wrap.lost : 0;
  const loads = layers.map((layer): LayerLoads => {
    const first = layer.ifd25N / NEWTONS_PER_POUND_FORCE / FOOT_SQUARE_INCHES;
    const firstKg = (first * PATCH_SQUARE_INCHES) / (PATCH_SHARE * SEAT_SHARE * POUNDS_PER_KG);
    return { share: layer.share * ofFoam, firstKg, lastKg: supportFactor * firstKg };
  });
  return {
    layers: loads,
    wrapLost,
    most: wrapLost + ofFoam * LAST_STRAIN,
    lastKg: Math.min(...loads.map(({ lastKg }) => lastKg)),
    factor: tested?.factor ?? 1,
  };
}

/**
 * Share of its thickness that a cushion goes down.
 *
 * @param loads - of the cushion
 * @param weightKg - body weight; finite, >= 0
 * @returns 0 to 0.65, a wrap apart
 * @source as `seatSinkMm`
 */
export function strainUnder({ layers, wrapLost, most, factor }: FoamLoads, weightKg: number): number {
  let strain = wrapLost;
  for (const layer of layers) strain += layer.share * estimated(layer, weightKg);
  return Math.min(most, factor * strain);
}

function estimated({ firstKg, lastKg }: LayerLoads, weightKg: number): number {
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
  const bottomsOut = weightKg > loads.lastKg || (loads.factor > 1 && strain >= loads.most);
  return { sinkMm: strain * foam.thicknessMm, strain, bottomsOut };
}
