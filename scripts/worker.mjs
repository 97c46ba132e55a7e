// npm run worker: one more process that counts studies, beside npm start or, with DATABASE_URL, on any machine.
import { installPackages } from './set-up.mjs';
import { runningPostgres } from './postgres.mjs';

const databaseUrl = process.env.DATABASE_URL ?? runningPostgres('main');
if (!databaseUrl) {
  console.error('Settlewright does not run here. Start it first (npm start), or set DATABASE_URL.');
  process.exit(1);
}
installPackages();
const { build } = await import('./build.mjs');
const { launch, stopChildren, watchParents } = await import('./processes.mjs');
const { workerCommand } = await import('./services.mjs');

build({ web: false });
const worker = launch(workerCommand, { env: { ...process.env, DATABASE_URL: databaseUrl } });

async function stop(code) {
  await stopChildren();
  process.exit(code);
}
process.on('SIGINT', () => void stop(0));
process.on('SIGTERM', () => void stop(0));
process.on('SIGHUP', () => void stop(0));
watchParents(() => void stop(0));
worker.once('exit', (code) => void stop(code ?? 1));
