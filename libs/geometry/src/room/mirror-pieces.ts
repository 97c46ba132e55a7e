import type { RunJoints } from '../cushions/run-joints.ts';
import { normalTurnDeg, toRoom } from '../parts/placement.ts';
import { benchLayout } from '../pieces/bench-layout.ts';
import { placeFrames } from '../pieces/place-frames.ts';
import { degrees, radians } from '../units/angle.ts';
import { mirrorCushionChoices } from './cushion-choices.ts';
import type { Piece, PieceOf, SetDocument } from './document.ts';
import { duplicatePiece } from './edit-pieces.ts';
import { footprint } from './footprint.ts';
import { namedPieces } from './named-pieces.ts';
import type { PostureChoice } from './posture-choice.ts';
import { withoutLostSeats } from './seating.ts';

/** An upright plane, seen from above as a line through a point; 0 runs along the room's x. */
export interface MirrorPlane {
  xMm: number;
  zMm: number;
  alongDeg: number;
}

type Seat = SetDocument['seating'][number];

/** Where a mirrored piece is put differs by less from where arithmetic would put it, millimetres and degrees. */
const TIDY = 1e6;
const tidy = (value: number) => Math.round(value * TIDY) / TIDY;

/**
 * The plane through the middle of some pieces.
 *
 * @param document - the set
 * @param pieceIds - unknown ids are passed over
 * @param swaps - what changes sides: left and right, or back and front
 * @returns a plane along or across the room; undefined where no piece is named
 */
export function middlePlane(
  document: SetDocument,
  pieceIds: readonly string[],
  swaps: 'left-right' | 'back-front',
): MirrorPlane | undefined {
  const corners = namedPieces(document, pieceIds).flatMap((piece) => [...footprint(piece).corners]);
  if (corners.length === 0) return undefined;
  const middle = (values: number[]) => tidy((Math.min(...values) + Math.max(...values)) / 2);
  return {
    xMm: middle(corners.map(([x]) => x)),
    zMm: middle(corners.map(([, z]) => z)),
    alongDeg: swaps === 'left-right' ? 90 : 0,
  };
}

/**
 * A plane of a bulkhead.
 *
 * @param wall - the bulkhead
 * @param which - along it, through the middle of its thickness, or across it, through the middle of its length
 * @returns the plane
 */
export function wallPlane(
  wall: Extract<Piece, { kind: 'bulkhead' }>,
  which: 'along' | 'across',
): MirrorPlane {
  const [xMm, , zMm] = toRoom(wall.at, [0, 0, which === 'along' ? -wall.thicknessMm / 2 : 0]);
  return { xMm: tidy(xMm), zMm: tidy(zMm), alongDeg: wall.at.turnDeg + (which === 'along' ? 0 : 90) };
}

/**
 * Mirrors pieces about an upright plane: what is at the left end comes to the right end, and whoever sits there goes with
 * their seat. Locked pieces stay.
 *
 * @param document - the set
 * @param pieceIds - what is mirrored; unknown ids are passed over
 * @param plane - the plane
 * @returns the new set; twice about one plane gives the set back, to a millionth of a millimetre
 */
export function mirrorPieces(
  document: SetDocument,
  pieceIds: readonly string[],
  plane: MirrorPlane,
): SetDocument {
  const mirrored = new Map(
    namedPieces(document, pieceIds)
      .filter(({ locked }) => !locked)
      .map((piece) => [piece.id, piece]),
  );
  const seating = document.seating.map((seat): Seat => {
    const piece = mirrored.get(seat.pieceId);
    return piece === undefined ? seat : mirroredSeat(seat, placeFrames(piece, document).length);
  });
  const pieces = document.pieces.map((piece) => (mirrored.has(piece.id) ? mirrorOf(piece, plane) : piece));
  return withoutLostSeats(mirrorCushionChoices({ ...document, pieces, seating }, new Set(mirrored.keys())));
}

/**
 * Adds mirrored copies; the originals stay. Copies get the next marks, and nobody sits on them.
 *
 * @param document - the set
 * @param pieceIds - unknown ids are passed over
 * @param plane - the plane
 * @returns the new set and the ids of the copies, in the order of the originals
 */
export function mirrorCopies(
  document: SetDocument,
  pieceIds: readonly string[],
  plane: MirrorPlane,
): { document: SetDocument; pieceIds: string[] } {
  const copies: string[] = [];
  const copied = namedPieces(document, pieceIds).reduce((set, original) => {
    const one = duplicatePiece(set, original.id);
    copies.push(one.pieceId);
    const pieces = one.document.pieces.map((piece) =>
      piece.id === one.pieceId ? mirrorOf({ ...piece, at: original.at }, plane) : piece,
    );
    return { ...one.document, pieces };
  }, document);
  return { document: withoutLostSeats(mirrorCushionChoices(copied, new Set(copies))), pieceIds: copies };
}

/** Every kind is the same on both sides of its own middle, but for what `handed` swaps. */
function mirrorOf<P extends Piece>(piece: P, plane: MirrorPlane): P {
  const along = radians(plane.alongDeg);
  const [c, s] = [Math.cos(along), -Math.sin(along)];
  const over = (x: number, z: number) => {
    const on = x * c + z * s;
    return [2 * on * c - x, 2 * on * s - z] as const;
  };
  const turn = radians(piece.at.turnDeg);
  const [fx, fz] = over(Math.sin(turn), Math.cos(turn));
  const [dx, dz] = over(piece.at.xMm - plane.xMm, piece.at.zMm - plane.zMm);
  const at = {
    xMm: tidy(plane.xMm + dx),
    zMm: tidy(plane.zMm + dz),
    turnDeg: normalTurnDeg(tidy(degrees(Math.atan2(fx, fz)))),
  };
  return handed({ ...piece, at });
}

function handed<P extends Piece>(piece: P): P {
  if (piece.kind === 'bench') {
    const { left, right } = piece.ends;
    return { ...piece, ends: { left: right, right: left }, upholstery: mirroredJoints(piece) };
  }
  if (piece.kind !== 'table' || piece.leaves === undefined) return piece;
  const { left, right, ...sides } = piece.leaves;
  return { ...piece, leaves: { ...sides, ...(right && { left: right }), ...(left && { right: left }) } };
}

/** Chosen joints are measured from the other end of the run, which is as long as before. */
function mirroredJoints(bench: PieceOf<'bench'>): PieceOf<'bench'>['upholstery'] {
  const { joints } = bench.upholstery;
  if (!joints) return bench.upholstery;
  const { cushionLeftMm, cushionRightMm } = benchLayout(bench);
  const whole = cushionRightMm - cushionLeftMm;
  const over = (one: RunJoints): RunJoints =>
    one.by === 'positions'
      ? {
          ...one,
          atMm: one.atMm
            .filter((at) => at < whole - 1)
            .map((at) => tidy(whole - at))
            .reverse(),
        }
      : one;
  const { seat, back } = joints;
  const mirrored = { ...(seat && { seat: over(seat) }), ...(back && { back: over(back) }) };
  return { ...bench.upholstery, joints: mirrored };
}

function mirroredSeat({ posture, ...seat }: Seat, places: number): Seat {
  const place = places + 1 - seat.place;
  return { ...seat, place, ...(posture && { posture: mirroredPosture(posture) }) };
}

function mirroredPosture({ arms, nudge, ...posture }: PostureChoice): PostureChoice {
  const swapped = arms === 'sill-left' ? 'sill-right' : arms === 'sill-right' ? 'sill-left' : arms;
  return {
    ...posture,
    ...(swapped && { arms: swapped }),
    ...(nudge && { nudge: { ...nudge, leftMm: 0 - nudge.leftMm } }),
  };
}
