import type { Gap } from '../distance/gap.ts';
import { boundsGap, hull } from '../distance/shape.ts';
import { skinPatches } from '../distance/skin-patches.ts';
import { partSurface } from '../distance/solids.ts';
import { solidSurface, surfaceGap, type Surface } from '../distance/surface.ts';
import { partEdges } from '../drawing/solid-outline.ts';
import { mixPoints } from '../mannequin/vector.ts';
import type { Vec3 } from '../parts/part.ts';
import { bodyPoint } from './body-points.ts';
import type { MeasureEnd } from './dimension.ts';
import type { MeasuringScene } from './measuring-scene.ts';

/** A measured line in the room, millimetres. */
export interface MeasuredLine {
  fromMm: Vec3;
  toMm: Vec3;
  /** Straight from end to end; below 0 where two whole things reach into each other. */
  distanceMm: number;
  /** Its share along the room's x, up, and along the room's z; never below 0. */
  acrossMm: number;
  upMm: number;
  alongMm: number;
}

/** What lies at an end; a point where it is one. */
interface Found {
  surfaces: readonly Surface[];
  point?: Vec3;
}

/**
 * Where a point end lies.
 *
 * @param end - of a line
 * @param scene - the set and who sits in it
 * @returns room frame, millimetres; `undefined` for a whole thing, or where its part or sitter is not there
 */
export function endPoint(end: MeasureEnd, scene: MeasuringScene): Vec3 | undefined {
  if (end.on === 'body') {
    const body = scene.body(end.pieceId, end.place);
    return body && end.point !== 'whole' ? bodyPoint(body, end.point) : undefined;
  }
  const part = scene.parts.get(end.partId);
  if (!part || end.on === 'part') return undefined;
  if (end.on === 'spot') return scene.spot(end.pieceId, end.atMm);
  const { corners, edges } = partEdges(part);
  if (end.on === 'corner') return corners[end.corner];
  const [a, b] = (edges[end.edge] ?? []).map((n) => corners[n]);
  return a && b && mixPoints(a, b, end.along);
}

function found(end: MeasureEnd, scene: MeasuringScene): Found | undefined {
  if (end.on === 'body' && end.point === 'whole') {
    const body = scene.body(end.pieceId, end.place);
    return body && { surfaces: skinPatches(body.mesh) };
  }
  if (end.on === 'part') {
    const part = scene.parts.get(end.partId);
    return part && { surfaces: [partSurface(part)] };
  }
  const point = endPoint(end, scene);
  return point && { surfaces: [solidSurface(hull([point]))], point };
}

/** The smallest gap; of things that meet how deep the deepest stretch is. */
function gapOf(one: Found, other: Found): Gap | undefined {
  const pairs = one.surfaces
    .flatMap((ours) => other.surfaces.map((theirs) => ({ ours, theirs, atLeast: boundsGap(ours, theirs) })))
    .sort((a, b) => a.atLeast - b.atLeast);
  let best: Gap | undefined;
  for (const { ours, theirs, atLeast } of pairs) {
    const limit = best ? Math.max(0, best.distanceMm) : Infinity;
    if (atLeast > limit) break;
    const gap = surfaceGap(ours, theirs, limit);
    if (gap && (!best || gap.distanceMm < best.distanceMm)) best = gap;
  }
  return best;
}

/**
 * Measures between two ends: points as they are, whole parts and bodies by the shortest way between them.
 *
 * @param ends - what is measured between
 * @param scene - the set and who sits in it
 * @returns the line; `undefined` where an end is not there
 */
export function measureEnds(
  [one, other]: readonly [MeasureEnd, MeasureEnd],
  scene: MeasuringScene,
): MeasuredLine | undefined {
  const [from, to] = [found(one, scene), found(other, scene)];
  if (!from || !to) return undefined;
  if (from.point && to.point) return lineOf(from.point, to.point);
  const gap = gapOf(from, to);
  return gap && { ...lineOf(gap.fromMm, gap.toMm), distanceMm: gap.distanceMm };
}

function lineOf(fromMm: Vec3, toMm: Vec3): MeasuredLine {
  const [acrossMm, upMm, alongMm] = ([0, 1, 2] as const).map((n) => Math.abs(toMm[n] - fromMm[n]));
  return {
    fromMm,
    toMm,
    distanceMm: Math.hypot(acrossMm!, upMm!, alongMm!),
    acrossMm: acrossMm!,
    upMm: upMm!,
    alongMm: alongMm!,
  };
}
