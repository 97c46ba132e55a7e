/** How many digits a currency has behind its point: 2 of USD, 0 of JPY. */
function digitsOf(currency: string): number {
  try {
    const format = new Intl.NumberFormat('en', { style: 'currency', currency });
    return format.resolvedOptions().maximumFractionDigits ?? 2;
  } catch {
    return 2;
  }
}

/** "$1,860.00" of 186000 and USD. */
export function moneyText(minor: number, currency: string): string {
  return new Intl.NumberFormat('en', { style: 'currency', currency }).format(
    minor / 10 ** digitsOf(currency),
  );
}

/** Whole smallest units of "1,860", "1860.5" or "$1,860.50"; null when it cannot be read without a guess. */
export function readMoney(text: string, currency: string): number | null {
  const digits = digitsOf(currency);
  const plain = text.replace(/[\s\u202f]|\p{Sc}/gu, '');
  const [, whole, part = ''] = /^(\d{1,3}(?:,\d{3})+|\d+)(?:\.(\d+))?$/.exec(plain) ?? [];
  if (whole === undefined || part.length > digits) return null;
  return Number(whole.replaceAll(',', '') + part.padEnd(digits, '0'));
}

/** What a field for money shows of a number: "425.00". */
export function moneyInput(minor: number, currency: string): string {
  const digits = digitsOf(currency);
  return (minor / 10 ** digits).toFixed(digits);
}
