import { createRequire } from 'node:module';
import { ARRANGEMENTS } from '@settlewright/geometry';
import { orderPack, withButtons } from './lib/order-pack.mjs';

const load = createRequire(import.meta.url);
const WARM_UP = 3;
const RUNS = 15;

/** Time to make the paper of one order of four cushions, cushions and cloth anew each time: the median of the runs. */
export async function run() {
  const { laidSpecPdf } = load('../apps/api/dist/paper/laid-pack.js');
  const document = withButtons(ARRANGEMENTS.find(({ id }) => id === 'facing-benches').build());
  const times = [];
  for (let n = 0; n < WARM_UP + RUNS; n += 1) {
    const start = performance.now();
    laidSpecPdf(orderPack(document));
    if (n >= WARM_UP) times.push(performance.now() - start);
  }
  times.sort((a, b) => a - b);
  return [{ name: 'spec-pdf-1', value: times[(RUNS - 1) / 2], unit: 'ms', aim: 300, reference: null }];
}
