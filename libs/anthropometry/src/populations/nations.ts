import { z } from 'zod';
import { MEASURE_KEYS } from '../measures/measures.ts';
import { normalQuantile } from '../people/normal.ts';
import { fillGaps } from './fill-gaps.ts';
import { populationOf } from './mix.ts';
import type { Population } from './population.ts';
import type { Survey, SurveyGroup } from './survey.ts';
import { workedBodies, type Ranges } from './survey-population.ts';
import { fromWorked, workedOf, type Worked } from './worked.ts';

const size = z.tuple([
  z.number().nullable(),
  z.number().positive(),
  z.number().nullable(),
  z.number().positive().nullable(),
]);
const sizes = z.partialRecord(z.enum(MEASURE_KEYS), size);
const schema = z.object({
  about: z.object({ sources: z.record(z.string(), z.string()) }),
  populations: z.array(
    z.object({
      id: z.string(),
      name: z.string(),
      source: z.string(),
      cautions: z.array(z.string()),
      men: sizes,
      women: sizes,
    }),
  ),
});

type Size = z.infer<typeof size>;
type Sizes = z.infer<typeof sizes>;

const CAUTIONS = [
  'Made of printed means and spreads with the ties between measures of US soldiers.',
  'Measures that were not read follow from the read ones as they do in US soldiers, girths and weight among them.',
];
/** Ends of the range of a drawn measure, in spreads: one in a hundred thousand lies beyond. */
const REACH = 4.4;

/**
 * National groups from printed sizes: each read measure has its mean and spread, the ties between measures are those
 * of the reference, and measures that were not read follow from the read ones.
 *
 * @param file - parsed `seed-data/populations/nations.json`
 * @param reference - survey that holds every measure
 * @returns the groups, all marked estimated
 * @throws Error naming the field that does not hold together
 * @source z-scores kept per measure (Nadadur and Parkinson 2013, abstract); gaps by conditional expectation
 */
export function nationalPopulations(file: unknown, reference: Survey): Population[] {
  const parsed = schema.safeParse(file);
  if (!parsed.success) {
    const [issue] = parsed.error.issues;
    throw new Error(`National groups: ${issue?.path.join('.')}: ${issue?.message}`);
  }
  const { about, populations } = parsed.data;
  return populations.map(({ id, name, source, cautions, men, women }) => {
    const from = about.sources[source];
    if (!from)
      throw new Error(
        `National groups: ${id}.source is ${source}; accepted: ${Object.keys(about.sources).join(', ')}`,
      );
    const groups = (
      [
        ['women', women],
        ['men', men],
      ] as const
    ).filter(([, read]) => Object.keys(read).length > 0);
    return populationOf(
      {
        id,
        name,
        kind: 'estimated',
        source: from,
        licence: 'printed figures, cited',
        cautions: [...cautions, ...CAUTIONS],
        read: new Set(MEASURE_KEYS.filter((key) => groups.every(([, read]) => read[key]))),
      },
      groups.map(([group, read]) => ({
        share: 1 / groups.length,
        bodies: bodiesOf(read, reference, group, id),
      })),
    );
  });
}

function bodiesOf(read: Sizes, reference: Survey, group: SurveyGroup, id: string) {
  const keys = MEASURE_KEYS.filter((key) => read[key]);
  const sds = keys.map((key) => spreadOf(read[key] as Size, `${id}.${group}.${key}`));
  const places = keys.map((key) => reference.measures.indexOf(key));
  const correlations = reference.correlations[group];
  const covariance = Float64Array.from({ length: keys.length ** 2 }, (_, at) => {
    const [a, b] = [Math.floor(at / keys.length), at % keys.length];
    const r = correlations[places[a] as number]?.[places[b] as number] as number;
    return r * (sds[a] as number) * (sds[b] as number);
  });
  const known = workedOf({
    keys,
    mean: Float64Array.from(keys, (key) => (read[key] as Size)[1]),
    covariance,
  });
  const { worked } = fillGaps(reference.worked[group], known);
  return workedBodies(group, worked, rangesOf(worked));
}

const FIVE_PERCENT = -normalQuantile(0.05);

/** The printed spread, or the one that the printed percentiles say. */
function spreadOf([p5, p50, p95, sd]: Size, field: string): number {
  if (sd !== null) return sd;
  if (p5 !== null && p95 !== null) return (p95 - p5) / (2 * FIVE_PERCENT);
  if (p5 !== null) return (p50 - p5) / FIVE_PERCENT;
  if (p95 !== null) return (p95 - p50) / FIVE_PERCENT;
  throw new Error(`National groups: ${field} has no spread; accepted: an outer percentile or a spread`);
}

function rangesOf({ keys, mean, covariance }: Worked): Ranges {
  return Object.fromEntries(
    keys.map((key, i) => {
      const reach = REACH * Math.sqrt(covariance[i * keys.length + i] as number);
      const at = mean[i] as number;
      return [key, { min: fromWorked(key, at - reach), max: fromWorked(key, at + reach) }];
    }),
  );
}
