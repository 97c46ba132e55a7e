import type { Vec3 } from '../parts/part.ts';

export const add = (a: Vec3, b: Vec3): Vec3 => [a[0] + b[0], a[1] + b[1], a[2] + b[2]];
export const sub = (a: Vec3, b: Vec3): Vec3 => [a[0] - b[0], a[1] - b[1], a[2] - b[2]];
export const scale = (a: Vec3, s: number): Vec3 => [a[0] * s, a[1] * s, a[2] * s];
export const dot = (a: Vec3, b: Vec3): number => a[0] * b[0] + a[1] * b[1] + a[2] * b[2];
export const length = (a: Vec3): number => Math.hypot(a[0], a[1], a[2]);
export const cross = (a: Vec3, b: Vec3): Vec3 => [
  a[1] * b[2] - a[2] * b[1],
  a[2] * b[0] - a[0] * b[2],
  a[0] * b[1] - a[1] * b[0],
];

/** Straight-line mixture of two numbers; 0 gives the first. */
export const mix = (a: number, b: number, t: number): number => a + (b - a) * t;

/** Straight-line mixture of two points; 0 gives the first. */
export const mixPoints = (a: Vec3, b: Vec3, t: number): Vec3 => [
  mix(a[0], b[0], t),
  mix(a[1], b[1], t),
  mix(a[2], b[2], t),
];

/** `a + b * s`. */
export const along = (a: Vec3, b: Vec3, s: number): Vec3 => [
  a[0] + b[0] * s,
  a[1] + b[1] * s,
  a[2] + b[2] * s,
];

export const clamp = (x: number, low: number, high: number): number => Math.min(high, Math.max(low, x));

/** Unit vector, or `fallback` when there is no direction. */
export function unit(a: Vec3, fallback: Vec3 = [0, 1, 0]): Vec3 {
  const l = length(a);
  return l > 1e-9 ? scale(a, 1 / l) : fallback;
}

/** Turns a point about the x axis through `pivot`; a positive angle carries z towards -y. */
export function turnAboutX(p: Vec3, pivot: Vec3, angleRad: number): Vec3 {
  const c = Math.cos(angleRad);
  const s = Math.sin(angleRad);
  const y = p[1] - pivot[1];
  const z = p[2] - pivot[2];
  return [p[0], pivot[1] + y * c - z * s, pivot[2] + y * s + z * c];
}

/** Turns a point about the vertical through `pivot`; a positive angle carries z towards +x. */
export function turnAboutY(p: Vec3, pivot: Vec3, angleRad: number): Vec3 {
  const c = Math.cos(angleRad);
  const s = Math.sin(angleRad);
  const x = p[0] - pivot[0];
  const z = p[2] - pivot[2];
  return [pivot[0] + x * c + z * s, p[1], pivot[2] - x * s + z * c];
}

/** Turns a vector about a unit axis. */
export function turnAbout(v: Vec3, axis: Vec3, angleRad: number): Vec3 {
  const c = Math.cos(angleRad);
  const s = Math.sin(angleRad);
  const k = dot(axis, v) * (1 - c);
  const w = cross(axis, v);
  return [
    v[0] * c + w[0] * s + axis[0] * k,
    v[1] * c + w[1] * s + axis[1] * k,
    v[2] * c + w[2] * s + axis[2] * k,
  ];
}

/** Three perpendicular unit vectors. */
export type Frame = readonly [Vec3, Vec3, Vec3];

/** Axis and angle of the turn that carries one frame onto another. */
export function turnBetween(from: Frame, to: Frame): { axis: Vec3; angleRad: number } {
  const entry = (row: number, column: number): number =>
    to[0][row]! * from[0][column]! + to[1][row]! * from[1][column]! + to[2][row]! * from[2][column]!;
  const axis: Vec3 = [entry(2, 1) - entry(1, 2), entry(0, 2) - entry(2, 0), entry(1, 0) - entry(0, 1)];
  const cosine = clamp((entry(0, 0) + entry(1, 1) + entry(2, 2) - 1) / 2, -1, 1);
  return { axis: unit(axis), angleRad: length(axis) < 1e-9 ? 0 : Math.acos(cosine) };
}
