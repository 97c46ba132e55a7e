import type { WaysIn } from '@settlewright/geometry';
import { createAsker } from '@/lib/ask-worker.ts';
import type { WaysQuestion } from './ways.worker.ts';

const ask = createAsker(
  () => new Worker(new URL('./ways.worker.ts', import.meta.url), { type: 'module', name: 'ways-in' }),
  'The search for ways in stopped.',
);

/** Has a worker look for the ways in, so that the page stays free. */
export const askWays = (question: Omit<WaysQuestion, 'id'>): Promise<WaysIn> =>
  ask((id): WaysQuestion => ({ id, ...question }));
