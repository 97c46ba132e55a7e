import Papa from 'papaparse';
import { Problem } from './problem';

const CSV_MAX_BYTES = 2_000_000;

export interface CsvRow {
  /** Line of the file, counted from 1. */
  line: number;
  cells: string[];
  /** What the reader found wrong with its quotes. */
  fault?: string;
}

/**
 * The rows of a CSV text: byte-order mark, any line ends, commas, semicolons, tabs or bars; empty rows left out.
 *
 * @throws Problem when it is too large or no text
 */
export function readCsvRows(csv: string): { delimiter: string; rows: CsvRow[] } {
  if (Buffer.byteLength(csv) > CSV_MAX_BYTES) {
    throw new Problem(413, 'csv-too-large', 'The file is larger than 2 MB. Split it and bring in the parts.');
  }
  const text = csv.replace(/^\ufeff/, '').replace(/\r\n?/g, '\n');
  if (text.includes('\0') || /\p{Cs}/u.test(text)) {
    throw csvRefused(
      'csv-not-text',
      'The file is not text. Save the table as CSV (UTF-8) and bring that in.',
    );
  }
  const rows: CsvRow[] = [];
  let delimiter = ',';
  let at = 0;
  let line = 1;
  Papa.parse<string[]>(text, {
    delimitersToGuess: [',', ';', '\t', '|'],
    step: ({ data, errors, meta }) => {
      delimiter = meta.delimiter;
      const fault = errors.find(({ code }) => code !== 'UndetectableDelimiter')?.message;
      if (data.some((cell) => cell.trim() !== ''))
        rows.push({ line, cells: data, ...(fault ? { fault } : {}) });
      line += text.slice(at, meta.cursor).split('\n').length - 1;
      at = meta.cursor;
    },
  });
  return { delimiter, rows };
}

/** The whole file cannot be used. */
export function csvRefused(code: string, detail: string): Problem {
  return new Problem(400, code, detail, [{ path: 'csv', code, message: detail }]);
}
