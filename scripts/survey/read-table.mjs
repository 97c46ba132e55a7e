import fs from 'node:fs';
import { createRequire } from 'node:module';
import path from 'node:path';
import zlib from 'node:zlib';
import { MEASURE_INFO, MEASURE_KEYS } from '@settlewright/anthropometry';
import { root } from '../root.mjs';

const { parse } = createRequire(path.join(root, 'apps/api/package.json'))('papaparse');

/**
 * A CSV file (gzipped when its name ends in .gz) as a table of people for `readPeople`.
 * Without a map the heading holds `sex`, perhaps `age`, and measure keys in mm and kg.
 */
export function readTable(file, map) {
  const bytes = fs.readFileSync(file);
  const text = (file.endsWith('.gz') ? zlib.gunzipSync(bytes) : bytes)
    .toString('utf8')
    .replace(/^\uFEFF/, '');
  const { data, errors } = parse(text, { skipEmptyLines: true });
  if (errors.length > 0) throw new Error(`${file}: row ${errors[0].row}: ${errors[0].message}`);
  const [heading, ...rows] = data;
  const column = (name) => {
    const at = heading.findIndex((head) => head.trim().toLowerCase() === name.toLowerCase());
    if (at < 0) throw new Error(`${file}: no column ${name}; found: ${heading.join(', ')}`);
    return { name, values: rows.map((row) => row[at] ?? '') };
  };
  const asKeys = MEASURE_KEYS.filter((key) => heading.includes(key)).map((key) => [
    key,
    { column: key, unit: MEASURE_INFO[key].unit },
  ]);
  const measures = Object.entries(map?.measures ?? Object.fromEntries(asKeys));
  const { column: sexColumn, ...words } = map?.sex ?? { column: 'sex' };
  const ageColumn = map ? map.age : heading.includes('age') && 'age';
  return {
    sex: { ...column(sexColumn), ...words },
    ...(ageColumn ? { age: column(ageColumn) } : {}),
    measures: Object.fromEntries(
      measures.map(([key, { column: name, unit }]) => [key, { ...column(name), unit }]),
    ),
    decimalComma: map?.decimalComma ?? false,
  };
}
