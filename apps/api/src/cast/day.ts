const EARLIEST = '1900-01-01';
const DAY_MS = 24 * 60 * 60 * 1000;

export const DAY_WORDS = 'a day such as 2026-11-03, not in the future';

/** A calendar day in ISO form that exists and has come somewhere on Earth. */
export function isPastDay(text: string, now: Date = new Date()): boolean {
  if (!/^\d{4}-\d{2}-\d{2}$/.test(text)) return false;
  const date = new Date(`${text}T00:00:00Z`);
  if (Number.isNaN(date.getTime()) || date.toISOString().slice(0, 10) !== text) return false;
  const latest = new Date(now.getTime() + DAY_MS).toISOString().slice(0, 10);
  return text >= EARLIEST && text <= latest;
}
