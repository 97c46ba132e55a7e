import { partPieces, type PartPiece } from '../drawing/part-pieces.ts';
import type { Part, Vec3 } from '../parts/part.ts';

interface Directions {
  edges: readonly Vec3[];
  normals: readonly Vec3[];
}

/** A part, or a piece of a hollow one, as a convex solid in the room, with the directions that may part it from another. */
export interface ConvexPart {
  corners: readonly Vec3[];
  /** Unit vectors along its edges and square to its faces, none twice; worked out when first asked for. */
  directions: () => Directions;
  minMm: Vec3;
  maxMm: Vec3;
}

const dot = (a: Vec3, b: Vec3): number => a[0] * b[0] + a[1] * b[1] + a[2] * b[2];
const cross = (a: Vec3, b: Vec3): Vec3 => [
  a[1] * b[2] - a[2] * b[1],
  a[2] * b[0] - a[0] * b[2],
  a[0] * b[1] - a[1] * b[0],
];

function unit(vector: Vec3): Vec3 | undefined {
  const length = Math.hypot(...vector);
  return length < 1e-9 ? undefined : [vector[0] / length, vector[1] / length, vector[2] / length];
}

/** Directions without those that run along one that is there already. */
function unlike(vectors: readonly Vec3[]): Vec3[] {
  const kept: Vec3[] = [];
  for (const vector of vectors) {
    const one = unit(vector);
    if (one !== undefined && kept.every((other) => Math.abs(dot(one, other)) < 1 - 1e-12)) kept.push(one);
  }
  return kept;
}

/**
 * Prepares a part for being tested against others.
 *
 * @param part - a placed part; a hollow prism is taken in convex pieces, a cylinder with 24 sides
 * @returns solids in the room, millimetres
 */
export function convexParts(part: Part): ConvexPart[] {
  return partPieces(part).map(convexPiece);
}

function convexPiece({ corners, edges }: PartPiece): ConvexPart {
  const axis = (n: 0 | 1 | 2) => corners.map((corner) => corner[n]);
  let known: Directions | undefined;
  return {
    corners,
    directions: () => (known ??= directionsOf(corners, edges)),
    minMm: [Math.min(...axis(0)), Math.min(...axis(1)), Math.min(...axis(2))],
    maxMm: [Math.max(...axis(0)), Math.max(...axis(1)), Math.max(...axis(2))],
  };
}

/** The corners are two like loops, one over the other: one loop and what leads across say all. */
function directionsOf(corners: readonly Vec3[], edges: readonly (readonly [number, number])[]): Directions {
  const half = corners.length / 2;
  const between = (from: number, to: number): Vec3 => {
    const [a, b] = [corners[from] ?? [0, 0, 0], corners[to] ?? [0, 0, 0]];
    return [b[0] - a[0], b[1] - a[1], b[2] - a[2]];
  };
  const across = between(0, half);
  const loop = unlike(
    edges.filter(([from, to]) => from < half && to < half).map(([from, to]) => between(from, to)),
  );
  return {
    edges: unlike([across, ...loop]),
    normals: unlike([across, ...loop.map((side) => cross(side, across))]),
  };
}

/**
 * Whether two boxes with upright sides share more than a margin.
 *
 * @param one - lowest and highest corner
 * @param other - lowest and highest corner
 * @param byMm - what may be shared in every direction, millimetres
 * @returns false as soon as they share no more than the margin along one axis
 */
export function boxesMeet(
  one: Pick<ConvexPart, 'minMm' | 'maxMm'>,
  other: Pick<ConvexPart, 'minMm' | 'maxMm'>,
  byMm: number,
): boolean {
  return ([0, 1, 2] as const).every(
    (axis) =>
      Math.min(one.maxMm[axis], other.maxMm[axis]) - Math.max(one.minMm[axis], other.minMm[axis]) > byMm,
  );
}

/**
 * Whether two parts reach into each other further than a margin, by separating axes.
 *
 * @param one - a part
 * @param other - another part
 * @param byMm - parts that share no more than this only touch, millimetres
 * @returns true when no direction parts them
 */
export function reachIntoEachOther(one: ConvexPart, other: ConvexPart, byMm: number): boolean {
  if (!boxesMeet(one, other, byMm)) return false;
  const partedAlong = (axis: Vec3): boolean => {
    const [a0, a1] = span(one.corners, axis);
    const [b0, b1] = span(other.corners, axis);
    return Math.min(a1, b1) - Math.max(a0, b0) <= byMm;
  };
  const [ours, theirs] = [one.directions(), other.directions()];
  if (ours.normals.some(partedAlong) || theirs.normals.some(partedAlong)) return false;
  return !ours.edges.some((a) =>
    theirs.edges.some((b) => {
      const axis = unit(cross(a, b));
      return axis !== undefined && partedAlong(axis);
    }),
  );
}

function span(corners: readonly Vec3[], axis: Vec3): [number, number] {
  let [low, high] = [Infinity, -Infinity];
  for (const corner of corners) {
    const at = dot(corner, axis);
    if (at < low) low = at;
    if (at > high) high = at;
  }
  return [low, high];
}
