import type { SetDocument } from '../room/document.ts';
import { cushionKeyParts } from './cushion-key.ts';
import type { CushionShape } from './cushion-shape.ts';

type Choices = NonNullable<SetDocument['cushions']>;

const known = new WeakMap<Choices, ReadonlyMap<string, (string | CushionShape)[]>>();
const NONE: readonly (string | CushionShape)[] = [];

function byPiece(choices: Choices): ReadonlyMap<string, (string | CushionShape)[]> {
  const found = new Map<string, (string | CushionShape)[]>();
  for (const [key, { shape }] of Object.entries(choices).sort(([a], [b]) => (a < b ? -1 : 1))) {
    const pieceId = cushionKeyParts(key)?.pieceId;
    if (!shape || pieceId === undefined) continue;
    found.set(pieceId, [...(found.get(pieceId) ?? []), key, shape]);
  }
  return found;
}

/**
 * The shapes that were chosen of a piece's cushions, to be told whether they are still the same.
 *
 * @param choices - of a set; not changed afterwards
 * @param pieceId - of the piece
 * @returns key and shape of each in turn, in the order of the keys; the very same list for the same choices
 */
export function shapesOfPiece(
  choices: SetDocument['cushions'],
  pieceId: string,
): readonly (string | CushionShape)[] {
  if (!choices) return NONE;
  const found = known.get(choices) ?? byPiece(choices);
  known.set(choices, found);
  return found.get(pieceId) ?? NONE;
}
