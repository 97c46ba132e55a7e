import type { Part } from '@settlewright/geometry';
import { Floats } from './floats';
import type { SeatPrint } from './seat-print';
import { eachSolidList, SOLID_LISTS, type SolidArrays } from './solid-arrays';
import { addParts } from './solids';

/** Triangles and edges of a piece as they go to the card. */
export type PackedSolids = Record<keyof SolidArrays, Float32Array>;

/** Where solids are made; emptied for the next piece. */
const workbench = eachSolidList(() => new Floats());

const eachList = (of: (list: keyof SolidArrays) => Float32Array): PackedSolids =>
  Object.fromEntries(SOLID_LISTS.map((list) => [list, of(list)])) as PackedSolids;

const kept = new WeakMap<readonly Part[], { prints: readonly SeatPrint[]; made: PackedSolids }>();

/**
 * Triangles and edges of one piece, made once for its parts and for those who sit on it: a piece that did not change,
 * under the same sitters, gives the very same lists.
 */
export function solidsOf(parts: readonly Part[], prints: readonly SeatPrint[] = []): PackedSolids {
  const known = kept.get(parts);
  if (known?.prints.length === prints.length && prints.every((print, n) => print === known.prints[n])) {
    return known.made;
  }
  for (const list of SOLID_LISTS) workbench[list].clear();
  addParts(workbench, parts, () => prints);
  const made = eachList((list) => workbench[list].slice(0));
  kept.set(parts, { prints, made });
  return made;
}

/** The solids of several pieces in one. */
export function joinSolids(pieces: readonly PackedSolids[]): PackedSolids {
  const [only] = pieces;
  if (only && pieces.length === 1) return only;
  return eachList((list) => {
    const joined = new Float32Array(pieces.reduce((length, piece) => length + piece[list].length, 0));
    let start = 0;
    for (const piece of pieces) {
      joined.set(piece[list], start);
      start += piece[list].length;
    }
    return joined;
  });
}
