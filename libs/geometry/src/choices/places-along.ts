import type { PlaceSituation } from '@settlewright/anthropometry';
import type { SetDocument } from '../room/document.ts';
import { measureSet } from '../situation/measure-set.ts';

/**
 * What sets offer at their places, one set after the other.
 *
 * @param documents - sets that a page compares; what cannot be built offers nothing
 * @returns a generator that yields how many were measured and returns the places of each
 */
export function* measuredPlaces(
  documents: Iterable<SetDocument | undefined>,
): Generator<number, PlaceSituation[][], void> {
  const places: PlaceSituation[][] = [];
  for (const document of documents) {
    places.push(document ? measureSet(document).places : []);
    yield places.length;
  }
  return places;
}

/**
 * Places of which something changes from set to set.
 *
 * @param along - places of each set, in the order of the values that made them
 * @returns ids of places; all of them when nothing changes
 */
export function changingPlaces(along: readonly PlaceSituation[][]): string[] {
  const told = along.filter((places) => places.length > 0);
  const [first = [], middle = [], last = []] = [told[0], told[Math.floor(told.length / 2)], told.at(-1)];
  const said = (places: readonly PlaceSituation[], id: string) =>
    JSON.stringify(places.find(({ placeId }) => placeId === id));
  const ids = first.map(({ placeId }) => placeId);
  const changing = ids.filter(
    (id) => said(first, id) !== said(last, id) || said(first, id) !== said(middle, id),
  );
  return changing.length > 0 ? changing : ids;
}
