import { PEN, type Sheet, type TextStyle } from './sheet';

export interface Chain {
  /** Where the ticks stand on the paper, along the chain, in rising order. */
  stops: readonly number[];
  /** One label for each space between two stops. */
  labels: readonly string[];
  /** Where the line stands across the chain: y of a level chain, x of an upright one. */
  at: number;
  direction: 'level' | 'upright';
  /** The side that labels too wide for their space move to: -1 up or left, 1 down or right. */
  outwards: 1 | -1;
  quiet?: boolean;
}

interface Placed {
  label: string;
  middle: number;
  /** 0 on the line; 1, 2 … rows outwards. */
  row: number;
}

const ROW_MM = 3.9;
const LABEL_HEIGHT_MM = 3.6;
const TICK_MM = 1.3;

const styleOf = (chain: Pick<Chain, 'quiet'>): TextStyle => ({
  size: 9,
  weight: chain.quiet ? 400 : 600,
  align: 'center',
});

/** How far beyond its line a chain needs paper, on its outward side. */
export function chainDepth(sheet: Sheet, chain: Chain): number {
  const rows = Math.max(0, ...place(sheet, chain).map(({ row }) => row));
  return (
    standOff(sheet, chain, rows) +
    (chain.direction === 'level' ? LABEL_HEIGHT_MM : chainWidth(sheet, chain)) / 2
  );
}

/** A run of dimensions: ticks at every stop, each label in its space or, where it has no room, beside the line. */
export function drawChain(sheet: Sheet, chain: Chain): void {
  const { stops, at, direction, outwards, quiet } = chain;
  const first = stops[0];
  const last = stops.at(-1);
  if (first === undefined || last === undefined) return;
  const level = direction === 'level';
  const pen = quiet ? PEN.hair : PEN.fine;
  const stroke = (a1: number, c1: number, a2: number, c2: number, width: number) =>
    level ? sheet.line(a1, c1, a2, c2, { pen: width }) : sheet.line(c1, a1, c2, a2, { pen: width });
  stroke(first, at, last, at, pen);
  for (const stop of stops) stroke(stop, at - TICK_MM, stop, at + TICK_MM, pen);
  for (const { label, middle, row } of place(sheet, chain)) {
    const across = at + outwards * standOff(sheet, chain, row);
    if (row > 0) stroke(middle, at, middle, across, PEN.hair);
    if (level) sheet.flag(label, middle, across + 1.15, styleOf(chain));
    else sheet.flag(label, across, middle + 1.15, styleOf(chain));
  }
}

/** Distance of a row of labels from the line. */
function standOff(sheet: Sheet, chain: Chain, row: number): number {
  if (row === 0) return 0;
  if (chain.direction === 'level') return row * ROW_MM;
  const width = chainWidth(sheet, chain);
  return width / 2 + 2 + (row - 1) * (width + 1.2);
}

/** Width of the widest label of a chain. */
export function chainWidth(sheet: Sheet, chain: Omit<Chain, 'at'>): number {
  return Math.max(...chain.labels.map((label) => sheet.textWidth(label, styleOf(chain))));
}

function place(sheet: Sheet, chain: Chain): Placed[] {
  const extent = (label: string) =>
    chain.direction === 'level' ? sheet.textWidth(label, styleOf(chain)) + 1 : LABEL_HEIGHT_MM;
  const taken: [number, number][][] = [];
  return gather(chain, extent).map(({ label, from, to }) => {
    const middle = (from + to) / 2;
    const size = extent(label);
    if (size + 0.6 <= to - from) return { label, middle, row: 0 };
    let row = 1;
    const low = middle - size / 2;
    const high = middle + size / 2;
    while ((taken[row] ?? []).some(([a, b]) => low < b && high > a)) row += 1;
    (taken[row] ??= []).push([low, high]);
    return { label, middle, row };
  });
}

/** Equal neighbours that have no room of their own share one label: "5 × 9¾". */
function gather(chain: Chain, extent: (label: string) => number) {
  const groups: { label: string; from: number; to: number; count: number; each: string }[] = [];
  chain.labels.forEach((label, index) => {
    const from = chain.stops[index] ?? 0;
    const to = chain.stops[index + 1] ?? from;
    const last = groups.at(-1);
    const cramped = extent(label) + 0.6 > to - from;
    if (last && cramped && last.each === label) {
      last.to = to;
      last.count += 1;
      last.label = `${last.count} × ${label}`;
    } else groups.push({ label, from, to, count: 1, each: label });
  });
  return groups;
}
