import { MEASURE_INFO, MEASURE_KEYS, SURVEY_UNITS, type MeasureKey } from '@settlewright/anthropometry';
import type { SelectOption } from '@/components/select.tsx';
import type { SurveyMapping, SurveyPreview } from '@/lib/contract.ts';

/** What one column of the table is. */
export type ColumnUse = MeasureKey | 'sex' | 'age' | 'unread';

type Unit = SurveyMapping['measures'][number]['unit'];

/** A mapping while it is being made: the sex may still be missing. */
export type OpenMapping = SurveyPreview['mapping'];

export const USES: readonly SelectOption<ColumnUse>[] = [
  { value: 'unread', words: 'not read' },
  { value: 'sex', words: 'woman or man' },
  { value: 'age', words: 'age in years' },
  ...MEASURE_KEYS.map((key) => ({ value: key, words: MEASURE_INFO[key].plain })),
];

/** Units that a measure may be written in. */
export const unitsOf = (key: MeasureKey): Unit[] =>
  Object.keys(SURVEY_UNITS[MEASURE_INFO[key].unit]) as Unit[];

export function columnUse({ sex, age, measures }: OpenMapping, column: string): ColumnUse {
  if (sex?.column === column) return 'sex';
  if (age === column) return 'age';
  return measures.find((one) => one.column === column)?.key ?? 'unread';
}

/** The mapping with one column used another way; a use that only one column can have leaves the other. */
export function withUse(mapping: OpenMapping, column: string, use: ColumnUse): OpenMapping {
  const { sex, age, ...rest } = mapping;
  const measures = mapping.measures.filter((one) => one.column !== column && one.key !== use);
  const isMeasure = use !== 'sex' && use !== 'age' && use !== 'unread';
  const unit = isMeasure ? unitsOf(use)[0] : undefined;
  const keptSex = use === 'sex' ? { column } : sex?.column === column ? undefined : sex;
  const keptAge = use === 'age' ? column : age === column ? undefined : age;
  return {
    ...rest,
    ...(keptSex ? { sex: keptSex } : {}),
    ...(keptAge === undefined ? {} : { age: keptAge }),
    measures: isMeasure && unit ? [...measures, { key: use, column, unit }] : measures,
  };
}

export const withUnit = (mapping: OpenMapping, column: string, unit: Unit): OpenMapping => ({
  ...mapping,
  measures: mapping.measures.map((one) => (one.column === column ? { ...one, unit } : one)),
});

/** The mapping as it can be sent; nothing while the column of the sex is missing. */
export const wholeMapping = (mapping: OpenMapping): SurveyMapping | undefined =>
  mapping.sex ? { ...mapping, sex: mapping.sex } : undefined;
