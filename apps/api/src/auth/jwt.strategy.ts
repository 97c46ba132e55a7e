import { createSecretKey } from 'node:crypto';
import { Injectable } from '@nestjs/common';
import { PassportStrategy } from '@nestjs/passport';
import { ExtractJwt, Strategy } from 'passport-jwt';
import { InjectDataSource } from '@nestjs/typeorm';
import { isUUID } from 'class-validator';
import type { DataSource } from 'typeorm';
import type { AccessRequest, CurrentUserInfo } from '../common/access.decorator';
import { InjectSettings, type Settings } from '../config/settings';
import { findCaller } from './find-caller';
import type { AccessTokenPayload } from './sessions.service';

@Injectable()
export class JwtStrategy extends PassportStrategy(Strategy, 'jwt') {
  constructor(
    @InjectSettings() config: Settings,
    @InjectDataSource() private readonly dataSource: DataSource,
  ) {
    // Ready made: from a string each request would try the kinds of key one after another. The typings know
    // only text and buffers; the library below them takes a key object.
    const key = createSecretKey(config.jwtSecret, 'utf8') as unknown as Buffer;
    super({
      jwtFromRequest: ExtractJwt.fromAuthHeaderAsBearerToken(),
      secretOrKeyProvider: (_request, _token, done) => done(null, key),
      algorithms: ['HS256'],
      passReqToCallback: true,
    });
  }

  /** The session is looked up each time, so that a sign-out holds at once; the role comes with it. */
  async validate(request: AccessRequest, { sub, sid }: AccessTokenPayload): Promise<CurrentUserInfo | false> {
    const { workshopId } = request.params;
    const inWorkshop = isUUID(workshopId) ? String(workshopId) : null;
    const caller = await findCaller(this.dataSource, sid, sub, inWorkshop);
    if (!caller) return false;
    if (inWorkshop && caller.role) {
      request.member = { workshopId: inWorkshop, userId: sub, role: caller.role };
    }
    return { id: sub, sessionId: sid };
  }
}
