import { CONFIDENCE_LIMITS, confidenceText } from '@settlewright/anthropometry';

const { lowest, highest, decimals } = CONFIDENCE_LIMITS;

export const ACCEPTED = `${confidenceText(lowest)} to ${confidenceText(highest)}`;

export type ReadConfidence = { ok: true; value: number | null } | { ok: false; message: string };

/** Reads 0.9, 0,9, .90, 90 % or nothing at all, which stands for the default. */
export function readConfidence(text: string): ReadConfidence {
  const typed = text.trim();
  if (typed === '') return { ok: true, value: null };
  const [, digits, percent] = /^(\d*[.,]?\d+)\s*(%)?$/.exec(typed) ?? [];
  const number = digits === undefined ? NaN : Number(digits.replace(',', '.')) / (percent ? 100 : 1);
  const value = Number(number.toFixed(decimals));
  if (Math.abs(number - value) < 1e-9 && value >= lowest && value <= highest) return { ok: true, value };
  return {
    ok: false,
    message: `${ACCEPTED} in hundredths is accepted, or nothing for the default; read “${typed}”.`,
  };
}
