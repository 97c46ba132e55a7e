import { formatLength, type LengthStyle } from '@settlewright/geometry';
import { moneyText } from '../life/money.ts';

/** Length by which cloth is priced and bought. */
export const pricedLength = ({ system }: LengthStyle): { per: 'yard' | 'metre'; perMm: number } =>
  system === 'millimetres' ? { per: 'metre', perMm: 1000 } : { per: 'yard', perMm: 914.4 };

/** Cloth by the yard with inches beside it, or by the metre, as on the paper. */
export function clothLength(mm: number, style: LengthStyle): string {
  return style.system === 'millimetres'
    ? `${(mm / 1000).toFixed(2)}\u202fm`
    : `${(mm / 914.4).toFixed(2)}\u202fyd (${formatLength(mm, { ...style, feet: false })})`;
}

/** What a cloth costs by the length it is bought by; it is kept by the metre, so a price of a yard is rounded once. */
export function priceWords(perMetreMinor: number, currency: string, style: LengthStyle): string {
  const { per, perMm } = pricedLength(style);
  const shown = `${moneyText(Math.round((perMetreMinor * perMm) / 1000), currency)} a ${per}`;
  return per === 'metre'
    ? shown
    : `${shown}, kept as ${moneyText(perMetreMinor, currency)} a metre, rounded to the smallest coin`;
}
