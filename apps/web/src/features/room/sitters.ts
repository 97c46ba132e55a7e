import type { BodyModel, KnownPerson, Sitter } from '@settlewright/anthropometry';
import type { SetDocument, SitterRef } from '@settlewright/geometry';
import type { CastMember } from '@/lib/contract';
import { sitterColours } from '@/lib/sitter-colours.ts';

/** Percentile mannequins offered in the list of who may sit. */
export const MANNEQUINS: Extract<SitterRef, { kind: 'mannequin' }>[] = [
  { kind: 'mannequin', bodyData: 'women', measure: 'stature', percentile: 5 },
  { kind: 'mannequin', bodyData: 'women', measure: 'stature', percentile: 50 },
  { kind: 'mannequin', bodyData: 'men', measure: 'stature', percentile: 50 },
  { kind: 'mannequin', bodyData: 'men', measure: 'stature', percentile: 95 },
];

const ORDINAL_ENDINGS: Partial<Record<string, string>> = { one: 'st', two: 'nd', few: 'rd' };
const ordinals = new Intl.PluralRules('en', { type: 'ordinal' });

export function ordinal(n: number): string {
  return `${n}${ORDINAL_ENDINGS[ordinals.select(n)] ?? 'th'}`;
}

export function mannequinName(ref: Extract<SitterRef, { kind: 'mannequin' }>): string {
  const who = ref.bodyData === 'women' ? 'Woman' : 'Man';
  return `${who}, ${ordinal(ref.percentile)} in ${ref.measure.replaceAll('_', ' ')}`;
}

/** Children offered in the list of who may sit: one of each size of school furniture. */
export const CHILDREN: Extract<SitterRef, { kind: 'child' }>[] = [1, 2, 3, 4, 5, 6].map((sizeMark) => ({
  kind: 'child',
  sizeMark,
}));

export function sitterKey(ref: SitterRef): string {
  if (ref.kind === 'cast') return ref.castId;
  if (ref.kind === 'child') return `child-${ref.sizeMark}`;
  return `${ref.bodyData}-${ref.measure}-${ref.percentile}`;
}

export function sitterName(ref: SitterRef, cast: readonly CastMember[]): string {
  if (ref.kind === 'mannequin') return mannequinName(ref);
  if (ref.kind === 'child') return `Child, size mark ${ref.sizeMark}`;
  return cast.find((member) => member.id === ref.castId)?.name ?? 'removed sitter';
}

/** Of who is no longer found at a place. */
const UNKNOWN_COLOUR = 6;

/** Tells the colour at a place of a set; all are different while there are enough. */
export function coloursOf(document: SetDocument, cast: readonly CastMember[]) {
  const colours = sitterColours(
    document.seating,
    (castId) => cast.find((member) => member.id === castId)?.colour,
  );
  return (placeId = ''): number => colours.get(placeId) ?? UNKNOWN_COLOUR;
}

/** What the checks know of a cast member; `undefined` when this reader may not see measures. */
export function personOf(member: CastMember): KnownPerson | undefined {
  if (!member.bodyData) return undefined;
  const measured = Object.entries(member.measured ?? {}).map(([key, value]) => [key, value.mm]);
  return {
    bodyData: member.bodyData,
    stature: member.statureMm ? { mm: member.statureMm, source: member.statureSource ?? 'told' } : undefined,
    weightKg: member.weightKg ?? undefined,
    age: member.age,
    measured: Object.fromEntries(measured) as KnownPerson['measured'],
    shoeMm: member.shoeMm ?? 0,
    clothing: member.clothing ?? 'light',
  };
}

const people = new WeakMap<CastMember, KnownPerson | undefined>();

/** Everyone who sits in the document and whose body is known here; an erased person keeps the place without a body. */
export function sittersOf(document: SetDocument, cast: readonly CastMember[], model: BodyModel): Sitter[] {
  return document.seating.flatMap(({ pieceId, place, sitter }): Sitter[] => {
    const placeId = `${pieceId}:${place}`;
    if (sitter.kind !== 'cast') {
      const id = `${sitterKey(sitter)}@${placeId}`;
      const person = sitter.kind === 'child' ? model.child(sitter.sizeMark) : model.mannequin(sitter);
      return [{ id, name: sitterName(sitter, cast), kind: 'mannequin', placeId, person }];
    }
    const member = cast.find((candidate) => candidate.id === sitter.castId);
    if (!member) return [];
    if (!people.has(member)) people.set(member, personOf(member));
    const person = people.get(member);
    if (!person) return [];
    const { id, name, removed } = member;
    return [{ id, name, kind: 'cast', placeId, person, ...(removed ? { noBody: true } : {}) }];
  });
}
