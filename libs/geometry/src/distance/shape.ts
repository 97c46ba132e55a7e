import { add, sub } from '../mannequin/vector.ts';
import type { Vec3 } from '../parts/part.ts';

/** Upright box around a shape, room frame, millimetres. */
export interface Bounds {
  minMm: Vec3;
  maxMm: Vec3;
}

/**
 * A convex solid as distances see it: a core, and a ball swept over it. The core is as small as the solid allows, so that
 * solids which overlap a little still have cores apart, and their distance is exact without a search for the depth.
 */
export interface Shape extends Bounds {
  /** Radius of the ball around every point of the core, millimetres. */
  marginMm: number;
  /** Writes the point of the core furthest in a direction of any length into `out`. */
  support: (x: number, y: number, z: number, out: Float64Array) => void;
}

/** The box that reaches so far to both sides of a point along each axis. */
const boxAbout = (centre: Vec3, reach: Vec3): Bounds => ({
  minMm: sub(centre, reach),
  maxMm: add(centre, reach),
});

const ballBounds = (centre: Vec3, radius: number): Bounds => boxAbout(centre, [radius, radius, radius]);

/**
 * A ball that runs along a line while its radius changes evenly; a capsule with equal radii, a ball with equal ends.
 *
 * @param from - centre of one end, millimetres
 * @param fromRadiusMm - radius there
 * @param to - centre of the other end
 * @param toRadiusMm - radius there
 */
export function roundedCone(from: Vec3, fromRadiusMm: number, to: Vec3, toRadiusMm: number): Shape {
  const marginMm = Math.min(fromRadiusMm, toRadiusMm);
  const [r0, r1] = [fromRadiusMm - marginMm, toRadiusMm - marginMm];
  const [x0, y0, z0] = from;
  const [x1, y1, z1] = to;
  return {
    ...boundsAround([ballBounds(from, fromRadiusMm), ballBounds(to, toRadiusMm)]),
    marginMm,
    support: (x, y, z, out) => {
      const length = Math.sqrt(x * x + y * y + z * z);
      const first = (x1 - x0) * x + (y1 - y0) * y + (z1 - z0) * z + (r1 - r0) * length < 0;
      const r = length > 0 ? (first ? r0 : r1) / length : 0;
      out[0] = (first ? x0 : x1) + r * x;
      out[1] = (first ? y0 : y1) + r * y;
      out[2] = (first ? z0 : z1) + r * z;
    },
  };
}

/**
 * An ellipsoid.
 *
 * @param centre - millimetres
 * @param axes - its half axes as vectors square to each other, millimetres
 */
export function ellipsoid(centre: Vec3, axes: readonly [Vec3, Vec3, Vec3]): Shape {
  const [a, b, c] = axes;
  const reach = (axis: 0 | 1 | 2): number => Math.hypot(a[axis], b[axis], c[axis]);
  return {
    ...boxAbout(centre, [reach(0), reach(1), reach(2)]),
    marginMm: 0,
    support: (x, y, z, out) => {
      const u = a[0] * x + a[1] * y + a[2] * z;
      const v = b[0] * x + b[1] * y + b[2] * z;
      const w = c[0] * x + c[1] * y + c[2] * z;
      const length = Math.sqrt(u * u + v * v + w * w) || 1;
      for (const i of [0, 1, 2] as const) out[i] = centre[i] + (u * a[i] + v * b[i] + w * c[i]) / length;
    },
  };
}

/**
 * The smallest convex solid around points: a triangle, a box, the hull of a prism.
 *
 * @param corners - at least one, millimetres
 */
export function hull(corners: readonly Vec3[]): Shape {
  const p = Float64Array.from(corners.flat());
  return {
    ...boundsAround(corners.map((at) => ({ minMm: at, maxMm: at }))),
    marginMm: 0,
    support: (x, y, z, out) => {
      let [best, at] = [-Infinity, 0];
      for (let i = 0; i < p.length; i += 3) {
        const reach = p[i]! * x + p[i + 1]! * y + p[i + 2]! * z;
        if (reach > best) [best, at] = [reach, i];
      }
      out[0] = p[at]!;
      out[1] = p[at + 1]!;
      out[2] = p[at + 2]!;
    },
  };
}

/** Nearly every distance of a skin is one of triangles: the same as their hull, without a loop. */
export function triangle(a: Vec3, b: Vec3, c: Vec3): Shape {
  const [ax, ay, az] = a;
  const [bx, by, bz] = b;
  const [cx, cy, cz] = c;
  return {
    minMm: [Math.min(ax, bx, cx), Math.min(ay, by, cy), Math.min(az, bz, cz)],
    maxMm: [Math.max(ax, bx, cx), Math.max(ay, by, cy), Math.max(az, bz, cz)],
    marginMm: 0,
    support: (x, y, z, out) => {
      const [i, j, k] = [ax * x + ay * y + az * z, bx * x + by * y + bz * z, cx * x + cy * y + cz * z];
      const first = i >= j && i >= k;
      const second = j >= k;
      out[0] = first ? ax : second ? bx : cx;
      out[1] = first ? ay : second ? by : cy;
      out[2] = first ? az : second ? bz : cz;
    },
  };
}

/**
 * A solid moved as a whole.
 *
 * @param shape - the solid
 * @param by - how far, millimetres
 */
export const moved = (shape: Shape, by: Vec3): Shape => ({
  minMm: add(shape.minMm, by),
  maxMm: add(shape.maxMm, by),
  marginMm: shape.marginMm,
  support: (x, y, z, out) => {
    shape.support(x, y, z, out);
    out[0]! += by[0];
    out[1]! += by[1];
    out[2]! += by[2];
  },
});

/**
 * The smallest convex solid around balls of one size: what a joint sweeps.
 *
 * @param centres - at least one, millimetres
 * @param radiusMm - of every ball
 */
export const hullOfBalls = (centres: readonly Vec3[], radiusMm: number): Shape => ({
  ...hull(centres),
  ...boundsAround(centres.map((centre) => ballBounds(centre, radiusMm))),
  marginMm: radiusMm,
});

/**
 * A round bar with flat ends.
 *
 * @param centre - its middle, millimetres
 * @param half - from the middle to the middle of one end
 * @param radiusMm - its radius
 */
export function cylinder(centre: Vec3, half: Vec3, radiusMm: number): Shape {
  const length = Math.hypot(...half);
  const [ux, uy, uz] = [half[0] / length, half[1] / length, half[2] / length];
  const reach = (axis: 0 | 1 | 2): number =>
    Math.abs(half[axis]) + radiusMm * Math.sqrt(Math.max(0, 1 - (half[axis] / length) ** 2));
  return {
    ...boxAbout(centre, [reach(0), reach(1), reach(2)]),
    marginMm: 0,
    support: (x, y, z, out) => {
      const along = ux * x + uy * y + uz * z;
      const [px, py, pz] = [x - along * ux, y - along * uy, z - along * uz];
      const across = Math.sqrt(px * px + py * py + pz * pz);
      const r = across > 1e-12 ? radiusMm / across : 0;
      const end = along < 0 ? -1 : 1;
      out[0] = centre[0] + end * half[0] + r * px;
      out[1] = centre[1] + end * half[1] + r * py;
      out[2] = centre[2] + end * half[2] + r * pz;
    },
  };
}

/** The box around boxes. */
export function boundsAround(all: readonly Bounds[]): Bounds {
  let [x0, y0, z0, x1, y1, z1] = [Infinity, Infinity, Infinity, -Infinity, -Infinity, -Infinity];
  for (const { minMm, maxMm } of all) {
    x0 = Math.min(x0, minMm[0]);
    y0 = Math.min(y0, minMm[1]);
    z0 = Math.min(z0, minMm[2]);
    x1 = Math.max(x1, maxMm[0]);
    y1 = Math.max(y1, maxMm[1]);
    z1 = Math.max(z1, maxMm[2]);
  }
  return { minMm: [x0, y0, z0], maxMm: [x1, y1, z1] };
}

/** Least distance that two boxes can have; 0 when they meet. */
export function boundsGap(one: Bounds, other: Bounds): number {
  const [p, q, r, s] = [one.minMm, one.maxMm, other.minMm, other.maxMm];
  const x = Math.max(0, p[0] - s[0], r[0] - q[0]);
  const y = Math.max(0, p[1] - s[1], r[1] - q[1]);
  const z = Math.max(0, p[2] - s[2], r[2] - q[2]);
  return Math.sqrt(x * x + y * y + z * z);
}
