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

/** The names that can be read: one that would lie on another is left to the list. */
export function clearOfEachOther<T extends PlacedName>(names: readonly T[]): Set<T> {
  const kept = new Set<T>();
  for (const one of [...names].sort((a, b) => Number(b.first) - Number(a.first))) {
    const meets = [...kept].some(
      (other) =>
        Math.abs(one.x - other.x) < ((one.letters + other.letters) / 2) * LETTER_PX &&
        Math.abs(one.y - other.y) < LINE_PX,
    );
    if (!meets) kept.add(one);
  }
  return kept;
}
