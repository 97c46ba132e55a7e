import type { SetDocument } from '@settlewright/geometry';
import type { SeatedBody } from '../picture.ts';

/** "Ottilie Brandt sits on B1, place 1; her feet hang 44 mm." */
export function sayPlaces(document: SetDocument, bodies: readonly SeatedBody[]): string {
  if (bodies.length === 0) return 'Nobody is seated.';
  return bodies
    .map((body) => {
      const mark = document.pieces.find((piece) => piece.id === body.pieceId)?.mark ?? '';
      const place = body.placeId.split(':').at(-1) ?? '';
      const notes = body.pose.words.length > 0 ? `: ${body.pose.words.join(', ')}` : '';
      return `${body.name} sits on ${mark}, place ${place}${notes}.`;
    })
    .join(' ');
}
