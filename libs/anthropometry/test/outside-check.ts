import fs from 'node:fs';
import path from 'node:path';
import { fileURLToPath } from 'node:url';
import { afterAll, afterEach, expect } from 'vitest';

/** A value from outside that the engine has to meet. */
export interface OutsideCheck {
  /** Where the value was read, in the words of the list. */
  source: string;
  /** What is compared; with the source it names the check. */
  what: string;
  expected: number;
  /** What the engine gives. */
  ours: number;
  /** Largest difference allowed, in the unit. */
  tolerance: number;
  unit: 'mm' | 'kg' | 'points' | 'people' | 'persons' | 'degrees' | '';
}

const root = path.resolve(path.dirname(fileURLToPath(import.meta.url)), '../../..');
const page = path.join(root, 'docs/outside-checks.md');
/** A folder to write to while the page is being made again. */
const renewed = process.env.OUTSIDE_CHECKS;
const rows: OutsideCheck[] = [];

/**
 * Compares a value of ours with one from outside, and puts the comparison on the list of `docs/outside-checks.md`.
 * Call it inside a test. After a new or changed check, `npm run outside-checks` writes the list again.
 *
 * @throws Error when the difference is above the tolerance
 */
export function outsideCheck(check: OutsideCheck): void {
  rows.push({ ...check });
  const difference = Math.abs(check.ours - check.expected);
  const said = `${check.what}: ours ${check.ours}, ${check.source} has ${check.expected} ${check.unit}`;
  expect(difference, said).toBeLessThanOrEqual(check.tolerance);
}

/** What names a check and its demand, spaced as the page is; what we give may move without the list going stale. */
const demand = ({ source, what, expected, tolerance, unit }: Omit<OutsideCheck, 'ours'>) =>
  [source, what, `${expected}`, `${tolerance}`, unit].join(' | ').replaceAll(/ +/g, ' ');

let file: Task | undefined;
afterEach(({ task }) => {
  file = task.file;
});

afterAll(() => {
  if (rows.length === 0) return;
  const spec = path.relative(root, expect.getState().testPath ?? '');
  if (renewed) {
    fs.writeFileSync(path.join(renewed, spec.replaceAll('/', '~')), JSON.stringify({ spec, rows }));
    return;
  }
  const asked = rows.map(demand);
  expect(asked.filter((one, at) => asked.indexOf(one) < at)).toEqual([]);
  const listed = listedFor(spec);
  const stale = 'docs/outside-checks.md is stale; npm run outside-checks writes it again';
  expect(
    asked.filter((one) => !listed.includes(one)),
    stale,
  ).toEqual([]);
  if (file && !someLeftOut(file)) {
    expect(
      listed.filter((one) => !asked.includes(one)),
      stale,
    ).toEqual([]);
  }
});

/** The demands that the page lists for one spec file. */
function listedFor(spec: string): string[] {
  const section = fs.readFileSync(page, 'utf8').split(`\n## ${spec}\n`)[1]?.split('\n## ')[0] ?? '';
  const table = section.split('\n').filter((line) => line.startsWith('|'));
  return table.slice(2).map((line) => {
    const [source = '', what = '', expected, , , tolerance, unit = ''] = line
      .split('|')
      .slice(1)
      .map((cell) => cell.trim().replaceAll('\\', ''));
    return demand({
      source,
      what,
      expected: Number(expected),
      tolerance: Number(tolerance),
      unit: unit as '',
    });
  });
}

interface Task {
  mode: string;
  result?: { state: string };
  tasks?: Task[];
}

/** Whether a test of the file did not run, so that its checks are not among the rows. */
function someLeftOut({ mode, result, tasks }: Task): boolean {
  return mode === 'skip' || result?.state === 'fail' || (tasks ?? []).some(someLeftOut);
}
