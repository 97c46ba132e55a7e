import { toPiece } from '../parts/placement.ts';
import { benchLayout } from '../pieces/bench-layout.ts';
import { insideCorners } from '../pieces/corners.ts';
import type { PieceOf, SetDocument } from '../room/document.ts';
import { footprint } from '../room/footprint.ts';

/** What an end of a bench's run of cushions meets. */
export type RunEnd = 'wall' | 'end-wall' | 'arm' | 'corner' | 'free';

/** One end of a run, seen from in front. */
export interface RunEndFound {
  meets: RunEnd;
  /** Face of the wall, end wall or arm along the bench's x axis; `undefined` when there is none. */
  faceXMm: number | undefined;
  /** Mark of the wall, when it is a piece of its own. */
  wallMark?: string;
}

/** A wall further from the end of a bench than this is not what its cushion meets. */
const WALL_WITHIN_MM = 120;
const OVERLAP_MM = 20;

/**
 * What the run of cushions meets at both ends, as seen from in front.
 *
 * @param bench - the bench
 * @param document - the set, for walls and corners
 */
export function runEnds(
  bench: PieceOf<'bench'>,
  document: SetDocument,
): Record<'left' | 'right', RunEndFound> {
  const layout = benchLayout(bench);
  const corners = new Set(insideCorners(bench, document).map(({ end }) => end));
  const find = (side: 'left' | 'right'): RunEndFound => {
    const inner = side === 'left' ? layout.innerLeftMm : layout.innerRightMm;
    const { kind } = bench.ends[side];
    if (kind === 'wall') return { meets: 'end-wall', faceXMm: inner };
    if (kind === 'arm') return { meets: 'arm', faceXMm: inner };
    const wall = wallAt(bench, document, side);
    if (wall) return { meets: 'wall', ...wall };
    return { meets: corners.has(side) ? 'corner' : 'free', faceXMm: undefined };
  };
  return { left: find('left'), right: find('right') };
}

/** The nearest bulkhead that crosses the line of the seat just beyond an end. */
function wallAt(
  bench: PieceOf<'bench'>,
  document: SetDocument,
  side: 'left' | 'right',
): { faceXMm: number; wallMark: string } | undefined {
  const layout = benchLayout(bench);
  const outward = side === 'left' ? -1 : 1;
  const end = (outward * bench.lengthMm) / 2;
  let best: { faceXMm: number; wallMark: string } | undefined;
  for (const piece of document.pieces) {
    if (piece.kind !== 'bulkhead') continue;
    const corners = footprint(piece).corners.map(([x, z]) => toPiece(bench.at, [x, 0, z]));
    const xs = corners.map(([x]) => x);
    const zs = corners.map(([, , z]) => z);
    const middle = (layout.faceZMm + layout.frontZMm) / 2;
    if (Math.min(...zs) > middle || Math.max(...zs) < middle) continue;
    const face = side === 'left' ? Math.max(...xs) : Math.min(...xs);
    const gap = (face - end) * outward;
    if (gap < -OVERLAP_MM || gap > WALL_WITHIN_MM) continue;
    if (!best || gap < (best.faceXMm - end) * outward) best = { faceXMm: face, wallMark: piece.mark };
  }
  return best;
}
