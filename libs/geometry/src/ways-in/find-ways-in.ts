import type { SetDocument } from '../room/document.ts';
import { survey } from '../situation/survey.ts';
import { obstaclesOf } from './obstacles.ts';
import { sittingOrder, type SittingOrder } from './sitting-order.ts';
import { walkIn } from './walk-in.ts';
import { freed, type MayMove } from './what-is-moved.ts';
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
 * The way is the one with most room to each side, from the set's entrance, else from the start of its route, or from open
 * floor beside the set where neither is kept.
 *
 * @param document - the set
 * @param comers - who sits where; a place that does not exist is left out
 * @param heights - what is stepped over and what is leaned under, heights above the floor, as in rule EGRESS-08
 * @param mayMove - what may be moved for somebody who is stuck otherwise
 * @returns ways in the order of the comers
 */
export function findWaysIn(
  document: SetDocument,
  comers: readonly Comer[],
  heights: BodyHeights,
  mayMove: MayMove = { chairs: true, leaves: true },
): WaysIn {
  const found = survey(document);
  const space = searchSpace();
  const all = obstaclesOf(found, heights[1]).filter(({ topMm }) => topMm > heights[0]);
  const seats = new Map(found.places.map((place) => [place.frame.placeId, place]));
  const sitting = comers.flatMap((comer) => {
    const place = seats.get(comer.placeId);
    return place ? [{ comer, place }] : [];
  });
  const { entrance, route } = document.asked;
  const from: WayIn['from'] = entrance ? 'entrance' : route ? 'route' : 'open-floor';
  const ways = sitting.map(({ comer, place }) => {
    const around = all.filter((one) => place.piece.kind !== 'loose-seat' || one.pieceId !== place.piece.id);
    const { walked, chairs, leaves } = freed(document, place, around, mayMove, heights, (obstacles) =>
      walkIn(found, place, comer, obstacles, heights, space),
    );
    if (walked === undefined) {
      return { placeId: comer.placeId, from, steps: [], passes: false, chairs: [], leaves: [], past: [] };
    }
    const others = sitting.filter((other) => other.place !== place);
    return {
      placeId: comer.placeId,
      from,
      steps: walked.steps,
      ...(walked.tightest ? { tightest: walked.tightest } : {}),
      passes: walked.clearMm >= 0,
      chairs,
      leaves,
      ...whoIsPassed(walked, others, heights, (bodies) =>
        walkIn(found, place, comer, [...walked.obstacles, ...bodies], heights, space, 0),
      ),
    };
  });
  return { ways, order: sittingOrder(ways) };
}
