import type { Part } from '@settlewright/geometry';
import type { SeatPrint } from './seat-print';
import { createSink, listsOf, packSink, type PackedSolids } from './solid-arrays';
import { addParts } from './solids';

/** Where solids are made; emptied for the next piece. */
const workbench = createSink();

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
  for (const list of listsOf(workbench)) list.clear();
  addParts(workbench, parts, () => prints);
  const made = packSink(workbench);
  kept.set(parts, { prints, made });
  return made;
}

type Floating = Exclude<keyof PackedSolids, 'indices' | 'roundIndices'>;

/** The solids of several pieces in one. */
export function joinSolids(pieces: readonly PackedSolids[]): PackedSolids {
  const [only] = pieces;
  if (only && pieces.length === 1) return only;
  const count = (list: keyof PackedSolids) =>
    pieces.reduce((length, piece) => length + piece[list].length, 0);
  const joined = (list: Floating) => {
    const all = new Float32Array(count(list));
    let start = 0;
    for (const piece of pieces) {
      all.set(piece[list], start);
      start += piece[list].length;
    }
    return all;
  };
  /** Points of a piece are numbered on from those of the pieces before it. */
  const numbered = (list: 'indices' | 'roundIndices') => {
    const all = new Uint32Array(count(list));
    let [start, first] = [0, 0];
    for (const { [list]: own, materials } of pieces) {
      for (let n = 0; n < own.length; n++) all[start + n] = own[n]! + first;
      start += own.length;
      first += materials.length;
    }
    return all;
  };
  return {
    positions: joined('positions'),
    normals: joined('normals'),
    materials: joined('materials'),
    grains: joined('grains'),
    indices: numbered('indices'),
    roundIndices: numbered('roundIndices'),
    edges: joined('edges'),
    edgeWeights: joined('edgeWeights'),
  };
}
