import type { LengthStyle } from './length-style.ts';

/** Kilograms in a cubic metre for each pound in a cubic foot. */
export const KG_M3_PER_LB_FT3 = 16.018463;
/** Newtons in a pound of force. */
export const NEWTON_PER_LBF = 4.4482216;

type Style = Pick<LengthStyle, 'system'>;
const isMetric = ({ system }: Style): boolean => system === 'millimetres';

/**
 * A density or a firmness as a person of a system of units types it.
 *
 * @param what - density in kilograms per cubic metre, or firmness in newtons
 * @param value - of it
 * @param style - units in which it is shown
 * @returns the number in those units
 */
export function foamNumber(what: 'density' | 'firmness', value: number, style: Style): number {
  if (isMetric(style)) return value;
  return value / (what === 'density' ? KG_M3_PER_LB_FT3 : NEWTON_PER_LBF);
}

/**
 * The way back from `foamNumber`.
 *
 * @param what - density or firmness
 * @param shown - in the units of the style
 * @param style - units in which it was typed
 * @returns kilograms per cubic metre or newtons
 */
export function fromFoamNumber(what: 'density' | 'firmness', shown: number, style: Style): number {
  if (isMetric(style)) return shown;
  return shown * (what === 'density' ? KG_M3_PER_LB_FT3 : NEWTON_PER_LBF);
}

/**
 * The unit of a density or a firmness.
 *
 * @param what - density or firmness
 * @param style - units in which it is shown
 */
export function foamUnit(what: 'density' | 'firmness', style: Style): string {
  if (what === 'density') return isMetric(style) ? 'kg/m³' : 'lb/ft³';
  return isMetric(style) ? 'N' : 'lb';
}

/**
 * A density or a firmness in words, rounded as the trade says it.
 *
 * @param what - density in kilograms per cubic metre, or firmness in newtons
 * @param value - of it
 * @param style - units in which it is shown
 */
export function foamText(what: 'density' | 'firmness', value: number, style: Style): string {
  const shown = foamNumber(what, value, style);
  const digits = what === 'density' && !isMetric(style) ? 1 : 0;
  return `${shown.toFixed(digits)}\u202f${foamUnit(what, style)}`;
}
