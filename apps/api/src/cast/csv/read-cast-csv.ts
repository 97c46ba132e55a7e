import Papa from 'papaparse';
import { Problem } from '../../common/problem';
import { withoutGuard } from '../../common/spreadsheet-cell';
import type { UnitSystem } from '../../productions/entities/production.entity';
import { type CastRow, type CellProblem, type FileSetting, readCastRow } from './cast-row';
import { type Column, readColumns } from './columns';

const CSV_MAX_BYTES = 2_000_000;
export const CSV_MAX_ROWS = 2_000;

export interface ReadRow {
  /** Line of the file, counted from 1; the header stands on line 1. */
  line: number;
  value?: CastRow;
  problems: CellProblem[];
  /** What a person should look at, though the row can be taken. */
  warnings: CellProblem[];
}

export interface ReadCsv {
  columns: Column[];
  ignoredColumns: string[];
  rows: ReadRow[];
}

interface RawRow {
  line: number;
  cells: string[];
  fault?: string;
}

/** Reads a list of people. A file that is no such list is refused whole; a bad row only by itself. */
export function readCastCsv(csv: string, units: UnitSystem, existingNames: readonly string[]): ReadCsv {
  const { delimiter, rows } = splitRows(csv);
  const [head, ...body] = rows;
  if (!head)
    throw refused('csv-empty', 'The file is empty; accepted is a header line and a line for each person.');
  const { columns, ignored, repeated } = readColumns(head.cells.map(withoutGuard));
  const twice = repeated[0];
  if (twice) {
    throw refused(
      'csv-column-twice',
      `The columns ${twice.headers.join(' and ')} both mean ${twice.key}. Keep one.`,
    );
  }
  if (!columns.some(({ key }) => key === 'name')) {
    const read = head.cells.slice(0, 8).join(', ').slice(0, 120);
    throw refused('csv-no-name', `No column is called "name". The first line reads: ${read}`);
  }
  if (body.length > CSV_MAX_ROWS) {
    throw refused(
      'csv-too-many-rows',
      `The file has ${body.length} rows; accepted are up to ${CSV_MAX_ROWS}.`,
    );
  }
  const metric = units === 'millimetres';
  const setting: FileSetting = {
    bareLength: metric ? 'mm' : 'in',
    bareMass: metric ? 'kg' : 'lb',
    decimalComma: delimiter !== ',',
  };
  const read = body.map((row) => readRow(row, columns, setting, head.cells.length));
  return { columns, ignoredColumns: ignored, rows: withDuplicates(read, existingNames) };
}

function splitRows(csv: string): { delimiter: string; rows: RawRow[] } {
  if (Buffer.byteLength(csv) > CSV_MAX_BYTES) {
    throw new Problem(413, 'csv-too-large', 'The file is larger than 2 MB. Split it and bring in the parts.');
  }
  const text = csv.replace(/^\ufeff/, '').replace(/\r\n?/g, '\n');
  if (text.includes('\0') || /\p{Cs}/u.test(text)) {
    throw refused('csv-not-text', 'The file is not text. Save the table as CSV (UTF-8) and bring that in.');
  }
  const rows: RawRow[] = [];
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

function readRow(row: RawRow, columns: Column[], setting: FileSetting, width: number): ReadRow {
  const surplus = row.cells.slice(width).filter((cell) => cell.trim() !== '');
  const whole = row.cells.join(' ').slice(0, 80);
  const broken = row.fault
    ? {
        read: whole,
        accepted: 'quotes that open and close',
        message: `The quotes of this row do not close: ${whole}`,
      }
    : surplus.length > 0
      ? {
          read: surplus.join(' ').slice(0, 80),
          accepted: `${width} cells`,
          message: `The row has more cells than the header; accepted: ${width}`,
        }
      : null;
  if (broken) return { line: row.line, problems: [{ column: '', ...broken }], warnings: [] };
  return { line: row.line, warnings: [], ...readCastRow(row.cells.map(withoutGuard), columns, setting) };
}

const sameName = (name: string) => name.normalize('NFKC').toLowerCase().replace(/\s+/g, ' ').trim();

function withDuplicates(rows: ReadRow[], existingNames: readonly string[]): ReadRow[] {
  const seen = new Map(existingNames.map((name) => [sameName(name), 'somebody in this production']));
  return rows.map((row) => {
    if (!row.value) return row;
    const { name } = row.value;
    const other = seen.get(sameName(name));
    if (!other) {
      seen.set(sameName(name), `line ${row.line}`);
      return row;
    }
    const message = `${name} is also the name of ${other}. Both are kept.`;
    return { ...row, warnings: [{ column: 'name', read: name, accepted: 'a name of its own', message }] };
  });
}

function refused(code: string, detail: string): Problem {
  return new Problem(400, code, detail, [{ path: 'csv', code, message: detail }]);
}
