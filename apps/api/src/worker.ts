import 'reflect-metadata';
import { NestFactory } from '@nestjs/core';
import { Logger } from 'nestjs-pino';
import { readSettings, SettingsError } from './config/settings';
import { WorkerModule } from './worker.module';

async function start(): Promise<void> {
  readSettings(process.env, 'worker');
  const app = await NestFactory.createApplicationContext(WorkerModule, {
    abortOnError: false,
    bufferLogs: true,
  });
  app.useLogger(app.get(Logger));
  app.enableShutdownHooks();
}

start().catch((fault: unknown) => {
  console.error(fault instanceof SettingsError ? fault.message : fault);
  process.exit(1);
});
