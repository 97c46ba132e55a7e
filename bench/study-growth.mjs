import { drawPeople, studyOnce } from './lib/study-scene.mjs';
import { leastTime } from './lib/times.mjs';

const WARM_UP = 20;
const RUNS = 41;

/** How the time of a study grows: 160,000 people against 40,000. */
export async function run() {
  const [few, many] = [40_000, 160_000].map(drawPeople);
  leastTime(WARM_UP, () => studyOnce(few));
  leastTime(WARM_UP, () => studyOnce(many));
  const value = leastTime(RUNS, () => studyOnce(many)) / leastTime(RUNS, () => studyOnce(few));
  return [{ name: 'study-growth', value, unit: 'times', aim: 4.4, reference: null }];
}
