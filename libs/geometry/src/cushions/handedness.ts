import { isMirrorOfItself } from './group-cushions.ts';
import type { CushionSpec } from './cushion-spec.ts';

/**
 * How a cushion stands to its mirror image: handed by the wall, end wall or arm it meets; the same either way; or one way
 * round by its own shape, closure, buttons or marks.
 */
export type Handedness = CushionSpec['hand'] | 'one-way';

/** The same in the words of the sheet. */
export const HANDEDNESS_WORDS: Record<Handedness, string> = {
  left: 'left hand',
  right: 'right hand',
  either: 'either hand',
  'one-way': 'one way round',
};

/**
 * The hand of a cushion as whoever makes or lays it has to know it.
 *
 * @param spec - the cushion
 * @returns the hand of what it meets, if that is on one side only; otherwise whether its mirror image is the same cushion
 */
export function handednessOf(spec: CushionSpec): Handedness {
  if (spec.hand !== 'either') return spec.hand;
  return isMirrorOfItself(spec) ? 'either' : 'one-way';
}
