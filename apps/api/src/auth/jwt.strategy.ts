import { createSecretKey } from 'node:crypto';
import { Injectable } from '@nestjs/common';
import { PassportStrategy } from '@nestjs/passport';
import { ExtractJwt, Strategy } from 'passport-jwt';
import type { CurrentUserInfo } from '../common/access.decorator';
import { InjectSettings, type Settings } from '../config/settings';
import { type AccessTokenPayload, SessionsService } from './sessions.service';

@Injectable()
export class JwtStrategy extends PassportStrategy(Strategy, 'jwt') {
  constructor(
    @InjectSettings() config: Settings,
    private readonly sessions: SessionsService,
  ) {
    // Ready made: from a string each request would try the kinds of key one after another. The typings know
    // only text and buffers; the library below them takes a key object.
    const key = createSecretKey(config.jwtSecret, 'utf8') as unknown as Buffer;
    super({
      jwtFromRequest: ExtractJwt.fromAuthHeaderAsBearerToken(),
      secretOrKeyProvider: (_request, _token, done) => done(null, key),
      algorithms: ['HS256'],
    });
  }

  /** The session is looked up each time, so that a sign-out holds at once. */
  async validate(payload: AccessTokenPayload): Promise<CurrentUserInfo | false> {
    const open = await this.sessions.isOpen(payload.sid, payload.sub);
    return open ? { id: payload.sub, sessionId: payload.sid } : false;
  }
}
