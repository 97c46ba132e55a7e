import type { ClothLayout, ClothPanel, ClothRoll } from './cloth.ts';
import { layInOrder, readyPanels, type ReadyPanel } from './lay-in-order.ts';
import { layoutBoundMm } from './layout-bound.ts';
import { seededRandom } from './random.ts';

interface NestOptions {
  /** Layouts tried; the answer never gets worse with more. */
  tries: number;
  /** The same seed gives the same layout. */
  seed?: number;
}

const longest = ({ ways }: ReadyPanel) => Math.max(...ways.map(({ lengthMm }) => lengthMm));
const widest = ({ ways }: ReadyPanel) => Math.max(...ways.map(({ widthMm }) => widthMm));
const area = ({ panel }: ReadyPanel) => panel.widthMm * panel.lengthMm;

/** Orders that are known to do well: large before small, by four measures of large. */
const ORDERS: readonly ((a: ReadyPanel, b: ReadyPanel) => number)[] = [
  (a, b) => widest(b) - widest(a) || longest(b) - longest(a),
  (a, b) => area(b) - area(a),
  (a, b) => longest(b) - longest(a) || widest(b) - widest(a),
  (a, b) => b.panel.widthMm + b.panel.lengthMm - (a.panel.widthMm + a.panel.lengthMm),
];

/**
 * Lays panels on a roll so that little of it is taken up.
 *
 * The best of four plain orders is improved by exchanging two panels, again and again. The layout need not be
 * cut edge to edge.
 *
 * @param panels - to be cut, seam allowance included
 * @param roll - the cloth
 * @param options - how long to try
 * @returns the shortest layout found and the length below which none exists
 * @throws Error naming the first panel that is wider than the roll in every way it may lie
 */
export function nestPanels(
  panels: readonly ClothPanel[],
  roll: ClothRoll,
  { tries, seed = 1 }: NestOptions,
): ClothLayout {
  const ready = readyPanels(panels, roll);
  const boundMm = layoutBoundMm(ready, roll);
  const random = seededRandom(seed);
  const starts = ORDERS.map((order) => ready.slice().sort(order)).map((order) => ({
    order,
    laid: layInOrder(order, roll),
  }));
  let best = starts.reduce((a, b) => (b.laid.lengthMm < a.laid.lengthMm ? b : a));
  let present = best;
  for (let i = 0; i < tries && best.laid.lengthMm > boundMm + 0.01; i += 1) {
    const order = present.order.slice();
    const a = Math.floor(random() * order.length);
    const b = Math.floor(random() * order.length);
    [order[a], order[b]] = [order[b]!, order[a]!];
    const laid = layInOrder(order, roll);
    // A little worse is allowed at first, so that the search leaves its first hollow.
    const allowedMm = boundMm * 0.02 * (1 - i / tries) * random();
    if (laid.lengthMm <= present.laid.lengthMm + allowedMm) present = { order, laid };
    if (laid.lengthMm < best.laid.lengthMm) best = { order, laid };
  }
  return { ...best.laid, boundMm };
}
