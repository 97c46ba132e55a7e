import { poseMannequin } from '@settlewright/geometry';
import { atTable, strangers } from './lib/strangers.mjs';
import { middleTime } from './lib/times.mjs';

const PEOPLE = 200;
const WARM_UP = 60;
const SEED = 3;
const ARMS = [undefined, 'lap', 'cup', 'sill-left'];
const SILLS = [{ side: 'left', topMm: 700, centreToEdgeMm: 230, usableDepthMm: 150 }];

/** Time to find the posture of one person at a place with a table, a sill and a back: joints and solids, no mesh. */
export async function run() {
  const people = strangers(WARM_UP + PEOPLE, SEED);
  const situation = { ...atTable.situation, sills: SILLS };
  const pose = (n) =>
    poseMannequin({ ...atTable, means: people[n], situation, choice: { arms: ARMS[n % ARMS.length] } });
  middleTime(WARM_UP, pose);
  const value = middleTime(PEOPLE, (n) => pose(WARM_UP + n));
  return [{ name: 'posture', value, unit: 'ms', aim: 2, reference: null }];
}
