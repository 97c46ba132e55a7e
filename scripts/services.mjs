// The product's processes on this machine: PostgreSQL, the mail stand-in, the API and a worker.
import http from 'node:http';
import path from 'node:path';
import { freePort } from './ports.mjs';
import { startPostgres } from './postgres.mjs';
import { keepRunning, launch } from './processes.mjs';
import { root } from './root.mjs';

/** Starts the mail stand-in and answers where it listens; with SMTP_URL set nothing is started. */
export async function startMail() {
  if (process.env.SMTP_URL) return { smtpUrl: process.env.SMTP_URL, page: undefined };
  const smtpPort = await freePort(2525);
  const pagePort = await freePort(8025);
  launch([process.execPath, path.join(root, 'scripts/fakes/mail.mjs')], {
    env: { ...process.env, FAKE_SMTP_PORT: String(smtpPort), FAKE_MAIL_PAGE_PORT: String(pagePort) },
  });
  return { smtpUrl: `smtp://127.0.0.1:${smtpPort}`, page: `http://127.0.0.1:${pagePort}/` };
}

/** What the API needs to know of its surroundings. */
export function apiEnvironment({ databaseUrl, smtpUrl, port, publicUrl, demo }) {
  return {
    ...process.env,
    NODE_ENV: process.env.NODE_ENV ?? 'development',
    DATABASE_URL: databaseUrl,
    SMTP_URL: smtpUrl,
    PORT: String(port),
    HOST: process.env.HOST ?? '127.0.0.1',
    PUBLIC_URL: process.env.PUBLIC_URL ?? publicUrl,
    WEB_DIST: path.join(root, 'apps/web/dist'),
    DEMO: demo ? '1' : '0',
  };
}

function answers(url) {
  return new Promise((resolve) => {
    http
      .get(url, (response) => {
        response.resume();
        resolve(response.statusCode === 200);
      })
      .on('error', () => resolve(false));
  });
}

/** Waits until the API says that it is ready; false when its process ended first. */
export async function untilReady(child, address) {
  while (child.exitCode === null && child.signalCode === null) {
    if (await answers(`${address}/api/health/ready`)) return true;
    await new Promise((resolve) => setTimeout(resolve, 100));
  }
  return false;
}

/** The built worker, which counts studies. */
export const workerCommand = [
  process.execPath,
  '--enable-source-maps',
  path.join(root, 'apps/api/dist/worker.js'),
];

/** PostgreSQL, mail stand-in, the built API and a worker; `port` 0 takes any free one. */
export async function startProduct({ cluster, port, demo, env = {} }) {
  const database = await startPostgres(cluster);
  const mail = await startMail();
  const taken = await freePort(port);
  const address = `http://127.0.0.1:${taken}`;
  const api = launch([process.execPath, '--enable-source-maps', path.join(root, 'apps/api/dist/main.js')], {
    env: {
      ...apiEnvironment({
        databaseUrl: database.url,
        smtpUrl: mail.smtpUrl,
        port: taken,
        publicUrl: address,
        demo,
      }),
      ...env,
    },
  });
  keepRunning('worker', workerCommand, { env: { ...process.env, DATABASE_URL: database.url, ...env } });
  return { database, mail, api, address };
}
