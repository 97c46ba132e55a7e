import type { Part, Vec3 } from '../parts/part.ts';
import { convexPieces } from './convex-pieces.ts';
import { partEdges } from './solid-outline.ts';

/** A convex solid in the room: two like loops of corners, one after the other, and its edges as pairs of corners. */
export interface PartPiece {
  corners: Vec3[];
  edges: [number, number][];
}

/**
 * A part as convex solids: itself, or pieces of a hollow prism.
 *
 * @param part - placed in the room
 * @returns pieces that touch and together fill the part; a round one has 24 sides
 */
export function partPieces(part: Part): PartPiece[] {
  const whole = partEdges(part);
  if (part.solid.shape !== 'prism') return [whole];
  const pieces = convexPieces(part.solid.outlineMm);
  if (pieces.length === 1) return [whole];
  const half = whole.corners.length / 2;
  return pieces.map((piece) => {
    const n = piece.length;
    return {
      corners: [...piece, ...piece.map((i) => i + half)].map((i) => whole.corners[i]!),
      edges: piece.flatMap((_, i): [number, number][] => [
        [i, (i + 1) % n],
        [n + i, n + ((i + 1) % n)],
        [i, n + i],
      ]),
    };
  });
}
