import 'reflect-metadata';
import { NestFactory } from '@nestjs/core';
import type { NestExpressApplication } from '@nestjs/platform-express';
import { Logger } from 'nestjs-pino';
import { AppModule } from './app.module';
import { setUpHttp } from './common/http';
import { readSettings, SettingsError, settings, type Settings } from './config/settings';
import { serveOpenApi } from './openapi';

async function start(): Promise<void> {
  // Read once before anything starts: faults of the environment are told without a stack.
  readSettings(process.env);
  const app = await NestFactory.create<NestExpressApplication>(AppModule, {
    abortOnError: false,
    bodyParser: false,
    bufferLogs: true,
  });
  app.useLogger(app.get(Logger));
  const config = app.get<Settings>(settings.KEY);
  setUpHttp(app, config);
  serveOpenApi(app);
  await app.listen(config.port, config.host);
}

start().catch((fault: unknown) => {
  const words = fault instanceof SettingsError ? fault.message : fault;
  console.error(words);
  // What was opened before the fault would keep the process alive without ever answering.
  process.exit(1);
});
