import type { Vec3 } from '../src/parts/part.ts';

/** Triangles on the surface of a solid, their corners exactly on it. */
export interface SolidMesh {
  positions: Float32Array;
  indices: number[];
  /** No point of the surface is further from the triangles than this. */
  withinMm: number;
}

/** Chords around a circle so that none of them cuts deeper than `sagMm`. */
const chords = (radiusMm: number, sagMm: number): number =>
  Math.max(8, Math.ceil(Math.PI / Math.acos(1 - sagMm / radiusMm)));

type Profile = readonly (readonly [radiusMm: number, along: number])[];

/** Turns a profile about the y axis; its first and last points lie on the axis. */
function turned(profile: Profile, around: number, place: (p: Vec3) => Vec3): Omit<SolidMesh, 'withinMm'> {
  const positions: number[] = [];
  const indices: number[] = [];
  for (const [radius, y] of profile) {
    for (let i = 0; i < around; i++) {
      const angle = (2 * Math.PI * i) / around;
      positions.push(...place([radius * Math.cos(angle), y, radius * Math.sin(angle)]));
    }
  }
  for (let ring = 0; ring + 1 < profile.length; ring++) {
    for (let i = 0; i < around; i++) {
      const [a, b] = [ring * around + i, ring * around + ((i + 1) % around)];
      if (profile[ring]![0] > 0) indices.push(a, b, a + around);
      if (profile[ring + 1]![0] > 0) indices.push(b, b + around, a + around);
    }
  }
  return { positions: Float32Array.from(positions), indices };
}

/** Points of an arc about (0, `along`), angles from the axis downwards. */
const arc = (radius: number, along: number, from: number, to: number, sagMm: number): Profile => {
  const steps = Math.max(2, Math.ceil((chords(radius, sagMm) * Math.abs(to - from)) / (2 * Math.PI)));
  return Array.from({ length: steps + 1 }, (_, i) => {
    const angle = from + ((to - from) * i) / steps;
    const onAxis = angle < 1e-9 || angle > Math.PI - 1e-9;
    return [onAxis ? 0 : radius * Math.sin(angle), along - radius * Math.cos(angle)] as const;
  });
};

/** A ball that runs along a line while its radius changes evenly. */
export function coneMesh(from: Vec3, r0: number, to: Vec3, r1: number, sagMm: number): SolidMesh {
  const way = to.map((x, i) => x - from[i]!) as unknown as Vec3;
  const long = Math.hypot(...way);
  const swallowed = long <= Math.abs(r0 - r1);
  const [middle, r] = r0 > r1 ? [0, r0] : [long, r1];
  // Where the common tangent touches both balls.
  const touch = swallowed ? 0 : Math.acos(Math.max(-1, Math.min(1, (r1 - r0) / long)));
  const profile = swallowed
    ? arc(r, middle, 0, Math.PI, sagMm)
    : [...arc(r0, 0, 0, touch, sagMm), ...arc(r1, long, touch, Math.PI, sagMm)];
  const u: Vec3 = long > 0 ? (way.map((x) => x / long) as unknown as Vec3) : [0, 1, 0];
  const [v, w] = squareTo(u);
  return {
    ...turned(profile, chords(Math.max(r0, r1), sagMm), ([x, y, z]) => [
      from[0] + x * v[0] + y * u[0] + z * w[0],
      from[1] + x * v[1] + y * u[1] + z * w[1],
      from[2] + x * v[2] + y * u[2] + z * w[2],
    ]),
    withinMm: 2 * sagMm,
  };
}

function squareTo(u: Vec3): readonly [Vec3, Vec3] {
  const other: Vec3 = Math.abs(u[0]) < 0.7 ? [1, 0, 0] : [0, 1, 0];
  const cross = (a: Vec3, b: Vec3): Vec3 => [
    a[1] * b[2] - a[2] * b[1],
    a[2] * b[0] - a[0] * b[2],
    a[0] * b[1] - a[1] * b[0],
  ];
  const v = cross(u, other);
  const size = Math.hypot(...v);
  const unit = v.map((x) => x / size) as unknown as Vec3;
  return [unit, cross(unit, u)];
}

/** An ellipsoid; the chords of a ball of its largest radius, pressed together. */
export function ellipsoidMesh(radii: Vec3, sagMm: number, place: (p: Vec3) => Vec3): SolidMesh {
  const largest = Math.max(...radii);
  const share = sagMm / largest;
  return {
    ...turned(arc(1, 0, 0, Math.PI, share), chords(1, share), ([x, y, z]) =>
      place([x * radii[0], y * radii[1], z * radii[2]]),
    ),
    withinMm: 2 * sagMm,
  };
}

/** A round bar. */
export function barMesh(
  radiusMm: number,
  heightMm: number,
  sagMm: number,
  place: (p: Vec3) => Vec3,
): SolidMesh {
  const h = heightMm / 2;
  const profile: Profile = [
    [0, -h],
    [radiusMm, -h],
    [radiusMm, h],
    [0, h],
  ];
  return { ...turned(profile, chords(radiusMm, sagMm), place), withinMm: sagMm };
}

/** A convex outline in x and y, as deep as `depthMm` about z = 0. */
export function prismMesh(
  outline: readonly (readonly [number, number])[],
  depthMm: number,
  place: (p: Vec3) => Vec3,
): SolidMesh {
  const n = outline.length;
  const ends = [-depthMm / 2, depthMm / 2].flatMap((z) => outline.map(([x, y]) => place([x, y, z])));
  const caps = Array.from({ length: n - 2 }, (_, i) => [0, i + 2, i + 1, n, n + i + 1, n + i + 2]);
  const sides = outline.map((_, i) => {
    const j = (i + 1) % n;
    return [i, j, n + j, i, n + j, n + i];
  });
  return { positions: Float32Array.from(ends.flat()), indices: [...caps, ...sides].flat(), withinMm: 0 };
}
