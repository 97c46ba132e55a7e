import type { NextMeasures } from '@settlewright/anthropometry';
import type { NextQuestion } from './next-question.ts';
import type { NumberedQuestion, Reply } from './next.worker.ts';

interface Waiting {
  resolve: (answer: NextMeasures) => void;
  reject: (fault: Error) => void;
}

let worker: Worker | undefined;
let count = 0;
const waiting = new Map<number, Waiting>();

function started(): Worker {
  if (worker) return worker;
  worker = new Worker(new URL('./next.worker.ts', import.meta.url), { type: 'module', name: 'measure-next' });
  worker.onmessage = ({ data }: MessageEvent<Reply>) => {
    const asker = waiting.get(data.id);
    waiting.delete(data.id);
    if ('fault' in data) asker?.reject(new Error(data.fault));
    else asker?.resolve(data.answer);
  };
  worker.onerror = () => {
    worker?.terminate();
    worker = undefined;
    for (const { reject } of waiting.values()) reject(new Error('The worker stopped.'));
    waiting.clear();
  };
  return worker;
}

/** Has a worker try the measurements of one sitter, so that the page stays free. */
export function askNext(question: NextQuestion): Promise<NextMeasures> {
  count += 1;
  const id = count;
  return new Promise((resolve, reject) => {
    waiting.set(id, { resolve, reject });
    const numbered: NumberedQuestion = { id, question };
    started().postMessage(numbered);
  });
}
