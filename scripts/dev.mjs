// npm run dev: API and web from source, both restarting on change.
import path from 'node:path';
import { installDebianPackages, installPackages } from './set-up.mjs';

installPackages();
installDebianPackages(['postgresql']);
const { freePort } = await import('./ports.mjs');
const { startPostgres } = await import('./postgres.mjs');
const { launch, stopChildren, watchParents } = await import('./processes.mjs');
const { root } = await import('./root.mjs');
const { apiEnvironment, startMail, startStandIns } = await import('./services.mjs');

const database = await startPostgres('main');
const mail = await startMail();
const port = await freePort(Number(process.env.PORT ?? 3000));
const webPort = await freePort(5173);
const publicUrl = `http://127.0.0.1:${webPort}`;
const env = apiEnvironment({
  ...{ databaseUrl: database.url, smtpUrl: mail.smtpUrl, port, publicUrl, demo: true },
  standIns: await startStandIns('main', port),
});
const watched = ['--watch', '--watch-preserve-output', '-C', 'source', '-r', '@swc-node/register'];
for (const entry of ['src/main.ts', 'src/worker.ts']) {
  launch([process.execPath, ...watched, entry], { cwd: path.join(root, 'apps/api'), env });
}
launch([path.join(root, 'node_modules/.bin/vite'), '--host', '127.0.0.1', '--port', String(webPort)], {
  cwd: path.join(root, 'apps/web'),
  env: { ...process.env, PORT: String(port), WEB_PORT: String(webPort) },
});

let stopping = false;
async function stop() {
  if (stopping) return;
  stopping = true;
  await stopChildren();
  await database.stop();
  process.exit(0);
}
process.on('SIGINT', () => void stop());
process.on('SIGTERM', () => void stop());
watchParents(() => void stop());
console.log(`Web at ${publicUrl}, mail at ${mail.page ?? mail.smtpUrl}`);
