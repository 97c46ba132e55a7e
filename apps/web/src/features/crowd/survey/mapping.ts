import { MEASURE_INFO, MEASURE_KEYS, SURVEY_UNITS, type MeasureKey } from '@settlewright/anthropometry';
import type { SelectOption } from '@/components/select.tsx';
import type { OpenSurveyMapping, SurveyMapping } from '@/lib/contract.ts';

/** What one column of the table is. */
export type ColumnUse = MeasureKey | 'sex' | 'age' | 'unread';

type Unit = SurveyMapping['measures'][number]['unit'];

export const USES: readonly SelectOption<ColumnUse>[] = [
  { value: 'unread', words: 'not read' },
  { value: 'sex', words: 'woman or man' },
  { value: 'age', words: 'age in years' },
  ...MEASURE_KEYS.map((key) => ({ value: key, words: MEASURE_INFO[key].plain })),
];

/** Units that a measure may be written in. */
export const unitsOf = (key: MeasureKey): Unit[] =>
  Object.keys(SURVEY_UNITS[MEASURE_INFO[key].unit]) as Unit[];

export function columnUse({ sex, age, measures }: OpenSurveyMapping, column: string): ColumnUse {
  if (sex?.column === column) return 'sex';
  if (age === column) return 'age';
  return measures.find((one) => one.column === column)?.key ?? 'unread';
}

/**
 * The mapping with one column used another way; a use that only one column can have leaves the other. The unit is left
 * to the server, which finds it from the values.
 */
export function withUse(mapping: OpenSurveyMapping, column: string, use: ColumnUse): OpenSurveyMapping {
  const { sex, age, ...rest } = mapping;
  const measures = mapping.measures.filter((one) => one.column !== column && one.key !== use);
  const isMeasure = use !== 'sex' && use !== 'age' && use !== 'unread';
  const keptSex = use === 'sex' ? { column } : sex?.column === column ? undefined : sex;
  const keptAge = use === 'age' ? column : age === column ? undefined : age;
  return {
    ...rest,
    ...(keptSex ? { sex: keptSex } : {}),
    ...(keptAge === undefined ? {} : { age: keptAge }),
    measures: isMeasure ? [...measures, { key: use, column }] : measures,
  };
}

export const withUnit = (mapping: OpenSurveyMapping, column: string, unit: Unit): OpenSurveyMapping => ({
  ...mapping,
  measures: mapping.measures.map((one) => (one.column === column ? { ...one, unit } : one)),
});

/** The mapping as people can be added by it; nothing while the column of the sex or a unit is missing. */
export function wholeMapping({ sex, measures, ...rest }: OpenSurveyMapping): SurveyMapping | undefined {
  const whole = measures.flatMap(({ unit, ...one }) => (unit ? [{ ...one, unit }] : []));
  return sex && whole.length === measures.length ? { ...rest, sex, measures: whole } : undefined;
}
