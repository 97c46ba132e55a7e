import { NestFactory } from '@nestjs/core';
import type { OpenAPIObject } from '@nestjs/swagger';
import { AppModule } from '../app.module';
import { API_PREFIX } from '../common/http';
import { createOpenApi } from '../openapi';

/** Nothing is started in preview: the routes and their types are only looked at. */
export async function describeApi(): Promise<OpenAPIObject> {
  const app = await NestFactory.create(AppModule, { preview: true, abortOnError: false, logger: false });
  app.setGlobalPrefix(API_PREFIX);
  return createOpenApi(app);
}
