import type { MannequinPose, Vec3 } from '@settlewright/geometry';
import { backPrintsOf, type BackPrint } from './back-print.ts';
import type { SeatedBody } from '../picture.ts';
import { add, partAxes, scale, subtract } from './vectors.ts';

/** A stretch of the body that rests on a seat: a line in the room and its radius at both ends, mm. */
interface Stretch {
  from: Vec3;
  to: Vec3;
  radii: readonly [number, number];
}

/** What one sitter presses into the cushions of a piece. */
export interface SeatPrint {
  /** Point and upward normal of the pressed seat. */
  origin: Vec3;
  up: Vec3;
  stretches: Stretch[];
  /** What leans on the back. */
  backs: BackPrint[];
}

/** Cloth follows the body this far inside its outline and is level again this far outside, mm. */
const INSIDE_MM = 14;
const OUTSIDE_MM = 62;
const NONE: readonly SeatPrint[] = [];

const known = new WeakMap<MannequinPose, SeatPrint>();

/** The underside of pelvis and thighs, and the trunk; made once for a pose and forgotten with it. */
export function seatPrintOf(pose: MannequinPose): SeatPrint {
  const before = known.get(pose);
  if (before) return before;
  const { originMm, facingRad, tiltRad } = pose.placement;
  const [side, up] = partAxes([-tiltRad, facingRad, 0]);
  const stretches = pose.segments.flatMap((segment): Stretch[] => {
    if (segment.kind === 'ellipsoid') {
      if (segment.name !== 'pelvis') return [];
      const radius = segment.radiiMm[1];
      const aside = scale(side, Math.max(0, segment.radiiMm[0] - radius));
      return [
        {
          from: subtract(segment.centreMm, aside),
          to: add(segment.centreMm, aside),
          radii: [radius, radius],
        },
      ];
    }
    if (!/thigh/.test(segment.name)) return [];
    return [{ from: segment.fromMm, to: segment.toMm, radii: [segment.fromRadiusMm, segment.toRadiusMm] }];
  });
  const print = { origin: originMm, up, stretches, backs: backPrintsOf(pose) };
  known.set(pose, print);
  return print;
}

/** Who presses which piece. */
export function printsByPiece(
  bodies: readonly Pick<SeatedBody, 'pieceId' | 'pose'>[],
): (pieceId: string) => readonly SeatPrint[] {
  const prints = new Map<string, SeatPrint[]>();
  for (const { pieceId, pose } of bodies) {
    prints.set(pieceId, [...(prints.get(pieceId) ?? []), seatPrintOf(pose)]);
  }
  return (pieceId) => prints.get(pieceId) ?? NONE;
}

const ease = (t: number): number => t * t * (3 - 2 * t);

/** Asked at each point of a panel in each frame of a pull: numbers alone, as lists cost several times as much. */
function depthUnder({ origin, up, stretches }: SeatPrint, point: Vec3): number {
  const [ux, uy, uz] = up;
  const above = ux * (point[0] - origin[0]) + uy * (point[1] - origin[1]) + uz * (point[2] - origin[2]);
  if (above <= 0) return 0;
  let deepest = 0;
  for (const { from, to, radii } of stretches) {
    const [rx, ry, rz] = [to[0] - from[0], to[1] - from[1], to[2] - from[2]];
    const rise = rx * ux + ry * uy + rz * uz;
    const [fx, fy, fz] = [rx - rise * ux, ry - rise * uy, rz - rise * uz];
    const [gx, gy, gz] = [point[0] - from[0], point[1] - from[1], point[2] - from[2]];
    const length = fx * fx + fy * fy + fz * fz;
    const t = length > 0 ? Math.min(1, Math.max(0, (gx * fx + gy * fy + gz * fz) / length)) : 0;
    const radius = radii[0] + (radii[1] - radii[0]) * t;
    const [ax, ay, az] = [gx - rx * t, gy - ry * t, gz - rz * t];
    const over = ax * ux + ay * uy + az * uz;
    const outside = Math.sqrt(Math.max(0, ax * ax + ay * ay + az * az - over * over)) - radius;
    if (outside >= OUTSIDE_MM) continue;
    const share = 1 - Math.min(1, Math.max(0, (outside + INSIDE_MM) / (INSIDE_MM + OUTSIDE_MM)));
    // A knee that is lifted leaves the cloth where it is.
    const underside = Math.max(0, above - over - radius);
    deepest = Math.max(deepest, Math.max(0, above - underside) * ease(share));
  }
  return deepest;
}

/** How far cloth at a point of the unpressed top goes down, mm. */
export const pressedBy = (prints: readonly SeatPrint[], point: Vec3): number =>
  prints.reduce((deepest, print) => Math.max(deepest, depthUnder(print, point)), 0);
