import type { Handle } from '@settlewright/geometry';
import { boxAt, meet, type Box } from '../overlay/box.ts';
import { add, scale } from '../scene/vectors.ts';
import { pixelsPerMm, project, type ViewFrame, type Viewport } from '../scene/view-frame.ts';

/** Where the button of a handle stands, and which way its arrow points on the sheet. */
export interface PlacedHandle {
  x: number;
  y: number;
  angleRad: number;
}

/** Side of a button, CSS pixels. */
export const HANDLE_PX = 28;

/** A pull that the view shortens to less than this points at the eye. */
const TOWARDS_EYE = 0.3;
const PROBE_MM = 10;
const GAP = 3;
/** Off its point, along the pull and aside of it: first just outside the piece, then wherever there is room. */
const OFFSETS: readonly (readonly [number, number])[] = [
  [20, 0],
  [36, 0],
  [20, 30],
  [20, -30],
  [52, 0],
  [36, 34],
  [36, -34],
  [4, 44],
  [4, -44],
];

const buttonAt = (x: number, y: number): Box => boxAt(x, y, HANDLE_PX, HANDLE_PX);

/**
 * Finds a place for each handle outside its piece, clear of what stands there and of each other. A handle that
 * points at the eye, lies off the sheet or finds no room is left out; the one in the hand always has a place.
 */
export function placeHandles(
  frame: ViewFrame,
  viewport: Viewport,
  handles: readonly Handle[],
  taken: readonly Box[],
  inHand: string | undefined,
): Map<string, PlacedHandle> {
  const placed = new Map<string, PlacedHandle>();
  const full = [...taken];
  const pixels = pixelsPerMm(frame, viewport);
  const isInside = ({ left, right, top, bottom }: Box) =>
    left >= 0 && right <= viewport.width && top >= 0 && bottom <= viewport.height;
  const first = handles.filter(({ id }) => id === inHand);
  for (const handle of [...first, ...handles.filter(({ id }) => id !== inHand)]) {
    const at = project(frame, viewport, handle.atMm);
    const to = project(frame, viewport, add(handle.atMm, scale(handle.along, PROBE_MM)));
    const length = Math.hypot(to.x - at.x, to.y - at.y);
    const held = handle.id === inHand;
    if (!held && !(length > TOWARDS_EYE * PROBE_MM * pixels)) continue;
    const [ux, uy] = length > 0 ? [(to.x - at.x) / length, (to.y - at.y) / length] : [0, -1];
    const spots = OFFSETS.map(([out, aside]) => ({
      x: at.x + ux * out - uy * aside,
      y: at.y + uy * out + ux * aside,
    }));
    const free = held
      ? spots[0]
      : spots.find(({ x, y }) => {
          const box = buttonAt(x, y);
          return isInside(box) && !full.some((other) => meet(box, other, GAP));
        });
    if (!free) continue;
    full.push(buttonAt(free.x, free.y));
    placed.set(handle.id, { ...free, angleRad: Math.atan2(uy, ux) });
  }
  return placed;
}
