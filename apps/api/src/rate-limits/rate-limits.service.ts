import { HttpStatus, Injectable } from '@nestjs/common';
import { InjectDataSource } from '@nestjs/typeorm';
import { RateLimiterPostgres, RateLimiterRes } from 'rate-limiter-flexible';
import { DataSource } from 'typeorm';
import { Problem } from '../common/problem';

const MINUTE = 60;
const HOUR = 60 * MINUTE;

/** How often within how many seconds, for one key. */
const LIMITS = {
  'sign-in-address-and-ip': { points: 10, duration: 15 * MINUTE },
  'sign-in-ip': { points: 100, duration: 15 * MINUTE },
  'sign-up-ip': { points: 20, duration: HOUR },
  'mail-address': { points: 5, duration: HOUR },
  'mail-ip': { points: 30, duration: HOUR },
  invitation: { points: 60, duration: HOUR },
  'token-ip': { points: 60, duration: 15 * MINUTE },
  'link-ip': { points: 120, duration: MINUTE },
  'link-answer': { points: 30, duration: HOUR },
  'link-file': { points: 120, duration: HOUR },
  'tried-sets': { points: 30, duration: MINUTE },
} as const;

export type LimitName = keyof typeof LIMITS;

/** Counts in PostgreSQL, since several processes may serve the same people. */
@Injectable()
export class RateLimits {
  private readonly limiters: Record<LimitName, RateLimiterPostgres>;

  constructor(@InjectDataSource() dataSource: DataSource) {
    const make = (name: LimitName) =>
      new RateLimiterPostgres({
        storeClient: dataSource,
        storeType: 'typeorm',
        tableName: 'rate_limits',
        tableCreated: true,
        clearExpiredByTimeout: false,
        keyPrefix: name,
        ...LIMITS[name],
      });
    this.limiters = Object.fromEntries(
      Object.keys(LIMITS).map((name) => [name, make(name as LimitName)]),
    ) as Record<LimitName, RateLimiterPostgres>;
  }

  /** Counts one attempt; refuses with 429 and the wait in words when there were too many. */
  async take(name: LimitName, key: string): Promise<void> {
    try {
      await this.limiters[name].consume(key);
    } catch (refusal) {
      if (!(refusal instanceof RateLimiterRes)) throw refusal;
      const retryAfterSeconds = Math.ceil(refusal.msBeforeNext / 1000);
      const wait =
        retryAfterSeconds < 90
          ? `${retryAfterSeconds} seconds`
          : `${Math.ceil(retryAfterSeconds / 60)} minutes`;
      throw new Problem(
        HttpStatus.TOO_MANY_REQUESTS,
        'too-many-attempts',
        `Too many attempts. Try again in ${wait}.`,
        undefined,
        { retryAfterSeconds },
      );
    }
  }

  async forget(name: LimitName, key: string): Promise<void> {
    await this.limiters[name].delete(key);
  }
}
