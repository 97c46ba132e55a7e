import { createBodyModel } from '@settlewright/anthropometry';
import summary from '@settlewright/seed-data/populations/ansur2.json';
import { replyTo } from '@/lib/ask-worker.ts';
import { answerNext, type NextQuestion } from './next-question.ts';

export interface NumberedQuestion {
  id: number;
  question: NextQuestion;
}

const model = createBodyModel(summary);

self.onmessage = ({ data: { id, question } }: MessageEvent<NumberedQuestion>) => {
  void replyTo(id, () => answerNext(question, model)).then((reply) => self.postMessage(reply));
};
