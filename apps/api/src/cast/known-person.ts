import type { KnownPerson } from '@settlewright/anthropometry';
import type { CastMember } from './entities/cast-member.entity';

/** A cast member as the checks read one. */
export interface CastPerson {
  id: string;
  name: string;
  person: KnownPerson;
  /** Erased: a place may still name them, and no body is behind it. */
  noBody?: true;
}

export function castPerson(member: CastMember): CastPerson {
  const taken = Object.entries(member.measured).map(([key, measure]) => [key, measure.mm] as const);
  return {
    id: member.id,
    name: member.name,
    ...(member.removedAt ? { noBody: true as const } : {}),
    person: {
      bodyData: member.bodyData,
      ...(member.statureMm === null
        ? {}
        : { stature: { mm: member.statureMm, source: member.statureSource } }),
      ...(member.weightKg === null ? {} : { weightKg: member.weightKg }),
      ...(member.age === null ? {} : { age: member.age }),
      measured: Object.fromEntries(taken),
      shoeMm: member.shoeMm,
      clothing: member.clothing,
    },
  };
}
