import type { Amount } from './amount.ts';
import type { CushionDrop } from './fit-sheet.ts';
import { SOURCE_MARK_WORDS } from './rule-book.ts';
import { SINK_ERROR } from './sink-band.ts';

/**
 * The cushions that a value hangs on, with how far each goes down and what that rests on.
 *
 * @param value - of a question
 * @returns one entry a cushion, millimetres
 */
export const dropsIn = ({ doubts }: Amount): CushionDrop[] => doubts.map(({ drop }) => drop);

/**
 * What a drop rests on, without anybody's name: the estimate with its mark, or test sits.
 *
 * @param drop - its error as a share, and how many sits it rests on
 * @returns words such as "estimate, give or take 30 %, from memory" or "by a test sit, give or take 18 %"
 */
export function dropSourceWords({ error, sits }: Pick<CushionDrop, 'error' | 'sits'>): string {
  const range = `give or take ${Math.round(error * 100)}\u00a0%`;
  if (sits === 0) return `estimate, ${range}, ${SOURCE_MARK_WORDS[SINK_ERROR.mark]}`;
  return `by ${sits === 1 ? 'a test sit' : `${sits} test sits`}, ${range}`;
}
