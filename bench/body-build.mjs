import { createRequire } from 'node:module';
import { createBodyModel, MEASURE_KEYS } from '@settlewright/anthropometry';
import { mannequinMesh, poseMannequin } from '@settlewright/geometry';

const load = createRequire(import.meta.url);
const PEOPLE = 60;
const WARM_UP = 20;
const SEED = 1;

/** Time to solve, pose and mesh one person never seen before, at the near level; the first ones only warm up. */
export async function run() {
  const model = createBodyModel(load('@settlewright/seed-data/populations/ansur2.json'));
  const anybody = model.predict({ bodyData: 'mixed', measured: {}, shoeMm: 25, clothing: 'light' });
  const { columns } = anybody.sample(WARM_UP + PEOPLE, SEED);
  const times = [];
  for (let row = 0; row < WARM_UP + PEOPLE; row += 1) {
    const means = Object.fromEntries(MEASURE_KEYS.map((key) => [key, columns[key][row]]));
    const start = performance.now();
    const pose = poseMannequin({
      means,
      shoeMm: 25,
      frame: { hipMm: [0, 450, 135], facingRad: 0 },
      situation: {
        effectiveDepthMm: 430,
        seatTiltRad: 0.03,
        backLeanRad: 0.12,
        backTopMm: 1000,
        table: { topMm: 740, overlapMm: 50 },
      },
      sinkMm: 10,
    });
    mannequinMesh(pose);
    if (row >= WARM_UP) times.push(performance.now() - start);
  }
  times.sort((a, b) => a - b);
  const at = (share) => times[Math.min(times.length - 1, Math.floor(share * times.length))];
  return [
    { name: 'body-build', value: at(0.5), unit: 'ms', aim: 15, reference: null },
    { name: 'body-build-p95', value: at(0.95), unit: 'ms', aim: 30, reference: null },
  ];
}
