import { normalTurnDeg, toPiece } from '../parts/placement.ts';
import type { Rectangle } from '../parts/rectangles.ts';
import type { Piece, PieceOf } from '../room/document.ts';
import { windowHole } from './sill.ts';

/** A sill belongs to a wall when its rear edge lies this near the wall's face. */
const SILL_TO_WALL_MM = 60;
const SILL_TO_WALL_DEG = 3;
/** A window that stands out of its wall by less than this is flush with its edge, millimetres. */
const FLUSH_MM = 0.01;

/**
 * The hole that a sill's window needs in a wall, frame included.
 *
 * @param wall - the wall
 * @param sill - any sill of the set
 * @returns x along the wall from its middle, y above the floor; undefined where the sill does not stand at the face of
 *   this wall, or has no window
 */
export function holeInWall(wall: PieceOf<'bulkhead'>, sill: PieceOf<'sill'>): Rectangle | undefined {
  const hole = windowHole(sill);
  const x = alongFace(wall, sill);
  return hole && x !== undefined ? { ...hole, x0: hole.x0 + x, x1: hole.x1 + x } : undefined;
}

/** Middle of a sill along a wall; undefined where it does not stand at the wall's face. */
function alongFace(wall: PieceOf<'bulkhead'>, sill: PieceOf<'sill'>): number | undefined {
  const [x, , z] = toPiece(wall.at, [sill.at.xMm, 0, sill.at.zMm]);
  const turned = Math.abs(normalTurnDeg(sill.at.turnDeg - wall.at.turnDeg));
  return Math.abs(z) > SILL_TO_WALL_MM || turned > SILL_TO_WALL_DEG ? undefined : x;
}

/**
 * Whether two pieces are a sill and the wall that holds its window, or would hold one.
 *
 * @param one - any piece
 * @param other - any piece
 * @returns true for a sill whose middle stands at the face of a wall, in either order
 */
export function standsInWall(one: Piece, other: Piece): boolean {
  const pair = wallAndSill(one, other);
  const x = pair && alongFace(...pair);
  return pair !== undefined && x !== undefined && Math.abs(x) < pair[0].lengthMm / 2;
}

/**
 * Whether a window reaches beyond the edges of its wall.
 *
 * @param one - a wall or a sill at its face
 * @param other - the other of the two
 * @returns true when the wall no longer surrounds the window's frame
 */
export function windowLeavesWall(one: Piece, other: Piece): boolean {
  const pair = wallAndSill(one, other);
  const hole = pair && holeInWall(...pair);
  if (pair === undefined || hole === undefined) return false;
  const [wall] = pair;
  const half = wall.lengthMm / 2;
  return Math.max(-half - hole.x0, hole.x1 - half, hole.y1 - wall.heightMm) > FLUSH_MM;
}

function wallAndSill(one: Piece, other: Piece): [PieceOf<'bulkhead'>, PieceOf<'sill'>] | undefined {
  if (one.kind === 'bulkhead' && other.kind === 'sill') return [one, other];
  if (one.kind === 'sill' && other.kind === 'bulkhead') return [other, one];
  return undefined;
}
