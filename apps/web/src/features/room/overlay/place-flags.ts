import type { Vec3 } from '@settlewright/geometry';
import { project, type ScreenPoint, type ViewFrame, type Viewport } from '../scene/view-frame.ts';
import { boxAt, boxOf, EDGE, HEAD_WIDTH_MM, meet, type Box } from './box.ts';
import type { PlacedName } from './place-names.ts';

/** A flag to be placed over the picture, in CSS pixels; its size is that of the rendered element. */
export interface FlagToPlace {
  id: string;
  fromMm: Vec3;
  toMm: Vec3;
  width: number;
  height: number;
}

export interface PlacedFlag {
  id: string;
  /** Its middle. */
  x: number;
  y: number;
  width: number;
  height: number;
  from: ScreenPoint;
  to: ScreenPoint;
  /** Where a leader starts when the flag had to leave its line. */
  leader?: { x: number; y: number };
}

/** Something round that a flag had better not cover: a part of a body. */
export interface Blob {
  atMm: Vec3;
  radiusMm: number;
}

const HEAD_HEIGHT_MM = 240;

/** Flags and names stand so far apart, CSS pixels. */
const APART = 4;

const ALONG = [0.5, 0.36, 0.64, 0.22, 0.78];
const ASIDE = [26, -26, 48, -48, 72, -72, 100, -100, 136, -136];
/** Off its own cross line as well, where that is full. */
const SHIFTS = [0, 32, -32, 64, -64, 96, -96];
/** A line this much shortened by the view is seen end on and says nothing. */
const END_ON = 0.08;

/** Whether a line of the room runs so nearly towards the eye that it cannot be read. */
export function isEndOn(frame: ViewFrame, viewport: Viewport, fromMm: Vec3, toMm: Vec3): boolean {
  const [from, to] = [project(frame, viewport, fromMm), project(frame, viewport, toMm)];
  const pixels = viewport.height / (2 * frame.halfHeightMm);
  const trueMm = Math.hypot(toMm[0] - fromMm[0], toMm[1] - fromMm[1], toMm[2] - fromMm[2]);
  return Math.hypot(to.x - from.x, to.y - from.y) < END_ON * trueMm * pixels;
}

/**
 * Finds a place for each flag: on its line, then along it, then off it with a leader.
 * Flags keep clear of heads, names and each other and stay on the sheet; they are never turned.
 */
export function placeFlags(
  frame: ViewFrame,
  viewport: Viewport,
  flags: readonly FlagToPlace[],
  headsMm: readonly Vec3[],
  names: readonly PlacedName[],
  bodies: readonly Blob[] = [],
): PlacedFlag[] {
  const pixels = viewport.height / (2 * frame.halfHeightMm);
  const taken: Box[] = headsMm.map((head) => {
    const top = project(frame, viewport, head);
    const height = HEAD_HEIGHT_MM * pixels;
    return boxAt(top.x, top.y + height / 2, HEAD_WIDTH_MM * pixels, height);
  });
  const rows = new Set(names.map((name) => name.y));
  const [row] = rows;
  if (rows.size === 1 && row !== undefined) {
    taken.push({ left: 0, right: viewport.width, top: row - 12, bottom: row + 12 });
  } else taken.push(...names.map(boxOf));
  const shy: Box[] = bodies.map(({ atMm, radiusMm }) => {
    const at = project(frame, viewport, atMm);
    return boxAt(at.x, at.y, radiusMm * 2 * pixels, radiusMm * 2 * pixels);
  });
  return flags.map((flag) => {
    const from = project(frame, viewport, flag.fromMm);
    const to = project(frame, viewport, flag.toMm);
    const length = Math.hypot(to.x - from.x, to.y - from.y);
    const across =
      length < 1 ? { x: 1, y: 0 } : { x: (to.y - from.y) / length, y: -(to.x - from.x) / length };
    const isFree = (x: number, y: number, avoid: readonly Box[]): boolean => {
      const box = boxAt(x, y, flag.width, flag.height);
      const inside =
        box.left >= EDGE &&
        box.right <= viewport.width - EDGE &&
        box.top >= EDGE &&
        box.bottom <= viewport.height - EDGE;
      return inside && ![...taken, ...avoid].some((other) => meet(box, other, APART));
    };
    const on = (t: number) => ({ x: from.x + (to.x - from.x) * t, y: from.y + (to.y - from.y) * t });
    const middle = on(0.5);
    const keep = (x: number, y: number, leader: boolean): PlacedFlag => {
      const { id, width, height } = flag;
      taken.push(boxAt(x, y, width, height));
      return { id, x, y, width, height, from, to, ...(leader ? { leader: middle } : {}) };
    };
    // A line much shorter than its flag would vanish behind it.
    const hides = length < Math.abs(across.x) * flag.height * 1.4 + Math.abs(across.y) * flag.width * 1.25;
    // Clear of bodies if there is such a place, else at least of heads, names and other flags.
    for (const avoid of [shy, []]) {
      if (!hides) {
        for (const t of ALONG) {
          const at = on(t);
          if (isFree(at.x, at.y, avoid)) return keep(at.x, at.y, false);
        }
      }
      for (const shift of SHIFTS) {
        for (const aside of ASIDE) {
          const reach = Math.sign(aside) * (Math.abs(across.x) * flag.width * 0.5) + aside;
          const x = middle.x + across.x * reach - across.y * shift;
          const y = middle.y + across.y * aside + across.x * shift;
          if (isFree(x, y, avoid)) return keep(x, y, true);
        }
      }
    }
    const x = Math.min(Math.max(middle.x, EDGE + flag.width / 2), viewport.width - EDGE - flag.width / 2);
    const y = Math.min(Math.max(middle.y, EDGE + flag.height / 2), viewport.height - EDGE - flag.height / 2);
    return keep(x, y, Math.hypot(x - middle.x, y - middle.y) > 2);
  });
}

/** The tape as a path: the line, its two end ticks, and true ticks along one side. */
export function tapePath(placed: Pick<PlacedFlag, 'from' | 'to'>, lengthMm: number, tickMm: number): string {
  const { from, to } = placed;
  const length = Math.hypot(to.x - from.x, to.y - from.y);
  // Also false for a point that the view cannot place, as on a sheet without height.
  if (!(length >= 1)) return '';
  const [ux, uy] = [(to.x - from.x) / length, (to.y - from.y) / length];
  const [nx, ny] = [-uy, ux];
  const point = (along: number, side: number) =>
    `${(from.x + ux * along + nx * side).toFixed(1)} ${(from.y + uy * along + ny * side).toFixed(1)}`;
  const strokes = [
    `M${point(0, 0)}L${point(length, 0)}`,
    `M${point(0, -6)}L${point(0, 6)}`,
    `M${point(length, -6)}L${point(length, 6)}`,
  ];
  const gap = lengthMm > 0 ? (length * tickMm) / lengthMm : 0;
  if (gap >= 3.5) {
    for (let n = 1; n * gap < length - 1; n++) {
      strokes.push(`M${point(n * gap, 0)}L${point(n * gap, n % 6 === 0 ? 5 : 3)}`);
    }
  }
  return strokes.join('');
}
