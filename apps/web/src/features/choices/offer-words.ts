import { exactValue, joinWords } from '@/lib/dimension-words.ts';
import type { FootRail } from '@/lib/foot-rails.ts';
import { shortName } from '@/lib/short-name.ts';
import type { LengthStyle } from '@settlewright/geometry';
import type { Offer } from './offer.ts';
import { countWords } from './words.ts';

/** Whom a value serves by every check that the dimension moves: "At least tight for all six", or whom it leaves out. */
export function servesWords({ lost }: Offer, people: number): string {
  if (lost.length === 0)
    return people === 1
      ? 'At least tight by every check it moves.'
      : `At least tight for all ${countWords(people)} by every check it moves.`;
  if (people === 1) return 'No value is at least tight by every check it moves; this one misses the fewest.';
  const names = joinWords(lost.map(({ name }) => shortName(name)));
  return lost.length === people
    ? 'No value is at least tight for anybody by every check it moves; this one misses the fewest.'
    : `No value is at least tight for all by every check it moves; this one leaves out the fewest: ${names}.`;
}

/** A rail's height, built up to the next step: "2⅛″ high to fit, 1⅛″ to be tight". */
export function railHeights(
  { tightMm, fitsMm, estimated }: FootRail,
  step: number,
  style: LengthStyle,
): string {
  const show = (mm: number) => exactValue(Math.ceil(mm / step - 1e-6) * step, 'mm', style);
  const [tight, fits] = [show(tightMm), show(fitsMm)];
  const both = tight === fits ? `${fits} high` : `${fits} high to fit, ${tight} to be tight`;
  return estimated ? `${both}, est.` : both;
}
