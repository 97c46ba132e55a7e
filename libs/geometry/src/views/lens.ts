import { cross, dot, sub } from '../mannequin/vector.ts';
import type { Vec3 } from '../parts/part.ts';
import type { LensCamera } from './named-view.ts';

const DEG = Math.PI / 180;

/** A flat size, millimetres. */
export interface Size {
  width: number;
  height: number;
}

/**
 * The angle of view of a lens focused far away, over one side of its picture.
 *
 * @param sideMm - width, height or diagonal of the picture behind the lens; finite, > 0
 * @param focalLengthMm - finite, > 0
 * @returns degrees
 * @source α = 2 arctan(d / 2f), for a rectilinear lens at infinity
 */
export function angleOfViewDeg(sideMm: number, focalLengthMm: number): number {
  return (2 * Math.atan(sideMm / (2 * focalLengthMm))) / DEG;
}

/**
 * The largest frame of a ratio that fits into a film back; the lens is not an anamorphic one.
 *
 * @param backMm - picture area behind the lens, millimetres
 * @param aspect - width over height; > 0
 * @returns millimetres behind the lens
 */
export function frameOnBack(backMm: Size, aspect: number): Size {
  const width = Math.min(backMm.width, backMm.height * aspect);
  return { width, height: width / aspect };
}

/**
 * The angles that a frame takes in.
 *
 * @param lens - focal length, film back and ratio are read
 * @returns degrees across and up
 */
export function frameAnglesDeg(lens: Pick<LensCamera, 'focalLengthMm' | 'backMm' | 'aspect'>): Size {
  const { width, height } = frameOnBack(lens.backMm, lens.aspect);
  return {
    width: angleOfViewDeg(width, lens.focalLengthMm),
    height: angleOfViewDeg(height, lens.focalLengthMm),
  };
}

/**
 * What the frame takes in at a distance, square to the lens.
 *
 * @param lens - focal length, film back and ratio are read
 * @param distanceMm - from the lens along its axis; >= 0
 * @returns millimetres of the room, across and up
 */
export function fieldAt(
  lens: Pick<LensCamera, 'focalLengthMm' | 'backMm' | 'aspect'>,
  distanceMm: number,
): Size {
  const frame = frameOnBack(lens.backMm, lens.aspect);
  const times = distanceMm / lens.focalLengthMm;
  return { width: frame.width * times, height: frame.height * times };
}

/** How a lens stands in the room: its place and three unit vectors, `toward` from the scene to the lens. */
export interface LensStand {
  eyeMm: Vec3;
  right: Vec3;
  up: Vec3;
  toward: Vec3;
}

/**
 * Where a lens stands and which way it looks.
 *
 * @param lens - place, height, turn and tilt are read
 * @returns millimetres and unit vectors of the room; the frame stands level
 */
export function lensStand({
  at,
  heightMm,
  turnDeg,
  tiltDeg,
}: Pick<LensCamera, 'at' | 'heightMm' | 'turnDeg' | 'tiltDeg'>): LensStand {
  const [turn, tilt] = [turnDeg * DEG, tiltDeg * DEG];
  const right: Vec3 = [Math.cos(turn), 0, -Math.sin(turn)];
  const toward: Vec3 = [Math.sin(turn) * Math.cos(tilt), -Math.sin(tilt), Math.cos(turn) * Math.cos(tilt)];
  return { eyeMm: [at.xMm, heightMm, at.zMm], right, up: cross(toward, right), toward };
}

/**
 * Where a point of the room falls in the frame of a lens.
 *
 * @param lens - the camera
 * @param point - in the room, millimetres
 * @returns from the middle of the frame to the right and up, as shares of its width and height (0.5 is the edge), and the
 * distance along the axis; nothing for what is not before the lens
 */
export function inFrame(
  lens: LensCamera,
  point: Vec3,
): { across: number; up: number; distanceMm: number } | undefined {
  const { eyeMm, right, up, toward } = lensStand(lens);
  const way = sub(point, eyeMm);
  const distanceMm = -dot(way, toward);
  if (distanceMm <= 0) return undefined;
  const field = fieldAt(lens, distanceMm);
  return { across: dot(way, right) / field.width, up: dot(way, up) / field.height, distanceMm };
}

/**
 * Turns a lens to a point.
 *
 * @param lens - from where
 * @param point - in the room, millimetres; straight above or below the lens its turn stays
 * @returns turn within (-180, 180] and tilt within ±89, degrees
 */
export function aimAt(
  lens: Pick<LensCamera, 'at' | 'heightMm' | 'turnDeg'>,
  point: Vec3,
): Pick<LensCamera, 'turnDeg' | 'tiltDeg'> {
  const [x, y, z] = [point[0] - lens.at.xMm, point[1] - lens.heightMm, point[2] - lens.at.zMm];
  const level = Math.hypot(x, z);
  const tiltDeg = Math.max(-89, Math.min(89, Math.atan2(y, level) / DEG));
  return { turnDeg: level < 1e-6 ? lens.turnDeg : Math.atan2(-x, -z) / DEG, tiltDeg };
}

/**
 * The floor that a frame takes in, for a plan: from the lens to both edges of its picture.
 *
 * @param lens - tilt is left out: the wedge of a level frame
 * @param reachMm - how far along the axis it is drawn
 * @returns left and right end on the floor, as seen through the lens; millimetres
 */
export function wedgeOf(
  lens: LensCamera,
  reachMm: number,
): { left: readonly [x: number, z: number]; right: readonly [x: number, z: number] } {
  const { eyeMm, right, toward } = lensStand({ ...lens, tiltDeg: 0 });
  const half = fieldAt(lens, reachMm).width / 2;
  const end = (side: number): readonly [number, number] => [
    eyeMm[0] - toward[0] * reachMm + right[0] * half * side,
    eyeMm[2] - toward[2] * reachMm + right[2] * half * side,
  ];
  return { left: end(-1), right: end(1) };
}
