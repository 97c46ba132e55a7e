import { type ChildProcess, fork, spawn } from 'node:child_process';
import { once } from 'node:events';
import { mkdtemp } from 'node:fs/promises';
import { createServer } from 'node:net';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import type { Settings } from '../../src/config/settings';

const SCRIPTS = join(__dirname, '../../../../scripts/fakes');

export const PAYMENT_SECRETS = { secretKey: 'sk_test_stand_in', webhookSecret: 'whsec_stand_in' };
export const STORE_KEYS = {
  bucket: 'orders',
  region: 'us-east-1',
  accessKeyId: 'stand-in',
  secretAccessKey: 'stand-in-key',
};

export interface StandIn {
  url: string;
  end(): Promise<void>;
}

/** The payment provider, telling its events to an address. */
export function startPayments(eventsUrl: string): Promise<StandIn> {
  return start('payments.mjs', {
    FAKE_PAYMENTS_EVENTS_URL: eventsUrl,
    FAKE_PAYMENTS_WEBHOOK_SECRET: PAYMENT_SECRETS.webhookSecret,
    FAKE_PAYMENTS_RETRY_MS: '100',
  });
}

/** The object store, in a folder of its own. */
export async function startObjects(): Promise<StandIn & { folder: string }> {
  const folder = await mkdtemp(join(tmpdir(), 'settlewright-objects-'));
  return { ...(await start('objects.mjs', { FAKE_OBJECTS_FOLDER: folder })), folder };
}

async function start(script: string, env: Record<string, string>): Promise<StandIn> {
  const child = fork(join(SCRIPTS, script), { env: { ...process.env, ...env }, execArgv: [] });
  const [said] = (await once(child, 'message')) as [{ port: number }];
  return { url: `http://127.0.0.1:${said.port}`, end: () => ended(child, 'SIGTERM') };
}

export async function freePort(): Promise<number> {
  const server = createServer();
  server.listen(0, '127.0.0.1');
  await once(server, 'listening');
  const { port } = server.address() as { port: number };
  server.close();
  await once(server, 'close');
  return port;
}

/** The API in a process of its own, so that it can be killed. */
export class ApiProcess {
  private constructor(
    private readonly child: ChildProcess,
    readonly url: string,
  ) {}

  static async start(settings: Settings, port: number): Promise<ApiProcess> {
    const { payments, objectStore } = settings;
    const child = spawn(process.execPath, ['-C', 'source', '-r', '@swc-node/register', 'src/main.ts'], {
      cwd: join(__dirname, '../..'),
      stdio: 'ignore',
      env: {
        ...process.env,
        NODE_ENV: 'development',
        DATABASE_URL: settings.databaseUrl,
        PORT: String(port),
        HOST: '127.0.0.1',
        PUBLIC_URL: settings.publicUrl,
        JWT_SECRET: settings.jwtSecret,
        SMTP_URL: settings.smtpUrl,
        MAIL_FROM: settings.mailFrom,
        LOG_LEVEL: 'silent',
        ...(payments && {
          STRIPE_SECRET_KEY: payments.secretKey,
          STRIPE_WEBHOOK_SECRET: payments.webhookSecret,
          STRIPE_API_URL: payments.apiUrl,
        }),
        ...(objectStore && {
          S3_BUCKET: objectStore.bucket,
          S3_ENDPOINT: objectStore.endpoint ?? '',
          S3_ACCESS_KEY_ID: objectStore.accessKeyId,
          S3_SECRET_ACCESS_KEY: objectStore.secretAccessKey,
        }),
      },
    });
    const api = new ApiProcess(child, `http://127.0.0.1:${port}/api`);
    while (!(await api.answers())) {
      if (child.exitCode !== null) throw new Error(`the API ended with ${child.exitCode}`);
      await new Promise((resolve) => setTimeout(resolve, 100));
    }
    return api;
  }

  /** Nothing in it gets to end what it began. */
  kill(): Promise<void> {
    return ended(this.child, 'SIGKILL');
  }

  private async answers(): Promise<boolean> {
    const answer = await fetch(`${this.url}/health/live`).catch(() => null);
    return answer?.ok ?? false;
  }
}

async function ended(child: ChildProcess, signal: NodeJS.Signals): Promise<void> {
  if (child.exitCode !== null || child.signalCode !== null) return;
  child.kill(signal);
  await once(child, 'exit');
}
