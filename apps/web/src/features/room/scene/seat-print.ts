import type { MannequinPose, Vec3 } from '@settlewright/geometry';
import { backPrintsOf, type BackPrint } from './back-print.ts';
import type { SeatedBody } from '../picture.ts';
import { add, dot, mix, partAxes, scale, subtract } from './vectors.ts';

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

function depthUnder(print: SeatPrint, point: Vec3): number {
  const above = dot(print.up, subtract(point, print.origin));
  if (above <= 0) return 0;
  let deepest = 0;
  for (const { from, to, radii } of print.stretches) {
    const run = subtract(to, from);
    const flatRun = subtract(run, scale(print.up, dot(run, print.up)));
    const gap = subtract(point, from);
    const length = dot(flatRun, flatRun);
    const t = length > 0 ? Math.min(1, Math.max(0, dot(gap, flatRun) / length)) : 0;
    const nearest = mix(from, to, t);
    const radius = radii[0] + (radii[1] - radii[0]) * t;
    const away = subtract(point, nearest);
    const outside = Math.sqrt(Math.max(0, dot(away, away) - dot(away, print.up) ** 2)) - radius;
    const share = 1 - Math.min(1, Math.max(0, (outside + INSIDE_MM) / (INSIDE_MM + OUTSIDE_MM)));
    // A knee that is lifted leaves the cloth where it is.
    const underside = Math.max(0, dot(print.up, subtract(nearest, print.origin)) - radius);
    deepest = Math.max(deepest, Math.max(0, above - underside) * ease(share));
  }
  return deepest;
}

/** How far cloth at a point of the unpressed top goes down, mm. */
export const pressedBy = (prints: readonly SeatPrint[], point: Vec3): number =>
  prints.reduce((deepest, print) => Math.max(deepest, depthUnder(print, point)), 0);
