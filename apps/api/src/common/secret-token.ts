import { createHash, randomBytes } from 'node:crypto';

/** 256 random bits, fit for an address. Only their hash is stored. */
export function newToken(): string {
  return randomBytes(32).toString('base64url');
}

export function hashToken(token: string): string {
  return createHash('sha256').update(token).digest('hex');
}
