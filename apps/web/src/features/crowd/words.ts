import type { DropSpan, GroupShares, Rejection, RuleBook, Share } from '@settlewright/anthropometry';
import { CROWD_WEAR } from '@/lib/crowd/crowds.ts';

/** "34", "fewer than 1", "more than 99": people of 100, rounded so that few are never none. */
export function ofHundred({ value }: Pick<Share, 'value'>): string {
  const n = Math.round(value * 100);
  if (n === 0 && value > 0) return 'fewer than 1';
  if (n === 100 && value < 1) return 'more than 99';
  return String(n);
}

/** "about" before a number; "fewer than 1" says as much by itself. */
export const isAbout = ({ value }: Pick<Share, 'value'>): boolean => /^[1-9]/.test(ofHundred({ value }));

/** "33 to 35 by counting alone": the range of a share, in people of 100. */
export function rangeWords({ low, high }: Pick<Share, 'low' | 'high'>): string {
  const [from, to] = [Math.round(low * 100), Math.round(high * 100)];
  return from === to ? 'Counting alone moves it by less than 1' : `${from} to ${to} by counting alone`;
}

/** "28 to 39 over the drop": what the range of how far cushions go down does to a share; nothing where it rounds away. */
export function overDropWords(
  span: DropSpan | undefined,
  told = (value: number) => ofHundred({ value }),
): string | undefined {
  if (!span) return undefined;
  const [low, high] = [told(span.low), told(span.high)];
  return low === high ? undefined : `${low} to ${high} over the drop`;
}

/** "women 41, men 27"; nothing for people of one sex. */
export function sexWords({ women, men }: GroupShares): string | undefined {
  return women && men ? `women ${ofHundred(women)}, men ${ofHundred(men)}` : undefined;
}

/** The check that turns most away, and the next of those it leaves. */
export function rejectionWords(
  most: Rejection | undefined,
  next: Rejection | undefined,
  ruleBook: RuleBook,
): string | undefined {
  if (!most) return undefined;
  const name = (id: string) => ruleBook.rule(id).columnName.toLowerCase();
  const first = ruleBook.rule(most.ruleId).columnName;
  const people = ofHundred({ value: most.lost });
  const all = most.lost === 1;
  const one = all ? `${first} turns everybody away.` : `${first} turns away most: ${people} in 100.`;
  if (!next || all) return one;
  return `${one} Of those it leaves, ${name(next.ruleId)} turns away ${ofHundred({ value: next.lost })} in 100.`;
}

/** What everybody of the crowd wears. */
export const WEAR_WORDS = `Everybody wears shoes of ${CROWD_WEAR.shoeMm} mm and ${CROWD_WEAR.clothing} clothes, sits upright with the back against the rest, and presses the cushion by their own weight.`;

/** What "over the drop" means. */
export const OVER_DROP_WORDS =
  'Shares take how far a cushion goes down at its best value. “Over the drop” is the same count with every cushion ' +
  'going down least and most, as far as 90 of 100 cases reach; test sits narrow it.';

/** Of 100 people, to a tenth. */
export const tenth = (share: number): string => (share * 100).toFixed(1);

/** "About 34.2 in 100 (34.1 to 34.3)", for counts so large that tenths mean something. */
export function fineWords({ value, low, high }: Share): string {
  const range = tenth(low) === tenth(high) ? '' : ` (${tenth(low)} to ${tenth(high)})`;
  if (value === 0) return `None in 100${range}`;
  if (value === 1) return `All of 100${range}`;
  if (tenth(value) === '0.0') return `Fewer than 0.1 in 100${range}`;
  return tenth(value) === '100.0' ? `More than 99.9 in 100${range}` : `About ${tenth(value)} in 100${range}`;
}
