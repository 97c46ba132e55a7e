import { expect } from 'vitest';

const NUMBER = /\d+(?!-|\d)/g;
const wordsOf = (line: string): string => line.replace(NUMBER, '#');
const numbersOf = (line: string): number[] => [...line.matchAll(NUMBER)].map(([digits]) => Number(digits));

const block = (readme: string, language: string): string =>
  readme.split(`\`\`\`${language}\n`)[1]?.split('\n```')[0] ?? '';

/** Runs the example with its imports handed in, and returns the lines that it prints. */
function printedBy(example: string, modules: Record<string, unknown>): string[] {
  const body = example
    .replace(/^import (\{[^}]+\}) from '([^']+)';$/gm, "const $1 = modules['$2'];")
    .replace(/^import (\w+) from '([^']+)' with .*$/gm, "const $1 = modules['$2'].default;");
  const lines: string[] = [];
  // eslint-disable-next-line @typescript-eslint/no-implied-eval -- the example is a file of this repository
  const run = new Function('modules', 'console', body) as (...given: unknown[]) => void;
  run(modules, { log: (line: string) => lines.push(line) });
  return lines;
}

/**
 * Expects that the example of a README runs and prints what the README says: the same words, each number within 2 of
 * the one told, because a newer model of bodies may move a figure a little.
 *
 * @param readme - the text of the README, with one block of `js` and one of `text`
 * @param modules - what the example's imports find, by name
 */
export function expectToPrintAsTold(readme: string, modules: Record<string, unknown>): void {
  const printed = printedBy(block(readme, 'js'), modules);
  const told = block(readme, 'text').split('\n');
  expect(printed.map(wordsOf)).toEqual(told.map(wordsOf));
  printed.forEach((line, at) => {
    const expected = numbersOf(told[at] as string);
    numbersOf(line).forEach((value, n) => {
      expect(Math.abs(value - (expected[n] as number)), line).toBeLessThanOrEqual(2);
    });
  });
}
