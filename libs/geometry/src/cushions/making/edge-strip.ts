import {
  outlinePoints,
  outlineStretches,
  stretchLength,
  type OutlineCorner,
  type OutlineStretch,
  type Point2,
} from '../../outlines/outline.ts';

/** How the strip round a plan divides into closure and boxing. */
export interface EdgeStrip {
  closure: { edgeMm: number; wrapMm: number; lengthMm: number };
  /** Boxing, from one end of the closure anticlockwise round to the other. */
  boxingMm: number;
  /** Ends of straight stretches along the boxing, from its start: where it is sewn to a corner. */
  marksMm: number[];
}

const isOf = (stretch: OutlineStretch, edge: string): boolean =>
  stretch.kind === 'line' && stretch.edge === edge;

/**
 * Divides the way round a plan: the closure takes an edge and goes round both its ends, the boxing takes the rest.
 *
 * An edge that a notch interrupts is closed over the notch as well: from its first stretch to its last.
 *
 * @param corners - plan, seam to seam
 * @param edge - with the closure
 * @param wrapMm - wanted round each end; less where the closure would meet itself
 * @returns lengths that together are the perimeter
 */
export function edgeStrip(corners: readonly OutlineCorner[], edge: string, wrapMm: number): EdgeStrip {
  const stretches = outlineStretches(corners);
  const lengths = stretches.map(stretchLength);
  const perimeter = lengths.reduce((sum, length) => sum + length, 0);
  const start = firstOf(stretches, edge);
  const turned = [...stretches.slice(start), ...stretches.slice(0, start)];
  const turnedLengths = [...lengths.slice(start), ...lengths.slice(0, start)];
  const last = turned.findLastIndex((stretch) => isOf(stretch, edge));
  const edgeMm = turnedLengths.slice(0, last + 1).reduce((sum, length) => sum + length, 0);
  const wrap = Math.min(wrapMm, (perimeter - edgeMm) / 2);
  const boxingMm = perimeter - edgeMm - 2 * wrap;
  const marksMm: number[] = [];
  let along = -wrap;
  for (const length of turnedLengths.slice(last + 1)) {
    if (along > 1e-6 && along < boxingMm - 1e-6) marksMm.push(along);
    along += length;
  }
  return { closure: { edgeMm, wrapMm: wrap, lengthMm: edgeMm + 2 * wrap }, boxingMm, marksMm };
}

/** The stretch with which an edge begins, going anticlockwise; the first stretch where no edge has that name. */
function firstOf(stretches: readonly OutlineStretch[], edge: string): number {
  const count = stretches.length;
  const gaps = stretches.map((stretch, i) => {
    if (!isOf(stretch, edge)) return -1;
    let gap = 0;
    while (gap < count && !isOf(stretches[(i + count - 1 - gap) % count]!, edge)) gap += 1;
    return gap;
  });
  const widest = Math.max(...gaps);
  return Math.max(0, gaps.indexOf(widest));
}

/**
 * The way of a closure along its edge and round both ends.
 *
 * @param corners - plan, seam to seam
 * @param edge - with the closure
 * @param wrapMm - round each end, as `edgeStrip` gives it
 * @returns points anticlockwise from one end of the closure to the other; arcs as chords
 */
export function closurePath(corners: readonly OutlineCorner[], edge: string, wrapMm: number): Point2[] {
  const stretches = outlineStretches(corners);
  const { closure } = edgeStrip(corners, edge, wrapMm);
  const points = outlinePoints(corners, 0.5);
  const start = stretches[firstOf(stretches, edge)]!.from;
  const first = points.findIndex(([x, y]) => Math.hypot(x - start[0], y - start[1]) < 1e-6);
  const way = [...points.slice(first), ...points.slice(0, first)];
  const forward = along(way, closure.edgeMm + wrapMm);
  const backward = along([way[0]!, ...way.slice(1).reverse()], wrapMm);
  return [...backward.slice(1).reverse(), ...forward];
}

/** The first so many millimetres of a closed way. */
function along(way: readonly Point2[], lengthMm: number): Point2[] {
  const taken: Point2[] = [way[0]!];
  let left = lengthMm;
  for (let i = 0; i < way.length && left > 1e-6; i += 1) {
    const [from, to] = [way[i]!, way[(i + 1) % way.length]!];
    const whole = Math.hypot(to[0] - from[0], to[1] - from[1]);
    const part = Math.min(1, left / whole);
    taken.push([from[0] + part * (to[0] - from[0]), from[1] + part * (to[1] - from[1])]);
    left -= whole;
  }
  return taken;
}
