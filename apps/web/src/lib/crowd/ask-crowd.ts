import type { CrowdTask, CrowdTasks } from './crowd-tasks.ts';
import type { Question, Reply } from './crowd.worker.ts';

interface Waiting {
  resolve: (answer: never) => void;
  reject: (fault: Error) => void;
}

let worker: Worker | undefined;
let next = 1;
const waiting = new Map<number, Waiting>();

function started(): Worker {
  if (worker) return worker;
  worker = new Worker(new URL('./crowd.worker.ts', import.meta.url), { type: 'module', name: 'crowd' });
  worker.onmessage = ({ data }: MessageEvent<Reply>) => {
    const asker = waiting.get(data.id);
    waiting.delete(data.id);
    if ('fault' in data) asker?.reject(new Error(data.fault));
    else asker?.resolve(data.answer as never);
  };
  worker.onerror = () => {
    worker?.terminate();
    worker = undefined;
    for (const { reject } of waiting.values()) reject(new Error('The counting stopped. Reload the page.'));
    waiting.clear();
  };
  return worker;
}

/**
 * Puts a question to the worker that holds the crowd; the page stays free meanwhile.
 *
 * @returns the answer; rejects when the population or the rules cannot be read
 */
export function askCrowd<Task extends CrowdTask>(
  task: Task,
  asked: CrowdTasks[Task]['asked'],
): Promise<CrowdTasks[Task]['answer']> {
  const id = next;
  next += 1;
  return new Promise((resolve, reject) => {
    waiting.set(id, { resolve, reject });
    const question: Question = { id, task, asked };
    started().postMessage(question);
  });
}
