import type { BodyData, KnownPerson } from '@settlewright/anthropometry';
import { LengthField } from '@/components/length-field.tsx';
import { MassField } from '@/components/mass-field.tsx';
import { entryOf, type QuantityEntry } from '@/components/quantity-entry.ts';
import { Select } from '@/components/select.tsx';
import { BODY_DATA_CHOICES } from '@/lib/body-data-choices.ts';
import { STATURE_MM, WEIGHT_KG } from '@/lib/body-limits.ts';

/** Somebody who is typed in for one trial and kept nowhere. */
export interface Stranger {
  stature: QuantityEntry;
  weight: QuantityEntry;
  bodyData: BodyData;
}

export const blankStranger: Stranger = { stature: entryOf(null), weight: entryOf(null), bodyData: 'mixed' };

const SHOE_MM = 25;

/** What the checks know of a stranger; `undefined` without a height. The same object for the same entries. */
export function knownStranger(stranger: Stranger): KnownPerson | undefined {
  const made = known.get(stranger);
  if (made) return made;
  const { stature, weight, bodyData } = stranger;
  if (stature.value === null || stature.problem !== undefined) return undefined;
  const person: KnownPerson = {
    bodyData,
    stature: { mm: stature.value, source: 'measured' },
    ...(weight.value === null || weight.problem !== undefined ? {} : { weightKg: weight.value }),
    measured: {},
    shoeMm: SHOE_MM,
    clothing: 'light',
  };
  known.set(stranger, person);
  return person;
}

const known = new WeakMap<Stranger, KnownPerson>();

export function StrangerFields({
  value,
  onChange,
}: {
  value: Stranger;
  onChange: (value: Stranger) => void;
}) {
  return (
    <>
      <LengthField
        label="Their height"
        feet
        description="Without shoes; ordinary shoes and light clothes are taken for the sit."
        minMm={STATURE_MM.min}
        maxMm={STATURE_MM.max}
        entry={value.stature}
        error={value.stature.problem}
        onChange={(stature) => onChange({ ...value, stature })}
      />
      <MassField
        label="Their weight"
        optional
        description="Says how far the cushion sinks."
        minKg={WEIGHT_KG.min}
        maxKg={WEIGHT_KG.max}
        entry={value.weight}
        error={value.weight.problem}
        onChange={(weight) => onChange({ ...value, weight })}
      />
      <Select
        label="Predict the rest from the survey of"
        options={BODY_DATA_CHOICES}
        value={value.bodyData}
        onChange={(bodyData) => onChange({ ...value, bodyData })}
      />
    </>
  );
}
