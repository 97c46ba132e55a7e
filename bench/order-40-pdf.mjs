import { createRequire } from 'node:module';
import { ARRANGEMENTS } from '@settlewright/geometry';
import { orderPack, withButtons } from './lib/order-pack.mjs';

const load = createRequire(import.meta.url);
const WARM_UP = 2;
const RUNS = 5;
const BAYS = 10;

/** Ten bays of two benches that differ in length: forty cushions, no two bays made alike. */
export function carOfForty() {
  const document = withButtons(ARRANGEMENTS.find(({ id }) => id === 'facing-benches').build());
  const bay = document.pieces.filter(({ kind }) => kind === 'bench');
  document.pieces = Array.from({ length: BAYS }, (_, n) =>
    bay.map((piece, i) => ({
      ...structuredClone(piece),
      id: `${piece.id}-${n}`,
      mark: `B${2 * n + i + 1}`,
      lengthMm: piece.lengthMm + 7 * n,
      upholstery: { ...piece.upholstery, longestCushionMm: 3000 },
      at: { ...piece.at, zMm: piece.at.zMm + 2000 * n },
    })),
  ).flat();
  document.seating = [];
  return document;
}

/** Time to make the paper of an order of forty cushions, its cloth laid anew each time: the median of the runs. */
export async function run() {
  const { laidSpecPdf } = load('../apps/api/dist/paper/laid-pack.js');
  const document = carOfForty();
  const pack = orderPack(document);
  if (pack.labels.length !== 40) throw new Error(`an order of ${pack.labels.length} cushions, not of forty`);
  const times = [];
  for (let n = 0; n < WARM_UP + RUNS; n += 1) {
    const start = performance.now();
    laidSpecPdf(orderPack(document));
    if (n >= WARM_UP) times.push(performance.now() - start);
  }
  times.sort((a, b) => a - b);
  return [{ name: 'order-40-pdf', value: times[(RUNS - 1) / 2], unit: 'ms', aim: 1500, reference: null }];
}
