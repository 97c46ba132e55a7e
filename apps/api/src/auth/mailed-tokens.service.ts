import { Injectable } from '@nestjs/common';
import { type EntityManager, In, IsNull } from 'typeorm';
import { Problem } from '../common/problem';
import { hashToken, newToken } from '../common/secret-token';
import { MailedToken, type MailedTokenPurpose } from './entities/mailed-token.entity';

const HOUR_MS = 3_600_000;

export const VALID_HOURS: Record<MailedTokenPurpose, number> = {
  'password-reset': 1,
  'email-confirm': 72,
  'email-change': 24,
};

@Injectable()
export class MailedTokensService {
  /** A new token; older ones for the same purpose stop working. */
  async issue(
    manager: EntityManager,
    userId: string,
    purpose: MailedTokenPurpose,
    email: string,
  ): Promise<string> {
    await this.revoke(manager, userId, purpose);
    const token = newToken();
    const expiresAt = new Date(Date.now() + VALID_HOURS[purpose] * HOUR_MS);
    await manager.insert(MailedToken, { userId, purpose, email, expiresAt, tokenHash: hashToken(token) });
    return token;
  }

  /** Uses the token up. Unknown, used and expired tokens give one and the same answer. */
  async redeem(manager: EntityManager, token: string, purposes: MailedTokenPurpose[]): Promise<MailedToken> {
    const found = await manager.findOne(MailedToken, {
      where: { tokenHash: hashToken(token), purpose: In(purposes) },
      lock: { mode: 'pessimistic_write' },
    });
    if (!found || found.usedAt || found.expiresAt <= new Date()) {
      throw new Problem(400, 'link-not-valid', 'This link was used before or is too old. Ask for a new one.');
    }
    await manager.update(MailedToken, { id: found.id }, { usedAt: new Date() });
    return found;
  }

  async revoke(manager: EntityManager, userId: string, purpose: MailedTokenPurpose): Promise<void> {
    await manager.update(MailedToken, { userId, purpose, usedAt: IsNull() }, { usedAt: new Date() });
  }
}
