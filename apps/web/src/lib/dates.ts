/** The words of the product are English wherever it is read, so its dates are too. */
const LOCALE = 'en-GB';
const DAY = new Intl.DateTimeFormat(LOCALE, { day: 'numeric', month: 'long' });
const DAY_AND_YEAR = new Intl.DateTimeFormat(LOCALE, { day: 'numeric', month: 'long', year: 'numeric' });
const TIME = new Intl.DateTimeFormat(LOCALE, { hour: 'numeric', minute: '2-digit' });

function read(iso: string | undefined | null): Date | undefined {
  if (!iso) return undefined;
  const date = new Date(iso);
  return Number.isNaN(date.getTime()) ? undefined : date;
}

/** "28 January", with the year where it is not the current one. */
export function dayWords(iso: string | undefined | null): string {
  const date = read(iso);
  if (date === undefined) return '';
  return date.getFullYear() === new Date().getFullYear() ? DAY.format(date) : DAY_AND_YEAR.format(date);
}

/** "2 December 2026", always with the year: what is printed is read in other years. */
export function dateWords(iso: string): string {
  const date = read(iso);
  return date === undefined ? '' : DAY_AND_YEAR.format(date);
}

/** "2 December 2026", as a paper that is kept says when it was made. */
export const todayWords = (): string => DAY_AND_YEAR.format(new Date());

/** "10:42". */
export function timeWords(iso: string | undefined | null): string {
  const date = read(iso);
  return date === undefined ? '' : TIME.format(date);
}

/** "28 January at 10:42". */
export function momentWords(iso: string | undefined | null): string {
  return read(iso) === undefined ? '' : `${dayWords(iso)} at ${timeWords(iso)}`;
}
