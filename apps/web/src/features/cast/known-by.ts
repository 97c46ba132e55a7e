import type { CastMember } from '@/lib/contract.ts';

export interface KnownBy {
  words: string;
  /** Most of this body is predicted. */
  estimated: boolean;
}

/** How well a person is known, in a few words: "9 measures", "height told, est.". */
export function knownBy(person: CastMember): KnownBy {
  const taken = Object.keys(person.measured ?? {}).length;
  if (taken > 0) {
    const all = taken + (person.statureMm !== undefined && person.statureSource === 'measured' ? 1 : 0);
    return { words: `${all} ${all === 1 ? 'measure' : 'measures'}`, estimated: false };
  }
  if (person.statureMm === undefined) {
    return {
      words: person.weightKg === undefined ? 'a name only, est.' : 'weight only, est.',
      estimated: true,
    };
  }
  return {
    words: person.statureSource === 'measured' ? 'height measured, est.' : 'height told, est.',
    estimated: true,
  };
}
