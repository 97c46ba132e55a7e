import type { PieceGroup, SetDocument } from './document.ts';
import { namedPieces } from './named-pieces.ts';

/**
 * Keeps pieces as a group.
 *
 * @param document - the set
 * @param name - what people call it, at most 80 characters
 * @param pieceIds - unknown ids are passed over
 * @returns the new set and the group's id; the same set where no piece is named
 */
export function groupPieces(
  document: SetDocument,
  name: string,
  pieceIds: readonly string[],
): { document: SetDocument; groupId: string } {
  const groups = document.groups ?? [];
  const taken = new Set(groups.map(({ id }) => id));
  let n = groups.length + 1;
  while (taken.has(`g${n}`)) n += 1;
  const members = namedPieces(document, pieceIds).map(({ id }) => id);
  const title = name.trim();
  if (members.length === 0 || title === '') return { document, groupId: '' };
  const group: PieceGroup = { id: `g${n}`, name: title, pieceIds: members };
  return { document: { ...document, groups: [...groups, group] }, groupId: group.id };
}

/**
 * Lets go of a group; its pieces stay.
 *
 * @param document - the set
 * @param groupId - an unknown id changes nothing
 * @returns the new set
 */
export function ungroupPieces(document: SetDocument, groupId: string): SetDocument {
  if (!document.groups?.some(({ id }) => id === groupId)) return document;
  return withGroups(
    document,
    document.groups.filter(({ id }) => id !== groupId),
  );
}

/**
 * Takes pieces that are no longer there out of groups, and groups that are empty then.
 *
 * @param document - the set
 * @returns the same object when nothing was lost
 */
export function withoutLostMembers(document: SetDocument): SetDocument {
  const { groups } = document;
  if (groups === undefined) return document;
  const there = new Set(document.pieces.map(({ id }) => id));
  if (groups.every(({ pieceIds }) => pieceIds.every((id) => there.has(id)))) return document;
  const kept = groups.flatMap((group) => {
    const pieceIds = group.pieceIds.filter((id) => there.has(id));
    return pieceIds.length === 0 ? [] : [{ ...group, pieceIds }];
  });
  return withGroups(document, kept);
}

function withGroups({ groups: _, ...document }: SetDocument, groups: PieceGroup[]): SetDocument {
  return groups.length === 0 ? document : { ...document, groups };
}
