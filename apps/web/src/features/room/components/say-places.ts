import { formatLength, type LengthStyle, type PoseNote, type SetDocument } from '@settlewright/geometry';
import type { SeatedBody } from '../picture.ts';

function sayNote({ kind, valueMm = 0 }: PoseNote, style: LengthStyle): string {
  const size = formatLength(valueMm, style);
  switch (kind) {
    case 'feet-hang':
      return `feet hang ${size}`;
    case 'slides-forward':
      return `sits ${size} forward of the back to free the knees; the back is not supported`;
    case 'knees-lift':
      return 'the seat is low: the thighs lift off it';
    case 'forearms-on-table':
      return 'forearms on the table';
    case 'hands-on-lap':
      return 'hands on the lap';
  }
}

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
