import { boxAt, meet, type Box } from '../overlay/box.ts';

/** A name in the drawing: its middle in pixels, how long it is, and whether it goes before others. */
export interface PlacedName {
  x: number;
  y: number;
  letters: number;
  /** What is blocked is named before what is free. */
  first: boolean;
}

/** Breadth of a letter and height of a line at the size the names are written in, with a little air. */
const LETTER_PX = 6;
const LINE_PX = 15;

/** The names that can be read: one that would lie on another, or under a label, is left to the list. */
export function clearOfEachOther<T extends PlacedName>(names: readonly T[], labels: readonly Box[]): Set<T> {
  const kept = new Set<T>();
  const taken = [...labels];
  for (const one of [...names].sort((a, b) => Number(b.first) - Number(a.first))) {
    const box = boxAt(one.x, one.y, one.letters * LETTER_PX, LINE_PX);
    if (taken.some((other) => meet(box, other, 0))) continue;
    kept.add(one);
    taken.push(box);
  }
  return kept;
}
