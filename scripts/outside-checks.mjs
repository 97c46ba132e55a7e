// npm run outside-checks: runs the tests that compare with the outside and writes docs/outside-checks.md.
// Words narrow it to the spec files whose path contains one of them; the other sections stay.
import { spawnSync } from 'node:child_process';
import fs from 'node:fs';
import os from 'node:os';
import path from 'node:path';
import { format, resolveConfig } from 'prettier';
import { root } from './root.mjs';

const page = path.join(root, 'docs/outside-checks.md');
const wanted = process.argv.slice(2);
const workspaces = ['libs/anthropometry', 'libs/geometry'];

function specsOf(workspace) {
  return fs
    .readdirSync(path.join(root, workspace, 'src'), { recursive: true })
    .filter((name) => name.endsWith('.spec.ts'))
    .map((name) => `src/${name}`)
    .filter((name) => wanted.length === 0 || wanted.some((word) => `${workspace}/${name}`.includes(word)))
    .filter((name) => fs.readFileSync(path.join(root, workspace, name), 'utf8').includes('outside-check'));
}

function sectionsOf(text) {
  const parts = text.split('\n## ').slice(1);
  return new Map(parts.map((part) => [part.slice(0, part.indexOf('\n')), part.slice(part.indexOf('\n'))]));
}

const places = { mm: 2, kg: 3, points: 3 };
const rounded = (value, unit) => Number(value.toFixed(places[unit] ?? 4));

function table(rows) {
  const lines = rows.map(({ source, what, expected, ours, tolerance, unit }) => {
    const cells = [
      source,
      what,
      expected,
      rounded(ours, unit),
      rounded(ours - expected, unit),
      tolerance,
      unit,
    ];
    return `| ${cells.join(' | ')} |`;
  });
  const head =
    '| source | what | value | ours | difference | allowed | unit |\n|---|---|---|---|---|---|---|';
  return `\n\n${[head, ...lines].join('\n')}\n`;
}

const folder = fs.mkdtempSync(path.join(os.tmpdir(), 'outside-checks-'));
let failed = false;
for (const workspace of workspaces) {
  const specs = specsOf(workspace);
  if (specs.length === 0) continue;
  const { status } = spawnSync(path.join(root, 'node_modules/.bin/vitest'), ['run', ...specs], {
    cwd: path.join(root, workspace),
    env: { ...process.env, OUTSIDE_CHECKS: folder },
    stdio: 'inherit',
  });
  failed ||= status !== 0;
}

const sections = fs.existsSync(page) ? sectionsOf(fs.readFileSync(page, 'utf8')) : new Map();
for (const spec of sections.keys()) if (!fs.existsSync(path.join(root, spec))) sections.delete(spec);
for (const name of fs.readdirSync(folder)) {
  const { spec, rows } = JSON.parse(fs.readFileSync(path.join(folder, name), 'utf8'));
  sections.set(spec, table(rows));
}
fs.rmSync(folder, { recursive: true });

const intro = `# Checks from outside

Values that were read in a source or counted in raw survey rows, beside what the engine gives. Each row is one
assertion of a test in the named file; the test fails beyond what is allowed, and when this list is stale.
Made by \`npm run outside-checks\`; what we give may move within what is allowed without a new list.
`;
const body = [...sections]
  .sort(([a], [b]) => a.localeCompare(b))
  .map(([spec, rows]) => `\n## ${spec}${rows}`)
  .join('');
const options = await resolveConfig(page);
fs.writeFileSync(page, await format(intro + body, { ...options, parser: 'markdown' }));
const count = body.split('\n').filter((line) => line.startsWith('|')).length - 2 * sections.size;
console.log(`docs/outside-checks.md: ${count} checks`);
process.exit(failed ? 1 : 0);
