import {
  buildPhrase,
  type Foam,
  formatLength,
  formatMass,
  type LengthStyle,
  phraseText,
} from '@settlewright/geometry';
import type { Size } from './spec-pack';

const KG_M3_PER_LB_FT3 = 16.018463;
const NEWTON_PER_LBF = 4.4482216;
const M3_PER_FT3 = 0.0283168466;

export const isMetric = (units: LengthStyle): boolean => units.system === 'millimetres';

/** Three sizes in a row, the unit once at the end. */
export function sizeWords({ widthMm, depthMm, thicknessMm }: Size, units: LengthStyle): string {
  return `${bareLength(widthMm, units)} × ${bareLength(depthMm, units)} × ${formatLength(thicknessMm, units)}`;
}

export function pairWords(a: number, b: number, units: LengthStyle): string {
  return `${bareLength(a, units)} × ${formatLength(b, units)}`;
}

export function bareLength(mm: number, units: LengthStyle): string {
  return formatLength(mm, { ...units, feet: false }).replace(/[″]|[\s\u00a0\u202f]*mm/g, '');
}

/** The other system, for a shop that measures in it. */
export function otherSystemWords(size: Size, units: LengthStyle): string {
  return sizeWords(
    size,
    isMetric(units) ? { system: 'feet-inches', roundTo: 16 } : { system: 'millimetres', roundTo: 16 },
  );
}

/** Long lengths of welt and boxing: in feet as well where inches rule, in metres where millimetres do. */
export function runWords(mm: number, units: LengthStyle): string {
  if (isMetric(units)) return `${formatLength(mm, units)} (${(mm / 1000).toFixed(2)}\u00a0m)`;
  if (units.system !== 'feet-inches') return formatLength(mm, units);
  return `${formatLength(mm, { ...units, feet: false })} (${formatLength(mm, { ...units, feet: true })})`;
}

/** Grade with density and firmness, neither without the other, and of what it is built up. */
export function foamWords(foam: Foam, thicknessMm: number, units: LengthStyle): string {
  const { grade, densityKgM3, ifd25N } = foam;
  const density = isMetric(units)
    ? `${Math.round(densityKgM3)}\u00a0kg/m³`
    : `${(densityKgM3 / KG_M3_PER_LB_FT3).toFixed(1)}\u00a0lb/ft³`;
  const firmness = isMetric(units)
    ? `firmness ${Math.round(ifd25N)}\u00a0N (25\u00a0% IFD)`
    : `firmness ${Math.round(ifd25N / NEWTON_PER_LBF)}\u00a0lb (25\u00a0% IFD)`;
  const built = phraseText(buildPhrase(foam, thicknessMm), units);
  return [[grade, density, firmness].filter(Boolean).join(', '), built].filter(Boolean).join('; ');
}

export function volumeWords(m3: number, units: LengthStyle): string {
  return isMetric(units) ? `${m3.toFixed(3)}\u00a0m³` : `${(m3 / M3_PER_FT3).toFixed(2)}\u00a0ft³`;
}

export function massWords(kg: number, units: LengthStyle): string {
  return formatMass(kg, units);
}
