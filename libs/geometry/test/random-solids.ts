import { ellipsoid, roundedCone, type Shape } from '../src/distance/shape.ts';
import { partShape } from '../src/distance/solids.ts';
import type { Part, Solid, Vec3 } from '../src/parts/part.ts';
import { barMesh, coneMesh, ellipsoidMesh, prismMesh, type SolidMesh } from './solid-meshes.ts';

/** A solid with what is known of it without the code under test: formulas of its own. */
export interface KnownSolid {
  kind: string;
  shape: Shape;
  /** Furthest reach along a unit vector, from the formula of the solid. */
  reach: (n: Vec3) => number;
  /** How far a point is outside, in millimetres or near enough; 0 or less inside. */
  outside: (p: Vec3) => number;
  /** Its surface in triangles, round ones cut by chords of `sagMm`. */
  mesh: (sagMm: number) => SolidMesh;
}

const dot = (a: Vec3, b: Vec3): number => a[0] * b[0] + a[1] * b[1] + a[2] * b[2];
const sub = (a: Vec3, b: Vec3): Vec3 => [a[0] - b[0], a[1] - b[1], a[2] - b[2]];

/** Numbers from 0 to 1 that are the same on every run. */
export function randomOf(seed: number): () => number {
  let state = seed;
  return () => {
    state = (state + 0x6d2b79f5) | 0;
    let t = Math.imul(state ^ (state >>> 15), 1 | state);
    t = (t + Math.imul(t ^ (t >>> 7), 61 | t)) ^ t;
    return ((t ^ (t >>> 14)) >>> 0) / 4294967296;
  };
}

/** Directions spread evenly over the ball. */
export const spreadDirections = (count: number): Vec3[] =>
  Array.from({ length: count }, (_, i) => {
    const y = 1 - (2 * i + 1) / count;
    const angle = i * Math.PI * (3 - Math.sqrt(5));
    const r = Math.sqrt(1 - y * y);
    return [r * Math.cos(angle), y, r * Math.sin(angle)];
  });

function knownCone(from: Vec3, r0: number, to: Vec3, r1: number): KnownSolid {
  return {
    kind: r0 === r1 ? 'capsule' : 'rounded cone',
    shape: roundedCone(from, r0, to, r1),
    reach: (n) => Math.max(dot(from, n) + r0, dot(to, n) + r1),
    outside: (p) => {
      const at = (t: number): number => {
        const c = [0, 1, 2].map((i) => from[i]! + t * (to[i]! - from[i]!)) as unknown as Vec3;
        return Math.hypot(...sub(p, c)) - (r0 + t * (r1 - r0));
      };
      let [low, high] = [0, 1];
      for (let i = 0; i < 60; i++) {
        const [a, b] = [low + (high - low) / 3, high - (high - low) / 3];
        if (at(a) < at(b)) high = b;
        else low = a;
      }
      return Math.min(at(0), at(1), at((low + high) / 2));
    },
    mesh: (sagMm) => coneMesh(from, r0, to, r1, sagMm),
  };
}

type Matrix = readonly [Vec3, Vec3, Vec3];

/** Carries a point of a solid's own frame into the room. */
const placing =
  (turn: Matrix, at: Vec3) =>
  (p: Vec3): Vec3 =>
    [0, 1, 2].map(
      (i) => at[i]! + turn[0][i]! * p[0] + turn[1][i]! * p[1] + turn[2][i]! * p[2],
    ) as unknown as Vec3;

/** Columns of the turn about z, then x, then y. */
function turnOf([x, y, z]: Vec3): Matrix {
  const turned = (p: Vec3): Vec3 => {
    const a: Vec3 = [p[0] * Math.cos(z) - p[1] * Math.sin(z), p[0] * Math.sin(z) + p[1] * Math.cos(z), p[2]];
    const b: Vec3 = [a[0], a[1] * Math.cos(x) - a[2] * Math.sin(x), a[1] * Math.sin(x) + a[2] * Math.cos(x)];
    return [b[0] * Math.cos(y) + b[2] * Math.sin(y), b[1], -b[0] * Math.sin(y) + b[2] * Math.cos(y)];
  };
  return [turned([1, 0, 0]), turned([0, 1, 0]), turned([0, 0, 1])];
}

function knownEllipsoid(centre: Vec3, radii: Vec3, turn: Matrix): KnownSolid {
  const axes = turn.map((axis, i) => axis.map((x) => x * radii[i]!)) as unknown as [Vec3, Vec3, Vec3];
  return {
    kind: 'ellipsoid',
    shape: ellipsoid(centre, axes),
    reach: (n) => dot(centre, n) + Math.hypot(...axes.map((axis) => dot(axis, n))),
    outside: (p) => {
      const share = Math.hypot(...turn.map((axis, i) => dot(axis, sub(p, centre)) / radii[i]!));
      return (share - 1) * Math.min(...radii);
    },
    mesh: (sagMm) => ellipsoidMesh(radii, sagMm, placing(turn, centre)),
  };
}

function knownPart(solid: Solid, positionMm: Vec3, rotationRad: Vec3): KnownSolid {
  const part: Part = {
    id: 'a/top-1',
    pieceId: 'a',
    role: 'top',
    material: 'oak',
    solid,
    positionMm,
    rotationRad,
  };
  const turn = turnOf(rotationRad);
  const own = (v: Vec3): Vec3 => [dot(turn[0], v), dot(turn[1], v), dot(turn[2], v)];
  const ownReach = ([x, y, z]: Vec3): number => {
    if (solid.shape === 'box') {
      const [w, h, d] = solid.sizeMm;
      return (Math.abs(x) * w + Math.abs(y) * h + Math.abs(z) * d) / 2;
    }
    if (solid.shape === 'cylinder') {
      return (Math.abs(y) * solid.heightMm) / 2 + solid.radiusMm * Math.hypot(x, z);
    }
    return Math.max(...solid.outlineMm.map(([u, v]) => u * x + v * y)) + (Math.abs(z) * solid.depthMm) / 2;
  };
  const ownOutside = ([x, y, z]: Vec3): number => {
    if (solid.shape === 'box') {
      const [w, h, d] = solid.sizeMm;
      return Math.max(Math.abs(x) - w / 2, Math.abs(y) - h / 2, Math.abs(z) - d / 2);
    }
    if (solid.shape === 'cylinder') {
      return Math.max(Math.abs(y) - solid.heightMm / 2, Math.hypot(x, z) - solid.radiusMm);
    }
    const sides = solid.outlineMm.map(([u, v], i) => {
      const [s, t] = solid.outlineMm[(i + 1) % solid.outlineMm.length]!;
      return ((t - v) * (x - u) - (s - u) * (y - v)) / Math.hypot(s - u, t - v);
    });
    return Math.max(...sides, Math.abs(z) - solid.depthMm / 2);
  };
  return {
    kind: solid.shape,
    shape: partShape(part),
    reach: (n) => dot(positionMm, n) + ownReach(own(n)),
    outside: (p) => ownOutside(own(sub(p, positionMm))),
    mesh: (sagMm) => {
      const place = placing(turn, positionMm);
      if (solid.shape === 'cylinder') return barMesh(solid.radiusMm, solid.heightMm, sagMm, place);
      if (solid.shape === 'prism') return prismMesh(solid.outlineMm, solid.depthMm, place);
      const [w, h, d] = solid.sizeMm.map((x) => x / 2) as unknown as Vec3;
      const rectangle = [
        [-w, -h],
        [w, -h],
        [w, h],
        [-w, h],
      ] as const;
      return prismMesh(rectangle, 2 * d, place);
    },
  };
}

/** A solid of a random kind, size, place and turn, in the sizes of bodies and furniture. */
export function randomSolid(random: () => number, spreadMm: number): KnownSolid {
  const within = (low: number, high: number): number => low + random() * (high - low);
  const three = (low: number, high: number): Vec3 => [
    within(low, high),
    within(low, high),
    within(low, high),
  ];
  const at = three(-spreadMm, spreadMm);
  const turn = three(-Math.PI, Math.PI);
  const away = (mm: number): Vec3 => at.map((x) => x + within(-mm, mm)) as unknown as Vec3;
  switch (Math.floor(random() * 7)) {
    case 0:
      return knownCone(at, within(15, 90), away(350), within(15, 90));
    case 1: {
      const r = within(15, 90);
      return knownCone(at, r, away(350), r);
    }
    case 2: {
      const r = within(15, 90);
      return knownCone(at, r, at, r);
    }
    case 3:
      return knownEllipsoid(at, three(60, 230), turnOf(turn));
    case 4:
      return knownPart({ shape: 'box', sizeMm: three(15, 900) }, at, turn);
    case 5:
      return knownPart({ shape: 'cylinder', radiusMm: within(10, 90), heightMm: within(30, 800) }, at, turn);
    default: {
      const count = 3 + Math.floor(random() * 5);
      const angles = Array.from({ length: count }, (_, i) => (2 * Math.PI * (i + within(0, 0.8))) / count);
      const [a, b] = [within(60, 300), within(60, 300)];
      const outlineMm = angles.map((angle) => [a * Math.cos(angle), b * Math.sin(angle)] as const);
      return knownPart({ shape: 'prism', outlineMm, depthMm: within(15, 800) }, at, turn);
    }
  }
}
