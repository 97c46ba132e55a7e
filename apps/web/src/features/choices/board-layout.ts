import { MM_PER_INCH } from '@settlewright/geometry';
import type { Dimension } from '@settlewright/geometry';

/** Places of the parts of a story stick, in pixels. */
export interface BoardLayout {
  /** Without room for columns: names stand above their laths. */
  narrow: boolean;
  width: number;
  height: number;
  left: number;
  right: number;
  curveTop: number;
  /** Foot of the curve, and top of the first row. */
  rowsTop: number;
  rowHeight: number;
  bandsTop: number;
  tapeTop: number;
  tapeBottom: number;
  /** Columns of the verdicts at the two values. */
  nowX: number;
  thenX: number;
  x: (value: number) => number;
  valueAt: (x: number) => number;
}

export const BAND_HEIGHT = 26;
const TAPE = 50;
const BOB = 38;
const NARROW = 620;

/** Lays a stick out for a width. */
export function boardLayout(input: {
  width: number;
  rows: number;
  bands: number;
  min: number;
  max: number;
}): BoardLayout {
  const { width, rows, bands, min, max } = input;
  const narrow = width < NARROW;
  const left = narrow ? 0.75 : 178;
  const right = narrow ? width - 0.75 : width - 326;
  // Two lines of words stand over the curve where it is narrow.
  const curveTop = narrow ? 46 : 30;
  const rowsTop = curveTop + (narrow ? 130 : 174);
  const rowHeight = narrow ? 62 : 52;
  const bandsTop = rowsTop + rows * rowHeight + 8;
  const tapeTop = bandsTop + bands * BAND_HEIGHT + 4;
  const across = Math.max(right - left, 1) / Math.max(max - min, 1e-6);
  return {
    narrow,
    width,
    height: tapeTop + TAPE + BOB,
    left,
    right,
    curveTop,
    rowsTop,
    rowHeight,
    bandsTop,
    tapeTop,
    tapeBottom: tapeTop + TAPE,
    nowX: right + 76,
    thenX: right + 206,
    x: (value) => left + (value - min) * across,
    valueAt: (x) => min + (x - left) / across,
  };
}

/** One tick of the tape. */
export interface Tick {
  value: number;
  size: 'long' | 'middle' | 'short';
  label?: string;
}

function ticks(
  min: number,
  max: number,
  { small, every, label }: { small: number; every: number; label: (n: number) => string },
): Tick[] {
  const found: Tick[] = [];
  for (let n = Math.ceil(min / small - 1e-6); n * small <= max + 1e-6; n += 1) {
    const isLong = n % every === 0;
    const size = isLong ? 'long' : n % (every / 2) === 0 ? 'middle' : 'short';
    found.push({ value: n * small, size, ...(isLong ? { label: label(n * small) } : {}) });
  }
  return found;
}

/** The two edges of the tape: inches above and millimetres below, or one scale for angles and firmness. */
export function tapeTicks(
  unit: Dimension['unit'],
  { left, right, valueAt }: Pick<BoardLayout, 'left' | 'right' | 'valueAt'>,
): { upper: Tick[]; lower: Tick[] } {
  const [min, max] = [valueAt(left), valueAt(right)];
  const per = (right - left) / (max - min);
  if (unit !== 'mm') {
    const base = unit === 'deg' ? 1 : 10;
    const every = [2, 5, 10, 20].find((times) => base * times * per >= 34) ?? 40;
    const mark = unit === 'deg' ? '°' : '\u202fN';
    const label = (n: number) => `${Math.round(n)}${mark}`;
    return {
      upper: ticks(min, max, { small: base, every: every % 2 ? every * 2 : every, label }),
      lower: [],
    };
  }
  const inch = per * MM_PER_INCH;
  const inches = [1, 2, 4, 6, 12].find((times) => inch * times >= 26) ?? 24;
  const quarters = inch >= 26 ? 4 : 2;
  const mm = [50, 100, 200, 500].find((step) => per * step >= 70) ?? 1000;
  return {
    upper: ticks(min, max, {
      small: MM_PER_INCH / quarters,
      every: inches * quarters,
      label: (value) => String(Math.round(value / MM_PER_INCH)),
    }),
    lower: ticks(min, max, { small: mm / 5, every: 5, label: (value) => `${Math.round(value)} mm` }),
  };
}

/** Width of a letter on the stick, on the safe side. */
export const LETTER = 7.9;

/** A name and the words behind it, as far as they have room: the words go first, then letters of the name. */
export function fittingName(name: string, aside: string, room: number): { first: string; rest: string } {
  const letters = Math.floor(room / LETTER);
  if (name.length + 1 + aside.length <= letters) return { first: name, rest: aside };
  return { first: name.length <= letters ? name : `${name.slice(0, Math.max(1, letters - 1))}…`, rest: '' };
}

/** Where verdicts stand over the laths of a narrow stick: all of the longest has room. */
export const verdictsX = (width: number, letters: number): number =>
  Math.max(0, Math.min(width * 0.52, width - MARK - letters * LETTER));

/** The mark of a verdict and the gap behind it. */
export const MARK = 31;
