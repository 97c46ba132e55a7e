import type { LengthStyle, SetDocument } from '@settlewright/geometry';
import type { SeatedBody } from '../picture.ts';
import { sayNote } from '../posture/note-words.ts';

type Said = Pick<SeatedBody, 'pieceId' | 'placeId' | 'name'> & {
  pose: Pick<SeatedBody['pose'], 'notes'>;
};

/**
 * "Ottilie Brandt sits on B1, place 1: feet hang 1¾″, hands on the lap." Whoever sees verdicts alone sees a body drawn in
 * round sizes, whose feet may hang where the person's do not: then only who sits where.
 */
export function sayPlaces(
  document: SetDocument,
  bodies: readonly Said[],
  style: LengthStyle,
  detail: 'full' | 'verdicts',
): string {
  if (bodies.length === 0) return 'Nobody is seated.';
  const said = bodies
    .map((body) => {
      const mark = document.pieces.find((piece) => piece.id === body.pieceId)?.mark ?? '';
      const place = body.placeId.split(':').at(-1) ?? '';
      const words = detail === 'full' ? body.pose.notes.map((note) => sayNote(note, style)) : [];
      return `${body.name} sits on ${mark}, place ${place}${words.length > 0 ? `: ${words.join(', ')}` : ''}.`;
    })
    .join(' ');
  return detail === 'full'
    ? said
    : `${said} Bodies are drawn in round sizes; how they fit stands on the fit sheet.`;
}
