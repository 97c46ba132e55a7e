import type { SetDocument } from '../room/document.ts';
import { MAX_DIMENSIONS, type MeasureEnd, type PinnedDimension } from './dimension.ts';

/**
 * Keeps a measured line with the set.
 *
 * @param document - the set
 * @param ends - what it runs between
 * @returns the new set and the line's id; the same set and an empty id when it holds as many as it may
 */
export function pinDimension(
  document: SetDocument,
  ends: readonly [MeasureEnd, MeasureEnd],
): { document: SetDocument; dimensionId: string } {
  const dimensions = document.dimensions ?? [];
  if (dimensions.length >= MAX_DIMENSIONS) return { document, dimensionId: '' };
  const taken = new Set(dimensions.map(({ id }) => id));
  let n = dimensions.length + 1;
  while (taken.has(`d${n}`)) n += 1;
  const id = `d${n}`;
  return { document: withDimensions(document, [...dimensions, { id, ends: [...ends] }]), dimensionId: id };
}

/**
 * Takes a pinned line away.
 *
 * @param document - the set
 * @param dimensionId - an unknown id changes nothing
 * @returns the new set
 */
export function unpinDimension(document: SetDocument, dimensionId: string): SetDocument {
  if (!document.dimensions?.some(({ id }) => id === dimensionId)) return document;
  return withDimensions(
    document,
    document.dimensions.filter(({ id }) => id !== dimensionId),
  );
}

/**
 * Takes lines away that hang on a piece which is no longer there.
 *
 * @param document - the set
 * @returns the same object when nothing was lost
 */
export function withoutLostDimensions(document: SetDocument): SetDocument {
  const { dimensions } = document;
  if (dimensions === undefined) return document;
  const there = new Set(document.pieces.map(({ id }) => id));
  const kept = dimensions.filter(({ ends }) => ends.every(({ pieceId }) => there.has(pieceId)));
  return kept.length === dimensions.length ? document : withDimensions(document, kept);
}

/**
 * A set with these lines; the key is absent where there are none.
 *
 * @param document - the set
 * @param dimensions - all of them
 */
export function withDimensions(
  { dimensions: _, ...document }: SetDocument,
  dimensions: PinnedDimension[],
): SetDocument {
  return dimensions.length === 0 ? document : { ...document, dimensions };
}
