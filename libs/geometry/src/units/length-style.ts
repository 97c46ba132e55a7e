/** Millimetres in one inch, exactly. */
export const MM_PER_INCH = 25.4;

/** Millimetres in one foot, exactly. */
export const MM_PER_FOOT = 304.8;

/** How lengths are shown. */
export interface LengthStyle {
  system: 'feet-inches' | 'decimal-inches' | 'millimetres';
  /** Finest part of an inch shown: sixteenths or eighths. */
  roundTo: 16 | 8;
  /** True for lengths of pieces, said in feet and inches; heights and depths stay in inches. */
  feet?: boolean;
}

/**
 * The rounding step of a style: the distance between two neighbouring numbers it can show.
 *
 * @param style - the display style
 * @returns millimetres: 1/16 or 1/8 in; 0.05 or 0.1 in with decimals; 1 mm
 */
export function lengthStep(style: LengthStyle): number {
  if (style.system === 'millimetres') return 1;
  if (style.system === 'decimal-inches') return (style.roundTo === 16 ? 0.05 : 0.1) * MM_PER_INCH;
  return MM_PER_INCH / style.roundTo;
}
