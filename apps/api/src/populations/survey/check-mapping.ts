import { MEASURE_INFO, SURVEY_UNITS } from '@settlewright/anthropometry';
import type { ProblemField } from '../../common/problem';
import type { Mapping, SuggestedMapping } from './mapping';
import type { SurveyFile } from './survey-file';
import { shortened } from './survey-file';

const NEEDED = ['stature', 'weight_kg'] as const;

/** Everything that keeps a mapping from being used, by field. */
export function mappingFaults(file: SurveyFile, mapping: SuggestedMapping): ProblemField[] {
  const faults: ProblemField[] = [];
  const fault = (path: string, code: string, message: string) =>
    faults.push({ path: `mapping.${path}`, code, message });
  const found = (path: string, column: string) => {
    if (column !== '' && file.headings.includes(column)) return;
    const accepted = file.headings
      .filter((heading) => heading !== '')
      .slice(0, 60)
      .map(shortened)
      .join(', ');
    fault(path, 'unknown-column', `no column is called "${shortened(column)}"; accepted: ${accepted}`);
  };
  if (mapping.sex) found('sex.column', mapping.sex.column);
  else fault('sex', 'missing', 'no column says who is a woman and who a man; choose one');
  const both = mapping.sex?.women?.find((word) => mapping.sex?.men?.includes(word));
  if (both !== undefined) {
    fault('sex', 'word-twice', `"${shortened(both)}" stands for women and for men; accepted: one of the two`);
  }
  if (typeof mapping.age === 'string') found('age', mapping.age);
  mapping.measures.forEach(({ key, column, unit }, at) => {
    found(`measures.${at}.column`, column);
    const units = Object.keys(SURVEY_UNITS[MEASURE_INFO[key].unit]);
    if (!units.includes(unit)) {
      fault(
        `measures.${at}.unit`,
        'unit',
        `${key} is in ${MEASURE_INFO[key].unit}; read "${unit}"; accepted: ${units.join(', ')}`,
      );
    }
    if (mapping.measures.findIndex((other) => other.key === key) !== at) {
      fault(`measures.${at}.key`, 'measure-twice', `${key} is given twice; accepted: one column each`);
    }
  });
  for (const key of NEEDED) {
    if (!mapping.measures.some((measure) => measure.key === key)) {
      const words = `no column holds the ${MEASURE_INFO[key].plain}; it is needed, the rest can be estimated`;
      fault('measures', 'missing', words);
    }
  }
  return faults;
}

/** A mapping in which nothing is missing. */
export const isWhole = (mapping: SuggestedMapping, faults: readonly ProblemField[]): mapping is Mapping =>
  faults.length === 0 && mapping.sex !== undefined;
