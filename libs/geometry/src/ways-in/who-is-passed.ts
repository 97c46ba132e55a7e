import type { PlanOutline } from '../situation/plan.ts';
import type { SurveyedPlace } from '../situation/survey.ts';
import { seatedAt, stoodUpAt } from './bodies.ts';
import type { Convex } from './convex.ts';
import type { Obstacle } from './obstacles.ts';
import type { WalkedIn } from './walk-in.ts';
import type { BodyHeights, Walker } from './walker.ts';
import type { FreerWay, WayIn } from './way-in.ts';

/** Somebody else of the set, at a place. */
interface Other {
  place: SurveyedPlace;
  comer: Walker;
}

/**
 * Who is in the way of somebody once seated.
 *
 * @param walked - the way
 * @param others - everybody else
 * @param heights - what is stepped over and what is leaned under
 * @param round - looks for another way, wide enough, with these bodies in the room
 * @returns those passed, and whether standing up is enough; with a narrower way that leads past fewer, where there is one
 */
export function whoIsPassed(
  walked: WalkedIn,
  others: readonly Other[],
  heights: BodyHeights,
  round: (bodies: readonly Obstacle[]) => WalkedIn | undefined,
): Pick<WayIn, 'past' | 'freer'> {
  const all = others.map((other) => ({ ...other, bodies: seatedAt(other.place, other.comer, heights) }));
  const inWayOf = (one: WalkedIn) =>
    all.filter(({ place, bodies }) => one.over.includes(place.frame.placeId) || one.touches(bodies));
  const inWay = inWayOf(walked);
  if (inWay.length === 0) return { past: [] };
  const answer = (how: 'stands-up' | 'sits-later') =>
    inWay.map(({ place }) => ({ placeId: place.frame.placeId, how }));
  // Who does not get through an empty room is not asked to look for another way.
  if (walked.clearMm < 0) return { past: answer('sits-later') };
  const seatedRound = round(inWay.flatMap(({ bodies }) => bodies));
  const freer = seatedRound && freerWay(seatedRound, inWay, inWayOf(seatedRound));
  const found = freer ? { freer } : {};
  if (freer?.past.length === 0) return { past: [], freer };
  if (!inWay.every((other) => canStandUp(other, walked.obstacles, heights))) {
    return { past: answer('sits-later'), ...found };
  }
  const stoodRound = round(inWay.flatMap(({ place, comer }) => stoodUpAt(place, comer, heights)));
  const stillInWay = stoodRound
    ? inWayOf(stoodRound).filter(
        (other) => !inWay.includes(other) || stoodRound.over.includes(other.place.frame.placeId),
      )
    : inWay;
  return { past: answer(stillInWay.length === 0 ? 'stands-up' : 'sits-later'), ...found };
}

function freerWay(
  round: WalkedIn,
  inWay: readonly Other[],
  stillInWay: readonly Other[],
): FreerWay | undefined {
  if (stillInWay.length >= inWay.length) return undefined;
  const idsOf = (others: readonly Other[]) => others.map(({ place }) => place.frame.placeId);
  return {
    steps: round.steps,
    ...(round.tightest ? { tightest: round.tightest } : {}),
    past: idsOf(stillInWay),
    insteadOf: idsOf(inWay),
  };
}

/** Whether there is room for the legs between the seat and what stands before it. */
function canStandUp({ place, comer }: Other, obstacles: readonly Obstacle[], heights: BodyHeights): boolean {
  const before = obstacles.filter(({ pieceId }) => pieceId !== place.piece.id);
  return stoodUpAt(place, comer, heights)
    .filter(({ group }) => group === 'thighs')
    .every((legs) =>
      before.every((one) => one.bottomMm >= legs.topMm || one.topMm <= legs.bottomMm || areApart(legs, one)),
    );
}

/** Whether some side of one of two convex outlines has all of the other beyond it. */
const areApart = (one: Obstacle, other: Obstacle): boolean =>
  isBeyond(one.shape, other.outline) || isBeyond(other.shape, one.outline);

const isBeyond = ({ xs, zs, nx, nz }: Convex, points: PlanOutline): boolean =>
  xs.some((sx, i) => {
    const [sz, a, b] = [zs[i] ?? 0, nx[i] ?? 0, nz[i] ?? 0];
    return points.every(([x, z]) => a * (x - sx) + b * (z - sz) >= 0);
  });
