import { best } from './amount.ts';
import type { Band } from './room.ts';

/** The lines of a rule for one sitter. */
export interface Lines {
  pass: Band;
  fail: Band;
}

/**
 * The fail lines that count: a fail line is never stricter than its pass line. A small sitter's own pass line may lie
 * beyond a fail line that is a plain number; then the two are one.
 *
 * @param question - lines in the rule's unit
 * @returns the fail lines, each side the rule's or the pass line
 */
export function failLines({ pass, fail }: Lines): Band {
  const band: Band = {};
  if (fail.lower) band.lower = pass.lower && best(fail.lower) > best(pass.lower) ? pass.lower : fail.lower;
  if (fail.upper) band.upper = pass.upper && best(fail.upper) < best(pass.upper) ? pass.upper : fail.upper;
  return band;
}
