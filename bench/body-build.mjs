import { mannequinMesh, poseMannequin } from '@settlewright/geometry';
import { atTable, strangers } from './lib/strangers.mjs';
import { timesOf } from './lib/times.mjs';

const PEOPLE = 60;
const WARM_UP = 20;
const SEED = 1;

/** Time to solve, pose and mesh one person never seen before, at the near level; the first ones only warm up. */
export async function run() {
  const people = strangers(WARM_UP + PEOPLE, SEED);
  const build = (n) => mannequinMesh(poseMannequin({ ...atTable, means: people[n] }));
  timesOf(WARM_UP, build);
  const times = timesOf(PEOPLE, (n) => build(WARM_UP + n));
  const at = (share) => times[Math.floor(share * PEOPLE)];
  return [
    { name: 'body-build', value: at(0.5), unit: 'ms', aim: 15, reference: null },
    { name: 'body-build-p95', value: at(0.95), unit: 'ms', aim: 30, reference: null },
  ];
}
