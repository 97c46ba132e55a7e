import { normalTurnDeg, toPiece } from '../parts/placement.ts';
import type { PieceOf, SetDocument } from '../room/document.ts';
import { radians } from '../units/angle.ts';
import { benchLayout } from './bench-layout.ts';

type Bench = PieceOf<'bench'>;

/** Benches within this of a right angle make a corner, degrees. */
const SQUARE_WITHIN_DEG = 15;
/** Benches further apart than this do not meet, millimetres. */
const MEETING_GAP_MM = 150;

/** An inside corner as one of its two legs sees it. */
export interface InsideCorner {
  bench: Bench;
  other: Bench;
  /** End of this leg at which the corner lies, as seen from in front. */
  end: 'left' | 'right';
  /** Front edge of the other leg along this leg's x axis. */
  otherFrontXMm: number;
}

/** The stretch of a bench that seats people, along its x axis. */
export interface SeatRun {
  leftMm: number;
  rightMm: number;
  leftCorner: boolean;
  rightCorner: boolean;
}

/**
 * Inside corners that a bench makes with the other benches of the set.
 *
 * @param bench - one leg
 * @param document - the set
 * @returns at most a few corners, in the order of the document
 */
export function insideCorners(bench: Bench, document: SetDocument): InsideCorner[] {
  const found: InsideCorner[] = [];
  for (const other of document.pieces) {
    if (other.kind !== 'bench' || other.id === bench.id) continue;
    const corner = cornerBetween(bench, other);
    if (corner !== undefined) found.push(corner);
  }
  return found;
}

/**
 * The stretch of a bench that people can sit on: between its ends, without the square of a corner.
 *
 * @param bench - the bench
 * @param document - the set, for corners
 * @returns the stretch along the bench's x axis, millimetres
 */
export function seatRun(bench: Bench, document: SetDocument | undefined): SeatRun {
  const layout = benchLayout(bench);
  const run = {
    leftMm: layout.innerLeftMm,
    rightMm: layout.innerRightMm,
    leftCorner: false,
    rightCorner: false,
  };
  if (document === undefined) return run;
  for (const corner of insideCorners(bench, document)) {
    if (corner.end === 'left') {
      run.leftMm = Math.max(run.leftMm, corner.otherFrontXMm);
      run.leftCorner = true;
    } else {
      run.rightMm = Math.min(run.rightMm, corner.otherFrontXMm);
      run.rightCorner = true;
    }
  }
  return run;
}

function cornerBetween(bench: Bench, other: Bench): InsideCorner | undefined {
  const turn = normalTurnDeg(other.at.turnDeg - bench.at.turnDeg);
  if (Math.abs(Math.abs(turn) - 90) > SQUARE_WITHIN_DEG) return undefined;
  const front = benchLayout(bench).frontZMm;
  const [x, , z] = toPiece(bench.at, [other.at.xMm, 0, other.at.zMm]);
  // The other bench looks towards this bench's right (+x) when it stands at its left end.
  const facing = Math.sign(Math.sin(radians(turn)));
  const otherFrontXMm = x + facing * benchLayout(other).frontZMm;
  const half = other.lengthMm / 2;
  if (z + half < front + MEETING_GAP_MM || z - half > front + MEETING_GAP_MM) return undefined;
  const fromMiddle = -facing * otherFrontXMm;
  if (fromMiddle < 0 || fromMiddle > bench.lengthMm / 2 + MEETING_GAP_MM) return undefined;
  return { bench, other, end: facing > 0 ? 'left' : 'right', otherFrontXMm };
}
