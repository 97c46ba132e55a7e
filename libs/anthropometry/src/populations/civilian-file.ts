import { z } from 'zod';
import { MEASURE_KEYS, type MeasureKey } from '../measures/measures.ts';
import type { SurveyGroup } from './survey.ts';

const perGroup = <T extends z.ZodType>(schema: T) => z.object({ men: schema, women: schema });
const pair = z.tuple([z.number(), z.number()]);
const marginal = z.object({
  mean: z.number(),
  sd: z.number().positive(),
  p: z.array(z.number()),
  range: pair,
});
const group = z.object({
  stature: marginal,
  ln_weight: marginal,
  r_stature_ln_weight: z.number().gt(-1).lt(1),
  coef: z.array(z.tuple([z.number(), z.number(), z.number()])),
  residual_sd: z.array(z.number().positive()),
  residual_corr: z.array(z.array(z.number().min(-1).max(1))),
  range: z.array(pair),
});
const schema = z.object({
  about: z.object({ source: z.string(), percentile_keys: z.array(z.number().gt(0).lt(100)).min(2) }),
  measures: z.array(z.enum(MEASURE_KEYS)),
  ...perGroup(group).shape,
});

/** Stature and weight of a group, as counted. */
export type CivilianGroup = z.infer<typeof group>;

/** The civilian file, read and checked. */
export interface CivilianFile {
  source: string;
  percents: readonly number[];
  /** Measures that follow from stature and weight, in the order of the coefficients. */
  measures: readonly MeasureKey[];
  groups: Record<SurveyGroup, CivilianGroup>;
}

/**
 * Reads the civilian generator.
 *
 * @param file - parsed `seed-data/populations/civilian-2015.json`
 * @throws Error naming the field that does not hold together
 */
export function readCivilianFile(file: unknown): CivilianFile {
  const parsed = schema.safeParse(file);
  if (!parsed.success) {
    const [issue] = parsed.error.issues;
    throw new Error(`Civilian file: ${issue?.path.join('.')}: ${issue?.message}`);
  }
  const { about, measures, men, women } = parsed.data;
  for (const [name, { coef, residual_sd, residual_corr, range, stature, ln_weight }] of [
    ['men', men],
    ['women', women],
  ] as const) {
    const lengths = [coef, residual_sd, residual_corr, range].map(({ length }) => length);
    if (lengths.some((length) => length !== measures.length)) {
      throw new Error(
        `Civilian file: ${name} holds ${lengths.join(', ')} rows; accepted: ${measures.length} each`,
      );
    }
    if (residual_corr.some((row, at) => row.length !== measures.length - at || row[0] !== 1)) {
      throw new Error(
        `Civilian file: ${name}.residual_corr is no upper triangle; accepted: rows that begin with 1`,
      );
    }
    for (const { p } of [stature, ln_weight]) {
      if (
        p.length !== about.percentile_keys.length ||
        p.some((value, at) => at > 0 && value < (p[at - 1] as number))
      ) {
        throw new Error(
          `Civilian file: ${name} has percentiles that fall; accepted: one for each key, never falling`,
        );
      }
    }
  }
  return { source: about.source, percents: about.percentile_keys, measures, groups: { men, women } };
}
