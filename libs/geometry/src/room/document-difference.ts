import { isSame } from './leaves.ts';

/** One point at which two versions of a set differ. A value that is absent is `undefined`. */
export interface DocumentDifference {
  /** Stable while the three versions stay the same. */
  id: string;
  kind:
    | 'parameter'
    | 'piece'
    | 'seating'
    | 'asked'
    | 'known-difference'
    | 'group'
    | 'view'
    | 'dimension'
    | 'cushion';
  pieceId?: string;
  mark?: string;
  /** Path of the parameter in its piece. */
  key?: string;
  label: string;
  base: unknown;
  mine: unknown;
  theirs: unknown;
  changedBy: 'mine' | 'theirs' | 'both';
  /** True when both sides changed it to different values, so that somebody must choose. */
  conflict: boolean;
}

/** A point of difference without its values. */
export type Named = Omit<DocumentDifference, 'base' | 'mine' | 'theirs' | 'changedBy' | 'conflict'>;

/**
 * The difference between two values.
 *
 * @param named - what it is called
 * @param values - of the three versions
 * @param known - false when the common version is lost
 * @returns the difference, or none
 */
export function compared(
  named: Named,
  values: { base: unknown; mine: unknown; theirs: unknown },
  known: boolean,
): DocumentDifference[] {
  if (isSame(values.mine, values.theirs)) return [];
  const changedBy =
    known && isSame(values.base, values.theirs)
      ? 'mine'
      : known && isSame(values.base, values.mine)
        ? 'theirs'
        : 'both';
  return [{ ...named, ...values, changedBy, conflict: changedBy === 'both' }];
}
