import type { Vec3 } from '../parts/part.ts';
import type { PagePoint } from './drawing.ts';

/** From where a set is drawn: from above, or square from one side of the room. */
export const VIEW_DIRECTIONS = ['above', 'front', 'rear', 'left', 'right'] as const;
export type ViewDirection = (typeof VIEW_DIRECTIONS)[number];

/** How a set is drawn: everything needed to draw the same view again. */
export interface SetView {
  direction: ViewDirection;
  /**
   * Where the set is cut, millimetres in the room: a height from above, z from front or rear, x from left or right.
   * What stands before the plane is taken away. Nothing is cut when absent.
   */
  sectionMm?: number;
  /** What becomes of edges that stand behind something. */
  hidden: 'dashed' | 'left-out';
  /** Real millimetres for one of the paper: 20 is 1 : 20. Words and dimensions are laid out for it. */
  scale: number;
}

/** Directions of a page in the room: `right` and `down` span it, `toward` points at the eye. Unit vectors. */
export interface PageFrame {
  right: Vec3;
  down: Vec3;
  toward: Vec3;
}

const DOWN: Vec3 = [0, -1, 0];

const FRAMES: Record<ViewDirection, PageFrame> = {
  above: { right: [1, 0, 0], down: [0, 0, 1], toward: [0, 1, 0] },
  front: { right: [1, 0, 0], down: DOWN, toward: [0, 0, 1] },
  rear: { right: [-1, 0, 0], down: DOWN, toward: [0, 0, -1] },
  right: { right: [0, 0, -1], down: DOWN, toward: [1, 0, 0] },
  left: { right: [0, 0, 1], down: DOWN, toward: [-1, 0, 0] },
};

/**
 * The frame of a page.
 *
 * @param direction - from where the set is seen
 * @returns unit vectors in the room; none mirrors the set
 */
export function pageFrame(direction: ViewDirection): PageFrame {
  return FRAMES[direction];
}

/**
 * A point of the room as a view has it.
 *
 * @param frame - of the page
 * @param point - in the room, millimetres
 * @returns right and down on the page, then how near the eye; millimetres
 */
export function onPage({ right, down, toward }: PageFrame, [x, y, z]: Vec3): Vec3 {
  return [
    right[0] * x + right[1] * y + right[2] * z,
    down[0] * x + down[1] * y + down[2] * z,
    toward[0] * x + toward[1] * y + toward[2] * z,
  ];
}

/**
 * A point of the room on the page.
 *
 * @param frame - of the page
 * @param point - in the room, millimetres
 * @returns right and down
 */
export function pagePoint(frame: PageFrame, point: Vec3): PagePoint {
  const [x, y] = onPage(frame, point);
  return [x, y];
}

/**
 * How near the eye the section of a view lies.
 *
 * @param view - with or without a section
 * @returns the third number of `onPage` for the plane, millimetres; infinite when nothing is cut
 */
export function sectionDepth({ direction, sectionMm }: SetView): number {
  if (sectionMm === undefined) return Infinity;
  return direction === 'rear' || direction === 'left' ? -sectionMm : sectionMm;
}
