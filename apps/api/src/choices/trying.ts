import { setImmediate } from 'node:timers/promises';
import type { SetDocument } from '@settlewright/geometry';
import { Problem } from '../common/problem';

/** Sitters checked for one answer, a piece counting as a tenth of one: some seconds, on a slow machine a minute. */
const MOST_WORK = 20_000;
const PIECE = 0.1;

/** Refuses what would keep a processor for long, before it begins. */
export function refuseTooMuch(document: SetDocument, tries: number, path: string): void {
  const { pieces, seating } = document;
  if (tries * (seating.length + pieces.length * PIECE) <= MOST_WORK) return;
  const most = Math.floor(MOST_WORK / tries);
  const message =
    `${tries} sets of ${seating.length} sitters and ${pieces.length} pieces would be tried; ` +
    `accepted: up to ${most} sitters, ten pieces counting as one`;
  throw Problem.invalid([{ path, code: 'too-much-work', message }]);
}

/** Goes through to the end, and lets other requests have their turn between two steps. */
export async function inTurns<T>(steps: Generator<unknown, T, void>): Promise<T> {
  for (;;) {
    const { done, value } = steps.next();
    if (done) return value;
    await setImmediate();
  }
}
