import type { NextMeasures } from '@settlewright/anthropometry';
import { createAsker } from '@/lib/ask-worker.ts';
import type { NextQuestion } from './next-question.ts';
import type { NumberedQuestion } from './next.worker.ts';

const ask = createAsker(
  () => new Worker(new URL('./next.worker.ts', import.meta.url), { type: 'module', name: 'measure-next' }),
  'The worker stopped.',
);

/** Has a worker try the measurements of one sitter, so that the page stays free. */
export const askNext = (question: NextQuestion): Promise<NextMeasures> =>
  ask((id): NumberedQuestion => ({ id, question }));
