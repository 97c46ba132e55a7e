import type { WaysIn } from '@settlewright/geometry';
import { createAsker } from '@/lib/ask-worker.ts';
import type { WaysQuestion } from './ways.worker.ts';

const ask = createAsker(
  () => new Worker(new URL('./ways.worker.ts', import.meta.url), { type: 'module', name: 'ways-in' }),
  'The search for ways in stopped.',
);

let last: Promise<unknown> = Promise.resolve();

/**
 * Has a worker look for the ways in, so that the page stays free. One search runs at a time: of the questions that wait
 * for it, those that nobody wants any more when their turn comes are not put, and answer with nothing.
 */
export function askWays(
  question: Omit<WaysQuestion, 'id'>,
  isWanted: () => boolean,
): Promise<WaysIn | undefined> {
  const answer = last.then(() =>
    isWanted() ? ask<WaysIn>((id): WaysQuestion => ({ id, ...question })) : undefined,
  );
  last = answer.catch(() => undefined);
  return answer;
}
