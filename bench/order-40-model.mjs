// An order of forty cushions of ten sizes: all that its papers show, but for the layout of its cloth.
import { addPiece, deriveCushions, emptySetDocument, orderModel, plainCover } from '@settlewright/geometry';
import { timesOf } from './lib/times.mjs';

const BENCHES = 20;
const WARM_UP = 5;
const RUNS = 21;

function forty() {
  let document = emptySetDocument();
  for (let n = 0; n < BENCHES; n += 1) document = addPiece(document, 'bench').document;
  const pieces = document.pieces.map((piece, n) => ({ ...piece, lengthMm: 900 + 30 * (n % 10) }));
  return { ...document, pieces };
}

/** Runs the bench; the median, cushions derived from the set each time. */
export function run() {
  const document = forty();
  const covers = [
    { ...plainCover('plum moquette'), repeatMm: { acrossMm: 340, alongMm: 460 }, direction: 'up-roll' },
  ];
  const order = () => orderModel({ cushions: deriveCushions(document), covers });
  const { totals } = order();
  if (totals.cushions !== 2 * BENCHES) throw new Error(`${totals.cushions} cushions, not ${2 * BENCHES}`);
  timesOf(WARM_UP, order);
  const value = timesOf(RUNS, order)[(RUNS - 1) / 2];
  return [{ name: 'order-40-model', value, unit: 'ms', aim: 50, reference: null }];
}
