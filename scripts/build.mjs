// Builds libraries, API and web, each only when its sources changed.
import { execFileSync } from 'node:child_process';
import { createHash } from 'node:crypto';
import fs from 'node:fs';
import path from 'node:path';
import { pathToFileURL } from 'node:url';
import { root } from './root.mjs';

const bin = (name) => path.join(root, 'node_modules', '.bin', name);

function filesUnder(entry) {
  const full = path.join(root, entry);
  if (!fs.existsSync(full)) return [];
  if (fs.statSync(full).isFile()) return [full];
  return fs
    .readdirSync(full, { withFileTypes: true })
    .filter(({ name }) => name !== 'node_modules' && name !== 'dist')
    .flatMap(({ name }) => filesUnder(path.join(entry, name)));
}

function fingerprint(entries) {
  const hash = createHash('sha256');
  for (const file of entries.flatMap(filesUnder).sort()) hash.update(file).update(fs.readFileSync(file));
  return hash.digest('hex');
}

const shared = ['tsconfig.base.json', 'package-lock.json', 'libs', 'seed-data'];
const steps = [
  {
    name: 'libraries and API',
    sources: [...shared, 'apps/api/src', 'apps/api/tsconfig.json', 'apps/api/tsconfig.build.json'],
    product: 'apps/api/dist',
    run: () =>
      execFileSync(bin('tsc'), ['-b', 'apps/api/tsconfig.build.json'], { cwd: root, stdio: 'inherit' }),
  },
  {
    name: 'web',
    sources: [...shared, 'apps/web/src', 'apps/web/public', 'apps/web/index.html', 'apps/web/vite.config.ts'],
    product: 'apps/web/dist',
    run: () =>
      execFileSync(bin('vite'), ['build', '--logLevel', 'warn'], {
        cwd: path.join(root, 'apps/web'),
        stdio: 'inherit',
      }),
  },
];

/** Builds what changed since the last build; a worker needs no web. */
export function build({ web = true } = {}) {
  for (const step of steps) {
    if (step.name === 'web' && !web) continue;
    const stamp = path.join(root, step.product, '.built-from');
    const mark = fingerprint(step.sources);
    if (fs.existsSync(stamp) && fs.readFileSync(stamp, 'utf8') === mark) continue;
    console.log(`· building ${step.name}`);
    step.run();
    fs.writeFileSync(stamp, mark);
  }
}

if (import.meta.url === pathToFileURL(process.argv[1] ?? '').href) build();
