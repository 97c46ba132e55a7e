// npm test: sets the machine up and proves the product. Stages can be named: npm test -- units api
import { spawn } from 'node:child_process';
import fs from 'node:fs';
import os from 'node:os';
import path from 'node:path';
import { installDebianPackages, installPackages } from './set-up.mjs';

installPackages();
installDebianPackages(['postgresql', 'chromium', 'poppler-utils', 'fonts-liberation']);
const { startPostgres } = await import('./postgres.mjs');
const { stopChildren, watchParents } = await import('./processes.mjs');
const { root } = await import('./root.mjs');
const { build } = await import('./build.mjs');
const { startProduct, untilReady } = await import('./services.mjs');

const reports = fs.mkdtempSync(path.join(os.tmpdir(), 'settlewright-test-'));
const bin = (name) => path.join(root, 'node_modules/.bin', name);
const results = [];
const services = [];

function command(words, { cwd = root, env = {} } = {}) {
  return new Promise((resolve) => {
    const child = spawn(words[0], words.slice(1), {
      cwd,
      env: { ...process.env, ...env },
      stdio: ['ignore', 'inherit', 'inherit'],
    });
    child.once('error', () => resolve(127));
    child.once('exit', (code) => resolve(code ?? 1));
  });
}

/** A stage that either passes or fails as a whole. */
async function check(name, words) {
  const code = await command(words);
  return { passed: code === 0 ? 1 : 0, failed: code === 0 ? 0 : 1, name };
}

/** A Jest or Vitest run, counted from its JSON report; a run that found no test has failed. */
async function suite(name, words, options) {
  const file = path.join(reports, `${name}.json`);
  const code = await command([...words(file)], options);
  const report = fs.existsSync(file) ? JSON.parse(fs.readFileSync(file, 'utf8')) : {};
  const passed = report.numPassedTests ?? 0;
  const failed = (report.numFailedTests ?? 0) + (report.numFailedTests === 0 && code !== 0 ? 1 : 0);
  const broken = report.numPassedTests === undefined || passed + failed === 0;
  return {
    name,
    passed,
    failed: broken ? Math.max(1, failed) : failed,
    skipped: report.numPendingTests ?? 0,
  };
}

const vitest = (config) => (file) => [
  bin('vitest'),
  'run',
  ...(config ? ['--config', config] : []),
  '--reporter=default',
  '--reporter=json',
  `--outputFile.json=${file}`,
];

async function api() {
  const database = await startPostgres('test');
  services.push(database);
  const jest = (file) => [bin('jest'), '--json', `--outputFile=${file}`, '--maxWorkers=2'];
  return suite('api', jest, { cwd: path.join(root, 'apps/api'), env: { DATABASE_URL: database.url } });
}

async function journeys() {
  build();
  const product = await startProduct({ cluster: 'test', port: 0, demo: true, env: { LOG_LEVEL: 'warn' } });
  services.push(product.database);
  if (!(await untilReady(product.api, product.address))) return { name: 'journeys', passed: 0, failed: 1 };
  return suite('journeys', vitest('vitest.e2e.config.ts'), {
    cwd: path.join(root, 'apps/web'),
    env: { PRODUCT_URL: product.address, MAIL_URL: product.mail.page },
  });
}

const stages = {
  build: async () => {
    build();
    return { name: 'build', passed: 1, failed: 0 };
  },
  types: () => check('types', ['npm', 'run', '--silent', 'types']),
  lint: () => check('lint', ['npm', 'run', '--silent', 'lint']),
  format: () => check('format', ['npm', 'run', '--silent', 'format:check']),
  depend: () => check('dependency rules', ['npm', 'run', '--silent', 'depend']),
  unused: () => check('unused code', ['npm', 'run', '--silent', 'unused']),
  units: async () => [
    await suite('anthropometry', vitest(), { cwd: path.join(root, 'libs/anthropometry') }),
    await suite('geometry', vitest(), { cwd: path.join(root, 'libs/geometry') }),
    await suite('web', vitest(), { cwd: path.join(root, 'apps/web') }),
  ],
  api,
  journeys,
};

async function stop() {
  await stopChildren();
  await Promise.all(services.map((service) => service.stop()));
  fs.rmSync(reports, { recursive: true, force: true });
}
watchParents(() => void stop().then(() => process.exit(1)));

const wanted = process.argv.slice(2);
const unknown = wanted.filter((name) => !(name in stages));
if (unknown.length > 0) {
  console.error(`No stage is called ${unknown.join(', ')}. Stages: ${Object.keys(stages).join(', ')}.`);
  process.exit(2);
}
async function run(name) {
  const from = Date.now();
  console.log(`\n== ${name}`);
  const outcome = await stages[name]().catch((error) => {
    console.error(error);
    return { name, passed: 0, failed: 1 };
  });
  for (const result of [outcome].flat()) results.push({ ...result, seconds: (Date.now() - from) / 1000 });
}

/** Stages in turn; the lanes of one step, of one core each, beside each other. */
const steps = [
  [['build']],
  [['lint'], ['types', 'format', 'depend', 'unused']],
  [['units']],
  [['api']],
  [['journeys']],
];
const isWanted = (name) => wanted.length === 0 || wanted.includes(name);
for (const lanes of steps) {
  await Promise.all(
    lanes.map(async (lane) => {
      for (const name of lane.filter(isWanted)) await run(name);
    }),
  );
}
await stop();

console.log('');
for (const { name, passed, failed, skipped, seconds } of results) {
  const left = skipped ? `, ${skipped} skipped` : '';
  console.log(
    `${failed > 0 ? '✗' : '✓'} ${name}: ${passed} passed, ${failed} failed${left} (${seconds.toFixed(0)} s)`,
  );
}
const sum = (key) => results.reduce((total, result) => total + (result[key] ?? 0), 0);
console.log(`${sum('passed')} passed, ${sum('failed')} failed`);
process.exit(sum('failed') > 0 ? 1 : 0);
