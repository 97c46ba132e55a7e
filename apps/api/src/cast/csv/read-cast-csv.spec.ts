import { describe, expect, it } from '@jest/globals';
import { Problem } from '../../common/problem';
import { CSV_MAX_ROWS, readCastCsv } from './read-cast-csv';
import { writeCastCsv } from './write-cast-csv';
import type { CastMember } from '../entities/cast-member.entity';

const inches = (csv: string, known: string[] = []) => readCastCsv(csv, 'feet-inches', known);
const metric = (csv: string, known: string[] = []) => readCastCsv(csv, 'millimetres', known);
const first = (read: ReturnType<typeof inches>) => read.rows[0]?.value;

function codeOf(read: () => unknown): string {
  try {
    read();
  } catch (problem) {
    if (problem instanceof Problem) return problem.code;
    throw problem;
  }
  return 'taken';
}

describe('reading a cast list', () => {
  it('reads measure keys with unit suffixes', () => {
    const csv =
      'name,stature_mm,weight_kg,popliteal_height_mm,hip_breadth_sitting_in,shoe_cm\nOttilie,1575,61.5,394,15,2.5\n';
    expect(first(inches(csv))).toMatchObject({
      name: 'Ottilie',
      statureMm: 1575,
      weightKg: 61.5,
      measured: { popliteal_height: { mm: 394 }, hip_breadth_sitting: { mm: 381 } },
      shoeMm: 25,
      statureSource: 'told',
      bodyData: 'mixed',
      clothing: 'light',
    });
  });

  it('reads plain words and feet and inches; a bare number follows the production', () => {
    const csv = 'Actor,Sex,Height,Weight,Hip width (in),Back of knee\nImre,M,"5\' 6""",160,14 1/2,15.5\n';
    expect(first(inches(csv))).toMatchObject({
      name: 'Imre',
      bodyData: 'men',
      statureMm: 1676.4,
      weightKg: 72.575,
      measured: { hip_breadth_sitting: { mm: 368.3 }, popliteal_height: { mm: 393.7 } },
    });
    expect(first(metric('name,height,weight\nImre,1676,72'))).toMatchObject({
      statureMm: 1676,
      weightKg: 72,
    });
  });

  it('reads an age in whole years and refuses anything else', () => {
    expect(first(metric('name,years old\nImre,41'))).toMatchObject({ age: 41 });
    for (const age of ['9', '41.5', 'forty', '-3', '1000']) {
      const [row] = metric(`name,age\nImre,${age}`).rows;
      expect(row?.problems).toMatchObject([
        { column: 'age', read: age, accepted: expect.stringContaining('16 to 110 years') },
      ]);
    }
  });

  it('reads a byte-order mark, semicolons and decimal commas', () => {
    const csv = '\ufeffname;Height (cm);weight_kg\r\nHetty;151,1;48,25\r\n';
    expect(first(metric(csv))).toMatchObject({ name: 'Hetty', statureMm: 1511, weightKg: 48.25 });
  });

  it('refuses what has two readings and offers both', () => {
    const { rows } = metric('name,stature_mm\nWren,"1,727"\n');
    expect(rows[0]?.value).toBeUndefined();
    expect(rows[0]?.problems).toEqual([
      expect.objectContaining({ column: 'stature_mm', read: '1,727', accepted: '1727 mm or 1.727 mm' }),
    ]);
  });

  it('names line, column, what was read and what is accepted for every bad cell', () => {
    const csv = [
      'name,stature_mm,weight_kg,body data,taken_on',
      'Good,1700,70,women,2026-01-25',
      '"Two',
      'lines",1700,70,women,',
      'Short,999,1000,lizards,2026-02-30',
      ',1700,70,men,',
      'Words,tall,NaN,men,',
      'Minus,-1700,-70,men,',
      'Huge,1e999,70,men,',
    ].join('\n');
    const { rows } = metric(csv);
    expect(rows.map(({ line, problems }) => [line, problems.map(({ column }) => column)])).toEqual([
      [2, []],
      [3, ['name']],
      [5, ['taken_on', 'stature_mm', 'weight_kg', 'body data']],
      [6, ['name']],
      [7, ['stature_mm', 'weight_kg']],
      [8, ['stature_mm', 'weight_kg']],
      [9, ['stature_mm']],
    ]);
    expect(rows[2]?.problems[1]).toMatchObject({ read: '999', accepted: '1000 to 2300 mm' });
  });

  it('flags names that are there twice and keeps both', () => {
    const { rows } = metric('name\nImre Salgado\nimre  salgado\nWren\n', ['WREN']);
    expect(rows.map(({ value, warnings }) => [value?.name, warnings.length])).toEqual([
      ['Imre Salgado', 0],
      ['imre  salgado', 1],
      ['Wren', 1],
    ]);
  });

  it('lists the columns it does not use', () => {
    expect(metric('name,agent,height_mm,telephone\nA,x,1700,1\n').ignoredColumns).toEqual([
      'agent',
      'telephone',
    ]);
  });

  it('takes markup and formulas for text', () => {
    const { rows } = metric('name,role\n<script>alert(1)</script>,=SUM(A1)\n');
    expect(rows[0]?.value).toMatchObject({ name: '<script>alert(1)</script>', role: '=SUM(A1)' });
  });

  it('refuses a row with quotes that do not close or cells without a header', () => {
    const { rows } = metric('name,height_mm\nA,1700,surplus\n"B,1700\n');
    expect(rows.map(({ value, problems }) => [value, problems.length])).toEqual([
      [undefined, 1],
      [undefined, 1],
    ]);
  });

  it.each([
    ['', 'csv-empty'],
    ['\n\n', 'csv-empty'],
    ['PK\u0003\u0004\u0000\u0000', 'csv-not-text'],
    ['{"name": "no list"}', 'csv-no-name'],
    ['height,weight\n1700,70', 'csv-no-name'],
    ['name,height_mm,stature_in\nA,1700,66', 'csv-column-twice'],
    ['name\n' + 'A\n'.repeat(CSV_MAX_ROWS + 1), 'csv-too-many-rows'],
    ['name\n' + 'x'.repeat(2_000_001), 'csv-too-large'],
  ])('refuses the whole of %.20j as %s', (csv, code) => {
    expect(codeOf(() => metric(csv))).toBe(code);
  });

  it('takes exactly as many rows as it says', () => {
    expect(metric('name\n' + 'A\n'.repeat(CSV_MAX_ROWS)).rows).toHaveLength(CSV_MAX_ROWS);
  });
});

describe('writing a cast list', () => {
  const person = {
    name: '=HYPERLINK("x")',
    role: '-conductor',
    bodyData: 'women',
    statureMm: 1575,
    statureSource: 'measured',
    weightKg: null,
    age: null,
    measured: { popliteal_height: { mm: 394.5, takenBy: '@Nell', takenOn: '2026-01-25' } },
    shoeMm: 25,
    clothing: 'medium',
    notes: 'line one\nline "two"; +3',
  } as CastMember;

  it('hides formulas from spreadsheets', () => {
    const csv = writeCastCsv([person]);
    expect(csv).toContain(`"'=HYPERLINK(""x"")"`);
    expect(csv).toContain(`'-conductor`);
    expect(csv).toContain(`'@Nell`);
  });

  it('can be read again without loss', () => {
    const { rows, ignoredColumns } = metric(writeCastCsv([person]));
    expect(ignoredColumns).toEqual([]);
    expect(rows[0]).toEqual({
      line: 2,
      warnings: [],
      problems: [],
      value: {
        name: person.name,
        role: person.role,
        bodyData: 'women',
        statureMm: 1575,
        statureSource: 'measured',
        measured: person.measured,
        shoeMm: 25,
        clothing: 'medium',
        notes: person.notes,
      },
    });
  });
});
