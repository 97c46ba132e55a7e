import type { NextFunction, Request, Response } from 'express';
import { Problem } from './problem';

const READING = new Set(['GET', 'HEAD', 'OPTIONS']);

/** Refuses what another site's page tries to change with this browser's cookie. */
export function refuseOtherSites(publicUrl: string) {
  const ownOrigin = new URL(publicUrl).origin;
  return (request: Request, _response: Response, next: NextFunction): void => {
    if (READING.has(request.method) || isOwnPage(request, ownOrigin)) {
      next();
      return;
    }
    next(Problem.forbidden('other-site', 'A page of another site may not change anything here.'));
  };
}

function isOwnPage(request: Request, ownOrigin: string): boolean {
  const site = request.get('sec-fetch-site');
  if (site) return site === 'same-origin' || site === 'none';
  const origin = request.get('origin');
  if (!origin || origin === ownOrigin) return true;
  return URL.canParse(origin) && new URL(origin).host === request.host;
}
