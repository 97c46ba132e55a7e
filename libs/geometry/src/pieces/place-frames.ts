import type { Vec3 } from '../parts/part.ts';
import { toRoom } from '../parts/placement.ts';
import type { Piece, PieceOf, SetDocument } from '../room/document.ts';
import { radians } from '../units/angle.ts';
import { benchLayout, HIP_BEFORE_BACK_MM } from './bench-layout.ts';
import { seatRun } from './corners.ts';
import { unpressedSeatTopMm } from './seat-sink.ts';

/** Where one person sits. */
export interface PlaceFrame {
  /** `${pieceId}:${place}`. */
  placeId: string;
  pieceId: string;
  /** Counted from 1, from the left as seen from in front. */
  place: number;
  /** On the unpressed seat, 135 mm before the back, on the place's centreline; room frame. */
  hipMm: Vec3;
  /** Upper front edge of the seat on the centreline; room frame. */
  frontMm: Vec3;
  /** Direction the sitter looks in, about the vertical; 0 looks along +z, turning anticlockwise from above. */
  facingRad: number;
  widthMm: number;
}

const TOLERANCE = 1e-6;

/**
 * The places of a bench or loose seat.
 *
 * @param piece - any piece; one nobody sits on has no places
 * @param document - the set; when given, the square in the corner of an L or U is kept free
 * @returns the places from the left as seen from in front
 */
export function placeFrames(piece: Piece, document?: SetDocument): PlaceFrame[] {
  if (piece.kind === 'bench') return benchPlaces(piece, document);
  if (piece.kind !== 'loose-seat') return [];
  const top = unpressedSeatTopMm(piece);
  const hipZ = Math.min(HIP_BEFORE_BACK_MM, piece.seatDepthMm);
  return [frame(piece, 1, 0, piece.widthMm, [top, hipZ], [top, piece.seatDepthMm])];
}

/**
 * The places of a whole set, corners taken into account.
 *
 * @param document - the set
 * @returns places in the order of the pieces
 */
export function placeFramesOf(document: SetDocument): PlaceFrame[] {
  return document.pieces.flatMap((piece) => placeFrames(piece, document));
}

function benchPlaces(bench: PieceOf<'bench'>, document: SetDocument | undefined): PlaceFrame[] {
  const run = seatRun(bench, document);
  const length = run.rightMm - run.leftMm;
  if (length <= 0) return [];
  const { places } = bench;
  const count = places.by === 'count' ? places.count : Math.floor(length / places.widthMm + TOLERANCE);
  const width = places.by === 'count' ? length / count : places.widthMm;
  // What is left over goes to a corner, where knees need it; otherwise it is shared by both ends.
  const spare = length - count * width;
  const share = run.leftCorner === run.rightCorner ? 0.5 : run.leftCorner ? 1 : 0;
  const layout = benchLayout(bench);
  const hipZ = layout.faceZMm + Math.min(HIP_BEFORE_BACK_MM, bench.seatDepthMm);
  const hipY = layout.seatTopFrontMm - (layout.frontZMm - hipZ) * Math.tan(layout.tiltRad);
  return Array.from({ length: count }, (_, i) => {
    const x = run.leftMm + spare * share + (i + 0.5) * width;
    return frame(bench, i + 1, x, width, [hipY, hipZ], [layout.seatTopFrontMm, layout.frontZMm]);
  });
}

function frame(
  piece: Piece,
  place: number,
  x: number,
  widthMm: number,
  hip: readonly [number, number],
  front: readonly [number, number],
): PlaceFrame {
  return {
    placeId: `${piece.id}:${place}`,
    pieceId: piece.id,
    place,
    hipMm: toRoom(piece.at, [x, ...hip]),
    frontMm: toRoom(piece.at, [x, ...front]),
    facingRad: radians(piece.at.turnDeg),
    widthMm,
  };
}
