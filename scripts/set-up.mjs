// What a fresh machine lacks: npm packages, Debian's PostgreSQL, and for the tests Chromium and Poppler.
import { execFileSync, spawnSync } from 'node:child_process';
import { createHash } from 'node:crypto';
import fs from 'node:fs';
import path from 'node:path';
import { findPostgres } from './postgres.mjs';
import { root } from './root.mjs';

const onPath = (name) => spawnSync('sh', ['-c', `command -v ${name}`]).status === 0;

function say(words) {
  console.log(`· ${words}`);
}

/** Runs npm ci when the lockfile differs from the one last installed. */
export function installPackages() {
  const lockfile = fs.readFileSync(path.join(root, 'package-lock.json'));
  const mark = createHash('sha256').update(lockfile).digest('hex');
  const stamp = path.join(root, 'node_modules', '.installed-lock');
  if (fs.existsSync(stamp) && fs.readFileSync(stamp, 'utf8') === mark) return;
  say('installing npm packages');
  execFileSync('npm', ['ci', '--no-audit', '--no-fund', '--loglevel=error'], { cwd: root, stdio: 'inherit' });
  fs.writeFileSync(stamp, mark);
}

function aptInstall(packages) {
  const sudo = process.getuid?.() === 0 ? [] : ['sudo', '-n'];
  if (sudo.length > 0 && spawnSync('sudo', ['-n', 'true']).status !== 0) return false;
  if (!onPath('apt-get')) return false;
  say(`installing ${packages.join(', ')} from Debian`);
  const apt = (...words) =>
    spawnSync([...sudo, 'apt-get'][0], [...sudo.slice(1), ...(sudo.length ? ['apt-get'] : []), ...words], {
      stdio: ['ignore', 'ignore', 'inherit'],
      env: { ...process.env, DEBIAN_FRONTEND: 'noninteractive' },
    }).status === 0;
  apt('update', '-qq');
  return apt('install', '-y', '-qq', '--no-install-recommends', ...packages);
}

/** Installs missing Debian packages, or stops with one clear line. */
export function installDebianPackages(wanted) {
  const present = {
    postgresql: () => Boolean(process.env.DATABASE_URL) || Boolean(findPostgres()),
    chromium: () => onPath('chromium'),
    'poppler-utils': () => onPath('pdftotext'),
    'fonts-liberation': () => fs.existsSync('/usr/share/fonts/truetype/liberation'),
  };
  const missing = wanted.filter((name) => !present[name]());
  if (missing.length === 0) return;
  if (!aptInstall(missing) || missing.some((name) => !present[name]())) {
    console.error(`Please install: apt-get install ${missing.join(' ')}`);
    process.exit(1);
  }
}
