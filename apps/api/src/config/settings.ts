import { randomBytes } from 'node:crypto';
import { resolve } from 'node:path';
import { Inject } from '@nestjs/common';
import { registerAs } from '@nestjs/config';
import { z } from 'zod';

/** Every fault of the environment at once, so that a wrong start is put right in one go. */
export class SettingsError extends Error {
  constructor(readonly faults: string[]) {
    super(`The settings cannot be used:\n${faults.map((fault) => `  - ${fault}`).join('\n')}`);
    this.name = 'SettingsError';
  }
}

const flag = z
  .enum(['0', '1', 'true', 'false'], { error: 'accepted: 1, true, 0 or false' })
  .transform((text) => text === '1' || text === 'true');

const address = (...schemes: string[]) =>
  z.string().refine((text) => schemes.some((scheme) => text.startsWith(scheme)) && URL.canParse(text), {
    error: `accepted: an address that starts with ${schemes.join(' or ')}`,
  });

const port = z.coerce.number({ error: 'accepted: a port from 0 to 65535' }).int().min(0).max(65535);

/** `false`, a number of proxies, or addresses as Express understands them. */
const trustProxy = z
  .string()
  .transform((text): boolean | number | string =>
    text === 'false' ? false : /^\d+$/.test(text) ? Number(text) : text,
  );

const shared = {
  DATABASE_URL: address('postgres://', 'postgresql://'),
  PORT: port.default(3000),
  TRUST_PROXY: trustProxy.default(false),
  DEMO: flag.default(false),
  WEB_DIST: z.string().min(1).optional(),
  COOKIE_SECURE: flag.optional(),
  STUDY_BLOCK_TIMEOUT_SECONDS: z.coerce
    .number({ error: 'accepted: whole seconds from 1 to 3600' })
    .int('accepted: whole seconds from 1 to 3600')
    .min(1, 'accepted: whole seconds from 1 to 3600')
    .max(3600, 'accepted: whole seconds from 1 to 3600')
    .default(60),
  STRIPE_SECRET_KEY: z.string().min(8, 'accepted: at least 8 characters').optional(),
  STRIPE_WEBHOOK_SECRET: z.string().min(8, 'accepted: at least 8 characters').optional(),
  STRIPE_API_URL: address('https://', 'http://').default('https://api.stripe.com'),
  S3_BUCKET: z.string().min(3, 'accepted: the name of a bucket').optional(),
  S3_ENDPOINT: address('https://', 'http://').optional(),
  S3_REGION: z.string().min(1).default('us-east-1'),
  S3_ACCESS_KEY_ID: z.string().min(1).optional(),
  S3_SECRET_ACCESS_KEY: z.string().min(1).optional(),
  LOG_LEVEL: z.enum(['trace', 'debug', 'info', 'warn', 'error', 'fatal', 'silent']).default('info'),
};

const production = z.object({
  ...shared,
  HOST: z.string().min(1).default('0.0.0.0'),
  PUBLIC_URL: address('https://', 'http://'),
  JWT_SECRET: z.string().min(32, 'accepted: at least 32 characters'),
  SMTP_URL: address('smtp://', 'smtps://'),
  MAIL_FROM: z.string().min(3),
});

const development = z.object({
  ...shared,
  HOST: z.string().min(1).default('127.0.0.1'),
  PUBLIC_URL: address('https://', 'http://').optional(),
  JWT_SECRET: z.string().min(32, 'accepted: at least 32 characters').optional(),
  SMTP_URL: address('smtp://', 'smtps://').default('smtp://127.0.0.1:2525'),
  MAIL_FROM: z.string().min(3).default('Settlewright <no-reply@localhost>'),
});

const SECRET_NAMES = new Set([
  'JWT_SECRET',
  'DATABASE_URL',
  'SMTP_URL',
  'STRIPE_SECRET_KEY',
  'STRIPE_WEBHOOK_SECRET',
  'S3_ACCESS_KEY_ID',
  'S3_SECRET_ACCESS_KEY',
]);

/** Where deposits are paid; the secrets are of the platform whose connected accounts the upholsterers have. */
export interface PaymentSettings {
  secretKey: string;
  webhookSecret: string;
  apiUrl: string;
}

/** Where files of orders are kept. Without an endpoint it is the region's own. */
export interface ObjectStoreSettings {
  bucket: string;
  endpoint: string | null;
  region: string;
  accessKeyId: string;
  secretAccessKey: string;
}

export interface Settings {
  production: boolean;
  databaseUrl: string;
  host: string;
  port: number;
  publicUrl: string;
  trustProxy: boolean | number | string;
  jwtSecret: string;
  smtpUrl: string;
  mailFrom: string;
  /** 0: nothing is sent until asked */
  mailPollMs: number;
  /** People whom a worker counts at a time. */
  studyBlockPeople: number;
  /** Studies that take no longer than this by estimate are counted before the request is answered. */
  studyAtOnceMs: number;
  /** For so long a worker searches for dimensions before it keeps what it tried and looks for other work. */
  searchPartMs: number;
  /** For so long a block is a worker's; then its worker is taken for lost and another gets it. */
  blockTimeoutSeconds: number;
  /** null: deposits are only recorded by hand */
  payments: PaymentSettings | null;
  /** null: no files are taken */
  objectStore: ObjectStoreSettings | null;
  cookieSecure: boolean;
  logLevel: string;
  demo: boolean;
  webDist: string | null;
}

/** A worker serves nobody, so it needs nothing but the database in production either. */
export function readSettings(env: NodeJS.ProcessEnv, role: 'server' | 'worker' = 'server'): Settings {
  const isProduction = env.NODE_ENV === 'production';
  // An empty variable is what most process runners pass for "not set".
  const given = Object.fromEntries(Object.entries(env).filter(([, value]) => value !== ''));
  const serves = isProduction && role === 'server';
  const read = serves ? production.safeParse(given) : development.safeParse(given);
  if (!read.success) {
    throw new SettingsError(read.error.issues.map((issue) => describeFault(issue, env)));
  }
  const values = read.data;
  const faults = [
    ...missingBeside(given, ['STRIPE_SECRET_KEY', 'STRIPE_WEBHOOK_SECRET']),
    ...missingBeside(given, ['S3_BUCKET', 'S3_ACCESS_KEY_ID', 'S3_SECRET_ACCESS_KEY']),
  ];
  if (faults.length > 0) throw new SettingsError(faults);
  const publicUrl = (values.PUBLIC_URL ?? `http://localhost:${values.PORT}`).replace(/\/+$/, '');
  return {
    production: isProduction,
    databaseUrl: values.DATABASE_URL,
    host: values.HOST,
    port: values.PORT,
    publicUrl,
    trustProxy: values.TRUST_PROXY,
    jwtSecret: values.JWT_SECRET ?? randomBytes(32).toString('base64url'),
    smtpUrl: values.SMTP_URL,
    mailFrom: values.MAIL_FROM,
    mailPollMs: 2000,
    studyBlockPeople: 40_000,
    studyAtOnceMs: 500,
    searchPartMs: 1000,
    blockTimeoutSeconds: values.STUDY_BLOCK_TIMEOUT_SECONDS,
    payments: paymentSettings(values),
    objectStore: objectStoreSettings(values),
    cookieSecure: values.COOKIE_SECURE ?? publicUrl.startsWith('https://'),
    logLevel: values.LOG_LEVEL,
    demo: values.DEMO,
    webDist: values.WEB_DIST ? resolve(values.WEB_DIST) : null,
  };
}

type Values = z.infer<typeof development> | z.infer<typeof production>;

function paymentSettings(values: Values): PaymentSettings | null {
  const { STRIPE_SECRET_KEY: secretKey, STRIPE_WEBHOOK_SECRET: webhookSecret } = values;
  if (secretKey === undefined || webhookSecret === undefined) return null;
  return { secretKey, webhookSecret, apiUrl: values.STRIPE_API_URL };
}

function objectStoreSettings(values: Values): ObjectStoreSettings | null {
  const { S3_BUCKET: bucket, S3_ACCESS_KEY_ID: accessKeyId, S3_SECRET_ACCESS_KEY: secretAccessKey } = values;
  if (bucket === undefined || accessKeyId === undefined || secretAccessKey === undefined) return null;
  const { S3_REGION: region, S3_ENDPOINT: endpoint = null } = values;
  return { bucket, endpoint, region, accessKeyId, secretAccessKey };
}

/** Settings that only make sense together: what is missing once one is there. */
function missingBeside(given: Record<string, string | undefined>, names: readonly string[]): string[] {
  const missing = names.filter((name) => given[name] === undefined);
  if (missing.length === names.length) return [];
  return missing.map((name) => `${name} is missing`);
}

function describeFault(issue: { path: PropertyKey[]; message: string }, env: NodeJS.ProcessEnv): string {
  const name = String(issue.path[0]);
  const value = env[name];
  if (value === undefined || value === '') return `${name} is missing`;
  const read = SECRET_NAMES.has(name) ? 'a value that is not shown' : JSON.stringify(value);
  return `${name}: read ${read}; ${issue.message}`;
}

export const settings = registerAs('settings', () => readSettings(process.env));

/** The same settings, read for a worker. */
export const workerSettings = registerAs('settings', () => readSettings(process.env, 'worker'));

export const InjectSettings = () => Inject(settings.KEY);
