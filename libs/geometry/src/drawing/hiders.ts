import type { Vec3 } from '../parts/part.ts';
import type { ConvexSolid } from './view-solid.ts';

type Bounds = Pick<ConvexSolid, 'min' | 'max'>;

/** Gives what may hide something between two corners of a box. */
export type Hiders = (from: Vec3, to: Vec3) => ConvexSolid[];

const least = (a: Vec3, b: Vec3): Vec3 => [Math.min(a[0], b[0]), Math.min(a[1], b[1]), Math.min(a[2], b[2])];
const most = (a: Vec3, b: Vec3): Vec3 => [Math.max(a[0], b[0]), Math.max(a[1], b[1]), Math.max(a[2], b[2])];
const sizeOf = ({ min, max }: Bounds): number => (max[0] - min[0]) * (max[1] - min[1]);

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
  return (from, to) => {
    const [low, high] = [least(from, to), most(from, to)];
    const near = ({ min, max }: Bounds): boolean =>
      max[2] >= low[2] && min[0] <= high[0] && max[0] >= low[0] && min[1] <= high[1] && max[1] >= low[1];
    return all.filter(near).flatMap((group) => group.solids.filter(near));
  };
}
