import { Injectable } from '@nestjs/common';
import type { Response } from 'express';
import { InjectSettings, type Settings } from '../config/settings';
import { AccountsService } from './accounts.service';
import type { SessionDto } from './dto/session.dto';
import { clearRefreshCookie, setRefreshCookie } from './refresh-cookie';
import { ACCESS_SECONDS, type IssuedTokens } from './sessions.service';

/** What a browser gets when a session opens, goes on or ends. */
@Injectable()
export class SessionAnswers {
  constructor(
    @InjectSettings() private readonly config: Settings,
    private readonly accounts: AccountsService,
  ) {}

  async opened(response: Response, tokens: IssuedTokens): Promise<SessionDto> {
    const me = await this.accounts.me(tokens.userId);
    setRefreshCookie(response, tokens.refreshToken, this.config);
    response.setHeader('Cache-Control', 'no-store');
    return { accessToken: tokens.accessToken, expiresInSeconds: ACCESS_SECONDS, ...me };
  }

  ended(response: Response): void {
    clearRefreshCookie(response, this.config);
  }
}
