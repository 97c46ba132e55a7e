import { benchLayout } from '../pieces/bench-layout.ts';
import type { PieceOf, SetDocument } from '../room/document.ts';
import { boardLines } from './board-lines.ts';
import { cushionKey } from './cushion-key.ts';
import { divideAt, divideOnBoards, divideRun } from './run-joints.ts';

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
 * Where a bench's run of cushions is divided.
 *
 * @param bench - the bench
 * @param kind - seats or backs
 * @returns ends of the stretches along the bench's x axis, rising, both ends of the run included
 */
export function runJointEnds(bench: PieceOf<'bench'>, kind: 'seat' | 'back'): number[] {
  const { cushionLeftMm: left, cushionRightMm: right, hasBack } = benchLayout(bench);
  const { longestCushionMm: longest, joints } = bench.upholstery;
  const chosen = joints?.[kind];
  if (chosen?.by === 'positions') return divideAt(left, right, chosen.atMm);
  const { jointsMm } = boardLines(bench);
  return chosen
    ? divideOnBoards(left, right, longest, jointsMm)
    : divideRun(left, right, longest, hasBack ? jointsMm : []);
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
      {
        key: cushionKey({ pieceId: piece.id, kind: 'seat', number: 1 }),
        piece,
        kind: 'seat',
        index: 0,
        count: 1,
        leftMm: -half,
        rightMm: half,
      },
    ];
  }
  const layout = benchLayout(piece);
  const runs = (kind: 'seat' | 'back'): CushionRun[] => {
    const ends = runJointEnds(piece, kind);
    const count = ends.length - 1;
    return Array.from({ length: count }, (_, index) => ({
      key: cushionKey({ pieceId: piece.id, kind, number: index + 1 }),
      piece,
      kind,
      index,
      count,
      leftMm: ends[index]!,
      rightMm: ends[index + 1]!,
    }));
  };
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
