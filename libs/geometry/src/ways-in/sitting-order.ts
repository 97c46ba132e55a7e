import type { WayIn } from './way-in.ts';

/** Who sits down when. */
export interface SittingOrder {
  /** Places, first to sit first. */
  placeIds: string[];
  /** Places in whose way somebody sits whatever the order: that person makes room again. */
  knotted: string[];
}

/**
 * An order of sitting down in which nobody is in anybody's way.
 *
 * @param ways - ways in, in the order of the places
 * @returns the order nearest to that of the places; where ways block each other in a ring, whoever waits for fewest goes on
 */
export function sittingOrder(ways: readonly Pick<WayIn, 'placeId' | 'past'>[]): SittingOrder {
  const waiting = new Map(ways.map(({ placeId }) => [placeId, new Set<string>()]));
  for (const { placeId, past } of ways) {
    for (const later of past) waiting.get(later.placeId)?.add(placeId);
  }
  const placeIds: string[] = [];
  const knotted: string[] = [];
  while (waiting.size > 0) {
    const [first] = [...waiting].sort(([, a], [, b]) => a.size - b.size);
    if (first === undefined) break;
    const [placeId, before] = first;
    if (before.size > 0) knotted.push(...before);
    placeIds.push(placeId);
    waiting.delete(placeId);
    for (const others of waiting.values()) others.delete(placeId);
  }
  return { placeIds, knotted: [...new Set(knotted)] };
}
