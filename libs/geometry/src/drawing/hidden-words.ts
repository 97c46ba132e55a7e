import type { SetDocument } from '../room/document.ts';

/** A sheet names so many; the rest is counted. */
const NAMED = 6;

/**
 * What a picture or drawing of a set leaves out because somebody hid it.
 *
 * @param document - the set
 * @returns words such as "1 piece hidden: T1"; nothing where all pieces are drawn
 */
export function hiddenWords(document: SetDocument): string | undefined {
  const marks = document.pieces.filter(({ hidden }) => hidden).map(({ mark }) => mark);
  if (marks.length === 0) return undefined;
  const more = marks.length - NAMED;
  const named = more > 0 ? [...marks.slice(0, NAMED), `${more} more`] : marks;
  const last = named.at(-1) ?? '';
  const list = named.length === 1 ? last : `${named.slice(0, -1).join(', ')} and ${last}`;
  return `${marks.length === 1 ? '1 piece' : `${marks.length} pieces`} hidden: ${list}`;
}
