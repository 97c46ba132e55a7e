import type { PlaceSituation } from './situation.ts';

/** Names tell places apart, but not what they offer. */
const NAMES = new Set(['placeId', 'pieceId', 'mark', 'place']);

/**
 * One place of each kind: places that offer the same numbers serve people alike.
 *
 * @param places - places of a set
 * @returns the first of each kind, in their order
 */
export function unlikePlaces(places: readonly PlaceSituation[]): PlaceSituation[] {
  const found = new Map<string, PlaceSituation>();
  for (const place of places) {
    const offer = JSON.stringify(place, (key, value: unknown) => (NAMES.has(key) ? undefined : value));
    if (!found.has(offer)) found.set(offer, place);
  }
  return [...found.values()];
}
