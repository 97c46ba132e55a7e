import type { Part, Vec3 } from '../parts/part.ts';
import { pagePoint, type PageFrame } from './set-view.ts';
import { boxAround, type Box } from './page-box.ts';
import { partEdges } from './solid-outline.ts';

/**
 * The box that parts fill on a page.
 *
 * @param parts - of a piece
 * @param frame - of the page
 * @returns millimetres, right and down
 */
export function extentOf(parts: readonly Part[], frame: PageFrame): Box {
  return boxAround(parts.flatMap((part) => cornersOf(part).map((corner) => pagePoint(frame, corner))));
}

/** Corners of a part; of an upright round one the corners of the box around it, whose extent is the true one. */
function cornersOf(part: Part): readonly Vec3[] {
  if (part.solid.shape !== 'cylinder') return partEdges(part).corners;
  const { radiusMm: r, heightMm } = part.solid;
  const [x, y, z] = part.positionMm;
  const h = heightMm / 2;
  return [-1, 1].flatMap((a) =>
    [-1, 1].flatMap((b) => [-1, 1].map((c): Vec3 => [x + a * r, y + b * h, z + c * r])),
  );
}

/**
 * Highest point of parts.
 *
 * @param parts - at least one
 * @returns millimetres above the floor
 */
export function topOf(parts: readonly Part[]): number {
  return Math.max(...parts.flatMap((part) => cornersOf(part).map(([, y]) => y)));
}

/**
 * Lowest point of parts.
 *
 * @param parts - at least one
 * @returns millimetres above the floor
 */
export function bottomOf(parts: readonly Part[]): number {
  return Math.min(...parts.flatMap((part) => cornersOf(part).map(([, y]) => y)));
}
