import { createAsker } from '../ask-worker.ts';
import type { CrowdTask, CrowdTasks } from './crowd-tasks.ts';
import type { Question } from './crowd.worker.ts';

const ask = createAsker(
  () => new Worker(new URL('./crowd.worker.ts', import.meta.url), { type: 'module', name: 'crowd' }),
  'The counting stopped. Reload the page.',
);

/**
 * Puts a question to the worker that holds the crowd; the page stays free meanwhile.
 *
 * @returns the answer; rejects when the population or the rules cannot be read
 */
export const askCrowd = <Task extends CrowdTask>(
  task: Task,
  asked: CrowdTasks[Task]['asked'],
): Promise<CrowdTasks[Task]['answer']> => ask((id): Question => ({ id, task, asked }));
