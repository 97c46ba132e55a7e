import { add, cross, dot, length, sub } from '../mannequin/vector.ts';
import type { Part, Vec3 } from '../parts/part.ts';
import { convexPieces } from './convex-pieces.ts';
import { onPage, type PageFrame } from './set-view.ts';
import { partEdges } from './solid-outline.ts';

/** A side of a solid: what lies inside has `normal · point` at most `limit`. */
export interface HalfSpace {
  normal: Vec3;
  limit: number;
}

/** A convex solid in the frame of a view, with the box it fills. */
export interface ConvexSolid {
  sides: HalfSpace[];
  min: Vec3;
  max: Vec3;
}

/** A circle of a round part that lies in the page's own plane. */
export interface PageCircle {
  centre: Vec3;
  radiusMm: number;
}

/** A part in the frame of a view: an outline drawn out along an axis. */
export interface ViewSolid {
  part: Part;
  /** Corners of the near end, in turning order; right, down, toward the eye. */
  base: Vec3[];
  axis: Vec3;
  /** True where two sides of the outline meet so flatly that no ink runs along their edge. */
  smooth: boolean[];
  /** What hides: the part itself, or convex pieces of a hollow one. */
  convex: ConvexSolid[];
  /** Both ends of a round part that is seen along its axis. */
  circles: PageCircle[];
}

/** Sides that meet at less than this are one curved face, radians; the scene inks its edges alike. */
const CORNER_RAD = 0.35;
const ROUND_SIDES = 64;

/** Middles of the sides of a 64-sided figure lie as far inside its circle as its corners lie outside: 0.06 % each. */
const ROUND_FACTOR = 2 / (1 + Math.cos(Math.PI / ROUND_SIDES));

/** The near end of a part in the room, and the way it is drawn out. */
export function ringOf(part: Part): { base: Vec3[]; axis: Vec3 } {
  if (part.solid.shape === 'cylinder') {
    const [x, y, z] = part.positionMm;
    const { radiusMm, heightMm } = part.solid;
    const base = Array.from({ length: ROUND_SIDES }, (_, i): Vec3 => {
      const angle = (2 * Math.PI * i) / ROUND_SIDES;
      const radius = radiusMm * ROUND_FACTOR;
      return [x + radius * Math.cos(angle), y - heightMm / 2, z + radius * Math.sin(angle)];
    });
    return { base, axis: [0, heightMm, 0] };
  }
  const { corners } = partEdges(part);
  const half = corners.length / 2;
  return { base: corners.slice(0, half), axis: sub(corners[half]!, corners[0]!) };
}

function sideOf(a: Vec3, b: Vec3, c: Vec3, inside: Vec3): HalfSpace | undefined {
  const raw = cross(sub(b, a), sub(c, a));
  const size = length(raw);
  if (size < 1e-9) return undefined;
  const sign = dot(raw, sub(inside, a)) > 0 ? -1 : 1;
  const normal: Vec3 = [(sign * raw[0]) / size, (sign * raw[1]) / size, (sign * raw[2]) / size];
  return { normal, limit: dot(normal, a) };
}

function convexSolid(ring: readonly Vec3[], axis: Vec3): ConvexSolid {
  const all = [...ring, ...ring.map((corner) => add(corner, axis))];
  const inside = all.reduce<Vec3>(
    (sum, p) => add(sum, [p[0] / all.length, p[1] / all.length, p[2] / all.length]),
    [0, 0, 0],
  );
  const [p, q] = ring as [Vec3, Vec3];
  // Pieces of a hollow outline may have corners on a straight side: the one furthest off it tells the plane best.
  const off = (corner: Vec3): number => length(cross(sub(q, p), sub(corner, p)));
  const r = ring.reduce((best, corner) => (off(corner) > off(best) ? corner : best));
  const found = [
    sideOf(p, q, r, inside),
    sideOf(add(p, axis), add(q, axis), add(r, axis), inside),
    ...ring.map((corner, i) => sideOf(corner, ring[(i + 1) % ring.length]!, add(corner, axis), inside)),
  ];
  const along = (n: 0 | 1 | 2) => all.map((corner) => corner[n]);
  return {
    sides: found.filter((side) => side !== undefined),
    min: [Math.min(...along(0)), Math.min(...along(1)), Math.min(...along(2))],
    max: [Math.max(...along(0)), Math.max(...along(1)), Math.max(...along(2))],
  };
}

function angleAt(before: Vec3, at: Vec3, after: Vec3): number {
  const [a, b] = [sub(at, before), sub(after, at)];
  return Math.atan2(length(cross(a, b)), dot(a, b));
}

/**
 * Takes a part into the frame of a view.
 *
 * @param part - a placed part; a cylinder stands upright, as all of them do, and is taken with 64 sides, whose
 * places are off by 0.06 % of its radius at most
 * @param frame - of the page
 * @returns the solid, millimetres
 */
export function viewSolid(part: Part, frame: PageFrame): ViewSolid {
  const ring = ringOf(part);
  const base = ring.base.map((corner) => onPage(frame, corner));
  const axis = onPage(frame, ring.axis);
  const n = base.length;
  const smooth = base.map(
    (corner, i) => angleAt(base[(i + n - 1) % n]!, corner, base[(i + 1) % n]!) < CORNER_RAD,
  );
  const outline = part.solid.shape === 'prism' ? part.solid.outlineMm : undefined;
  const pieces = outline ? convexPieces(outline) : [base.map((_, i) => i)];
  const convex = pieces.map((piece) =>
    convexSolid(
      piece.map((i) => base[i]!),
      axis,
    ),
  );
  const round = part.solid.shape === 'cylinder' && Math.hypot(axis[0], axis[1]) < 1e-6;
  const circles: PageCircle[] = [];
  if (round && part.solid.shape === 'cylinder') {
    const centre = onPage(frame, part.positionMm);
    const { radiusMm, heightMm } = part.solid;
    for (const end of [-0.5, 0.5]) {
      circles.push({ centre: [centre[0], centre[1], centre[2] + end * heightMm], radiusMm });
    }
  }
  return { part, base, axis, smooth, convex, circles };
}
