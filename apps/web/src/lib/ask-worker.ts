/** What a worker answers: the number of the question, and its answer or what went wrong. */
export type Reply<Answer> = { id: number } & ({ answer: Answer } | { fault: string });

/** What is said of something that was thrown. */
export const faultWords = (fault: unknown): string =>
  fault instanceof Error ? fault.message : String(fault);

/** What a worker sends back: what `answer` makes, or why it could not. */
export async function replyTo<Answer>(
  id: number,
  answer: () => Answer | Promise<Answer>,
): Promise<Reply<Answer>> {
  try {
    return { id, answer: await answer() };
  } catch (fault) {
    return { id, fault: faultWords(fault) };
  }
}

interface Waiting {
  resolve: (answer: never) => void;
  reject: (fault: Error) => void;
}

/**
 * Puts numbered questions to a worker that is started with the first of them.
 *
 * @param start - makes the worker
 * @param stopped - what is said when it breaks down; the next question starts another
 * @returns sends what `question` makes of a number, and gives the answer that comes back under it; rejects with the
 *   worker's words when it cannot answer
 */
export function createAsker(start: () => Worker, stopped: string) {
  let worker: Worker | undefined;
  let count = 0;
  const waiting = new Map<number, Waiting>();

  function started(): Worker {
    if (worker) return worker;
    worker = start();
    worker.onmessage = ({ data }: MessageEvent<Reply<never>>) => {
      const asker = waiting.get(data.id);
      waiting.delete(data.id);
      if ('fault' in data) asker?.reject(new Error(data.fault));
      else asker?.resolve(data.answer);
    };
    worker.onerror = () => {
      worker?.terminate();
      worker = undefined;
      for (const { reject } of waiting.values()) reject(new Error(stopped));
      waiting.clear();
    };
    return worker;
  }

  return <Answer>(question: (id: number) => unknown): Promise<Answer> => {
    count += 1;
    const id = count;
    return new Promise((resolve, reject) => {
      waiting.set(id, { resolve, reject });
      started().postMessage(question(id));
    });
  };
}
