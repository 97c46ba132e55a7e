import { partPieces } from '../drawing/part-pieces.ts';
import { convexOutline } from '../drawing/solid-outline.ts';
import { halfOutline } from '../outlines/half-outline.ts';
import type { Part } from '../parts/part.ts';

/** A point seen from above: two level axes, millimetres. */
export type PlanPoint = readonly [number, number];

/** A convex outline seen from above. */
export type PlanOutline = readonly PlanPoint[];

/** A part as clearances see it: an upright prism around it. */
export interface PlanSolid {
  pieceId: string;
  role: Part['role'];
  bottomMm: number;
  topMm: number;
  outline: PlanOutline;
  /** Circle around the outline, in the room: x, z and radius. */
  circle: readonly [number, number, number];
}

const CIRCLE_SIDES = 32;

/**
 * A part as clearances see it: the upright prism around it, or those around the pieces of a shaped cushion.
 *
 * @param part - a placed part, turned about y and x only
 * @returns outlines in the room's x and z, and height ranges
 */
export function planSolids(part: Part): PlanSolid[] {
  const { solid, pieceId, role } = part;
  if (solid.shape !== 'prism' || !solid.isPanel) return [planSolid(part)];
  return partPieces(part).map(({ corners }) => {
    const outline = convexOutline(corners.map(([x, , z]): PlanPoint => [x, z]));
    const heights = corners.map(([, y]) => y);
    const [[x0, x1], [z0, z1]] = [extent(outline, 0), extent(outline, 1)];
    return {
      pieceId,
      role,
      bottomMm: Math.min(...heights),
      topMm: Math.max(...heights),
      outline,
      circle: [(x0 + x1) / 2, (z0 + z1) / 2, Math.hypot(x1 - x0, z1 - z0) / 2],
    };
  });
}

function planSolid(part: Part): PlanSolid {
  const [px, py, pz] = part.positionMm;
  const [pitch, yaw] = part.rotationRad;
  const [c, s] = [Math.cos(yaw), Math.sin(yaw)];
  const place = (x: number, z: number): PlanPoint => [px + x * c + z * s, pz - x * s + z * c];
  const rectangle = (x0: number, x1: number, z0: number, z1: number): PlanOutline => [
    place(x0, z0),
    place(x1, z0),
    place(x1, z1),
    place(x0, z1),
  ];
  const { solid } = part;
  const named = { pieceId: part.pieceId, role: part.role };
  if (solid.shape === 'cylinder') {
    const outline = Array.from({ length: CIRCLE_SIDES }, (_, i) => {
      const angle = (2 * Math.PI * i) / CIRCLE_SIDES;
      return place(solid.radiusMm * Math.cos(angle), solid.radiusMm * Math.sin(angle));
    });
    return {
      ...named,
      bottomMm: py - solid.heightMm / 2,
      topMm: py + solid.heightMm / 2,
      outline,
      circle: [px, pz, solid.radiusMm],
    };
  }
  if (solid.shape === 'prism') {
    const xs = solid.outlineMm.map(([x]) => x);
    const ys = solid.outlineMm.map(([, y]) => y);
    const [x0, x1] = [Math.min(...xs), Math.max(...xs)];
    const outline = rectangle(x0, x1, -solid.depthMm / 2, solid.depthMm / 2);
    const [cx, cz] = place((x0 + x1) / 2, 0);
    return {
      ...named,
      bottomMm: py + Math.min(...ys),
      topMm: py + Math.max(...ys),
      outline,
      circle: [cx, cz, Math.hypot(x1 - x0, solid.depthMm) / 2],
    };
  }
  const [w, h, d] = solid.sizeMm;
  const [cp, sp] = [Math.abs(Math.cos(pitch)), Math.abs(Math.sin(pitch))];
  const halfZ = (d * cp + h * sp) / 2;
  const halfY = (h * cp + d * sp) / 2;
  return {
    ...named,
    bottomMm: py - halfY,
    topMm: py + halfY,
    outline: rectangle(-w / 2, w / 2, -halfZ, halfZ),
    circle: [px, pz, Math.hypot(w / 2, halfZ)],
  };
}

/** A level frame: an origin and the direction its second axis looks in. */
export interface PlanFrame {
  xMm: number;
  zMm: number;
  facingRad: number;
}

/**
 * Takes an outline from the room into a frame: first axis to the left of whoever looks along the second.
 *
 * @param outline - in the room's x and z
 * @param frame - origin and facing
 * @returns the outline in the frame's two axes
 */
export function inFrame(outline: PlanOutline, frame: PlanFrame): PlanOutline {
  const [c, s] = [Math.cos(frame.facingRad), Math.sin(frame.facingRad)];
  return outline.map(([x, z]) => {
    const [dx, dz] = [x - frame.xMm, z - frame.zMm];
    return [dx * c - dz * s, dx * s + dz * c] as const;
  });
}

/**
 * Takes an outline from a frame back into the room.
 *
 * @param outline - in the frame's two axes
 * @param frame - origin and facing
 * @returns the outline in the room's x and z
 */
export function outOfFrame(outline: PlanOutline, frame: PlanFrame): PlanOutline {
  const [c, s] = [Math.cos(frame.facingRad), Math.sin(frame.facingRad)];
  return outline.map(([left, ahead]) => [frame.xMm + left * c + ahead * s, frame.zMm - left * s + ahead * c]);
}

/**
 * A rectangle along the axes of a frame.
 *
 * @param frame - origin and facing
 * @param left - limits along the first axis
 * @param ahead - limits along the second axis
 * @returns the rectangle in the room's x and z
 */
export function rectangleIn(
  frame: PlanFrame,
  left: readonly [number, number],
  ahead: readonly [number, number],
): PlanOutline {
  return outOfFrame(
    [
      [left[0], ahead[0]],
      [left[1], ahead[0]],
      [left[1], ahead[1]],
      [left[0], ahead[1]],
    ],
    frame,
  );
}

/** A window in a frame; an open side is infinite. */
export interface PlanWindow {
  left?: readonly [number, number];
  ahead?: readonly [number, number];
}

/** What shares less than this with a window only touches it, millimetres. */
const TOUCHING_MM = 1e-6;

/**
 * The part of a convex outline inside a window.
 *
 * @param outline - convex, in the frame of the window
 * @param window - limits along the first axis (`left`) and the second (`ahead`)
 * @returns the outline cut to the window; empty when they do not meet or only touch
 */
export function clipped(outline: PlanOutline, window: PlanWindow): PlanOutline {
  const rest = clippedLine(outline, window);
  if (rest.length < 3) return [];
  const [x0, x1] = extent(rest, 0);
  const [z0, z1] = extent(rest, 1);
  return x1 - x0 < TOUCHING_MM || z1 - z0 < TOUCHING_MM ? [] : rest;
}

/**
 * The part of a line, or of an outline without width, inside a window.
 *
 * @param outline - convex, in the frame of the window
 * @param window - limits along the first axis (`left`) and the second (`ahead`)
 * @returns the line cut to the window; empty when they do not meet
 */
export function clippedLine(outline: PlanOutline, window: PlanWindow): PlanOutline {
  let rest = outline;
  for (const [axis, limits] of [
    [0, window.left],
    [1, window.ahead],
  ] as const) {
    if (limits === undefined) continue;
    rest = halfOutline(rest, axis, limits[0], 1);
    rest = halfOutline(rest, axis, limits[1], -1);
  }
  return rest;
}

/**
 * Area of an outline.
 *
 * @param outline - simple polygon
 * @returns square millimetres, never negative
 */
export function area(outline: PlanOutline): number {
  let twice = 0;
  outline.forEach(([x, z], i) => {
    const [nx, nz] = outline[(i + 1) % outline.length] ?? [x, z];
    twice += x * nz - nx * z;
  });
  return Math.abs(twice) / 2;
}

/**
 * Lowest and highest value of an outline along an axis.
 *
 * @param outline - at least one point
 * @param axis - 0 for the first axis, 1 for the second
 * @returns [lowest, highest]
 */
export function extent(outline: PlanOutline, axis: 0 | 1): [number, number] {
  let [low, high] = [Infinity, -Infinity];
  for (const point of outline) {
    low = Math.min(low, point[axis]);
    high = Math.max(high, point[axis]);
  }
  return [low, high];
}
