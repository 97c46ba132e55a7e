import { MEASURE_KEYS, type MeasureKey } from '../measures/measures.ts';
import { normalQuantile } from '../people/normal.ts';
import { decimals, PERCENTILE_KEYS, type ColumnStatistics } from './column-statistics.ts';
import { fillGaps } from './fill-gaps.ts';
import { completeSpread } from './own-spread.ts';
import type { LogBlock, SurveySummary } from './summarise.ts';
import type { Survey, SurveyGroup } from './survey.ts';
import { DERIVED, fromWorked, isLogged, momentsOf, type Moments, type Worked } from './worked.ts';

/** Statistics of a measure that nobody took: `n` is 0. */
type EstimatedStatistics = Pick<ColumnStatistics, 'n' | 'mean' | 'sd' | 'p' | 'min' | 'max'>;

/** A summary that holds every measure, with the lists of which were read and which were estimated. */
export interface WholeSummary extends Omit<SurveySummary, 'stats'> {
  read: MeasureKey[];
  estimated: MeasureKey[];
  stats: Record<SurveyGroup, Partial<Record<MeasureKey | 'age', ColumnStatistics | EstimatedStatistics>>>;
  self_reported_stature: Record<SurveyGroup, { over_mm: number; sd_mm: number }>;
  mannequin: { shoe_mm: number; clothing: Survey['mannequin']['clothing'] };
  age_shift?: { from_years: number; to_years: number } & Record<
    SurveyGroup,
    Partial<Record<MeasureKey, number>>
  >;
}

/** Ends of the range of an estimated measure, in standard deviations: one in a thousand lies beyond. */
const END_Z = 3.09;

/**
 * Completes the summary of a survey that lacks measures: these follow from the read ones as in the reference.
 *
 * @param summary - from `summarise`
 * @param reference - survey that holds every measure, for example of `ansur2.json`
 * @returns a summary that `readSurvey` takes, its estimated measures marked
 */
export function completeSummary(summary: SurveySummary, reference: Survey): WholeSummary {
  const whole = { men: fillGroup(summary, reference, 'men'), women: fillGroup(summary, reference, 'women') };
  const read = summary.measures;
  const logged = MEASURE_KEYS.filter((key) => !(key in DERIVED));
  const told = (group: SurveyGroup) => {
    const { overMm, sdMm } = reference.selfReportedStature[group];
    return { over_mm: overMm, sd_mm: sdMm };
  };
  const { ageShift } = reference;
  const spread = (group: SurveyGroup) => {
    const { spread: fitted, log } = summary;
    const own = { fitted: fitted[group], people: log[group].n, read, worked: whole[group].worked };
    const theirs = reference.spread?.[group];
    return theirs ? completeSpread(own, theirs, reference.worked[group]) : own.fitted;
  };
  return {
    ...summary,
    measures: [...MEASURE_KEYS],
    read: [...read],
    estimated: MEASURE_KEYS.filter((key) => !read.includes(key)),
    stats: { men: statsOf(summary, whole.men, 'men'), women: statsOf(summary, whole.women, 'women') },
    corr: { men: triangleOf(whole.men.moments), women: triangleOf(whole.women.moments) },
    log: {
      about: summary.log.about,
      measures: logged,
      plain: logged.filter((key) => !isLogged(key)),
      men: logBlockOf(summary.log.men.n, whole.men.worked),
      women: logBlockOf(summary.log.women.n, whole.women.worked),
    },
    spread: {
      about: summary.spread.about,
      men: spread('men'),
      women: spread('women'),
    },
    self_reported_stature: { men: told('men'), women: told('women') },
    mannequin: { shoe_mm: reference.mannequin.shoeMm, clothing: reference.mannequin.clothing },
    ...(ageShift
      ? { age_shift: { from_years: ageShift.fromYears, to_years: ageShift.toYears, ...ageShift.perYear } }
      : {}),
  };
}

interface WholeGroup {
  worked: Worked;
  /** Of every measure, the derived one among them. */
  moments: Moments;
}

function fillGroup(summary: SurveySummary, reference: Survey, group: SurveyGroup): WholeGroup {
  const { measures, [group]: block } = summary.log;
  const size = measures.length;
  const covariance = new Float64Array(size * size);
  let next = 0;
  for (let i = 0; i < size; i += 1) {
    for (let j = i; j < size; j += 1) {
      const value = (block.corr[next] as number) * (block.sd[i] as number) * (block.sd[j] as number);
      covariance[i * size + j] = value;
      covariance[j * size + i] = value;
      next += 1;
    }
  }
  const known = { keys: measures, mean: Float64Array.from(block.mean), covariance };
  const { worked } = fillGaps(reference.worked[group], known);
  return { worked, moments: withDerived(momentsOf(worked)) };
}

function withDerived({ keys, mean, covariance }: Moments): Moments {
  const size = keys.length;
  const rows = MEASURE_KEYS.map((key) =>
    (DERIVED[key] ?? ([[key, 1]] as const)).map(([part, factor]) => [keys.indexOf(part), factor] as const),
  );
  const sum = (a: number, b: number): number =>
    (rows[a] as (readonly [number, number])[]).reduce(
      (outer, [i, u]) =>
        outer +
        (rows[b] as (readonly [number, number])[]).reduce(
          (inner, [j, v]) => inner + u * v * (covariance[i * size + j] as number),
          0,
        ),
      0,
    );
  const all = MEASURE_KEYS.length;
  return {
    keys: MEASURE_KEYS,
    mean: Float64Array.from(rows, (row) => row.reduce((m, [i, u]) => m + u * (mean[i] as number), 0)),
    covariance: Float64Array.from({ length: all * all }, (_, at) => sum(Math.floor(at / all), at % all)),
  };
}

function statsOf(summary: SurveySummary, { worked, moments }: WholeGroup, group: SurveyGroup) {
  const estimated = MEASURE_KEYS.map((key, place): [MeasureKey, EstimatedStatistics | ColumnStatistics] => {
    const read = summary.stats[group][key];
    if (read) return [key, read];
    const mean = moments.mean[place] as number;
    const sd = Math.sqrt(moments.covariance[place * MEASURE_KEYS.length + place] as number);
    const index = worked.keys.indexOf(key);
    const at = (z: number): number => {
      if (index < 0) return decimals(mean + z * sd, 1);
      const own = Math.sqrt(worked.covariance[index * worked.keys.length + index] as number);
      return decimals(fromWorked(key, (worked.mean[index] as number) + z * own), 1);
    };
    const p = PERCENTILE_KEYS.map((percent) => at(normalQuantile(percent / 100)));
    return [key, { n: 0, mean: decimals(mean, 2), sd: decimals(sd, 2), p, min: at(-END_Z), max: at(END_Z) }];
  });
  const { age } = summary.stats[group];
  return { ...(age ? { age } : {}), ...Object.fromEntries(estimated) };
}

/** Correlations of a covariance matrix to 4 decimals, upper triangle with the diagonal. */
function triangleOf({ keys, covariance }: Pick<Moments, 'keys' | 'covariance'>): number[][] {
  const size = keys.length;
  const sd = (i: number): number => Math.sqrt(covariance[i * size + i] as number);
  return keys.map((_, i) =>
    Array.from({ length: size - i }, (__, offset) => {
      if (offset === 0) return 1;
      return decimals((covariance[i * size + i + offset] as number) / (sd(i) * sd(i + offset)), 4);
    }),
  );
}

function logBlockOf(n: number, { keys, mean, covariance }: Worked): LogBlock {
  return {
    n,
    mean: Array.from(mean, (x) => decimals(x, 6)),
    sd: keys.map((_, i) => decimals(Math.sqrt(covariance[i * keys.length + i] as number), 6)),
    corr: triangleOf({ keys, covariance }).flat(),
  };
}
