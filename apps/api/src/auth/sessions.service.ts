import { HttpStatus, Injectable } from '@nestjs/common';
import { JwtService } from '@nestjs/jwt';
import { InjectDataSource } from '@nestjs/typeorm';
import { DataSource, type EntityManager, IsNull } from 'typeorm';
import { hashToken, newToken } from '../common/secret-token';
import { Problem } from '../common/problem';
import { RefreshToken } from './entities/refresh-token.entity';
import { Session } from './entities/session.entity';

export const ACCESS_SECONDS = 10 * 60;
export const SESSION_DAYS = 30;
/** two tabs may refresh with the same cookie at nearly the same time */
const OVERLAP_MS = 10_000;

export interface IssuedTokens {
  userId: string;
  accessToken: string;
  refreshToken: string;
}

/** `sub` is the person, `sid` the session. */
export interface AccessTokenPayload {
  sub: string;
  sid: string;
}

type EndReason = NonNullable<Session['endedBecause']>;

@Injectable()
export class SessionsService {
  constructor(
    @InjectDataSource() private readonly dataSource: DataSource,
    private readonly jwt: JwtService,
  ) {}

  async open(manager: EntityManager, userId: string): Promise<IssuedTokens> {
    const expiresAt = new Date(Date.now() + SESSION_DAYS * 86_400_000);
    const session = await manager.save(Session, manager.create(Session, { userId, expiresAt }));
    return this.issue(manager, session);
  }

  /** A new pair for a refresh token; one that was used before, and not just now, ends the whole session. */
  async refresh(presented: string): Promise<IssuedTokens> {
    const result = await this.dataSource.transaction(async (manager) => {
      const token = await manager.findOne(RefreshToken, {
        where: { tokenHash: hashToken(presented) },
        lock: { mode: 'pessimistic_write' },
      });
      const session = token && (await manager.findOneBy(Session, { id: token.sessionId }));
      if (!token || !session || session.endedAt || session.expiresAt <= new Date()) return null;
      if (token.usedAt && Date.now() - token.usedAt.getTime() > OVERLAP_MS) {
        await this.end(manager, session.id, 'token-reused');
        return null;
      }
      if (!token.usedAt) await manager.update(RefreshToken, { id: token.id }, { usedAt: new Date() });
      return this.issue(manager, session);
    });
    if (!result) {
      throw new Problem(HttpStatus.UNAUTHORIZED, 'session-ended', 'This session has ended. Sign in again.');
    }
    return result;
  }

  /** Ends the session that a refresh token belongs to, whether or not the token is still good. */
  async endByToken(presented: string): Promise<void> {
    const token = await this.dataSource.manager.findOneBy(RefreshToken, { tokenHash: hashToken(presented) });
    if (token) await this.end(this.dataSource.manager, token.sessionId, 'signed-out');
  }

  async end(manager: EntityManager, sessionId: string, endedBecause: EndReason): Promise<void> {
    await manager.update(
      Session,
      { id: sessionId, endedAt: IsNull() },
      { endedAt: new Date(), endedBecause },
    );
  }

  async endAll(manager: EntityManager, userId: string, endedBecause: EndReason): Promise<void> {
    await manager.update(Session, { userId, endedAt: IsNull() }, { endedAt: new Date(), endedBecause });
  }

  async removeExpired(): Promise<void> {
    await this.dataSource
      .createQueryBuilder()
      .delete()
      .from(Session)
      .where(`expires_at < now() OR ended_at < now() - interval '30 days'`)
      .execute();
  }

  private async issue(manager: EntityManager, session: Session): Promise<IssuedTokens> {
    const refreshToken = newToken();
    await manager.insert(RefreshToken, { sessionId: session.id, tokenHash: hashToken(refreshToken) });
    const payload: AccessTokenPayload = { sub: session.userId, sid: session.id };
    const accessToken = await this.jwt.signAsync(payload, { expiresIn: ACCESS_SECONDS });
    return { userId: session.userId, accessToken, refreshToken };
  }
}
