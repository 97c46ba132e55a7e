import type { Vec3 } from '@settlewright/geometry';
import { add, dot, mix, scale, slerp, subtract, turn, type Quat } from './vectors';

/**
 * How the room is seen, as numbers. The picture plane stands at `target`; `perspective` is one over
 * the distance of the eye from that plane, so 0 is an orthographic drawing and a view can pass from
 * one to the other without a jump. The eye may stand off the axis (`eyeMm`): a shifted lens keeps
 * uprights upright.
 */
export interface ViewFrame {
  target: Vec3;
  orientation: Quat;
  perspective: number;
  eyeMm: readonly [number, number];
  centreMm: readonly [number, number];
  halfHeightMm: number;
  /** Nearest and farthest depth towards the viewer, from the picture plane. */
  depthMm: readonly [near: number, far: number];
}

export interface Viewport {
  width: number;
  height: number;
}

/** A point in CSS pixels from the top left; `depth` grows towards the viewer. */
export interface ScreenPoint {
  x: number;
  y: number;
  depth: number;
}

export const pixelsPerMm = (frame: ViewFrame, viewport: Viewport): number =>
  viewport.height / (2 * frame.halfHeightMm);

/** Where a point of the room lies on the picture plane, before scaling. */
export function onPlane(frame: ViewFrame, point: Vec3): { x: number; y: number; z: number } {
  const local = subtract(point, frame.target);
  const x = dot(local, turn(frame.orientation, [1, 0, 0]));
  const y = dot(local, turn(frame.orientation, [0, 1, 0]));
  const z = dot(local, turn(frame.orientation, [0, 0, 1]));
  const p = frame.perspective;
  const w = Math.max(1 - p * z, 0.02);
  return { x: (x - frame.eyeMm[0] * p * z) / w, y: (y - frame.eyeMm[1] * p * z) / w, z };
}

export function project(frame: ViewFrame, viewport: Viewport, point: Vec3): ScreenPoint {
  const plane = onPlane(frame, point);
  const k = pixelsPerMm(frame, viewport);
  return {
    x: viewport.width / 2 + (plane.x - frame.centreMm[0]) * k,
    y: viewport.height / 2 - (plane.y - frame.centreMm[1]) * k,
    depth: plane.z,
  };
}

/** The line of sight through a pixel. */
export function rayThrough(
  frame: ViewFrame,
  viewport: Viewport,
  x: number,
  y: number,
): { origin: Vec3; direction: Vec3 } {
  const k = pixelsPerMm(frame, viewport);
  const px = frame.centreMm[0] + (x - viewport.width / 2) / k;
  const py = frame.centreMm[1] - (y - viewport.height / 2) / k;
  const right = turn(frame.orientation, [1, 0, 0]);
  const up = turn(frame.orientation, [0, 1, 0]);
  const toward = turn(frame.orientation, [0, 0, 1]);
  const hit = add(frame.target, add(scale(right, px), scale(up, py)));
  const p = frame.perspective;
  if (p < 1e-9) return { origin: add(hit, scale(toward, frame.depthMm[0])), direction: scale(toward, -1) };
  const eye = add(
    frame.target,
    add(add(scale(right, frame.eyeMm[0]), scale(up, frame.eyeMm[1])), scale(toward, 1 / p)),
  );
  const along = subtract(hit, eye);
  return { origin: eye, direction: scale(along, 1 / Math.sqrt(dot(along, along))) };
}

/** Projection matrix for a camera placed at `target`, column by column. */
export function projectionColumns(frame: ViewFrame, aspect: number): number[] {
  const { perspective: p, eyeMm, centreMm, halfHeightMm: h, depthMm } = frame;
  const halfWidth = h * aspect;
  const [near, far] = depthMm;
  const [wNear, wFar] = [1 - p * near, 1 - p * far];
  const a = -(wNear + wFar) / (near - far);
  const b = wFar - a * far;
  return [
    ...[1 / halfWidth, 0, 0, 0],
    ...[0, 1 / h, 0, 0],
    ...[((centreMm[0] - eyeMm[0]) * p) / halfWidth, ((centreMm[1] - eyeMm[1]) * p) / h, a, -p],
    ...[-centreMm[0] / halfWidth, -centreMm[1] / h, b, 1],
  ];
}

const lerp = (a: number, b: number, t: number): number => a + (b - a) * t;

/** A frame on the way from one view to another. */
export function between(a: ViewFrame, b: ViewFrame, t: number): ViewFrame {
  if (t >= 1) return b;
  const perspective = lerp(a.perspective, b.perspective, t);
  const near = Math.max(a.depthMm[0], b.depthMm[0]);
  return {
    target: mix(a.target, b.target, t),
    orientation: slerp(a.orientation, b.orientation, t),
    perspective,
    eyeMm: [lerp(a.eyeMm[0], b.eyeMm[0], t), lerp(a.eyeMm[1], b.eyeMm[1], t)],
    centreMm: [lerp(a.centreMm[0], b.centreMm[0], t), lerp(a.centreMm[1], b.centreMm[1], t)],
    halfHeightMm: lerp(a.halfHeightMm, b.halfHeightMm, t),
    depthMm: [
      perspective > 0 ? Math.min(near, 0.8 / perspective) : near,
      Math.min(a.depthMm[1], b.depthMm[1]),
    ],
  };
}
