import 'reflect-metadata';
import type { NestExpressApplication } from '@nestjs/platform-express';
import { Test, type TestingModuleBuilder } from '@nestjs/testing';
import { Client } from 'pg';
import { DataSource } from 'typeorm';
import { AppModule } from '../src/app.module';
import { setUpHttp } from '../src/common/http';
import { readSettings, type Settings, settings } from '../src/config/settings';
import { serveOpenApi } from '../src/openapi';

export interface TestApp {
  app: NestExpressApplication;
  dataSource: DataSource;
  settings: Settings;
  close(): Promise<void>;
}

/** The whole application on a real database that belongs to this Jest worker, emptied before each file. */
export async function startTestApp(
  changes: Partial<Settings> = {},
  databaseSuffix = '',
  adapt: (builder: TestingModuleBuilder) => TestingModuleBuilder = (builder) => builder,
): Promise<TestApp> {
  const databaseUrl = await makeWorkerDatabase(databaseSuffix);
  const config: Settings = {
    ...readSettings({ ...process.env, NODE_ENV: 'test', DATABASE_URL: databaseUrl }),
    publicUrl: 'http://settlewright.test',
    logLevel: 'silent',
    mailPollMs: 0,
    demo: false,
    webDist: null,
    ...changes,
  };
  return startAppOn(config, adapt);
}

/** One more process of the application, with the settings and so the database of another. */
export async function startAppOn(
  config: Settings,
  adapt: (builder: TestingModuleBuilder) => TestingModuleBuilder = (builder) => builder,
): Promise<TestApp> {
  const builder = Test.createTestingModule({ imports: [AppModule] })
    .overrideProvider(settings.KEY)
    .useValue(config);
  const module = await adapt(builder).compile();
  const app = module.createNestApplication<NestExpressApplication>({ bodyParser: false, logger: false });
  setUpHttp(app, config);
  serveOpenApi(app);
  try {
    await app.init();
  } catch (fault) {
    await app.get(DataSource).destroy();
    throw fault;
  }
  return { app, dataSource: app.get(DataSource), settings: config, close: () => app.close() };
}

/** A fresh database `<name>_<worker>` beside the one of DATABASE_URL. */
export async function makeWorkerDatabase(suffix = ''): Promise<string> {
  const given = process.env.DATABASE_URL;
  if (!given) throw new Error('DATABASE_URL is missing: run through scripts/with-database.mjs');
  const url = new URL(given);
  const name = `${url.pathname.slice(1)}_${process.env.JEST_WORKER_ID ?? '1'}${suffix}`;
  const client = new Client({ connectionString: given });
  await client.connect();
  await client.query(`DROP DATABASE IF EXISTS "${name}" WITH (FORCE)`);
  await client.query(`CREATE DATABASE "${name}"`);
  await client.end();
  url.pathname = `/${name}`;
  return url.toString();
}
