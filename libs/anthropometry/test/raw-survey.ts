import fs from 'node:fs';
import path from 'node:path';
import { fileURLToPath } from 'node:url';
import zlib from 'node:zlib';
import { MEASURE_KEYS } from '../src/measures/measures.ts';
import { MEASURE_INFO } from '../src/measures/measure-info.ts';
import type { PeopleTable } from '../src/populations/survey-rows.ts';

const root = path.resolve(path.dirname(fileURLToPath(import.meta.url)), '../../..');
const file = path.join(process.env.RAW_DATA ?? path.join(root, '../shared/data'), 'ansur2-seated.csv.gz');

/**
 * The rows of the survey, which are no part of the project: looked for in the folder that RAW_DATA names, else in
 * shared/data beside the checkout.
 *
 * @returns the table, or `undefined`, and then the reason is printed
 */
export function rawSurvey(): PeopleTable | undefined {
  if (!fs.existsSync(file)) {
    console.warn(`Left out what needs the survey's rows: ${file} is not there.`);
    return undefined;
  }
  const [heading = '', ...lines] = zlib.gunzipSync(fs.readFileSync(file)).toString().trim().split(/\r?\n/);
  const names = heading.split(',');
  const rows = lines.map((line) => line.split(','));
  const column = (name: string) => ({
    name,
    values: rows.map((row) => row[names.indexOf(name)] as string),
  });
  const held = MEASURE_KEYS.filter((key) => names.includes(key));
  return {
    sex: column('sex'),
    age: column('age'),
    measures: Object.fromEntries(held.map((key) => [key, { ...column(key), unit: MEASURE_INFO[key].unit }])),
  };
}
