import { formatLength, type LengthStyle, type PoseNote, type SetDocument } from '@settlewright/geometry';
import type { SeatedBody } from '../picture.ts';

function sayNote({ kind, valueMm = 0, side = 'left' }: PoseNote, style: LengthStyle): string {
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
    case 'feet-on-rail':
      return 'feet on the rail';
    case 'rail-out-of-reach':
      return 'no rail in reach of the feet';
    case 'sits-upright':
      return 'sits upright, off the back';
    case 'slumps':
      return 'slumps';
    case 'forearms-level':
      return 'arms hanging, forearms level';
    case 'hand-to-cup':
      return 'right hand at a cup';
    case 'table-out-of-reach':
      return 'no table in reach';
    case 'forearm-on-sill':
      return `${side} forearm on the sill`;
    case 'sill-out-of-reach':
      return `no sill in reach on the ${side}`;
    case 'not-as-checked':
      return 'posture chosen by hand; the checks are for the usual one';
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
