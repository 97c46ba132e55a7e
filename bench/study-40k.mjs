import { drawPeople, studyOnce } from './lib/study-scene.mjs';
import { middleTime } from './lib/times.mjs';

const WARM_UP = 20;
const RUNS = 41;

/** Time of one study on one thread: 40,000 people at one bench place, every rule, the joint share and who is lost. */
export async function run() {
  const people = drawPeople(40_000);
  middleTime(WARM_UP, () => studyOnce(people));
  const value = middleTime(RUNS, () => studyOnce(people));
  return [{ name: 'study-40k', value, unit: 'ms', aim: 60, reference: null }];
}
