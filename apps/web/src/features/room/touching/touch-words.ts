import {
  formatLength,
  type LengthStyle,
  type Part,
  type SetDocument,
  type SitterGap,
} from '@settlewright/geometry';

const ROLE_WORDS: Partial<Record<Part['role'], string>> = {
  'seat-cushion': 'seat',
  'edge-lip': 'edge',
  'sill-board': 'board',
};

interface Named {
  document: SetDocument;
  bodies: readonly { placeId: string; name: string }[];
}

/** What a sitter comes near to: "T1 apron", "Hetty Vance’s left elbow". */
export function sayThing({ thing }: Pick<SitterGap, 'thing'>, { document, bodies }: Named): string {
  if (thing.kind === 'body') {
    const name = bodies.find(({ placeId }) => placeId === thing.placeId)?.name ?? 'a neighbour';
    return `${name}’s ${thing.segment}`;
  }
  const mark = document.pieces.find(({ id }) => id === thing.pieceId)?.mark ?? '';
  return `${mark} ${ROLE_WORDS[thing.role] ?? thing.role.replaceAll('-', ' ')}`;
}

const FOREARM = /forearm|hand|upper arm/;
const FOOT = /foot|shin/;

/** Contacts by which somebody sits and rests: arms on a table or sill, feet on a rail. Everything else is in the way. */
export function isMeant({ segment, thing }: Pick<SitterGap, 'segment' | 'thing'>): boolean {
  if (thing.kind !== 'part') return false;
  if (['top', 'leaf', 'edge-lip', 'sill-board', 'arm'].includes(thing.role)) return FOREARM.test(segment);
  return ['rail', 'foot'].includes(thing.role) && FOOT.test(segment);
}

/** "1½″ from left knee to T1 apron, on the skin". */
export function sayGap(gap: SitterGap, named: Named, style: LengthStyle): string {
  const size = formatLength(Math.abs(gap.distanceMm), style);
  const to = `${gap.segment} and ${sayThing(gap, named)}`;
  const how = gap.measuredOn === 'skin' ? 'on the skin' : 'on solids';
  return gap.distanceMm < 0 ? `${to} overlap by ${size}, ${how}` : `${size} between ${to}, ${how}`;
}
