import fs from 'node:fs';
import ansur2 from '@settlewright/seed-data/populations/ansur2.json' with { type: 'json' };
import fitRules from '@settlewright/seed-data/fit-rules.json' with { type: 'json' };
import { expect, it } from 'vitest';
import * as anthropometry from './index.ts';

const readme = fs.readFileSync(new URL('../README.md', import.meta.url), 'utf8');
const block = (language: string): string => readme.split(`\`\`\`${language}\n`)[1]?.split('\n```')[0] ?? '';

const modules: Record<string, unknown> = {
  '@settlewright/anthropometry': anthropometry,
  '@settlewright/seed-data/populations/ansur2.json': { default: ansur2 },
  '@settlewright/seed-data/fit-rules.json': { default: fitRules },
};

/** Runs the example with its imports handed in, and returns the lines that it prints. */
function printedBy(example: string): string[] {
  const body = example
    .replace(/^import (\{[^}]+\}) from '([^']+)';$/gm, "const $1 = modules['$2'];")
    .replace(/^import (\w+) from '([^']+)' with .*$/gm, "const $1 = modules['$2'].default;");
  const lines: string[] = [];
  // eslint-disable-next-line @typescript-eslint/no-implied-eval -- the example is a file of this repository
  const run = new Function('modules', 'console', body) as (...given: unknown[]) => void;
  run(modules, { log: (line: string) => lines.push(line) });
  return lines;
}

const NUMBER = /\d+(?!-|\d)/g;
const wordsOf = (line: string): string => line.replace(NUMBER, '#');
const numbersOf = (line: string): number[] => [...line.matchAll(NUMBER)].map(([digits]) => Number(digits));

it('the example of the README runs and prints what it says', () => {
  const printed = printedBy(block('js'));
  const told = block('text').split('\n');
  expect(printed.map(wordsOf)).toEqual(told.map(wordsOf));
  printed.forEach((line, at) => {
    const expected = numbersOf(told[at] as string);
    numbersOf(line).forEach((value, n) => {
      // A newer model of bodies may move a figure a little; the words stand.
      expect(Math.abs(value - (expected[n] as number)), line).toBeLessThanOrEqual(2);
    });
  });
});
