import type { Vec3 } from '@settlewright/geometry';

/** Unit quaternion, x y z w. */
export type Quat = readonly [number, number, number, number];

export const add = (a: Vec3, b: Vec3): Vec3 => [a[0] + b[0], a[1] + b[1], a[2] + b[2]];
export const subtract = (a: Vec3, b: Vec3): Vec3 => [a[0] - b[0], a[1] - b[1], a[2] - b[2]];
export const scale = (a: Vec3, by: number): Vec3 => [a[0] * by, a[1] * by, a[2] * by];
export const dot = (a: Vec3, b: Vec3): number => a[0] * b[0] + a[1] * b[1] + a[2] * b[2];
export const cross = (a: Vec3, b: Vec3): Vec3 => [
  a[1] * b[2] - a[2] * b[1],
  a[2] * b[0] - a[0] * b[2],
  a[0] * b[1] - a[1] * b[0],
];
export const mix = (a: Vec3, b: Vec3, t: number): Vec3 => add(a, scale(subtract(b, a), t));

export function normalise(a: Vec3): Vec3 {
  const length = Math.hypot(a[0], a[1], a[2]);
  return length === 0 ? a : scale(a, 1 / length);
}

/** Turns a vector by a quaternion. */
export function turn(q: Quat, v: Vec3): Vec3 {
  const u: Vec3 = [q[0], q[1], q[2]];
  const twice = scale(cross(u, v), 2);
  return add(add(v, scale(twice, q[3])), cross(u, twice));
}

/** Quaternion that takes x, y, z onto three orthonormal axes. */
export function fromAxes(right: Vec3, up: Vec3, toward: Vec3): Quat {
  const trace = right[0] + up[1] + toward[2];
  if (trace > 0) {
    const s = 2 * Math.sqrt(trace + 1);
    return [(up[2] - toward[1]) / s, (toward[0] - right[2]) / s, (right[1] - up[0]) / s, s / 4];
  }
  if (right[0] > up[1] && right[0] > toward[2]) {
    const s = 2 * Math.sqrt(1 + right[0] - up[1] - toward[2]);
    return [s / 4, (up[0] + right[1]) / s, (toward[0] + right[2]) / s, (up[2] - toward[1]) / s];
  }
  if (up[1] > toward[2]) {
    const s = 2 * Math.sqrt(1 + up[1] - right[0] - toward[2]);
    return [(up[0] + right[1]) / s, s / 4, (toward[1] + up[2]) / s, (toward[0] - right[2]) / s];
  }
  const s = 2 * Math.sqrt(1 + toward[2] - right[0] - up[1]);
  return [(toward[0] + right[2]) / s, (toward[1] + up[2]) / s, s / 4, (right[1] - up[0]) / s];
}

/** Shortest way round from one orientation to another. */
export function slerp(a: Quat, b: Quat, t: number): Quat {
  let cosine = a[0] * b[0] + a[1] * b[1] + a[2] * b[2] + a[3] * b[3];
  const sign = cosine < 0 ? -1 : 1;
  cosine = Math.abs(cosine);
  const angle = Math.acos(Math.min(1, cosine));
  const sine = Math.sin(angle);
  const wa = sine < 1e-5 ? 1 - t : Math.sin((1 - t) * angle) / sine;
  const wb = (sine < 1e-5 ? t : Math.sin(t * angle) / sine) * sign;
  return [a[0] * wa + b[0] * wb, a[1] * wa + b[1] * wb, a[2] * wa + b[2] * wb, a[3] * wa + b[3] * wb];
}

/** Axes of a part: rotation about y first, then x, then z (three.js order 'YXZ'). */
export function partAxes([x, y, z]: Vec3): readonly [Vec3, Vec3, Vec3] {
  const [cx, sx, cy, sy, cz, sz] = [
    Math.cos(x),
    Math.sin(x),
    Math.cos(y),
    Math.sin(y),
    Math.cos(z),
    Math.sin(z),
  ];
  return [
    [cy * cz + sy * sx * sz, cx * sz, -sy * cz + cy * sx * sz],
    [-cy * sz + sy * sx * cz, cx * cz, sy * sz + cy * sx * cz],
    [sy * cx, -sx, cy * cx],
  ];
}
