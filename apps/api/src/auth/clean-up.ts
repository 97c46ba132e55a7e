import { Injectable } from '@nestjs/common';
import { Cron } from '@nestjs/schedule';
import { InjectDataSource } from '@nestjs/typeorm';
import { DataSource, LessThan } from 'typeorm';
import { MailedToken } from './entities/mailed-token.entity';
import { SessionsService } from './sessions.service';

const DAY_MS = 86_400_000;

/** What can no longer be used is removed each night. */
@Injectable()
export class CleanUp {
  constructor(
    @InjectDataSource() private readonly dataSource: DataSource,
    private readonly sessions: SessionsService,
  ) {}

  @Cron('17 3 * * *')
  async run(): Promise<void> {
    await this.sessions.removeExpired();
    const weekAgo = new Date(Date.now() - 7 * DAY_MS);
    await this.dataSource.manager.delete(MailedToken, { expiresAt: LessThan(weekAgo) });
    await this.dataSource.query('DELETE FROM rate_limits WHERE expire < $1', [Date.now() - DAY_MS]);
  }
}
