import type { PlaceSituation } from './situation.ts';

/** Names tell places apart, but not what they offer. */
const NAMES = new Set(['placeId', 'pieceId', 'mark', 'place']);

/**
 * Which place may stand for each: the first that offers the same numbers.
 *
 * @param places - places of a set
 * @returns the stand-in of each place by its id, in the order of the places
 */
export function standInPlaces(places: readonly PlaceSituation[]): Map<string, PlaceSituation> {
  const first = new Map<string, PlaceSituation>();
  return new Map(
    places.map((place) => {
      const offer = offerOf(place);
      const standIn = first.get(offer) ?? place;
      first.set(offer, standIn);
      return [place.placeId, standIn];
    }),
  );
}

/**
 * One place of each kind: places that offer the same numbers serve people alike.
 *
 * @param places - places of a set
 * @returns the first of each kind, in their order
 */
export function unlikePlaces(places: readonly PlaceSituation[]): PlaceSituation[] {
  return [...new Set(standInPlaces(places).values())];
}

const offerOf = (place: PlaceSituation): string =>
  JSON.stringify(place, (key, value: unknown) => (NAMES.has(key) ? undefined : value));
