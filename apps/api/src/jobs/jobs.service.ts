import { Injectable, Logger, type OnModuleDestroy } from '@nestjs/common';
import { InjectDataSource } from '@nestjs/typeorm';
import type { Pool } from 'pg';
import PgBoss from 'pg-boss';
import { DataSource } from 'typeorm';
import { InjectSettings, type Settings } from '../config/settings';
import { withAdvisoryLock } from '../database/run-migrations';

const SCHEMA = 'jobs';
/** Any number that nothing else in this database uses. */
const SET_UP_LOCK = 761_204_119;
const FEWEST_SECONDS_BETWEEN_CHECKS = 1;
const MOST_SECONDS_BETWEEN_CHECKS = 10;

/** What waits for workers, in a schema of its own in the same database. */
@Injectable()
export class Jobs implements OnModuleDestroy {
  private readonly logger = new Logger(Jobs.name);
  private opened: Promise<PgBoss> | null = null;
  private minds = false;

  constructor(
    @InjectDataSource() private readonly dataSource: DataSource,
    @InjectSettings() private readonly config: Settings,
  ) {}

  /** For so long a job is a worker's; then its worker is taken for lost. */
  get timeoutSeconds(): number {
    return this.config.blockTimeoutSeconds;
  }

  /** Who does the work also looks after jobs whose worker has ended. Before anything else is asked. */
  mindLostJobs(): void {
    this.minds = true;
  }

  async onModuleDestroy(): Promise<void> {
    const boss = await this.opened?.catch(() => null);
    await boss?.stop({ graceful: false });
  }

  /** Opened when first needed: most processes and most tests never put anything off. */
  open(): Promise<PgBoss> {
    this.opened ??= this.start().catch((fault: unknown) => {
      this.opened = null;
      throw fault;
    });
    return this.opened;
  }

  /** Runs `work` while no other process sets anything up in the schema. */
  async settingUp<T>(work: () => Promise<T>): Promise<T> {
    return withAdvisoryLock(this.dataSource, SET_UP_LOCK, work);
  }

  private async start(): Promise<PgBoss> {
    const boss = new PgBoss({
      schema: SCHEMA,
      db: { executeSql: (text, values) => this.pool().query(text, values) },
      schedule: false,
      supervise: this.minds,
      maintenanceIntervalSeconds: Math.max(
        FEWEST_SECONDS_BETWEEN_CHECKS,
        Math.min(MOST_SECONDS_BETWEEN_CHECKS, Math.floor(this.timeoutSeconds / 4)),
      ),
    });
    boss.on('error', (fault) => this.logger.error(fault.message));
    // Several processes may start at once on an empty database.
    await this.settingUp(() => boss.start());
    return boss;
  }

  private pool(): Pool {
    return (this.dataSource.driver as unknown as { master: Pool }).master;
  }
}
