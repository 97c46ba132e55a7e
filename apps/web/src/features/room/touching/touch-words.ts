import {
  CONTACT_MM,
  formatLength,
  type EnvelopeGap,
  type JointEnvelope,
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

/** A stretch of a body as people call it. */
const sayStretch = (segment: string): string => segment.replace(/ (root|inside)$/, '');

interface Named {
  document: SetDocument;
  bodies: readonly { placeId: string; name: string }[];
}

/** What a sitter comes near to: "T1 apron", "Hetty Vance’s left elbow". */
export function sayThing({ thing }: Pick<SitterGap, 'thing'>, { document, bodies }: Named): string {
  if (thing.kind === 'body') {
    const name = bodies.find(({ placeId }) => placeId === thing.placeId)?.name ?? 'a neighbour';
    return `${name}’s ${sayStretch(thing.segment)}`;
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
  const to = `${sayStretch(gap.segment)} and ${sayThing(gap, named)}`;
  const how = gap.measuredOn === 'skin' ? 'on the skin' : 'on solids';
  if (Math.abs(gap.distanceMm) <= CONTACT_MM) return `${to} touch, ${how}`;
  return gap.distanceMm < 0 ? `${to} overlap by ${size}, ${how}` : `${size} between ${to}, ${how}`;
}

/** How far off something has a word to say of what elbows and knees sweep, mm. */
export const SWEPT_WITHIN_MM = 300;

/** "Left elbow: 4″ to W1 wall board", or what is in its way. */
export function saySwept(
  { joint, side }: Pick<JointEnvelope, 'joint' | 'side'>,
  gap: EnvelopeGap | undefined,
  named: Named,
  style: LengthStyle,
): string {
  const limb = `${side === 'left' ? 'Left' : 'Right'} ${joint}`;
  if (!gap) return `${limb}: free, nothing within ${formatLength(SWEPT_WITHIN_MM, style)}`;
  const size = formatLength(Math.abs(gap.distanceMm), style);
  const thing = sayThing(gap, named);
  return gap.distanceMm < 0 ? `${limb}: ${thing} in its way by ${size}` : `${limb}: ${size} to ${thing}`;
}

/** One thing that a body meets: the deepest gap, and what else of the body meets it. */
export interface Meeting {
  deepest: SitterGap;
  also: readonly string[];
}

const keyOf = ({ thing }: SitterGap): string => (thing.kind === 'part' ? thing.partId : thing.placeId);

/** What a body meets, each thing once, in the order given. */
export function meetings(gaps: readonly SitterGap[]): Meeting[] {
  const byThing = new Map<string, SitterGap[]>();
  for (const gap of gaps) byThing.set(keyOf(gap), [...(byThing.get(keyOf(gap)) ?? []), gap]);
  return [...byThing.values()].flatMap((all) => {
    const [deepest] = all.toSorted((a, b) => a.distanceMm - b.distanceMm);
    if (!deepest) return [];
    const stretches = new Set(all.map(({ segment }) => sayStretch(segment)));
    stretches.delete(sayStretch(deepest.segment));
    return [{ deepest, also: [...stretches] }];
  });
}

/** "Rests: left forearm on T1 top". */
export const sayRests = (gaps: readonly SitterGap[], named: Named): string[] => [
  ...new Set(gaps.map((gap) => `${sayStretch(gap.segment)} on ${sayThing(gap, named)}`)),
];

/** "Touches T1 apron with the left thigh, right thigh". */
export const sayTouches = (gaps: readonly SitterGap[], named: Named): string[] =>
  meetings(gaps).map(
    ({ deepest, also }) =>
      `${sayThing(deepest, named)} with the ${[sayStretch(deepest.segment), ...also].join(', ')}`,
  );
