import { randomUUID } from 'node:crypto';
import type { IncomingMessage, ServerResponse } from 'node:http';
import { RequestMethod } from '@nestjs/common';
import type { Params } from 'nestjs-pino';

const TOKEN_PATHS = /^(\/api\/link|\/api\/invitations|\/order|\/invitation|\/reset|\/confirm)\/[^/]+/i;

/** The path as it may stand in a log: no query (searches name people), no token of a private link. */
export function loggedPath(url: string): string {
  const path = (url.split('?', 1)[0] ?? '').replace(/\/{2,}/g, '/');
  return path.replace(TOKEN_PATHS, '$1/[token]');
}

export function logParameters(level: string): Params {
  return {
    forRoutes: [{ path: '{*path}', method: RequestMethod.ALL }],
    pinoHttp: {
      level,
      genReqId: (_request: IncomingMessage, response: ServerResponse) => {
        const id = randomUUID();
        response.setHeader('X-Request-Id', id);
        return id;
      },
      serializers: {
        req: (request: { id: string; method: string; url: string }) => ({
          id: request.id,
          method: request.method,
          path: loggedPath(request.url),
        }),
        res: (response: { statusCode: number }) => ({ status: response.statusCode }),
      },
      autoLogging: { ignore: (request: IncomingMessage) => request.url?.startsWith('/assets/') ?? false },
    },
  };
}
