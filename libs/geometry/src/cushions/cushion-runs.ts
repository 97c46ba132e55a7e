import { benchLayout } from '../pieces/bench-layout.ts';
import type { PieceOf, SetDocument } from '../room/document.ts';
import { boardLines } from './board-lines.ts';

/** A piece that carries cushions. */
export type CushionedPiece = PieceOf<'bench'> | PieceOf<'loose-seat'>;

/** One cushion's stretch of its piece, along the piece's x axis, before any fitting gap. */
export interface CushionRun {
  /** `${pieceId}/${kind}-${n}`; the n-th from the left as seen from in front. */
  key: string;
  piece: CushionedPiece;
  kind: 'seat' | 'back';
  /** Counted from 0, from the left as seen from in front. */
  index: number;
  count: number;
  leftMm: number;
  rightMm: number;
}

/**
 * Divides a run into equal stretches no longer than a limit; a division goes to the nearest board joint
 * when that keeps both neighbours within the limit.
 *
 * @param leftMm - start of the run
 * @param rightMm - end of the run, greater than `leftMm`
 * @param longestMm - longest stretch allowed, > 0
 * @param jointsMm - preferred places for a division
 * @returns the ends of the stretches, rising, both ends of the run included
 */
export function divideRun(
  leftMm: number,
  rightMm: number,
  longestMm: number,
  jointsMm: readonly number[],
): number[] {
  const length = rightMm - leftMm;
  const count = Math.max(1, Math.ceil(length / longestMm - 1e-9));
  const ends = [leftMm];
  for (let i = 1; i < count; i += 1) {
    const even = leftMm + (length * i) / count;
    const before = ends[ends.length - 1]!;
    const stretchesAfter = count - i;
    const fitting = jointsMm.filter(
      (joint) =>
        joint > before + 1 &&
        joint - before <= longestMm + 1e-6 &&
        rightMm - joint <= stretchesAfter * longestMm + 1e-6,
    );
    const nearest = fitting.sort((a, b) => Math.abs(a - even) - Math.abs(b - even))[0];
    ends.push(nearest !== undefined && Math.abs(nearest - even) < length / count / 4 ? nearest : even);
  }
  return [...ends, rightMm];
}

/**
 * The cushions of one piece.
 *
 * @param piece - a bench or loose seat
 * @returns seats from the left, then backs from the left; none where the cushion is 0 thick
 */
export function cushionRuns(piece: CushionedPiece): CushionRun[] {
  if (piece.kind === 'loose-seat') {
    if (piece.seatCushion.thicknessMm <= 0) return [];
    const half = piece.widthMm / 2;
    return [
      { key: `${piece.id}/seat-1`, piece, kind: 'seat', index: 0, count: 1, leftMm: -half, rightMm: half },
    ];
  }
  const layout = benchLayout(piece);
  const { jointsMm } = boardLines(piece);
  const ends = divideRun(
    layout.cushionLeftMm,
    layout.cushionRightMm,
    piece.upholstery.longestCushionMm,
    layout.hasBack ? jointsMm : [],
  );
  const count = ends.length - 1;
  const runs = (kind: 'seat' | 'back'): CushionRun[] =>
    Array.from({ length: count }, (_, index) => ({
      key: `${piece.id}/${kind}-${index + 1}`,
      piece,
      kind,
      index,
      count,
      leftMm: ends[index]!,
      rightMm: ends[index + 1]!,
    }));
  return [
    ...(piece.seatCushion.thicknessMm > 0 ? runs('seat') : []),
    ...(layout.hasBack && piece.backCushion.thicknessMm > 0 ? runs('back') : []),
  ];
}

/**
 * The cushions of a set in the order of their marks: all seats in the order of the pieces, then all backs.
 *
 * @param document - the set
 */
export function cushionRunsOf(document: SetDocument): CushionRun[] {
  const all = document.pieces.flatMap((piece) =>
    piece.kind === 'bench' || piece.kind === 'loose-seat' ? cushionRuns(piece) : [],
  );
  return [...all.filter(({ kind }) => kind === 'seat'), ...all.filter(({ kind }) => kind === 'back')];
}
