import { gapBetween, segmentShape, type MannequinSegment, type Vec3 } from '@settlewright/geometry';
import type { SeatedBody } from '../picture.ts';
import type { Ray } from '../scene/pick.ts';
import { add, normalise, scale } from '../scene/vectors.ts';

/** Near enough to have been pressed. */
const TOUCH_MM = 5;
const FURTHEST_MM = 100_000;

const pointAt = (at: Vec3) =>
  segmentShape({
    kind: 'rounded-cone',
    tag: 'suit',
    name: '',
    fromMm: at,
    toMm: at,
    fromRadiusMm: 0,
    toRadiusMm: 0,
  });

/** Distance along a ray to the first solid of a body: as far on each time as nothing can be in the way. */
function distanceTo(segments: readonly MannequinSegment[], { origin, direction }: Ray): number | undefined {
  const ahead = normalise(direction);
  const shapes = segments.map(segmentShape);
  let [along, before] = [0, Infinity];
  while (along < FURTHEST_MM) {
    const point = pointAt(add(origin, scale(ahead, along)));
    let free = Infinity;
    for (const shape of shapes) free = Math.min(free, gapBetween(point, shape, free)?.distanceMm ?? free);
    if (free < TOUCH_MM) return along;
    // Once past the nearest point the way only leads off.
    if (free > before + FURTHEST_BACK_MM) return undefined;
    before = Math.min(before, free);
    along += free;
  }
  return undefined;
}

/** Longer than a body is: whoever is that much further off again is behind the eye. */
const FURTHEST_BACK_MM = 2500;

/** The body that a ray meets first, before anything else at `beforeMm`. */
export function bodyUnder(
  bodies: readonly SeatedBody[],
  ray: Ray,
  beforeMm = Infinity,
): SeatedBody | undefined {
  let best: { body: SeatedBody; distanceMm: number } | undefined;
  for (const body of bodies) {
    const distanceMm = distanceTo(body.pose.segments, ray);
    if (distanceMm !== undefined && distanceMm < (best?.distanceMm ?? beforeMm)) best = { body, distanceMm };
  }
  return best?.body;
}
