import { createRequire } from 'node:module';
import { createBodyModel, MEASURE_KEYS } from '@settlewright/anthropometry';
import { poseMannequin } from '@settlewright/geometry';

const load = createRequire(import.meta.url);
const PEOPLE = 200;
const WARM_UP = 60;
const SEED = 3;

/** Time to find the posture of one person at a place with a table, a sill and a back: joints and solids, no mesh. */
export async function run() {
  const model = createBodyModel(load('@settlewright/seed-data/populations/ansur2.json'));
  const anybody = model.predict({ bodyData: 'mixed', measured: {}, shoeMm: 25, clothing: 'light' });
  const { columns } = anybody.sample(WARM_UP + PEOPLE, SEED);
  const arms = [undefined, 'lap', 'cup', 'sill-left'];
  const times = [];
  for (let row = 0; row < WARM_UP + PEOPLE; row += 1) {
    const means = Object.fromEntries(MEASURE_KEYS.map((key) => [key, columns[key][row]]));
    const start = performance.now();
    poseMannequin({
      means,
      shoeMm: 25,
      frame: { hipMm: [0, 450, 135], facingRad: 0 },
      situation: {
        effectiveDepthMm: 430,
        seatTiltRad: 0.03,
        backLeanRad: 0.12,
        backTopMm: 1000,
        table: { topMm: 740, overlapMm: 50 },
        sills: [{ side: 'left', topMm: 700, centreToEdgeMm: 230, usableDepthMm: 150 }],
      },
      sinkMm: 10,
      choice: { arms: arms[row % arms.length] },
    });
    if (row >= WARM_UP) times.push(performance.now() - start);
  }
  times.sort((a, b) => a - b);
  return [{ name: 'posture', value: times[PEOPLE / 2], unit: 'ms', aim: 2, reference: null }];
}
