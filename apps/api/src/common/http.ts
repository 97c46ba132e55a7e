import type { IncomingMessage } from 'node:http';
import compression from 'compression';
import cookieParser from 'cookie-parser';
import type { NestExpressApplication } from '@nestjs/platform-express';
import helmet from 'helmet';
import type { Settings } from '../config/settings';
import { BODY_LIMIT, nameBodyFaults } from './body-faults';
import { ProblemFilter } from './problem.filter';
import { refuseOtherSites } from './same-origin';
import { createValidationPipe } from './validation';
import { serveWebApp } from './web-app';

export const API_PREFIX = 'api';

/** Everything that stands before and around the routes; the same for the server and for the tests. */
export function setUpHttp(app: NestExpressApplication, config: Settings): void {
  const secure = config.publicUrl.startsWith('https://');
  app.disable('x-powered-by');
  app.set('trust proxy', config.trustProxy);
  app.set('query parser', 'simple');
  app.use(
    helmet({
      strictTransportSecurity: secure,
      contentSecurityPolicy: {
        useDefaults: false,
        directives: {
          defaultSrc: ["'self'"],
          scriptSrc: ["'self'"],
          // The toast library writes its rules into a style element.
          styleSrc: ["'self'", "'unsafe-inline'"],
          imgSrc: ["'self'", 'data:', 'blob:'],
          objectSrc: ["'none'"],
          baseUri: ["'none'"],
          formAction: ["'self'"],
          frameAncestors: ["'none'"],
          ...(secure ? { upgradeInsecureRequests: [] } : {}),
        },
      },
    }),
    compression(),
    cookieParser(),
    refuseOtherSites(config.publicUrl),
  );
  // A signature is over the very bytes that came.
  app.useBodyParser('raw', { limit: BODY_LIMIT.bytes, type: isSigned });
  app.useBodyParser('json', { limit: BODY_LIMIT.bytes });
  app.use(nameBodyFaults);
  if (config.webDist) serveWebApp(app, config.webDist);
  app.setGlobalPrefix(API_PREFIX);
  app.useGlobalPipes(createValidationPipe());
  app.useGlobalFilters(new ProblemFilter());
  app.enableShutdownHooks();
}

function isSigned({ url = '' }: IncomingMessage): boolean {
  return url.split('?', 1)[0] === `/${API_PREFIX}/payments/events`;
}
