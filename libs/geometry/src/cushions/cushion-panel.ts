import { outlinePoints, type OutlineCorner, type Point2 } from '../outlines/outline.ts';
import { shapedOutline, type CushionShape } from './cushion-shape.ts';

/** Chords of a rounded corner: how far off the arc, and what they turn by; less than what is inked as an edge. */
const SAG_MM = 0.5;
const TURN_RAD = 0.3;

/**
 * The outline of a cushion in the room.
 *
 * It is laid into the place of the cushion, wood to wood, as plain cushions are: the fitting gaps, an eighth or a quarter
 * of an inch, are said on the order and not built here. What was drawn freely starts in the place's front corner at
 * the sitter's right.
 *
 * @param placeMm - width and depth of the place; of a back its height
 * @param shape - what was chosen
 * @returns points about the middle of the place, anticlockwise as the face is seen with its back edge up;
 * `undefined` where it is the plain rectangle, or cannot be cut
 */
export function cushionPanel(
  placeMm: { widthMm: number; depthMm: number },
  shape: CushionShape | undefined,
): Point2[] | undefined {
  if (!shape) return undefined;
  const outline = shapedOutline(placeMm, shape);
  if (!outline.ok || isPlain(outline.corners, placeMm)) return undefined;
  const { widthMm, depthMm } = placeMm;
  return outlinePoints(outline.corners, SAG_MM, TURN_RAD).map(([x, y]): Point2 => [
    x - widthMm / 2,
    y - depthMm / 2,
  ]);
}

function isPlain(
  corners: readonly OutlineCorner[],
  { widthMm, depthMm }: { widthMm: number; depthMm: number },
): boolean {
  const isOn = (value: number, end: number) => Math.abs(value) < 1e-6 || Math.abs(value - end) < 1e-6;
  return (
    corners.length === 4 &&
    corners.every(({ at: [x, y], radiusMm }) => radiusMm === 0 && isOn(x, widthMm) && isOn(y, depthMm))
  );
}
