// node scripts/summarise-survey.mjs <people.csv[.gz]> --out <file> [--source <words>] [--columns <map.json>]
//   [--reference <summary.json>] [--published <summary.json>]
// A table of measured people, one row a person, becomes a population summary. Needs the built libraries (npm run build).
//   --columns    names and units where the heading does not hold our measure keys in mm and kg, for example
//                {"sex":{"column":"Gender","women":["2"],"men":["1"]},"age":"Age","decimalComma":true,
//                 "measures":{"stature":{"column":"Height","unit":"cm"}}}
//   --reference  measures that the table lacks are estimated from it (default: seed-data/populations/ansur2.json)
//   --published  measures that the table lacks are kept as published there: the same survey, fuller than its rows
import fs from 'node:fs';
import path from 'node:path';
import { parseArgs } from 'node:util';
import { completeSummary, readPeople, readSurvey, summarise } from '@settlewright/anthropometry';
import { keepPublished } from './survey/keep-published.mjs';
import { readTable } from './survey/read-table.mjs';
import { root } from './root.mjs';

const { values: options, positionals } = parseArgs({
  allowPositionals: true,
  options: {
    out: { type: 'string' },
    source: { type: 'string' },
    columns: { type: 'string' },
    reference: { type: 'string' },
    published: { type: 'string' },
  },
});
const [file] = positionals;
if (!file || !options.out) {
  console.error(
    'Usage: node scripts/summarise-survey.mjs <people.csv[.gz]> --out <file> (see the head of the script)',
  );
  process.exit(2);
}
const readJson = (name) => JSON.parse(fs.readFileSync(name, 'utf8'));
const published = options.published && readJson(options.published);
const reference =
  !published &&
  readSurvey(readJson(options.reference ?? path.join(root, 'seed-data/populations/ansur2.json')));

const table = readTable(file, options.columns && readJson(options.columns));
const people = readPeople(table, reference || undefined);
const SHOWN = 20;
for (const { row, field, read, accepted } of people.faults.slice(0, SHOWN)) {
  console.error(`row ${row}, ${field}: read "${read}"; accepted: ${accepted}`);
}
const summary = summarise(people, options.source ?? path.basename(file));
const whole = published ? keepPublished(summary, published) : completeSummary(summary, reference);
readSurvey(whole);
fs.writeFileSync(options.out, JSON.stringify(whole));
const { women, men } = people.groups;
console.log(
  `${women.count} women, ${men.count} men; ${people.faults.length} faults; ${summary.measures.length} measures read, ` +
    `${whole.measures.length - summary.measures.length} ${published ? 'as published' : 'estimated'}: ${options.out}`,
);
