/** Which cushion of which piece: the n-th from the left as seen from in front, counted from 1. */
export interface CushionKeyParts {
  pieceId: string;
  kind: 'seat' | 'back';
  number: number;
}

/** A piece's id may hold anything, the rest is ours. */
export const CUSHION_KEY = /^(.{1,40})\/(seat|back)-([1-9]\d?)$/s;

/**
 * The name under which a set keeps what was chosen of a cushion.
 *
 * @param parts - piece, kind and number
 */
export const cushionKey = ({ pieceId, kind, number }: CushionKeyParts): string =>
  `${pieceId}/${kind}-${number}`;

/**
 * Reads a cushion's key.
 *
 * @param key - as `cushionKey` makes it
 * @returns its parts, `undefined` for any other text
 */
export function cushionKeyParts(key: string): CushionKeyParts | undefined {
  const [, pieceId, kind, number] = CUSHION_KEY.exec(key) ?? [];
  return pieceId === undefined
    ? undefined
    : { pieceId, kind: kind as 'seat' | 'back', number: Number(number) };
}
