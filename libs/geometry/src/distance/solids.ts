import type { MannequinSegment } from '../mannequin/segments.ts';
import { turnAboutX, turnAboutY } from '../mannequin/vector.ts';
import type { Part, Vec3 } from '../parts/part.ts';
import { partPieces } from '../drawing/part-pieces.ts';
import { partEdges } from '../drawing/solid-outline.ts';
import { boundsAround, cylinder, ellipsoid, hull, roundedCone, type Shape } from './shape.ts';
import { solidSurface, type Surface } from './surface.ts';

const ZERO: Vec3 = [0, 0, 0];

/**
 * A simple solid of a body, as distances see it.
 *
 * @param segment - from a posed body, room frame
 */
export function segmentShape(segment: MannequinSegment): Shape {
  if (segment.kind === 'rounded-cone') {
    return roundedCone(segment.fromMm, segment.fromRadiusMm, segment.toMm, segment.toRadiusMm);
  }
  const { radiiMm, leanRad, facingRad } = segment;
  const axis = (v: Vec3): Vec3 => turnAboutY(turnAboutX(v, ZERO, leanRad), ZERO, facingRad);
  return ellipsoid(segment.centreMm, [
    axis([radiiMm[0], 0, 0]),
    axis([0, radiiMm[1], 0]),
    axis([0, 0, radiiMm[2]]),
  ]);
}

/**
 * The convex solid around a part: boxes and round bars as they are, a hollow prism filled up.
 *
 * @param part - placed in the room
 */
export function partShape(part: Part): Shape {
  const { corners } = partEdges(part);
  if (part.solid.shape !== 'cylinder') return hull(corners);
  const half = corners.length / 2;
  const centreOf = (ring: readonly Vec3[]): Vec3 =>
    [0, 1, 2].map((i) => ring.reduce((sum, p) => sum + p[i]!, 0) / ring.length) as unknown as Vec3;
  const [bottom, top] = [centreOf(corners.slice(0, half)), centreOf(corners.slice(half))];
  const mean = (i: 0 | 1 | 2): number => (bottom[i] + top[i]) / 2;
  return cylinder(
    [mean(0), mean(1), mean(2)],
    [(top[0] - bottom[0]) / 2, (top[1] - bottom[1]) / 2, (top[2] - bottom[2]) / 2],
    part.solid.radiusMm,
  );
}

/**
 * A part, as distances see it: itself, a hollow prism in convex pieces.
 *
 * @param part - placed in the room
 */
export function partSurface(part: Part): Surface {
  const pieces = partPieces(part);
  if (pieces.length === 1) return solidSurface(partShape(part));
  const shapes = pieces.map(({ corners }) => hull(corners));
  return {
    ...boundsAround(shapes),
    runs: shapes.map((shape) => ({ minMm: shape.minMm, maxMm: shape.maxMm, shapes: () => [shape] })),
    around: () => partShape(part),
    convex: false,
  };
}
