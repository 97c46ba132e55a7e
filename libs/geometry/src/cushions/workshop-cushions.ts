import { z } from 'zod';
import { MM_PER_INCH } from '../units/length-style.ts';
import { CUSHION_SETTINGS, type CushionSettings } from './cushion-settings.ts';
import { foamGradeSchema, type FoamGrade } from './foam-grades.ts';

export type AllowanceKey = keyof CushionSettings;

/** Every allowance, in the order of the page. */
export const ALLOWANCE_KEYS = Object.keys(CUSHION_SETTINGS) as AllowanceKey[];

/** Least and most that an allowance may be, millimetres, where it is not 0 to 300. */
const LIMITS: Partial<Record<AllowanceKey, readonly [number, number]>> = {
  clothWidth: [300, 3500],
  weltStrip: [10, 150],
  seam: [3, 60],
  boardThickness: [3, 40],
  wrapLost: [0, MM_PER_INCH],
  knifeCrown: [0, MM_PER_INCH],
};

/**
 * What an allowance may be.
 *
 * @param key - which
 * @returns millimetres, both ends included
 */
export function allowanceLimits(key: AllowanceKey): { minMm: number; maxMm: number } {
  const [minMm, maxMm] = LIMITS[key] ?? [0, 300];
  return { minMm, maxMm };
}

const own = (key: AllowanceKey) => {
  const { minMm, maxMm } = allowanceLimits(key);
  return z.number().min(minMm).max(maxMm).optional();
};

/** A workshop's own way of making cushions: allowances that differ from the usual ones, and its grades of foam. */
export const workshopCushionsSchema = z.strictObject({
  allowancesMm: z.strictObject(
    Object.fromEntries(ALLOWANCE_KEYS.map((key) => [key, own(key)])) as Record<
      AllowanceKey,
      ReturnType<typeof own>
    >,
  ),
  foams: z
    .array(foamGradeSchema)
    .max(60)
    .refine((foams) => new Set(foams.map(({ name }) => name.toLowerCase())).size === foams.length, {
      message: 'Two grades of foam have the same name',
    }),
});

export type WorkshopCushions = z.infer<typeof workshopCushionsSchema>;

/** A workshop that has set nothing of its own. */
export const NO_OWN_CUSHIONS: WorkshopCushions = { allowancesMm: {}, foams: [] };

/** What the cushions of a revision are made with, kept as it was on the day it was issued. */
export interface CushionRules {
  settings: CushionSettings;
  foams: FoamGrade[];
}

/**
 * The rules that follow from what a workshop has set of its own.
 *
 * @param workshop - its own values; each is called a shop rule
 */
export function cushionRules({ allowancesMm, foams }: WorkshopCushions): CushionRules {
  const settings = Object.fromEntries(
    ALLOWANCE_KEYS.map((key) => {
      const valueMm = allowancesMm[key];
      const usual = CUSHION_SETTINGS[key];
      return [key, valueMm === undefined ? usual : { ...usual, valueMm, source: 'shop rule' }];
    }),
  ) as CushionSettings;
  return { settings, foams };
}

/**
 * Rules that were kept, with the usual value for an allowance that did not exist then.
 *
 * @param kept - with a revision; null where it was issued before workshops had their own
 */
export function keptCushionRules(kept: CushionRules | null): CushionRules {
  if (kept === null) return { settings: CUSHION_SETTINGS, foams: [] };
  return { ...kept, settings: { ...CUSHION_SETTINGS, ...kept.settings } };
}
