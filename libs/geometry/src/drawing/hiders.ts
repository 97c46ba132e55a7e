import type { Vec3 } from '../parts/part.ts';
import { TOUCHING_MM } from './hidden-stretches.ts';
import type { ConvexSolid } from './view-solid.ts';

type Bounds = Pick<ConvexSolid, 'min' | 'max'>;

/** Gives one by one what may hide something between two corners of a box, so that a search may stop at any. */
export type Hiders = (from: Vec3, to: Vec3) => Iterable<ConvexSolid>;

const least = (a: Vec3, b: Vec3): Vec3 => [Math.min(a[0], b[0]), Math.min(a[1], b[1]), Math.min(a[2], b[2])];
const most = (a: Vec3, b: Vec3): Vec3 => [Math.max(a[0], b[0]), Math.max(a[1], b[1]), Math.max(a[2], b[2])];
const sizeOf = ({ min, max }: Bounds): number => (max[0] - min[0]) * (max[1] - min[1]);

/**
 * Left, right, top, bottom and nearest of each box, one after another: thousands are read for every edge. What only
 * touches hides nothing, so the boxes are smaller by that.
 */
const BOX = 5;
function flatBoxes(boxes: readonly Bounds[]): Float64Array {
  const flat = new Float64Array(boxes.length * BOX);
  boxes.forEach(({ min, max }, n) =>
    flat.set(
      [
        min[0] + TOUCHING_MM,
        max[0] - TOUCHING_MM,
        min[1] + TOUCHING_MM,
        max[1] - TOUCHING_MM,
        max[2] - TOUCHING_MM,
      ],
      n * BOX,
    ),
  );
  return flat;
}

/**
 * Sorts what hides by piece, so that an edge is held against the pieces before it alone, the large ones first.
 *
 * @param solids - all there are in a view, each with its piece
 * @returns a search among them
 */
export function hidersOf(solids: readonly (readonly [pieceId: string, solid: ConvexSolid])[]): Hiders {
  const groups = new Map<string, Bounds & { solids: ConvexSolid[] }>();
  for (const [pieceId, solid] of solids) {
    const group = groups.get(pieceId) ?? { min: solid.min, max: solid.max, solids: [] };
    group.min = least(group.min, solid.min);
    group.max = most(group.max, solid.max);
    group.solids.push(solid);
    groups.set(pieceId, group);
  }
  const all = [...groups.values()].sort((a, b) => sizeOf(b) - sizeOf(a));
  for (const group of all) group.solids.sort((a, b) => sizeOf(b) - sizeOf(a));
  const pieceBoxes = flatBoxes(all);
  const solidBoxes = all.map((group) => flatBoxes(group.solids));
  return function* (from, to) {
    const [low, high] = [least(from, to), most(from, to)];
    const isNear = (boxes: Float64Array, at: number): boolean =>
      boxes[at + 4]! >= low[2] &&
      boxes[at]! <= high[0] &&
      boxes[at + 1]! >= low[0] &&
      boxes[at + 2]! <= high[1] &&
      boxes[at + 3]! >= low[1];
    for (let n = 0; n < all.length; n += 1) {
      if (!isNear(pieceBoxes, n * BOX)) continue;
      const [own, boxes] = [all[n]!.solids, solidBoxes[n]!];
      for (let k = 0; k < own.length; k += 1) if (isNear(boxes, k * BOX)) yield own[k]!;
    }
  };
}
