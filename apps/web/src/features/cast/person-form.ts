import {
  contradictions,
  MEASURE_INFO,
  TAPE_MEASURE_KEYS,
  type TapeMeasureKey,
} from '@settlewright/anthropometry';
import { z } from 'zod';
import { entryOf, type QuantityEntry } from '@/components/quantity-entry.ts';
import type { CastMember, TapeReading } from '@/lib/contract.ts';
import { AGE_YEARS } from '@/lib/body-limits.ts';
import type { CastInput } from './api.ts';

const quantity = z
  .object({ value: z.number().nullable(), problem: z.string().optional() })
  .superRefine((entry, context) => {
    if (entry.problem !== undefined) context.addIssue({ code: 'custom', message: entry.problem });
  });

/** The form as it is filled in; texts that cannot be read are refused with their own words. */
export const personFormSchema = z.object({
  name: z
    .string()
    .trim()
    .min(1, 'Type a name; a part or a seat number will do.')
    .max(120, 'At most 120 characters.'),
  role: z.string().trim().max(120, 'At most 120 characters.'),
  bodyData: z.enum(['women', 'men', 'mixed']),
  stature: quantity,
  statureSource: z.enum(['measured', 'told']),
  weight: quantity,
  age: z
    .string()
    .trim()
    .refine(
      (text) =>
        text === '' || (/^\d+$/.test(text) && Number(text) >= AGE_YEARS.min && Number(text) <= AGE_YEARS.max),
      `Whole years, ${AGE_YEARS.min} to ${AGE_YEARS.max}.`,
    ),
  shoe: quantity,
  clothing: z.enum(['light', 'medium', 'heavy']),
  notes: z.string().trim().max(4000, 'At most 4,000 characters.'),
  takenBy: z.string().trim().max(120, 'At most 120 characters.'),
  takenOn: z.string(),
  measured: z
    .object(
      Object.fromEntries(TAPE_MEASURE_KEYS.map((key) => [key, quantity])) as Record<
        TapeMeasureKey,
        typeof quantity
      >,
    )
    .superRefine((entries, context) => {
      const taken = Object.entries(entries).flatMap(([key, { value }]) =>
        value === null ? [] : [[key, value]],
      );
      for (const { shorter, longer } of contradictions(
        Object.fromEntries(taken) as Partial<Record<TapeMeasureKey, number>>,
      )) {
        const message = `Must be less than the ${MEASURE_INFO[longer].plain}; one of the two has slipped.`;
        context.addIssue({ code: 'custom', path: [shorter], message });
      }
    }),
});

export type PersonForm = z.infer<typeof personFormSchema>;

const STANDARD_SHOE_MM = 25;

export function formOf(person: CastMember | null): PersonForm {
  const measured = Object.fromEntries(
    TAPE_MEASURE_KEYS.map((key) => [key, entryOf(person?.measured?.[key]?.mm)]),
  ) as Record<TapeMeasureKey, QuantityEntry>;
  return {
    name: person?.name ?? '',
    role: person?.role ?? '',
    bodyData: person?.bodyData ?? 'mixed',
    stature: entryOf(person?.statureMm),
    statureSource: person?.statureSource ?? 'told',
    weight: entryOf(person?.weightKg),
    age: person?.age === undefined ? '' : String(person.age),
    shoe: entryOf(person?.shoeMm ?? STANDARD_SHOE_MM),
    clothing: person?.clothing ?? 'light',
    notes: person?.notes ?? '',
    takenBy: '',
    takenOn: '',
    measured,
  };
}

/** Readings nobody touched keep who took them and when; new ones carry what the form says. */
function readings(form: PersonForm, person: CastMember | null): CastInput['measured'] {
  const kept: CastInput['measured'] = {};
  for (const key of TAPE_MEASURE_KEYS) {
    const mm = form.measured[key].value;
    if (mm === null) continue;
    const before = person?.measured?.[key];
    if (before !== undefined && before.mm === mm) {
      kept[key] = before;
      continue;
    }
    const reading: TapeReading = { mm };
    if (form.takenBy !== '') reading.takenBy = form.takenBy;
    if (form.takenOn !== '') reading.takenOn = form.takenOn;
    kept[key] = reading;
  }
  return kept;
}

export function inputOf(form: PersonForm, person: CastMember | null): CastInput {
  return {
    name: form.name,
    role: form.role,
    bodyData: form.bodyData,
    statureMm: form.stature.value,
    statureSource: form.statureSource,
    weightKg: form.weight.value,
    age: form.age === '' ? null : Number(form.age),
    measured: readings(form, person),
    ...(form.shoe.value === null ? {} : { shoeMm: form.shoe.value }),
    clothing: form.clothing,
    notes: form.notes,
  };
}

/** Fields of the server that go by another name in the form. */
export function formPath(serverPath: string): string {
  const [head, ...rest] = serverPath.split('.');
  const names: Record<string, string> = { statureMm: 'stature', weightKg: 'weight', shoeMm: 'shoe' };
  const own = names[head ?? ''] ?? head ?? '';
  return own === 'measured' ? ['measured', ...rest.slice(0, 1)].join('.') : own;
}
