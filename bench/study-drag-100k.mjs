import { createStudy } from '@settlewright/anthropometry';
import { drawPeople, makePlace, setupFor } from './lib/study-scene.mjs';
import { middleTime } from './lib/times.mjs';

const PLACES = 12;
const STEP_MM = 25.4 / 8;
const WARM_UP = 40;
const RUNS = 81;

/**
 * Time of one step of a drag: the seats of twelve unlike places go up by an eighth of an inch, for 100,000 people. New
 * joint shares, the share of every rule at every place, and who is lost by each.
 */
export async function run() {
  const people = drawPeople(100_000);
  const placesAt = (step) =>
    Array.from({ length: PLACES }, (_, n) => makePlace(n, STEP_MM * ((step % 24) - 12)));
  const study = createStudy(people, setupFor(placesAt(0)));
  study.shares();
  const move = (step) => {
    study.move(placesAt(step));
    study.shares();
  };
  middleTime(WARM_UP, move);
  const value = middleTime(RUNS, (n) => move(n + WARM_UP));
  return [{ name: 'study-drag-100k', value, unit: 'ms', aim: 16, reference: null }];
}
