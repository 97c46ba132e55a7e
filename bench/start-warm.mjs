// Time from `npm start` to ready on a machine where everything is built and the database exists.
import { spawn } from 'node:child_process';
import { freePort } from '../scripts/ports.mjs';
import { root } from '../scripts/root.mjs';

async function once() {
  const port = await freePort(0);
  const from = performance.now();
  const child = spawn('npm', ['start', '--silent'], {
    cwd: root,
    env: { ...process.env, PORT: String(port), LOG_LEVEL: 'warn' },
    stdio: ['ignore', 'pipe', 'inherit'],
  });
  const seconds = await new Promise((resolve, reject) => {
    child.stdout.on('data', (text) => {
      if (String(text).includes('Settlewright runs at')) resolve((performance.now() - from) / 1000);
    });
    child.once('exit', (code) => reject(new Error(`npm start ended with ${code}`)));
  });
  const ended = new Promise((resolve) => child.once('exit', resolve));
  child.kill('SIGTERM');
  await ended;
  return seconds;
}

export async function run() {
  await once();
  const times = [await once(), await once(), await once()].sort((a, b) => a - b);
  return [
    { name: 'start-warm', value: Math.round(times[1] * 100) / 100, unit: 's', aim: 8, reference: null },
  ];
}
