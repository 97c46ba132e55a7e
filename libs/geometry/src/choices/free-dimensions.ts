import { kindOf, SEAT_AND_TABLES, type Dimension } from './dimension.ts';

/** Most dimensions that one search moves: with more, too few choices are tried of each. */
export const MOST_FREE = 6;
/** People drawn for the share of a search: good to about two in a hundred. */
export const SEARCH_PEOPLE = 4000;
/** The same people each time. */
export const SEARCH_SEED = 1;

/** The numbers of pieces that a dimension sets: two dimensions that set the same one cannot both be free. */
function setsOf(dimension: Dimension): string[] {
  const { pieceIds, marks } = dimension;
  const kind = kindOf(dimension);
  if (kind !== SEAT_AND_TABLES) return pieceIds.map((pieceId) => `${kind} ${pieceId}`);
  return pieceIds.map((pieceId, n) => `${n < marks.length ? 'seat-height' : 'table-height'} ${pieceId}`);
}

/**
 * The free dimension that already moves a number of another one.
 *
 * @param dimension - the one that is to be free too
 * @param freeIds - ids of those that are free; the dimension's own is passed over
 * @param dimensions - dimensions of the set
 * @returns the first that clashes; `undefined` when both may be free
 */
export function clashOf(
  dimension: Dimension,
  freeIds: readonly string[],
  dimensions: readonly Dimension[],
): Dimension | undefined {
  const own = new Set(setsOf(dimension));
  return dimensions.find(
    (other) =>
      other.id !== dimension.id && freeIds.includes(other.id) && setsOf(other).some((one) => own.has(one)),
  );
}
