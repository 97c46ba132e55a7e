import type { SetDocument } from '../room/document.ts';
import { survey, type SurveyedPlace } from '../situation/survey.ts';
import { obstaclesOf, type Obstacle } from './obstacles.ts';
import { OPEN_MM } from './room-around.ts';
import { sittingOrder, type SittingOrder } from './sitting-order.ts';
import { walkIn, type WalkedIn } from './walk-in.ts';
import { whoIsPassed } from './who-is-passed.ts';
import type { BodyHeights, Walker } from './walker.ts';
import type { WayIn } from './way-in.ts';
import { searchSpace } from './widest-path.ts';

/** Somebody on the way to a place. */
export interface Comer extends Walker {
  placeId: string;
}

/** Ways in to places of a set. */
export interface WaysIn {
  ways: WayIn[];
  order: SittingOrder;
}

/**
 * The way in to each place for whoever sits there: walked, sideways, along the seat; where it is tightest, past whom it
 * leads, and in which order people best sit down.
 *
 * The way is the one with most room to each side, from the start of the set's route, or from open floor beside the set
 * where no route is kept.
 *
 * @param document - the set
 * @param comers - who sits where; a place that does not exist is left out
 * @param heights - what is stepped over and what is leaned under, heights above the floor, as in rule EGRESS-08
 * @returns ways in the order of the comers
 */
export function findWaysIn(document: SetDocument, comers: readonly Comer[], heights: BodyHeights): WaysIn {
  const found = survey(document);
  const space = searchSpace();
  const all = obstaclesOf(found, heights[1]).filter(({ topMm }) => topMm > heights[0]);
  const seats = new Map(found.places.map((place) => [place.frame.placeId, place]));
  const sitting = comers.flatMap((comer) => {
    const place = seats.get(comer.placeId);
    return place ? [{ comer, place }] : [];
  });
  const loose = new Set(document.pieces.flatMap(({ kind, id }) => (kind === 'loose-seat' ? [id] : [])));
  const ways = sitting.map(({ comer, place }) => {
    const around = all.filter((one) => place.piece.kind !== 'loose-seat' || one.pieceId !== place.piece.id);
    const { walked, chairs } = pastChairs(place, around, loose, (obstacles) =>
      walkIn(found, place, comer, obstacles, heights, space),
    );
    const from: WayIn['from'] = document.asked.route ? 'route' : 'open-floor';
    if (walked === undefined) {
      return { placeId: comer.placeId, from, steps: [], passes: false, chairs: [], past: [] };
    }
    const others = sitting.filter((other) => other.place !== place);
    return {
      placeId: comer.placeId,
      from,
      steps: walked.steps,
      ...(walked.tightest ? { tightest: walked.tightest } : {}),
      passes: walked.clearMm >= 0,
      chairs,
      past: whoIsPassed(walked, others, heights, (bodies) =>
        walkIn(found, place, comer, [...walked.obstacles, ...bodies], heights, space, 0),
      ),
    };
  });
  return { ways, order: sittingOrder(ways) };
}

/** Chairs stand where they are as long as one gets through; otherwise those in the way are taken out. */
function pastChairs(
  place: SurveyedPlace,
  around: readonly Obstacle[],
  loose: ReadonlySet<string>,
  walk: (obstacles: readonly Obstacle[]) => WalkedIn | undefined,
): { walked: WalkedIn | undefined; chairs: WayIn['chairs'] } {
  const walked = walk(around);
  if ((walked?.clearMm ?? -OPEN_MM) >= 0) return { walked, chairs: [] };
  const fixed = around.filter(({ pieceId }) => !loose.has(pieceId));
  if (fixed.length === around.length) return { walked, chairs: [] };
  const freed = walk(fixed);
  if (!freed || freed.clearMm <= (walked?.clearMm ?? -Infinity)) return { walked, chairs: [] };
  const inWay = around.filter((one) => loose.has(one.pieceId) && freed.touches([one]));
  const chairs = new Map(inWay.map(({ pieceId, mark }) => [pieceId, { pieceId, mark }]));
  chairs.delete(place.piece.id);
  return { walked: freed, chairs: [...chairs.values()] };
}
