import { readFileSync } from 'node:fs';
import { clothToBuy, makeCushion, nestPanels, PLAIN_MAKE } from '@settlewright/geometry';
import { leastTime } from './lib/times.mjs';

const { instances } = JSON.parse(
  readFileSync(new URL('../libs/geometry/test/strip-instances.json', import.meta.url), 'utf8'),
);
const NO_REPEAT = { acrossMm: 0, alongMm: 0 };
/** As many layouts as an order is tried with. */
const TRIES = 1500;
const RUNS = 3;
const CLOTH = {
  widthMm: 54 * 25.4,
  selvedgeMm: 0,
  lies: 'either',
  repeatMm: NO_REPEAT,
  startMm: 0,
  stepMm: 228.6,
};

/** Mean excess of published strips over the best proven bound, and of an order of 40 cushions over its own. */
function gapPercent() {
  const gaps = instances.map(({ width, pieces }) => {
    const panels = pieces.flatMap(([widthMm, lengthMm, count], i) =>
      Array.from({ length: count }, (_, n) => ({ id: `${i}/${n}`, widthMm, lengthMm, lies: 'up-roll' })),
    );
    const roll = { usableWidthMm: width, repeatMm: NO_REPEAT };
    const { lengthMm, boundMm } = nestPanels(panels, roll, { tries: TRIES });
    return 100 * (lengthMm / boundMm - 1);
  });
  const { layout } = orderOfForty();
  gaps.push(100 * (layout.lengthMm / layout.boundMm - 1));
  return gaps.reduce((a, b) => a + b, 0) / gaps.length;
}

/** Forty cushions of ten sizes, boxed, in one plain cloth. */
function orderOfForty() {
  const cushions = Array.from({ length: 40 }, (_, n) => {
    const finishedMm = { widthMm: 560 + 90 * (n % 10), depthMm: 430 + 15 * (n % 4), thicknessMm: 101.6 };
    const { made } = makeCushion({ finishedMm, make: PLAIN_MAKE });
    return { mark: `C${n + 1}`, finishedMm, make: PLAIN_MAKE, made };
  });
  return clothToBuy(cushions, CLOTH, { tries: TRIES });
}

/** How close panels lie on a roll, and the time an order of 40 cushions takes to be laid. */
export function run() {
  return [
    { name: 'nesting-gap', value: gapPercent(), unit: '%', aim: 10, reference: 'best proven lower bound' },
    { name: 'nesting-time', value: leastTime(RUNS, orderOfForty) / 1000, unit: 's', aim: 2, reference: null },
  ];
}
