import fs from 'node:fs';
import * as anthropometry from '@settlewright/anthropometry';
import ansur2 from '@settlewright/seed-data/populations/ansur2.json' with { type: 'json' };
import fitRules from '@settlewright/seed-data/fit-rules.json' with { type: 'json' };
import { it } from 'vitest';
import { expectToPrintAsTold } from '../../anthropometry/test/readme-example.ts';
import * as geometry from './index.ts';

it('the example of the README runs and prints what it says', () => {
  expectToPrintAsTold(fs.readFileSync(new URL('../README.md', import.meta.url), 'utf8'), {
    '@settlewright/anthropometry': anthropometry,
    '@settlewright/geometry': geometry,
    '@settlewright/seed-data/populations/ansur2.json': { default: ansur2 },
    '@settlewright/seed-data/fit-rules.json': { default: fitRules },
  });
});
