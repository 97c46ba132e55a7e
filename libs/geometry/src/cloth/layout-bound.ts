import type { ClothRoll } from './cloth.ts';
import type { ReadyPanel } from './lay-in-order.ts';

/** Rounds of prices; every round gives a bound that holds, later ones mostly a better one. */
const ROUNDS = 60;

/** A width in which some panel may lie, whole millimetres rounded down, which can only lower the bound. */
interface WidthClass {
  widthMm: number;
  /** Panels that may lie so wide; no row holds more of them. */
  count: number;
}

/**
 * A length below which no layout of these panels exists.
 *
 * The largest of three: area over width; the longest panel; and a bound by reduced cost: give each width a price so
 * that no row across the roll costs more than 1; then the panels' lengths times their prices cannot exceed the roll.
 * Panels that may lie two ways count the cheaper one.
 *
 * @param ready - panels with the ways they may lie
 * @param roll - the cloth
 * @source reduced-cost (Farley) bound of the cutting-stock relaxation in which lengths may be sliced
 */
export function layoutBoundMm(ready: readonly ReadyPanel[], roll: ClothRoll): number {
  if (ready.length === 0) return 0;
  const area = ready.reduce((sum, { panel }) => sum + panel.widthMm * panel.lengthMm, 0);
  const longest = Math.max(...ready.map(({ ways }) => Math.min(...ways.map(({ lengthMm }) => lengthMm))));
  return Math.max(area / roll.usableWidthMm, longest, pricedBoundMm(ready, roll.usableWidthMm));
}

function pricedBoundMm(ready: readonly ReadyPanel[], usableWidthMm: number): number {
  const classes = widthClasses(ready);
  const index = new Map(classes.map(({ widthMm }, i) => [widthMm, i]));
  const options = ready.map(({ ways }) =>
    ways.map(({ widthMm, lengthMm }) => ({ at: index.get(Math.floor(widthMm))!, lengthMm })),
  );
  const width = Math.floor(usableWidthMm);
  const prices = classes.map(({ widthMm }) => widthMm / usableWidthMm);
  const used = new Float64Array(classes.length);
  let best = 0;
  for (let round = 1; round <= ROUNDS; round += 1) {
    const row = dearestRow(classes, prices, width);
    let value = 0;
    const demand = new Float64Array(classes.length);
    for (const panel of options) {
      const cheapest = panel.reduce((a, b) =>
        prices[b.at]! * b.lengthMm < prices[a.at]! * a.lengthMm ? b : a,
      );
      value += prices[cheapest.at]! * cheapest.lengthMm;
      demand[cheapest.at]! += cheapest.lengthMm;
    }
    best = Math.max(best, value / Math.max(row.cost, 1e-12));
    // Dearer where rows leave panels over, cheaper where rows have more of them than there are.
    const rate = 0.5 / Math.sqrt(round);
    classes.forEach((_, i) => {
      used[i]! += (row.counts[i]! * value) / Math.max(row.cost, 1e-12);
      const asked = demand[i]! * round;
      prices[i]! *= Math.exp((rate * (asked - used[i]!)) / Math.max(asked, used[i]!, 1e-9));
    });
  }
  return best;
}

function widthClasses(ready: readonly ReadyPanel[]): WidthClass[] {
  const counts = new Map<number, number>();
  for (const { ways } of ready) {
    for (const width of new Set(ways.map(({ widthMm }) => Math.floor(widthMm)))) {
      counts.set(width, (counts.get(width) ?? 0) + 1);
    }
  }
  return [...counts].map(([widthMm, count]) => ({ widthMm, count }));
}

/** The row across the roll that costs most: a bounded knapsack over whole millimetres. */
function dearestRow(
  classes: readonly WidthClass[],
  prices: readonly number[],
  width: number,
): { cost: number; counts: number[] } {
  const value = new Float64Array(width + 1);
  const taken = classes.map(({ widthMm, count }, i) => {
    const takes = new Uint16Array(width + 1);
    const most = Math.min(count, Math.floor(width / Math.max(1, widthMm)));
    const before = value.slice();
    for (let w = width; w >= widthMm; w -= 1) {
      for (let n = 1; n <= most && n * widthMm <= w; n += 1) {
        const worth = before[w - n * widthMm]! + n * prices[i]!;
        if (worth > value[w]!) {
          value[w] = worth;
          takes[w] = n;
        }
      }
    }
    return takes;
  });
  const counts = classes.map(() => 0);
  let left = width;
  for (let i = classes.length - 1; i >= 0; i -= 1) {
    const n = taken[i]![left]!;
    counts[i] = n;
    left -= n * classes[i]!.widthMm;
  }
  return { cost: value[width]!, counts };
}
