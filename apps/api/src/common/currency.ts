import { IsIn } from 'class-validator';

const CURRENCIES = new Set(Intl.supportedValuesOf('currency'));

/** The three letters of a currency (ISO 4217). */
export const Currency = (): PropertyDecorator =>
  IsIn([...CURRENCIES], { message: '$property accepts three letters of a currency, as USD' });

/** "$1,860.00" of 186000 and USD, for letters. */
export function moneyWords(minor: number, currency: string): string {
  const format = new Intl.NumberFormat('en-US', { style: 'currency', currency });
  return format.format(minor / 10 ** (format.resolvedOptions().maximumFractionDigits ?? 2));
}
