import {
  completeSummary,
  LEAST_PEOPLE,
  type MeasureKey,
  type PeopleTable,
  readPeople,
  type ReadPeople,
  type RowFault,
  summarise,
  type WholeSummary,
} from '@settlewright/anthropometry';
import type { ProblemField } from '../../common/problem';
import { csvText } from '../../common/spreadsheet-cell';
import { referenceSurvey } from '../built-in';
import { crowdFrom } from '../crowd-data';
import type { Mapping } from './mapping';
import { columnOf, shortened, type SurveyFile } from './survey-file';

/** A fault of a field, with the line of the file where it stands. */
export interface LineFault extends RowFault {
  line: number;
}

export interface CheckedSurvey {
  women: number;
  men: number;
  /** Rows with a fault. */
  leftOut: number;
  faults: LineFault[];
  /** Measures that the table holds; the others would be estimated. */
  read: MeasureKey[];
  /** Why these people cannot be summarised. */
  tooFew: ProblemField[];
  people: ReadPeople;
}

/** Reads the people of a table by a mapping without faults. */
export function checkSurvey(file: SurveyFile, mapping: Mapping): CheckedSurvey {
  const people = readPeople(tableOf(file, mapping), referenceSurvey());
  const { women, men } = people.groups;
  const read = [...women.measures.keys()];
  return {
    women: women.count,
    men: men.count,
    leftOut: new Set(people.faults.map(({ row }) => row)).size,
    faults: people.faults.map((fault) => ({
      ...fault,
      read: shortened(fault.read),
      line: file.lines[fault.row - 1] ?? 0,
    })),
    read,
    tooFew: (['women', 'men'] as const).flatMap((group) =>
      tooFew(group, people.groups[group].count, read.length),
    ),
    people,
  };
}

/** Statistics of the people, every measure that was not taken estimated. */
export function summaryOf({ people }: CheckedSurvey, source: string): WholeSummary {
  const whole = completeSummary(summarise(people, source), referenceSurvey());
  // What cannot be drawn from is refused now and not when it is studied.
  crowdFrom({ kind: 'own', id: '', name: '', source, summary: whole }).draw(1, 1);
  return whole;
}

/** The columns that are used, as they stand in the file, of rows without a fault; nothing else of it. */
export function keptRows(
  file: SurveyFile,
  { sex, age, measures }: Mapping,
  { people }: CheckedSurvey,
): string {
  const columns = [sex.column, ...(age ? [age] : []), ...measures.map(({ column }) => column)];
  const values = columns.map((column) => columnOf(file, column) ?? []);
  const faulty = new Set(people.faults.map(({ row }) => row));
  const rows = file.rows.map((_, row) => values.map((column) => column[row] ?? ''));
  return csvText([columns, ...rows.filter((_, row) => !faulty.has(row + 1))]);
}

function tableOf(file: SurveyFile, { sex, age, measures, decimalComma }: Mapping): PeopleTable {
  const column = (name: string) => ({ name, values: columnOf(file, name) ?? [] });
  return {
    sex: {
      ...column(sex.column),
      ...(sex.women?.length ? { women: sex.women } : {}),
      ...(sex.men?.length ? { men: sex.men } : {}),
    },
    ...(age ? { age: column(age) } : {}),
    measures: Object.fromEntries(
      measures.map(({ key, column: name, unit }) => [key, { ...column(name), unit }]),
    ),
    decimalComma,
  };
}

/** More people than measures, or each measure would seem to follow from the others. */
function tooFew(group: 'women' | 'men', count: number, measures: number): ProblemField[] {
  const least = Math.max(LEAST_PEOPLE, measures + 1);
  if (count >= least) return [];
  const why =
    least > LEAST_PEOPLE
      ? `more than the ${measures} measures, or fewer columns`
      : 'fewer say little of how bodies differ, and both sexes are needed';
  return [
    {
      path: `csv.${group}`,
      code: 'too-few-people',
      message: `${count} readable rows of ${group}; accepted: ${least} or more (${why})`,
    },
  ];
}
