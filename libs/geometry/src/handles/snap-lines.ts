import { boardRun, snapToBoards } from '../parts/boards.ts';
import { toPiece } from '../parts/placement.ts';
import { benchLayout } from '../pieces/bench-layout.ts';
import { unpressedSeatTopMm } from '../pieces/seat-sink.ts';
import { pieceEnvelope } from '../pieces/kinds.ts';
import { footprint } from '../room/footprint.ts';
import type { Piece, PieceOf, SetDocument } from '../room/document.ts';
import type { Handle } from './handle.ts';

/** A value that lines a handle up with something, and what that is. */
export interface SnapLine {
  value: number;
  words: string;
}

/** Only pieces this near to the handle are looked at, millimetres. */
const NEARBY_MM = 2000;
/** A wall this far behind a piece still gives it its board lines, millimetres. */
const BEHIND_MM = 900;
/** Cosine of half a degree: pieces turned more than this against the pull have no face across it. */
const SQUARE = 0.99996;

/**
 * Values at which a pulled handle lies in line with a face or an edge of another piece.
 *
 * @param document - the set as it was before the pull
 * @param handle - the handle as it was before the pull
 * @returns values in millimetres with words such as "end of B2"; none for an angle
 */
export function faceLines(document: SetDocument, handle: Handle): SnapLine[] {
  if (handle.kind === 'angle') return [];
  return document.pieces
    .filter(({ id }) => id !== handle.pieceId)
    .filter((piece) => distanceTo(piece, handle) <= NEARBY_MM)
    .flatMap((piece) => (isUpright(handle) ? heightLines(piece, handle) : levelLines(piece, handle)));
}

const isUpright = ({ along }: Handle): boolean => Math.abs(along[1]) > SQUARE;

function distanceTo(piece: Piece, { atMm }: Handle): number {
  const [x, , z] = toPiece(piece.at, atMm);
  const { x0, x1, z0, z1 } = footprint(piece);
  return Math.hypot(Math.max(x0 - x, 0, x - x1), Math.max(z0 - z, 0, z - z1));
}

function heightLines(piece: Piece, handle: Handle): SnapLine[] {
  const at = (yMm: number, words: string) => lineAt(handle, (yMm - handle.atMm[1]) * handle.along[1], words);
  const { minMm, maxMm } = pieceEnvelope(piece);
  const lines = [at(maxMm[1], `top of ${piece.mark}`)];
  if (minMm[1] > 1) lines.push(at(minMm[1], `underside of ${piece.mark}`));
  if (piece.kind === 'bench') {
    lines.push(at(benchLayout(piece).seatTopFrontMm, `seat of ${piece.mark}`));
  } else if (piece.kind === 'loose-seat') {
    lines.push(at(unpressedSeatTopMm(piece), `seat of ${piece.mark}`));
  } else if (piece.kind === 'table') {
    lines.push(at(piece.heightMm - piece.topThicknessMm, `underside of ${piece.mark}`));
  } else if (piece.kind === 'sill') {
    lines.push(at(piece.heightMm, `sill of ${piece.mark}`));
  }
  return lines;
}

function levelLines(piece: Piece, handle: Handle): SnapLine[] {
  const [x, , z] = toPiece(piece.at, handle.atMm);
  const [dx, , dz] = toPiece({ ...piece.at, xMm: 0, zMm: 0 }, handle.along);
  const { x0, x1, z0, z1 } = footprint(piece);
  if (Math.abs(dx) > SQUARE) {
    return [x0, x1].map((end) => lineAt(handle, (end - x) * dx, `end of ${piece.mark}`));
  }
  if (Math.abs(dz) < SQUARE) return [];
  const front = piece.kind === 'bench' ? benchLayout(piece).frontZMm : z1;
  const face = piece.kind === 'bulkhead' ? 'face' : 'front';
  return [
    lineAt(handle, (front - z) * dz, `${face} of ${piece.mark}`),
    lineAt(handle, (z0 - z) * dz, `back of ${piece.mark}`),
  ];
}

const lineAt = (handle: Handle, wayMm: number, words: string): SnapLine => ({
  value: handle.value + wayMm * handle.perMm,
  words,
});

/**
 * Values at which a pulled handle lies on a joint between two boards of the wall behind it, or at which a wall or a
 * back of boards takes whole boards only.
 *
 * @param document - the set as it was before the pull
 * @param handle - the handle as it was before the pull
 * @param near - about where a value is wanted, millimetres
 * @returns values in millimetres with words such as "board line of W1", "9 whole boards"
 */
export function boardValues(document: SetDocument, handle: Handle, near: number): SnapLine[] {
  if (handle.kind === 'angle') return [];
  const piece = document.pieces.find(({ id }) => id === handle.pieceId);
  if (!piece) return [];
  const own = wholeBoards(piece, handle, near);
  const wall = piece.kind === 'bulkhead' ? undefined : wallBehind(document, piece);
  if (!wall) return own;
  const upright = wall.boardDirection === 'vertical';
  const [x] = toPiece(wall.at, handle.atMm);
  const [dx] = toPiece({ ...wall.at, xMm: 0, zMm: 0 }, handle.along);
  if (upright ? Math.abs(dx) < SQUARE : !isUpright(handle)) return own;
  const run = boardRun(upright ? wall.lengthMm : wall.heightMm, wall.boards);
  const joints = run.slice(1).map(({ centreMm, widthMm }) => {
    const joint = centreMm - widthMm / 2;
    const way = upright ? (joint - x) * dx : (joint + wall.heightMm / 2 - handle.atMm[1]) * handle.along[1];
    return lineAt(handle, way, `board line of ${wall.mark}`);
  });
  return [...joints, ...own];
}

function wholeBoards(piece: Piece, { key }: Handle, near: number): SnapLine[] {
  const along =
    piece.kind === 'bulkhead' && key === (piece.boardDirection === 'vertical' ? 'lengthMm' : 'heightMm');
  const onBack = piece.kind === 'bench' && key === 'lengthMm' && piece.backHeightMm > 0;
  if (!along && !onBack) return [];
  const { innerLeftMm = 0, innerRightMm = 0 } = piece.kind === 'bench' ? benchLayout(piece) : {};
  const endsMm = piece.kind === 'bench' ? piece.lengthMm - (innerRightMm - innerLeftMm) : 0;
  const { lengthMm, boards } = snapToBoards(near - endsMm, piece.boards);
  return [{ value: lengthMm + endsMm, words: `${boards} whole ${boards === 1 ? 'board' : 'boards'}` }];
}

/** The nearest wall that a piece stands before, with its back or an end to it. */
function wallBehind(document: SetDocument, piece: Piece): PieceOf<'bulkhead'> | undefined {
  const { corners } = footprint(piece);
  const walls = document.pieces.flatMap((wall) => {
    if (wall.kind !== 'bulkhead') return [];
    const points = corners.map(([x, z]) => toPiece(wall.at, [x, 0, z]));
    const away = Math.min(...points.map(([, , z]) => z));
    const beside =
      points.every(([x]) => x < -wall.lengthMm / 2) || points.every(([x]) => x > wall.lengthMm / 2);
    return beside || away < -wall.thicknessMm || away > BEHIND_MM ? [] : [{ wall, away }];
  });
  return walls.sort((a, b) => a.away - b.away)[0]?.wall;
}
