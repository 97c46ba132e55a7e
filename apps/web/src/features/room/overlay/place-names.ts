import type { Vec3 } from '@settlewright/geometry';
import { project, type ScreenPoint, type ViewFrame, type Viewport } from '../scene/view-frame.ts';
import { boxAt, EDGE, HEAD_WIDTH_MM, meet, type Box } from './box.ts';

/** A name to be placed over the picture, in CSS pixels; its size is that of the rendered element. */
export interface NameToPlace {
  id: string;
  headMm: Vec3;
  width: number;
  height: number;
}

export interface PlacedName {
  id: string;
  /** Middle of the words. */
  x: number;
  y: number;
  width: number;
  height: number;
  head: { x: number; y: number };
}

const NAME_GAP = 18;
const NAME_ROW = 20;
const NAME_ABOVE_HEADS = 46;

/** Puts names into one row, or into several where one is too short, in the order of their heads so that no leader crosses another. */
export function placeNames(
  frame: ViewFrame,
  viewport: Viewport,
  names: readonly NameToPlace[],
): PlacedName[] {
  const heads = names
    .map((name) => ({ name, head: project(frame, viewport, name.headMm) }))
    .filter(({ head }) => head.x > EDGE && head.x < viewport.width - EDGE)
    .sort((a, b) => a.head.x - b.head.x);
  if (heads.length === 0) return [];
  const words = heads.reduce((sum, { name }) => sum + name.width + NAME_GAP, -NAME_GAP);
  const rows = Math.max(1, Math.ceil(words / Math.max(1, viewport.width - 2 * EDGE)));
  const highest = Math.min(...heads.map(({ head }) => head.y));
  const first = Math.min(highest - NAME_ABOVE_HEADS, viewport.height - 20);
  const y = Math.max(14 + (rows - 1) * NAME_ROW, first);
  // Who does not find room in one row stands in turns in the rows above it.
  return Array.from({ length: rows }, (_, row) =>
    rowOf(
      heads.filter((_head, n) => n % rows === row),
      viewport.width,
      y - row * NAME_ROW,
    ),
  ).flat();
}

interface Head {
  name: NameToPlace;
  head: ScreenPoint;
}

function rowOf(heads: readonly Head[], width: number, y: number): PlacedName[] {
  const left: number[] = [];
  let edge = EDGE;
  for (const { name, head } of heads) {
    const at = Math.max(edge, head.x - name.width / 2);
    left.push(at);
    edge = at + name.width + NAME_GAP;
  }
  let limit = width - EDGE;
  for (let n = heads.length - 1; n >= 0; n--) {
    const wide = heads[n]?.name.width ?? 0;
    left[n] = Math.max(EDGE, Math.min(left[n] ?? 0, limit - wide));
    limit = (left[n] ?? 0) - NAME_GAP;
  }
  return heads.map(({ name, head }, n) => ({
    id: name.id,
    x: (left[n] ?? 0) + name.width / 2,
    y,
    width: name.width,
    height: name.height,
    head: { x: head.x, y: head.y },
  }));
}

/** Seen from above: each name just below its own head. */
export function placeNamesAtHeads(
  frame: ViewFrame,
  viewport: Viewport,
  names: readonly NameToPlace[],
): PlacedName[] {
  const pixels = viewport.height / (2 * frame.halfHeightMm);
  const taken: Box[] = [];
  return names.map(({ id, headMm, width, height }) => {
    const head = project(frame, viewport, headMm);
    const x = Math.min(Math.max(head.x, EDGE + width / 2), viewport.width - EDGE - width / 2);
    const below = head.y + HEAD_WIDTH_MM * 0.75 * pixels + height / 2;
    // Heads side by side may be nearer than their names are wide: the next stands a row lower.
    const rows = [0, 1, 2].map((row) => boxAt(x, below + row * (height + 2), width, height));
    const box = rows.find((row) => !taken.some((other) => meet(row, other, 1))) ?? rows[0]!;
    taken.push(box);
    return { id, x, y: (box.top + box.bottom) / 2, width, height, head };
  });
}
