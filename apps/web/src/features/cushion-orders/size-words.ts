import { formatLength, type CushionSpec, type LengthStyle } from '@settlewright/geometry';

const KG_M3_PER_LB_FT3 = 16.018463;
const NEWTON_PER_LBF = 4.4482216;
const MM_PER_YARD = 914.4;
const MM_PER_METRE = 1000;

/** A quarter of an inch either way, unless the order says otherwise. */
export const USUAL_TOLERANCE_MM = 6.35;

const isMetric = ({ system }: LengthStyle) => system === 'millimetres';

/** How far a finished size may be off: "± ¼″". */
export const toleranceText = (toleranceMm: number, style: LengthStyle): string =>
  `± ${formatLength(toleranceMm, { ...style, feet: false })}`;

/** Three sizes with the unit once at the end, each as text of its own. */
export function sizeTexts(
  { widthMm, depthMm, thicknessMm }: CushionSpec['finishedMm'],
  style: LengthStyle,
): [string, string, string] {
  const show = (mm: number) => formatLength(mm, { ...style, feet: false });
  const bare = (mm: number) => show(mm).replace(/″$|[\s\u202f]?mm$/u, '');
  return [bare(widthMm), bare(depthMm), show(thicknessMm)];
}

/** The system the page is not in, for a shop that measures in it. */
export const otherSystem = (style: LengthStyle): LengthStyle =>
  isMetric(style) ? { system: 'feet-inches', roundTo: 16 } : { system: 'millimetres', roundTo: 16 };

/** Grade, density and firmness in the units of the page. */
export function foamText({ grade, densityKgM3, ifd25N }: CushionSpec['foam'], style: LengthStyle): string {
  return isMetric(style)
    ? `${grade}, ${Math.round(densityKgM3)}\u202fkg/m³, firmness ${Math.round(ifd25N)}\u202fN (25 % IFD)`
    : `${grade}, ${(densityKgM3 / KG_M3_PER_LB_FT3).toFixed(1)}\u202flb/ft³, firmness ${Math.round(ifd25N / NEWTON_PER_LBF)}\u202flb (25 % IFD)`;
}

/** What is bought by the yard or the metre, rounded up so that it is never short: "7.1 yd". */
export function runText(mm: number, style: LengthStyle): string {
  const [unit, per] = isMetric(style) ? ['m', MM_PER_METRE] : ['yd', MM_PER_YARD];
  return `${(Math.ceil((mm / per) * 10 - 1e-9) / 10).toFixed(1)}\u202f${unit}`;
}
