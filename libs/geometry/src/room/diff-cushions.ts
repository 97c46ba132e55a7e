import { CUSHION_CHOICE_WORDS, type CushionChoice } from '../cushions/cushion-choice.ts';
import { cushionKeyParts } from '../cushions/cushion-key.ts';
import type { SetDocument } from './document.ts';
import { compared, type DocumentDifference } from './document-difference.ts';
import { isSame } from './leaves.ts';

const FIELDS = Object.keys(CUSHION_CHOICE_WORDS) as (keyof CushionChoice)[];

/** Compares what was chosen of single cushions, field by field. */
export function cushionDifferences(
  base: SetDocument | null,
  mine: SetDocument,
  theirs: SetDocument,
): DocumentDifference[] {
  const keys = new Set([theirs, mine].flatMap(({ cushions = {} }) => Object.keys(cushions)));
  const pieceOf = (document: SetDocument | null, pieceId: string) =>
    document?.pieces.find(({ id }) => id === pieceId);
  return [...keys].flatMap((key) => {
    const parts = cushionKeyParts(key);
    if (!parts) return [];
    const { pieceId, kind, number } = parts;
    const [own, other] = [pieceOf(mine, pieceId), pieceOf(theirs, pieceId)];
    // Of a piece that one side does not have, or that each side added, choices go with the piece.
    if (!own || !other) return [];
    if (base && !pieceOf(base, pieceId) && !isSame(own, other)) return [];
    const label = `${kind === 'seat' ? 'seat' : 'back'} cushion ${number}`;
    return FIELDS.flatMap((field) =>
      compared(
        {
          id: `cushion:${key}:${field}`,
          kind: 'cushion',
          pieceId,
          mark: own.mark,
          key: field,
          label: `${CUSHION_CHOICE_WORDS[field]} of ${label}`,
        },
        {
          base: base?.cushions?.[key]?.[field],
          mine: mine.cushions?.[key]?.[field],
          theirs: theirs.cushions?.[key]?.[field],
        },
        base !== null,
      ),
    );
  });
}
