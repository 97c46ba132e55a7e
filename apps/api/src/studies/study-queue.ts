import { Injectable, Logger, type OnModuleDestroy } from '@nestjs/common';
import { InjectDataSource } from '@nestjs/typeorm';
import type { Pool } from 'pg';
import PgBoss from 'pg-boss';
import { DataSource, type EntityManager } from 'typeorm';
import { InjectSettings, type Settings } from '../config/settings';
import { withAdvisoryLock } from '../database/run-migrations';

const SCHEMA = 'jobs';
const BLOCKS = 'study-blocks';
const GIVEN_UP = 'study-blocks-given-up';
/** Any number that nothing else in this database uses. */
const SET_UP_LOCK = 761_204_119;
/** A block that so many workers lost is not tried again. */
const RETRIES = 4;
const FEWEST_SECONDS_BETWEEN_CHECKS = 1;
const MOST_SECONDS_BETWEEN_CHECKS = 10;

/** A block of a study that waits to be counted. */
export interface BlockJob {
  studyId: string;
  block: number;
}

interface TakenJob extends BlockJob {
  jobId: string;
}

/** Blocks to be counted, in a schema of their own in the same database. */
@Injectable()
export class StudyQueue implements OnModuleDestroy {
  private readonly logger = new Logger(StudyQueue.name);
  private opened: Promise<PgBoss> | null = null;
  private minds = false;

  constructor(
    @InjectDataSource() private readonly dataSource: DataSource,
    @InjectSettings() private readonly config: Settings,
  ) {}

  /** Who counts blocks also looks after those whose worker has ended. Before anything else is asked. */
  mindLostBlocks(): void {
    this.minds = true;
  }

  async onModuleDestroy(): Promise<void> {
    const boss = await this.opened?.catch(() => null);
    await boss?.stop({ graceful: false });
  }

  /** Part of the caller's transaction: a study and its blocks are there together or not at all. */
  async add(manager: EntityManager, studyId: string, blocks: number): Promise<void> {
    const boss = await this.open();
    const jobs = Array.from({ length: blocks }, (_, block) => ({
      name: BLOCKS,
      data: { studyId, block },
      expireInSeconds: this.config.blockTimeoutSeconds,
    }));
    const executeSql = async (text: string, values: unknown[]) => ({
      rows: await manager.query<object[]>(text, values),
    });
    await boss.insert(jobs, { db: { executeSql } });
  }

  /** A block that nobody counts yet; from now on it is the caller's until it is settled or the time is over. */
  take(): Promise<TakenJob | undefined> {
    return this.takeFrom(BLOCKS);
  }

  /** A block that was tried too often. */
  takeGivenUp(): Promise<TakenJob | undefined> {
    return this.takeFrom(GIVEN_UP);
  }

  async settle({ jobId }: TakenJob): Promise<void> {
    await (await this.open()).complete(BLOCKS, jobId);
  }

  async settleGivenUp({ jobId }: TakenJob): Promise<void> {
    await (await this.open()).complete(GIVEN_UP, jobId);
  }

  /** Another try, or none when there were enough. */
  async giveBack({ jobId }: TakenJob, why: string): Promise<void> {
    await (await this.open()).fail(BLOCKS, jobId, { message: why });
  }

  private async takeFrom(name: string): Promise<TakenJob | undefined> {
    const [job] = await (await this.open()).fetch<BlockJob>(name);
    return job && { jobId: job.id, ...job.data };
  }

  /** Opened when first needed: most processes and most tests never study anything. */
  private open(): Promise<PgBoss> {
    this.opened ??= this.start().catch((fault: unknown) => {
      this.opened = null;
      throw fault;
    });
    return this.opened;
  }

  private async start(): Promise<PgBoss> {
    const timeout = this.config.blockTimeoutSeconds;
    const boss = new PgBoss({
      schema: SCHEMA,
      db: { executeSql: (text, values) => this.pool().query(text, values) },
      schedule: false,
      supervise: this.minds,
      maintenanceIntervalSeconds: Math.max(
        FEWEST_SECONDS_BETWEEN_CHECKS,
        Math.min(MOST_SECONDS_BETWEEN_CHECKS, Math.floor(timeout / 4)),
      ),
    });
    boss.on('error', (fault) => this.logger.error(fault.message));
    // Several processes may start at once on an empty database.
    await withAdvisoryLock(this.dataSource, SET_UP_LOCK, async () => {
      await boss.start();
      await boss.createQueue(GIVEN_UP);
      const options = { retryLimit: RETRIES, expireInSeconds: timeout, deadLetter: GIVEN_UP };
      await boss.createQueue(BLOCKS, { name: BLOCKS, ...options });
    });
    return boss;
  }

  private pool(): Pool {
    return (this.dataSource.driver as unknown as { master: Pool }).master;
  }
}
