import type { Vec3 } from '@settlewright/geometry';
import { cornersOf, type Bounds } from './bounds';
import { cross, dot, fromAxes, subtract, type Quat } from './vectors';
import { onPlane, type ViewFrame, type Viewport } from './view-frame';

/** The lettered views of the key plan, and the free one. */
export const VIEW_LETTERS = ['A', 'B', 'C', 'D', 'E'] as const;
export type ViewLetter = (typeof VIEW_LETTERS)[number];

/** What the scene can be seen through: a lettered view, or a lens that stands in the room. */
export type SceneView = ViewLetter | 'lens';

export const VIEW_TITLES: Record<SceneView, string> = {
  A: 'From the aisle',
  B: 'Along the room',
  C: 'A cut through the bench',
  D: 'From above',
  E: 'From the corner',
  lens: 'Through a lens',
};

/** B, C and D are true to scale and carry a bar. */
export const isToScale = (letter: SceneView): boolean => letter === 'B' || letter === 'C' || letter === 'D';

/** Standing place of the section: a point in the plane and the direction that looks out of it. */
export interface Cut {
  pointMm: Vec3;
  toward: Vec3;
}

/** Whether a point is left when the section has taken away what stands before it. */
export const isBehind = (point: Vec3, cut: Cut | undefined): boolean =>
  cut === undefined || dot(subtract(point, cut.pointMm), cut.toward) <= 40;

/** Whether somebody keeps a name in the drawing: a level cut opens people, it takes none away. */
export const isBodyLeft = (crownMm: Vec3, cut: Cut | undefined): boolean =>
  (cut !== undefined && cut.toward[1] > 0.9) || isBehind(crownMm, cut);

export interface Insets {
  top: number;
  right: number;
  bottom: number;
  left: number;
}

export interface ViewRequest {
  letter: ViewLetter;
  bounds: Bounds;
  viewport: Viewport;
  insets: Insets;
  /** 1 fits the set into the sheet. */
  zoom: number;
  panMm: readonly [number, number];
  /** Of the free view, radians. */
  azimuth: number;
  elevation: number;
  cut?: Cut;
}

const UP: Vec3 = [0, 1, 0];
const EYE_ABOVE_FLOOR_MM = 1950;

function facing(toward: Vec3): Quat {
  return fromAxes(cross(UP, toward), UP, toward);
}

function orientationOf(request: ViewRequest): Quat {
  switch (request.letter) {
    case 'A':
      return facing([0, 0, 1]);
    case 'B':
      return facing([-1, 0, 0]);
    case 'C':
      // A level cut has no front: it is seen as the room is.
      return facing(request.cut && Math.abs(request.cut.toward[1]) < 0.9 ? request.cut.toward : [0, 0, 1]);
    case 'D':
      return fromAxes([1, 0, 0], [0, 0, -1], UP);
    case 'E': {
      const [ca, sa] = [Math.cos(request.azimuth), Math.sin(request.azimuth)];
      const [ce, se] = [Math.cos(request.elevation), Math.sin(request.elevation)];
      const right: Vec3 = [ca, 0, -sa];
      const toward: Vec3 = [sa * ce, se, ca * ce];
      return fromAxes(right, cross(toward, right), toward);
    }
  }
}

/** The frame that shows `bounds` within the insets of the sheet. */
export function frameFor(request: ViewRequest): ViewFrame {
  const { letter, bounds, viewport, insets, zoom, panMm } = request;
  const { min, max } = bounds;
  const middle: Vec3 = [(min[0] + max[0]) / 2, (min[1] + max[1]) / 2, (min[2] + max[2]) / 2];
  const size = Math.hypot(max[0] - min[0], max[1] - min[1], max[2] - min[2]);
  const target: Vec3 = letter === 'A' ? [middle[0], middle[1], max[2]] : middle;
  const eyeDistance = Math.max(3600, letter === 'A' ? (max[0] - min[0]) * 1.05 + 700 : size * 1.7);
  const loose: ViewFrame = {
    target,
    orientation: orientationOf(request),
    perspective: letter === 'A' || letter === 'E' ? 1 / eyeDistance : 0,
    eyeMm: letter === 'A' ? [0, Math.max(EYE_ABOVE_FLOOR_MM, max[1] + 350) - target[1]] : [0, 0],
    centreMm: [0, 0],
    halfHeightMm: 1,
    depthMm: [
      letter === 'A' || letter === 'E' ? Math.min(size + 600, eyeDistance * 0.8) : size + 600,
      -size - 3000,
    ],
  };
  const points = cornersOf(bounds).map((corner) => onPlane(loose, corner));
  const [left, right] = [Math.min(...points.map((p) => p.x)), Math.max(...points.map((p) => p.x))];
  const [bottom, top] = [Math.min(...points.map((p) => p.y)), Math.max(...points.map((p) => p.y))];
  const freeWidth = Math.max(40, viewport.width - insets.left - insets.right);
  const freeHeight = Math.max(40, viewport.height - insets.top - insets.bottom);
  const mmPerPixel = Math.max((right - left) / freeWidth, (top - bottom) / freeHeight, 0.05) / zoom;
  return {
    ...loose,
    halfHeightMm: (mmPerPixel * viewport.height) / 2,
    centreMm: [
      (left + right) / 2 + ((insets.right - insets.left) / 2) * mmPerPixel + panMm[0],
      (bottom + top) / 2 + ((insets.top - insets.bottom) / 2) * mmPerPixel + panMm[1],
    ],
  };
}
