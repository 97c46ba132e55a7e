import {
  whereAll,
  type LengthStyle,
  type StickRow,
  type StoryStick,
  type Stretch,
} from '@settlewright/geometry';
import { exactValue, joinWords } from '@/lib/dimension-words.ts';
import { furthestApart, seatElsewhere, SERVED } from './suggestion.ts';
import { countWords } from './words.ts';
import { shortName } from '@/lib/short-name.ts';

/** Whether one value suits everybody by their verdicts, what is not known never; if none does, who stands furthest apart and whom to seat elsewhere. */
export function commonWords(
  stick: Pick<StoryStick, 'values' | 'rows' | 'allFit' | 'allTight' | 'dimension'>,
  { present, step, style }: { present: number; step: number; style: LengthStyle },
): string {
  const { values, rows, allFit, allTight, dimension } = stick;
  if (rows.length === 0) return '';
  const show = (value: number) => exactValue(value, dimension.unit, style);
  // Ends are rounded inwards: what is named here can be built.
  const up = (value: number) => show(Math.ceil(value / step - 1e-3) * step);
  const down = (value: number) => show(Math.floor(value / step + 1e-3) * step);
  // A single tried value may lie between two steps: it is the present one.
  const span = ({ from, to }: Stretch) => (to - from < step / 2 ? show(from) : `${up(from)} to ${down(to)}`);
  const all = rows.length === 1 ? shortName(rows[0]?.name ?? '') : `all ${countWords(rows.length)}`;
  const [fit, tight] = [allFit[0], allTight[0]];
  if (fit) return `${span(fit)} fits ${all}.`;
  if (tight) return `${span(tight)} is at least tight for ${all}; no value fits ${all}.`;
  const apart = furthestApart(rows);
  const elsewhere = seatElsewhere(stick, present);
  const nowhere = rows.filter(({ states }) => !states.some((state) => SERVED.includes(state)));
  const isOpen = ({ states }: StickRow) => states.includes('notKnown');
  const never = nowhere.filter((row) => !isOpen(row));
  const unsure = nowhere.filter(isOpen);
  const mayBe = whereAll(values, rows, [...SERVED, 'notKnown']).length > 0;
  const guess = (row: StickRow) => (row.estimated ? ' (est., best guess)' : '');
  return [
    `No value ${mayBe ? 'is known to suit' : 'suits'} ${all}${
      apart
        ? `: ${shortName(apart.low.name)} needs ${down(apart.low.tight.at(-1)?.to ?? 0)} or less${guess(apart.low)}, ${shortName(apart.high.name)} ${up(apart.high.tight[0]?.from ?? 0)} or more${guess(apart.high)}`
        : ''
    }.`,
    ...(never.length > 0
      ? [`None between the ends of the tape suits ${joinWords(never.map(({ name }) => shortName(name)))}.`]
      : []),
    ...(unsure.length > 0 && rows.length > 1
      ? [`None is known to suit ${joinWords(unsure.map(({ name }) => shortName(name)))}.`]
      : []),
    ...(elsewhere && elsewhere.rows.length < rows.length
      ? [
          `Seat ${joinWords(elsewhere.rows.map(({ name }) => shortName(name)))} elsewhere, and ${span(elsewhere.others)} suits the others.`,
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
