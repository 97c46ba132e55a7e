import { MEASURE_KEYS, type MeasureKey } from '../measures/measures.ts';
import { MEASURE_INFO } from '../measures/measure-info.ts';
import type { Survey, SurveyGroup } from './survey.ts';

/** Units that a column may be written in, with the factor to millimetres or kilograms. */
export const SURVEY_UNITS = {
  mm: { mm: 1, cm: 10, m: 1000, in: 25.4 },
  kg: { kg: 1, '0.1kg': 0.1, lb: 0.45359237 },
} as const;
export type LengthUnit = keyof (typeof SURVEY_UNITS)['mm'];
export type WeightUnit = keyof (typeof SURVEY_UNITS)['kg'];

/** One column of a table of people, as text. */
export interface TextColumn {
  /** As the table heads it; used in messages. */
  name: string;
  values: readonly string[];
}

/** A table of measured people, one row a person. */
export interface PeopleTable {
  sex: TextColumn & { women?: readonly string[]; men?: readonly string[] };
  /** Years; left aside when absent. */
  age?: TextColumn;
  measures: Partial<Record<MeasureKey, TextColumn & { unit: LengthUnit | WeightUnit }>>;
  /** True where a comma stands before the decimals. */
  decimalComma?: boolean;
}

/** A field that could not be read; its row is left out. */
export interface RowFault {
  /** Counted from 1, the heading not counted. */
  row: number;
  field: string;
  read: string;
  accepted: string;
}

/** People of one group as columns in millimetres, kilograms and years. */
export interface GroupColumns {
  count: number;
  measures: Map<MeasureKey, Float64Array>;
  age?: Float64Array;
}

/** What was read of a table. */
export interface ReadPeople {
  groups: Record<SurveyGroup, GroupColumns>;
  faults: RowFault[];
}

const WOMEN = ['f', 'w', 'female', 'woman', 'women'];
const MEN = ['m', 'male', 'man', 'men'];
/** A person a good deal smaller or larger than anyone of the reference survey is taken for a slip of unit or key. */
const SLACK = 1.6;

/**
 * Reads a table of measured people. A row with a field that is missing, not a number or out of bounds is left out
 * and listed.
 *
 * @param table - columns of equal length, as text, each with its unit
 * @param reference - survey whose smallest and largest person bound what is accepted; without it any number above 0
 * @returns columns by group, and the faults in order of rows
 * @throws Error when a column has a unit of the wrong kind or another length than the sex column
 */
export function readPeople(table: PeopleTable, reference?: Survey): ReadPeople {
  const keys = MEASURE_KEYS.filter((key) => table.measures[key]);
  const total = table.sex.values.length;
  const factors = keys.map((key) => factorOf(table, key, total));
  const bounds = keys.map((key) => boundsOf(key, reference));
  const faults: RowFault[] = [];
  const kept: Record<SurveyGroup, number[][]> = { women: [], men: [] };
  const women = (table.sex.women ?? WOMEN).map((word) => word.toLowerCase());
  const men = (table.sex.men ?? MEN).map((word) => word.toLowerCase());

  for (let row = 0; row < total; row += 1) {
    const before = faults.length;
    const fault = (field: string, read: string, accepted: string) =>
      faults.push({ row: row + 1, field, read, accepted });
    const word = (table.sex.values[row] as string).trim().toLowerCase();
    const group = women.includes(word) ? 'women' : men.includes(word) ? 'men' : undefined;
    if (!group) fault(table.sex.name, table.sex.values[row] as string, [...women, ...men].join(', '));
    const values = keys.map((key, i) => {
      const column = table.measures[key] as TextColumn & { unit: string };
      const text = column.values[row] as string;
      const value = numberIn(text, table.decimalComma) * (factors[i] as number);
      const [low, high] = bounds[i] as [number, number];
      if (!(value >= low && value <= high))
        fault(column.name, text, wordsFor(column.unit, factors[i]!, low, high));
      return value;
    });
    if (table.age) {
      const text = table.age.values[row] as string;
      const years = numberIn(text, table.decimalComma);
      if (!(years > 0 && years < 120)) fault(table.age.name, text, 'years above 0 and below 120');
      values.push(years);
    }
    if (group && faults.length === before) kept[group].push(values);
  }
  return {
    groups: { women: columnsOf(keys, kept.women, table.age), men: columnsOf(keys, kept.men, table.age) },
    faults,
  };
}

function factorOf(table: PeopleTable, key: MeasureKey, total: number): number {
  const { name, unit, values } = table.measures[key] as TextColumn & { unit: string };
  const units: Readonly<Record<string, number>> = SURVEY_UNITS[MEASURE_INFO[key].unit];
  const factor = units[unit];
  if (factor === undefined) {
    throw new Error(`${name}: unit is ${unit}; accepted for ${key}: ${Object.keys(units).join(', ')}`);
  }
  if (values.length !== total) {
    throw new Error(`${name}: holds ${values.length} rows; accepted: ${total}, as many as the sex column`);
  }
  return factor;
}

function boundsOf(key: MeasureKey, reference: Survey | undefined): [number, number] {
  if (!reference) return [Number.MIN_VALUE, Number.MAX_VALUE];
  const { women, men } = reference.stats;
  // Weight goes with the square of a width.
  const slack = key === 'weight_kg' ? SLACK ** 2 : SLACK;
  return [Math.min(women[key].min, men[key].min) / slack, Math.max(women[key].max, men[key].max) * slack];
}

function wordsFor(unit: string, factor: number, low: number, high: number): string {
  if (high === Number.MAX_VALUE) return `a number above 0, in ${unit}`;
  const shown = (value: number): string => String(Number((value / factor).toPrecision(3)));
  return `${shown(low)} to ${shown(high)} ${unit}`;
}

const NUMBER = /^\d+(\.\d+)?$/;

/** A plain number, or NaN; what might be read in two ways is not read. */
function numberIn(text: string, decimalComma = false): number {
  const plain = decimalComma ? text.trim().replace(',', '.') : text.trim();
  return NUMBER.test(plain) ? Number(plain) : Number.NaN;
}

/** Shoulder heights follow from one another, so that either may be the one that was taken. */
function columnsOf(
  keys: readonly MeasureKey[],
  rows: readonly number[][],
  age: TextColumn | undefined,
): GroupColumns {
  const column = (index: number): Float64Array => Float64Array.from(rows, (row) => row[index] as number);
  const measures = new Map(keys.map((key, index) => [key, column(index)]));
  const [standing, sitting, stature, trunk] = (
    ['acromial_height', 'acromial_height_sitting', 'stature', 'sitting_height'] as const
  ).map((key) => measures.get(key));
  if (stature && trunk && standing && !sitting) {
    measures.set(
      'acromial_height_sitting',
      standing.map((x, i) => x - (stature[i] as number) + (trunk[i] as number)),
    );
  } else if (stature && trunk && sitting && !standing) {
    measures.set(
      'acromial_height',
      sitting.map((x, i) => x + (stature[i] as number) - (trunk[i] as number)),
    );
  }
  return { count: rows.length, measures, ...(age ? { age: column(keys.length) } : {}) };
}
