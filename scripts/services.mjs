// The product's processes on this machine: PostgreSQL, the stand-ins for mail, payments and files, the API and a worker.
import { randomBytes } from 'node:crypto';
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

const fake = (name, env) =>
  launch([process.execPath, path.join(root, 'scripts/fakes', name)], { env: { ...process.env, ...env } });

/** Starts the payment stand-in and answers what the API needs of it; with STRIPE_SECRET_KEY set nothing is started. */
async function startPayments(apiPort) {
  if (process.env.STRIPE_SECRET_KEY) return {};
  const port = await freePort(8026);
  const webhookSecret = randomBytes(24).toString('hex');
  fake('payments.mjs', {
    FAKE_PAYMENTS_PORT: String(port),
    FAKE_PAYMENTS_EVENTS_URL: `http://127.0.0.1:${apiPort}/api/payments/events`,
    FAKE_PAYMENTS_WEBHOOK_SECRET: webhookSecret,
  });
  return {
    STRIPE_SECRET_KEY: 'sk_test_this_machine',
    STRIPE_WEBHOOK_SECRET: webhookSecret,
    STRIPE_API_URL: `http://127.0.0.1:${port}`,
  };
}

/** Starts the object store stand-in on a folder beside the database; with S3_BUCKET set nothing is started. */
async function startObjects(cluster) {
  if (process.env.S3_BUCKET) return {};
  const port = await freePort(8027);
  fake('objects.mjs', {
    FAKE_OBJECTS_PORT: String(port),
    FAKE_OBJECTS_FOLDER: path.join(root, '.data', `objects-${cluster}`),
  });
  return {
    S3_BUCKET: 'settlewright',
    S3_ENDPOINT: `http://127.0.0.1:${port}`,
    S3_ACCESS_KEY_ID: 'this-machine',
    S3_SECRET_ACCESS_KEY: 'this-machine',
  };
}

/** The stand-ins for payments and files, as the API is told of them. */
export async function startStandIns(cluster, apiPort) {
  return { ...(await startPayments(apiPort)), ...(await startObjects(cluster)) };
}

/** What the API needs to know of its surroundings. */
export function apiEnvironment({ databaseUrl, smtpUrl, port, publicUrl, demo, standIns }) {
  return {
    ...process.env,
    ...standIns,
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

/** PostgreSQL, stand-ins, the built API and a worker; `port` 0 takes any free one. */
export async function startProduct({ cluster, port, demo, env = {} }) {
  const database = await startPostgres(cluster);
  const mail = await startMail();
  const taken = await freePort(port);
  const address = `http://127.0.0.1:${taken}`;
  const standIns = await startStandIns(cluster, taken);
  const api = launch([process.execPath, '--enable-source-maps', path.join(root, 'apps/api/dist/main.js')], {
    env: {
      ...apiEnvironment({
        databaseUrl: database.url,
        smtpUrl: mail.smtpUrl,
        port: taken,
        publicUrl: address,
        demo,
        standIns,
      }),
      ...env,
    },
  });
  keepRunning('worker', workerCommand, { env: { ...process.env, DATABASE_URL: database.url, ...env } });
  return { database, mail, api, address };
}
