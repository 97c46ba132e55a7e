import { csvRefused, readCsvRows } from '../../common/csv-rows';
import { withoutGuard } from '../../common/spreadsheet-cell';

/** A national survey holds some thousands of people; ten thousand rows of six measures fill the 2 MB. */
export const SURVEY_MAX_ROWS = 10_000;
const MAX_COLUMNS = 400;

/** A table as it stands in a file. */
export interface SurveyFile {
  headings: string[];
  rows: string[][];
  /** Line of each row in the file. */
  lines: number[];
  /** Columns are not parted by commas, so that a comma may stand before the decimals. */
  commaIsFree: boolean;
}

/** Reads a table of measured people; what is no such table is refused whole. */
export function readSurveyFile(csv: string): SurveyFile {
  const { delimiter, rows } = readCsvRows(csv);
  const [head, ...body] = rows;
  if (!head || body.length === 0) {
    throw csvRefused(
      'csv-empty',
      'The file holds no people; accepted is a line of headings and a line for each person.',
    );
  }
  if (body.length > SURVEY_MAX_ROWS) {
    throw csvRefused(
      'csv-too-many-rows',
      `The file has ${body.length} rows; accepted are up to ${SURVEY_MAX_ROWS}.`,
    );
  }
  const headings = head.cells.map((cell) => withoutGuard(cell).trim());
  if (headings.length > MAX_COLUMNS) {
    throw csvRefused(
      'csv-too-many-columns',
      `The file has ${headings.length} columns; accepted are up to ${MAX_COLUMNS}.`,
    );
  }
  const named = headings.filter((heading) => heading !== '');
  const twice = named.find((heading, at) => named.indexOf(heading) !== at);
  if (twice !== undefined) {
    throw csvRefused('csv-column-twice', `Two columns are called "${shortened(twice)}". Rename one.`);
  }
  const broken = body.find(({ fault }) => fault);
  if (broken) {
    throw csvRefused('csv-quotes', `Line ${broken.line}: quotes open that do not close.`);
  }
  return {
    headings,
    rows: body.map(({ cells }) => cells.map(withoutGuard)),
    lines: body.map(({ line }) => line),
    commaIsFree: delimiter !== ',',
  };
}

/** Everything in one column; undefined when there is no such column. */
export function columnOf({ headings, rows }: SurveyFile, name: string): string[] | undefined {
  const at = name === '' ? -1 : headings.indexOf(name);
  return at < 0 ? undefined : rows.map((cells) => (cells[at] ?? '').trim());
}

/** Long cells are cut where they are repeated to a person. */
export const shortened = (text: string): string => (text.length > 80 ? `${text.slice(0, 79)}…` : text);
