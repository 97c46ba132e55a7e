// Children that end with us, however we end.
import { spawn, spawnSync } from 'node:child_process';
import fs from 'node:fs';
import { root } from './root.mjs';

const setpriv = spawnSync('setpriv', ['--version']).status === 0;
const children = new Set();
let stopping = false;

/** Spawns a command that the kernel stops when this process dies. */
export function launch(command, options = {}) {
  const words = setpriv ? ['setpriv', '--pdeathsig=TERM', '--', ...command] : command;
  const child = spawn(words[0], words.slice(1), { stdio: 'inherit', cwd: root, ...options });
  children.add(child);
  child.once('exit', () => children.delete(child));
  return child;
}

const PAUSE_MS = 1000;

/** As `launch`, and again whenever it ends before everything is stopped. */
export function keepRunning(name, command, options) {
  launch(command, options).once('exit', () => {
    if (stopping) return;
    console.error(`The ${name} ended; it is started again.`);
    setTimeout(() => !stopping && keepRunning(name, command, options), PAUSE_MS).unref();
  });
}

/** Runs a command and answers its exit code. */
export function runToEnd(command, options = {}) {
  return new Promise((resolve) => {
    const child = launch(command, options);
    child.once('error', (error) => {
      console.error(`${command[0]}: ${error.message}`);
      resolve(127);
    });
    child.once('exit', (code, signal) => resolve(code ?? (signal ? 128 : 1)));
  });
}

/** Stops every child that still runs. */
export async function stopChildren() {
  stopping = true;
  await Promise.all(
    [...children].map(
      (child) =>
        new Promise((resolve) => {
          if (child.exitCode !== null || child.signalCode !== null) return resolve();
          child.once('exit', resolve);
          child.kill('SIGTERM');
          setTimeout(() => child.kill('SIGKILL'), 5000).unref();
        }),
    ),
  );
}

const parentOf = (pid) => {
  try {
    return Number(fs.readFileSync(`/proc/${pid}/stat`, 'utf8').split(') ')[1].split(' ')[1]);
  } catch {
    return 0;
  }
};

/**
 * npm starts us through a shell that passes no signal on and outlives a killed npm.
 * So the shell and npm are watched, and `onGone` runs when either has gone.
 */
export function watchParents(onGone) {
  if (!process.env.npm_lifecycle_event || !fs.existsSync('/proc/self/stat')) return;
  const parent = process.ppid;
  const grandparent = parentOf(parent);
  setInterval(() => {
    if (process.ppid !== parent || parentOf(parent) !== grandparent) onGone();
  }, 300).unref();
}
