import { partEdges } from '../drawing/solid-outline.ts';
import { clamp, dot, length, mixPoints, sub } from '../mannequin/vector.ts';
import type { Part, Vec3 } from '../parts/part.ts';
import { deriveParts } from '../pieces/kinds.ts';
import type { SetDocument } from '../room/document.ts';
import type { MeasureEnd } from './dimension.ts';
import { withDimensions } from './edit-dimensions.ts';

/**
 * Keeps pinned lines where they were measured after parts took another shape: corners and edges are told by their
 * number, and a part of another outline counts them anew. An end goes to the corner, or the point of an edge, that lies
 * nearest to where it was.
 *
 * @param before - the set that was measured
 * @param after - the same pieces with other parts
 * @returns the new set; the same object where no line hangs on a part that changed
 */
export function refastenDimensions(before: SetDocument, after: SetDocument): SetDocument {
  if (!after.dimensions) return after;
  const [was, is] = [before, after].map((set) => new Map(deriveParts(set).map((part) => [part.id, part])));
  let moved = false;
  const dimensions = after.dimensions.map((dimension) => {
    const ends = dimension.ends.map((end) => {
      const [old, now] = 'partId' in end ? [was!.get(end.partId), is!.get(end.partId)] : [];
      if (!old || !now || isAlike(old, now)) return end;
      const next = nearest(end, old, now);
      moved ||= next !== end;
      return next;
    });
    return { ...dimension, ends: ends as typeof dimension.ends };
  });
  return moved ? withDimensions(after, dimensions) : after;
}

/** Cosine of how far an edge may turn and still be the same one: 45 degrees. */
const SAME_WAY = Math.SQRT1_2;

/** Whether corners and edges of two solids are counted alike: as many of them, and each edge runs about the same way. */
function isAlike(a: Part, b: Part): boolean {
  const [one, other] = [partEdges(a), partEdges(b)];
  if (a.solid.shape !== b.solid.shape || one.corners.length !== other.corners.length) return false;
  const run = ({ corners }: typeof one, [from, to]: [number, number]) => sub(corners[to]!, corners[from]!);
  return one.edges.every((edge) => {
    const [was, is] = [run(one, edge), run(other, edge)];
    return dot(was, is) >= SAME_WAY * length(was) * length(is);
  });
}

function nearest(end: MeasureEnd, old: Part, now: Part): MeasureEnd {
  const [before, { corners, edges }] = [partEdges(old), partEdges(now)];
  if (end.on === 'corner') {
    const at = before.corners[end.corner];
    return at ? { ...end, corner: leastOf(corners.map((corner) => distance(corner, at))) } : end;
  }
  if (end.on !== 'edge') return end;
  const [a, b] = (before.edges[end.edge] ?? []).map((n) => before.corners[n]);
  if (!a || !b) return end;
  const at = mixPoints(a, b, end.along);
  const feet = edges.map(([from, to]) => footOn(corners[from]!, corners[to]!, at));
  const edge = leastOf(feet.map(({ mm }) => mm));
  return { ...end, edge, along: feet[edge]!.along };
}

const distance = (a: Vec3, b: Vec3): number => length(sub(a, b));

/** Where on a stretch the point nearest to another lies. */
function footOn(from: Vec3, to: Vec3, at: Vec3): { along: number; mm: number } {
  const run = sub(to, from);
  const square = dot(run, run);
  const along = square > 0 ? clamp(dot(run, sub(at, from)) / square, 0, 1) : 0;
  return { along, mm: distance(mixPoints(from, to, along), at) };
}

function leastOf(values: readonly number[]): number {
  return values.reduce((best, value, n) => (value < values[best]! ? n : best), 0);
}
