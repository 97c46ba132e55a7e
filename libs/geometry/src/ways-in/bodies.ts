import type { PlanOutline, PlanPoint } from '../situation/plan.ts';
import type { SurveyedPlace } from '../situation/survey.ts';
import { convexOf } from './convex.ts';
import type { Obstacle } from './obstacles.ts';
import { coreAt, poseAhead, type Pose } from './room-around.ts';
import { seated, standing, type Band, type BodyHeights, type Walker } from './walker.ts';

const SIDES = 24;

/**
 * Outline of a band, for drawing and for whoever passes: around the stadium, never within it.
 *
 * @param band - its line and radius
 * @param pose - where the body is
 * @returns a convex outline in the room's x and z; its corners lie up to 1 in 100 of the radius outside
 */
export function bandOutline({ core, radiusMm }: Pick<Band, 'core' | 'radiusMm'>, pose: Pose): PlanOutline {
  const [a, b] = coreAt(core, pose);
  const along = Math.atan2(b[1] - a[1], b[0] - a[0]);
  const out = radiusMm / Math.cos(Math.PI / SIDES);
  const half = SIDES / 2;
  const cap = ([x, z]: PlanPoint, from: number): PlanPoint[] =>
    Array.from({ length: half }, (_, n) => {
      const angle = from + ((n + 0.5) * Math.PI) / half;
      return [x + out * Math.cos(angle), z + out * Math.sin(angle)];
    });
  return [...cap(b, along - Math.PI / 2), ...cap(a, along + Math.PI / 2)];
}

const asObstacles = (place: SurveyedPlace, bands: readonly Band[], pose: Pose): Obstacle[] =>
  bands.map((band) => {
    const outline = bandOutline(band, pose);
    return {
      pieceId: place.piece.id,
      mark: place.piece.mark,
      group: band.name,
      placeId: place.frame.placeId,
      bottomMm: band.fromMm,
      topMm: band.toMm,
      outline,
      shape: convexOf(outline),
    };
  });

/**
 * Somebody who sits at a place, as an obstacle to others.
 *
 * @param place - where
 * @param walker - who
 * @param heights - what is stepped over comes first
 * @returns legs and trunk
 */
export const seatedAt = (place: SurveyedPlace, walker: Walker, [steppedOverMm]: BodyHeights): Obstacle[] =>
  asObstacles(
    place,
    seated(walker, place.frame.frontMm[1], steppedOverMm),
    poseAhead(place.plan, -place.effectiveDepthMm),
  );

/**
 * Somebody who has stood up at a place to let others pass: legs against the seat, leaning back over it.
 *
 * @param place - where
 * @param walker - who
 * @param heights - what is stepped over and what is leaned under
 * @returns thighs and trunk
 */
export function stoodUpAt(place: SurveyedPlace, walker: Walker, heights: BodyHeights): Obstacle[] {
  const bands = standing(walker, heights);
  const legsMm = bands[0]?.radiusMm ?? 0;
  return bands.flatMap((band) => {
    const leanMm = band.name === 'trunk' ? band.radiusMm : 0;
    return asObstacles(place, [band], poseAhead(place.plan, legsMm - leanMm));
  });
}
