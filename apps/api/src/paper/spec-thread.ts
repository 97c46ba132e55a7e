import { parentPort } from 'node:worker_threads';
import { laidSpecPdf } from './laid-pack';
import type { PressAnswer, PressTask } from './spec-press';

parentPort?.on('message', ({ id, data }: PressTask) => {
  parentPort?.postMessage(answerOf(id, data));
});

function answerOf(id: number, data: PressTask['data']): PressAnswer {
  try {
    return { id, pdf: laidSpecPdf(data) };
  } catch (fault) {
    return { id, fault: fault instanceof Error ? (fault.stack ?? fault.message) : String(fault) };
  }
}
