import { createBodyModel, type NextMeasures } from '@settlewright/anthropometry';
import summary from '@settlewright/seed-data/populations/ansur2.json';
import type { Reply } from '@/lib/ask-worker.ts';
import { answerNext, type NextQuestion } from './next-question.ts';

export interface NumberedQuestion {
  id: number;
  question: NextQuestion;
}

const model = createBodyModel(summary);

self.onmessage = ({ data: { id, question } }: MessageEvent<NumberedQuestion>) => {
  let reply: Reply<NextMeasures>;
  try {
    reply = { id, answer: answerNext(question, model) };
  } catch (fault) {
    reply = { id, fault: fault instanceof Error ? fault.message : String(fault) };
  }
  self.postMessage(reply);
};
