import type { LengthStyle, StoryStick } from '@settlewright/geometry';
import { exactValue, firstName, joinWords } from '@/lib/dimension-words.ts';
import { furthestApart, seatElsewhere } from './suggestion.ts';
import { countWords } from './words.ts';

/** Whether one value suits everybody; if none does, who stands furthest apart and whom to seat elsewhere. */
export function commonWords(
  stick: Pick<StoryStick, 'rows' | 'allFit' | 'allTight' | 'dimension'>,
  { present, step, style }: { present: number; step: number; style: LengthStyle },
): string {
  const { rows, allFit, allTight, dimension } = stick;
  if (rows.length === 0) return '';
  const show = (value: number) => exactValue(value, dimension.unit, style);
  // Ends are rounded inwards: what is named here can be built.
  const up = (value: number) => show(Math.ceil(value / step - 1e-3) * step);
  const down = (value: number) => show(Math.floor(value / step + 1e-3) * step);
  const all = rows.length === 1 ? firstName(rows[0]?.name ?? '') : `all ${countWords(rows.length)}`;
  const [fit, tight] = [allFit[0], allTight[0]];
  if (fit) return `${up(fit.from)} to ${down(fit.to)} fits ${all}.`;
  if (tight)
    return `${up(tight.from)} to ${down(tight.to)} is at least tight for ${all}; no value fits ${all}.`;
  const apart = furthestApart(rows);
  const elsewhere = seatElsewhere(stick, present);
  const nowhere = rows.filter(({ tight: bands }) => bands.length === 0).map(({ name }) => firstName(name));
  return [
    `No value suits ${all}${
      apart
        ? `: ${firstName(apart.low.name)} needs ${down(apart.low.tight.at(-1)?.to ?? 0)} or less, ${firstName(apart.high.name)} ${up(apart.high.tight[0]?.from ?? 0)} or more`
        : ''
    }.`,
    ...(nowhere.length > 0 ? [`None between the ends of the tape suits ${joinWords(nowhere)}.`] : []),
    ...(elsewhere && elsewhere.rows.length < rows.length
      ? [
          `Seat ${joinWords(elsewhere.rows.map(({ name }) => firstName(name)))} elsewhere, and ${up(elsewhere.others.from)} to ${down(elsewhere.others.to)} suits the others.`,
        ]
      : []),
  ].join(' ');
}

/** What the slider says: "18 inches; 1 fits, 2 tight, 2 won’t fit, 1 not known; 23 in 100". */
export function countsWords(verdicts: readonly (string | undefined)[]): string {
  const count = (verdict: string) => verdicts.filter((one) => one === verdict).length;
  const fits = count('fits');
  return [
    [fits, fits === 1 ? 'fits' : 'fit'],
    [count('tight'), 'tight'],
    [count('wontFit'), 'won’t fit'],
    [count('notKnown'), 'not known'],
  ]
    .filter(([n]) => n !== 0)
    .map(([n, words]) => `${n} ${words}`)
    .join(', ');
}
