import { replyTo } from '../ask-worker.ts';
import { createCrowdDesk } from './crowd-desk.ts';
import type { CrowdTask, CrowdTasks } from './crowd-tasks.ts';

/** A question with a number, so that its answer finds the way back. */
export interface Question<Task extends CrowdTask = CrowdTask> {
  id: number;
  task: Task;
  asked: CrowdTasks[Task]['asked'];
}

const desk = createCrowdDesk();
let turn: Promise<unknown> = Promise.resolve();

// One after the other: the desk keeps one crowd at a time.
self.onmessage = ({ data: { id, task, asked } }: MessageEvent<Question>) => {
  turn = turn.then(async () => {
    self.postMessage(await replyTo(id, () => desk.answer(task, asked)));
  });
};
