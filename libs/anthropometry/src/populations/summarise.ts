import { MEASURE_KEYS, type MeasureKey } from '../measures/measures.ts';
import {
  columnStatistics,
  decimals,
  digits,
  PERCENTILE_KEYS,
  type ColumnStatistics,
} from './column-statistics.ts';
import { leastSquares, meanOf } from './least-squares.ts';
import { fitSpread, type SpreadModel } from './spread.ts';
import type { GroupColumns, ReadPeople } from './survey-rows.ts';
import type { SurveyGroup } from './survey.ts';
import { DERIVED, isLogged, toWorked } from './worked.ts';

const GROUPS = ['men', 'women'] as const satisfies readonly SurveyGroup[];

/** Worked means, spreads and correlations as a summary prints them. */
export interface LogBlock {
  n: number;
  mean: number[];
  sd: number[];
  /** Upper triangle with the diagonal, row after row, in one list. */
  corr: number[];
}

/** Intercept, one slope per predictor, residual spread, share explained. */
export type Regression = number[];
type PerMeasure<T> = Partial<Record<MeasureKey, T>>;
type PerGroup<T> = Record<SurveyGroup, T>;

/** A population's summary in the layout of `seed-data/populations/ansur2.json`. */
export interface SurveySummary {
  about: { source: string; units: string; percentile_keys: number[]; percentile_rule: string };
  measures: MeasureKey[];
  stats: PerGroup<PerMeasure<ColumnStatistics> & { age?: ColumnStatistics }>;
  /** Upper triangles with the diagonal, row by row. */
  corr: PerGroup<number[][]>;
  reg_stature: PerGroup<PerMeasure<Regression>>;
  reg_stature_weight: PerGroup<PerMeasure<Regression>>;
  reg_stature_lnweight: PerGroup<PerMeasure<Regression>>;
  log: { about: string; measures: MeasureKey[]; plain: MeasureKey[] } & PerGroup<LogBlock>;
  spread: { about: string } & PerGroup<SpreadModel>;
}

/** Fewer people than this say little of a spread, and less of a percentile near the ends. */
export const LEAST_PEOPLE = 30;

const LOG_ABOUT =
  'natural logs (weight of kg, others of mm), the measures under `plain` in mm as they are; ' +
  'order of corr rows = measures; 4 decimals, upper triangle incl. diagonal row by row; ' +
  'acromial_height is left out, it follows from three others';
const SPREAD_ABOUT =
  'factor on the variance that is left over once the measures under `given` are known: ' +
  'exp(c0 + c1 s + c2 w + c3 w^2), s = ln stature - centre[0], w = ln weight - centre[1], ' +
  'both kept within range; 1 on average over the people';

/**
 * Statistics of people who were read, in the layout that `readSurvey` takes.
 *
 * @param people - from `readPeople`; stature and weight among the measures, both groups with at least `LEAST_PEOPLE`
 * @param source - where the people come from, in words
 * @returns the summary of the measures that were read
 * @throws Error naming what is missing
 */
export function summarise({ groups }: ReadPeople, source: string): SurveySummary {
  const measures = MEASURE_KEYS.filter((key) => groups.men.measures.has(key));
  for (const key of ['stature', 'weight_kg'] as const) {
    if (!measures.includes(key))
      throw new Error(`measures: ${key} is missing; accepted: a table that holds it`);
  }
  for (const group of GROUPS) {
    const { count } = groups[group];
    if (count < LEAST_PEOPLE) {
      throw new Error(`${group}: ${count} readable rows; accepted: ${LEAST_PEOPLE} or more`);
    }
  }
  const logged = measures.filter((key) => !(key in DERIVED));
  const perGroup = <T>(of: (columns: GroupColumns) => T): PerGroup<T> => ({
    men: of(groups.men),
    women: of(groups.women),
  });
  const weightAs = (f: (kg: number) => number) => (columns: GroupColumns) =>
    regressions(columns, measures, [columnOf(columns, 'stature'), columnOf(columns, 'weight_kg').map(f)]);
  return {
    about: {
      source,
      units: 'mm; weight_kg in kg',
      percentile_keys: [...PERCENTILE_KEYS],
      percentile_rule: 'linear interpolation (type 7)',
    },
    measures,
    stats: perGroup((columns) => ({
      ...(columns.age ? { age: columnStatistics(columns.age) } : {}),
      ...Object.fromEntries(measures.map((key) => [key, columnStatistics(columnOf(columns, key))])),
    })),
    corr: perGroup((columns) => correlations(measures.map((key) => columnOf(columns, key)))),
    reg_stature: perGroup((columns) => regressions(columns, measures, [columnOf(columns, 'stature')])),
    reg_stature_weight: perGroup(weightAs((kg) => kg)),
    reg_stature_lnweight: perGroup(weightAs(Math.log)),
    log: {
      about: LOG_ABOUT,
      measures: logged,
      plain: logged.filter((key) => !isLogged(key)),
      ...perGroup((columns) => logBlock(columns, logged)),
    },
    spread: {
      about: SPREAD_ABOUT,
      ...perGroup((columns) => fitSpread(new Map(logged.map((key) => [key, workedColumn(columns, key)])))),
    },
  };
}

const columnOf = ({ measures }: GroupColumns, key: MeasureKey): Float64Array =>
  measures.get(key) as Float64Array;

const workedColumn = (columns: GroupColumns, key: MeasureKey): Float64Array =>
  columnOf(columns, key).map((x) => toWorked(key, x));

function logBlock(columns: GroupColumns, keys: readonly MeasureKey[]): LogBlock {
  const worked = keys.map((key) => workedColumn(columns, key));
  return {
    n: columns.count,
    mean: worked.map((column) => decimals(meanOf(column), 6)),
    sd: worked.map((column) => decimals(spreadOf(column), 6)),
    corr: correlations(worked).flat(),
  };
}

function regressions(
  columns: GroupColumns,
  measures: readonly MeasureKey[],
  predictors: readonly Float64Array[],
): PerMeasure<Regression> {
  const given: readonly MeasureKey[] = ['stature', 'weight_kg'].slice(0, predictors.length) as MeasureKey[];
  return Object.fromEntries(
    measures
      .filter((key) => !given.includes(key))
      .map((key) => {
        const { intercept, slopes, residualSd, r2 } = leastSquares(predictors, columnOf(columns, key));
        return [
          key,
          [...[intercept, ...slopes].map((x) => digits(x, 6)), decimals(residualSd, 2), decimals(r2, 4)],
        ];
      }),
  );
}

function spreadOf(column: Float64Array): number {
  const mean = meanOf(column);
  return Math.sqrt(column.reduce((sum, x) => sum + (x - mean) ** 2, 0) / (column.length - 1));
}

/** Pearson correlations to 4 decimals, upper triangle with the diagonal. */
function correlations(columns: readonly Float64Array[]): number[][] {
  const standard = columns.map((column) => {
    const mean = meanOf(column);
    const scale = spreadOf(column) * Math.sqrt(column.length - 1);
    return column.map((x) => (x - mean) / scale);
  });
  return standard.map((a, i) =>
    standard.slice(i).map((b, offset) => {
      if (offset === 0) return 1;
      let sum = 0;
      for (let r = 0; r < a.length; r += 1) sum += (a[r] as number) * (b[r] as number);
      return decimals(sum, 4);
    }),
  );
}
