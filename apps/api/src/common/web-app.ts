import type { ServerResponse } from 'node:http';
import { join, sep } from 'node:path';
import type { NestExpressApplication } from '@nestjs/platform-express';
import type { NextFunction, Request, Response } from 'express';

/** A private link is the key to what it shows: nobody lists it. */
const PRIVATE_PAGE = /^\/+order\//i;
export const NOT_LISTED = 'noindex, nofollow, noarchive';
const NO_PAGE = /^\/+(api|assets)(\/|$)/i;

/**
 * The built web application on the same port: every address that is neither a file, nor under /api, nor a
 * missing asset gets its one page.
 */
export function serveWebApp(app: NestExpressApplication, webDist: string): void {
  app.useStaticAssets(webDist, {
    index: false,
    setHeaders: (response: ServerResponse, path: string) => {
      const hashed = path.includes(`${sep}assets${sep}`);
      response.setHeader('Cache-Control', hashed ? 'public, max-age=31536000, immutable' : 'no-cache');
    },
  });
  app.use((request: Request, response: Response, next: NextFunction) => {
    const wantsPage = (request.method === 'GET' || request.method === 'HEAD') && !NO_PAGE.test(request.path);
    if (!wantsPage) {
      next();
      return;
    }
    response.setHeader('Cache-Control', 'no-cache');
    if (PRIVATE_PAGE.test(request.path)) response.setHeader('X-Robots-Tag', NOT_LISTED);
    response.sendFile(join(webDist, 'index.html'), { cacheControl: false });
  });
}
