import { formatLength, type LengthStyle } from '@settlewright/geometry';

/** Length by which cloth is priced and bought. */
export const pricedLength = ({ system }: LengthStyle): { per: 'yard' | 'metre'; perMm: number } =>
  system === 'millimetres' ? { per: 'metre', perMm: 1000 } : { per: 'yard', perMm: 914.4 };

/** Cloth by the yard with inches beside it, or by the metre, as on the paper. */
export function clothLength(mm: number, style: LengthStyle): string {
  return style.system === 'millimetres'
    ? `${(mm / 1000).toFixed(2)}\u202fm`
    : `${(mm / 914.4).toFixed(2)}\u202fyd (${formatLength(mm, { ...style, feet: false })})`;
}
