import type { CookieOptions, Request, Response } from 'express';
import type { Settings } from '../config/settings';
import { SESSION_DAYS } from './sessions.service';

const REFRESH_COOKIE = 'settlewright_refresh';

const options = (config: Settings): CookieOptions => ({
  httpOnly: true,
  sameSite: 'strict',
  secure: config.cookieSecure,
  path: '/api/auth',
});

export function readRefreshCookie(request: Request): string | null {
  const value: unknown = (request.cookies as Record<string, unknown>)[REFRESH_COOKIE];
  return typeof value === 'string' && value !== '' ? value : null;
}

export function setRefreshCookie(response: Response, token: string, config: Settings): void {
  response.cookie(REFRESH_COOKIE, token, { ...options(config), maxAge: SESSION_DAYS * 86_400_000 });
}

export function clearRefreshCookie(response: Response, config: Settings): void {
  response.clearCookie(REFRESH_COOKIE, options(config));
}
