import { readFileSync } from 'node:fs';

/** Parsed JSON of a file in `seed-data`, as `populations/ansur2`. */
export function readSeedData(name: string): unknown {
  return JSON.parse(readFileSync(require.resolve(`@settlewright/seed-data/${name}.json`), 'utf8'));
}
