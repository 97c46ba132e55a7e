import type { Vec3 } from '../parts/part.ts';
import type { Shape } from './shape.ts';
import { emptySimplex, reduceToNearest } from './simplex.ts';

/** How near two cores come. */
export interface CoreGap {
  distanceMm: number;
  /** Nearest point of the one and of the other. */
  from: Vec3;
  to: Vec3;
}

const MOST_STEPS = 80;
/** Bounds on the distance closer than this end the search. */
const CLOSE_ENOUGH_MM = 1e-3;
/** Nearer than this, cores count as meeting. */
const MEETING_MM = 1e-6;

const simplex = emptySimplex();
const [onOne, onOther] = [new Float64Array(3), new Float64Array(3)];

/**
 * Distance between the cores of two shapes: the point of their difference nearest to the origin, found corner by corner.
 *
 * @param one - a shape
 * @param other - another shape
 * @param atMostMm - larger distances of the cores are of no matter
 * @returns the distance within 0.001 mm; `undefined` beyond the limit; 0 where the cores meet, and then the points say
 * nothing
 * @source Gilbert, Johnson and Keerthi 1988: distance of convex sets by support points
 */
export function coreDistance(one: Shape, other: Shape, atMostMm: number): CoreGap | undefined {
  const s = simplex;
  s.count = 0;
  const middle = (at: 0 | 1 | 2): number =>
    (one.minMm[at] + one.maxMm[at] - other.minMm[at] - other.maxMm[at]) / 2;
  let [vx, vy, vz] = [middle(0), middle(1), middle(2)];
  let square = Infinity;
  for (let step = 0; step < MOST_STEPS; step++) {
    one.support(-vx, -vy, -vz, onOne);
    other.support(vx, vy, vz, onOther);
    const [wx, wy, wz] = [onOne[0]! - onOther[0]!, onOne[1]! - onOther[1]!, onOne[2]! - onOther[2]!];
    const norm = Math.sqrt(vx * vx + vy * vy + vz * vz);
    const atLeast = norm > 0 ? (vx * wx + vy * wy + vz * wz) / norm : 0;
    if (atLeast > atMostMm) return undefined;
    if (step > 0 && norm - atLeast < CLOSE_ENOUGH_MM) break;
    if (isKnown(wx, wy, wz)) break;
    const at = s.count * 3;
    s.w[at] = wx;
    s.w[at + 1] = wy;
    s.w[at + 2] = wz;
    for (let i = 0; i < 3; i++) {
      s.a[at + i] = onOne[i]!;
      s.b[at + i] = onOther[i]!;
    }
    s.count += 1;
    const before = square;
    square = reduceToNearest(s);
    if (s.count === 4 || square < MEETING_MM ** 2) return { distanceMm: 0, from: [0, 0, 0], to: [0, 0, 0] };
    [vx, vy, vz] = [mixed(s.w, 0), mixed(s.w, 1), mixed(s.w, 2)];
    if (square >= before) break;
  }
  return {
    distanceMm: Math.sqrt(square),
    from: [mixed(s.a, 0), mixed(s.a, 1), mixed(s.a, 2)],
    to: [mixed(s.b, 0), mixed(s.b, 1), mixed(s.b, 2)],
  };
}

function isKnown(x: number, y: number, z: number): boolean {
  const { w, count } = simplex;
  for (let i = 0; i < count; i++) {
    if (w[i * 3] === x && w[i * 3 + 1] === y && w[i * 3 + 2] === z) return true;
  }
  return false;
}

function mixed(points: Float64Array, axis: number): number {
  let sum = 0;
  for (let i = 0; i < simplex.count; i++) sum += simplex.share[i]! * points[i * 3 + axis]!;
  return sum;
}
