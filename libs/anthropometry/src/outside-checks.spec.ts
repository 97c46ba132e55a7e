import fs from 'node:fs';
import { expect, it } from 'vitest';

const root = new URL('../../../', import.meta.url);
const page = fs.readFileSync(new URL('docs/outside-checks.md', root), 'utf8');

it('the list of checks from outside names no test file that is gone', () => {
  const named = [...page.matchAll(/^## (\S+\.spec\.ts)$/gm)].map(([, spec]) => spec ?? '');
  expect(named.length).toBeGreaterThan(3);
  expect(named.filter((spec) => !fs.existsSync(new URL(spec, root)))).toEqual([]);
});
