import { toRoom } from '../parts/placement.ts';
import { pieceEnvelope } from '../pieces/kinds.ts';
import type { Piece } from './document.ts';

/** What a piece covers on the floor. */
export interface Footprint {
  /** Limits in the piece's own frame. */
  x0: number;
  x1: number;
  z0: number;
  z1: number;
  /** Corners in the room, x and z, anticlockwise seen from above. */
  corners: readonly (readonly [number, number])[];
}

const kept = new WeakMap<Piece, Footprint>();

/**
 * The rectangle a piece covers, seen from above.
 *
 * @param piece - any piece, not changed afterwards; a beam covers what lies below it
 * @returns limits in its own frame and corners in the room, millimetres
 */
export function footprint(piece: Piece): Footprint {
  const known = kept.get(piece);
  if (known) return known;
  const { minMm, maxMm } = pieceEnvelope(piece);
  const [x0, , z0] = minMm;
  const [x1, , z1] = maxMm;
  const corner = (x: number, z: number) => {
    const [rx, , rz] = toRoom(piece.at, [x, 0, z]);
    return [rx, rz] as const;
  };
  const made: Footprint = {
    x0,
    x1,
    z0,
    z1,
    corners: [corner(x0, z1), corner(x1, z1), corner(x1, z0), corner(x0, z0)],
  };
  kept.set(piece, made);
  return made;
}
