import { type CsvRow, csvRefused, readCsvRows } from '../../common/csv-rows';
import { withoutGuard } from '../../common/spreadsheet-cell';
import type { UnitSystem } from '../../productions/entities/production.entity';
import { type CastRow, type CellProblem, type FileSetting, readCastRow } from './cast-row';
import { type Column, readColumns } from './columns';

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

/** Reads a list of people. A file that is no such list is refused whole; a bad row only by itself. */
export function readCastCsv(csv: string, units: UnitSystem, existingNames: readonly string[]): ReadCsv {
  const { delimiter, rows } = readCsvRows(csv);
  const [head, ...body] = rows;
  if (!head)
    throw csvRefused('csv-empty', 'The file is empty; accepted is a header line and a line for each person.');
  const { columns, ignored, repeated } = readColumns(head.cells.map(withoutGuard));
  const twice = repeated[0];
  if (twice) {
    throw csvRefused(
      'csv-column-twice',
      `The columns ${twice.headers.join(' and ')} both mean ${twice.key}. Keep one.`,
    );
  }
  if (!columns.some(({ key }) => key === 'name')) {
    const read = head.cells.slice(0, 8).join(', ').slice(0, 120);
    throw csvRefused('csv-no-name', `No column is called "name". The first line reads: ${read}`);
  }
  if (body.length > CSV_MAX_ROWS) {
    throw csvRefused(
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

function readRow(row: CsvRow, columns: Column[], setting: FileSetting, width: number): ReadRow {
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
