import { z } from 'zod';
import { MEASURE_KEYS, type MeasureKey } from '../measures/measures.ts';
import type { SpreadModel } from './spread.ts';
import { workedOfSurvey, type LogStatistics } from './survey-worked.ts';
import type { Worked } from './worked.ts';

/** The two groups that the survey describes. */
export type SurveyGroup = 'women' | 'men';

/** Mean, spread and percentiles of one measure in one group. */
export interface MeasureStatistics {
  mean: number;
  sd: number;
  min: number;
  max: number;
  /** Values at `Survey.percentileKeys`, never falling. */
  percentiles: readonly number[];
}

/** Statistics of a population survey, checked and with its correlations as a full matrix. */
export interface Survey {
  measures: readonly MeasureKey[];
  percentileKeys: readonly number[];
  stats: Record<SurveyGroup, Record<MeasureKey, MeasureStatistics>>;
  /** Full symmetric matrices, in the order of `measures`. */
  correlations: Record<SurveyGroup, readonly (readonly number[])[]>;
  /** Measures that were read in the source; the others were estimated from them. */
  read: ReadonlySet<MeasureKey>;
  /** People of each sex that were measured; absent where the source does not say. */
  surveyed?: Record<SurveyGroup, number>;
  /** Multivariate normal of the worked values. */
  worked: Record<SurveyGroup, Worked>;
  /** How the spread grows with weight; absent where nobody fitted it. */
  spread?: Record<SurveyGroup, SpreadModel>;
  /** What years add at the same stature and weight; absent where the source does not say. */
  ageShift?: AgeShift;
  /** By how much, and how unevenly, people overstate their height. */
  selfReportedStature: Record<SurveyGroup, { overMm: number; sdMm: number }>;
  /** What a percentile mannequin wears. */
  mannequin: { shoeMm: number; clothing: 'light' | 'medium' | 'heavy' };
}

/** Millimetres per year of age from `fromYears` to `toYears`, at the same stature and weight. */
export interface AgeShift {
  fromYears: number;
  toYears: number;
  perYear: Record<SurveyGroup, Partial<Record<MeasureKey, number>>>;
}

const statistics = z
  .object({
    mean: z.number().positive(),
    sd: z.number().positive(),
    p: z.array(z.number()).min(2),
    min: z.number().positive(),
    max: z.number().positive(),
  })
  .transform(({ p, ...rest }): MeasureStatistics => ({ ...rest, percentiles: p }));

/** Further columns, such as age, are left aside. */
const everyMeasure = z.object(
  Object.fromEntries(MEASURE_KEYS.map((key) => [key, statistics])) as Record<MeasureKey, typeof statistics>,
);

const perGroup = <T extends z.ZodType>(schema: T) => z.object({ men: schema, women: schema });

const measureKey = z.enum(MEASURE_KEYS);
const pair = z.tuple([z.number(), z.number()]);
const logBlock = z.object({
  n: z.number().int().positive().optional(),
  mean: z.array(z.number()),
  sd: z.array(z.number().positive()),
  corr: z.array(z.number().min(-1).max(1)),
});
const spreadModel = z.object({
  centre: pair,
  range: z.tuple([pair, pair]),
  sets: z.array(
    z.object({
      given: z.array(measureKey),
      factors: z.partialRecord(measureKey, z.tuple([z.number(), z.number(), z.number(), z.number()])),
    }),
  ),
});
const perYear = z.partialRecord(measureKey, z.number());

const summarySchema = z.object({
  about: z.object({ percentile_keys: z.array(z.number().gt(0).lt(100)).min(2) }),
  measures: z.array(measureKey),
  read: z.array(measureKey).optional(),
  stats: perGroup(everyMeasure),
  corr: perGroup(z.array(z.array(z.number().min(-1).max(1)))),
  self_reported_stature: perGroup(
    z
      .object({ over_mm: z.number(), sd_mm: z.number().nonnegative() })
      .transform(({ over_mm, sd_mm }) => ({ overMm: over_mm, sdMm: sd_mm })),
  ),
  log: perGroup(logBlock)
    .extend({ measures: z.array(measureKey), plain: z.array(measureKey).default([]) })
    .optional(),
  spread: perGroup(spreadModel).optional(),
  age_shift: perGroup(perYear)
    .extend({ from_years: z.number().positive(), to_years: z.number().positive() })
    .transform(({ from_years, to_years, men, women }): AgeShift => ({
      fromYears: from_years,
      toYears: to_years,
      perYear: { men, women },
    }))
    .optional(),
  mannequin: z
    .object({ shoe_mm: z.number().nonnegative(), clothing: z.enum(['light', 'medium', 'heavy']) })
    .transform(({ shoe_mm, clothing }) => ({ shoeMm: shoe_mm, clothing })),
});

/**
 * Reads the statistics of a survey and refuses a file that does not hold together.
 *
 * @param summary - parsed JSON, for example `seed-data/populations/ansur2.json`
 * @returns the statistics; correlations as full matrices (the file holds the upper triangle, row by row)
 * @throws Error naming the field, what was read and what is accepted
 * @source layout as written in the file's own `about`
 */
export function readSurvey(summary: unknown): Survey {
  const parsed = summarySchema.safeParse(summary);
  if (!parsed.success) {
    const [issue] = parsed.error.issues;
    throw new Error(
      `Population summary: ${issue?.path.join('.') ?? ''}: ${issue?.message ?? 'not readable'}`,
    );
  }
  const { about, measures, stats, corr } = parsed.data;
  const keys = about.percentile_keys;
  for (const group of ['men', 'women'] as const) {
    for (const measure of measures) {
      const values = stats[group][measure].percentiles;
      if (values.length !== keys.length || values.some((v, i) => i > 0 && v < (values[i - 1] ?? v))) {
        throw new Error(
          `Population summary: stats.${group}.${measure}.p holds ${values.length} values (${values.join(', ')}); ` +
            `accepted: ${keys.length} values that never fall`,
        );
      }
    }
  }
  const correlations = {
    men: fullMatrix(corr.men, measures.length, 'men'),
    women: fullMatrix(corr.women, measures.length, 'women'),
  };
  const { log, spread, age_shift: ageShift } = parsed.data;
  const worked = (group: SurveyGroup): Worked =>
    workedOfSurvey(measures, stats[group], correlations[group], log && logOf(log, group));
  return {
    measures,
    percentileKeys: keys,
    stats,
    correlations,
    read: new Set(parsed.data.read ?? measures),
    ...(log?.women.n && log.men.n ? { surveyed: { women: log.women.n, men: log.men.n } } : {}),
    worked: { men: worked('men'), women: worked('women') },
    ...(spread ? { spread: spread } : {}),
    ...(ageShift ? { ageShift } : {}),
    selfReportedStature: parsed.data.self_reported_stature,
    mannequin: parsed.data.mannequin,
  };
}

function logOf(log: NonNullable<z.infer<typeof summarySchema>['log']>, group: SurveyGroup): LogStatistics {
  const { measures, plain } = log;
  const { mean, sd, corr } = log[group];
  const accepted = (measures.length * (measures.length + 1)) / 2;
  if (mean.length !== measures.length || sd.length !== measures.length || corr.length !== accepted) {
    throw new Error(
      `Population summary: log.${group} holds ${mean.length} means, ${sd.length} spreads and ${corr.length} ` +
        `correlations; accepted: ${measures.length}, ${measures.length} and ${accepted}`,
    );
  }
  return { measures, plain, mean, sd, upper: corr };
}

function fullMatrix(upper: number[][], size: number, group: SurveyGroup): number[][] {
  const full = Array.from({ length: size }, () => new Array<number>(size).fill(0));
  for (let row = 0; row < size; row += 1) {
    const values = upper[row] ?? [];
    if (values.length !== size - row || values[0] !== 1) {
      throw new Error(
        `Population summary: corr.${group}[${row}] holds ${values.length} values starting with ${values[0]}; ` +
          `accepted: ${size - row} values starting with 1`,
      );
    }
    values.forEach((value, offset) => {
      (full[row] as number[])[row + offset] = value;
      (full[row + offset] as number[])[row] = value;
    });
  }
  return full;
}
