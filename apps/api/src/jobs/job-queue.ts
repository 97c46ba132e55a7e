import type PgBoss from 'pg-boss';
import type { EntityManager } from 'typeorm';
import type { Jobs } from './jobs.service';
import type { WorkVersion } from './work-version';

/** A job that so many workers lost is not tried again. */
const RETRIES = 4;

/** A job that is the caller's until it is settled or the time is over. */
export type Taken<T> = T & { jobId: string };

/**
 * Jobs of one kind. The version of the work is part of the queue's name: while servers and workers of two versions
 * run side by side, each worker finds only what it works out as the server meant it, and no try is spent on the rest.
 */
export class JobQueue<T extends object> {
  private readonly waiting: string;
  private readonly lost: string;
  private made: Promise<PgBoss> | null = null;

  constructor(
    private readonly jobs: Jobs,
    { own }: Pick<WorkVersion, 'own'>,
    kind: string,
  ) {
    this.waiting = `${kind}-${own}`;
    this.lost = `${kind}-${own}-given-up`;
  }

  /** Part of the caller's transaction: jobs are there together with what they are about, or not at all. */
  async add(manager: EntityManager, items: readonly T[], priority = 0): Promise<void> {
    const boss = await this.open();
    const jobs = items.map((data) => ({
      name: this.waiting,
      data,
      priority,
      expireInSeconds: this.jobs.timeoutSeconds,
    }));
    await boss.insert(jobs, { db: within(manager) });
  }

  /** A job that nobody else has. */
  take(): Promise<Taken<T> | undefined> {
    return this.takeFrom(this.waiting);
  }

  /** A job that was tried too often. */
  takeGivenUp(): Promise<Taken<T> | undefined> {
    return this.takeFrom(this.lost);
  }

  /** Done; part of the caller's transaction where there is one. */
  async settle({ jobId }: Taken<T>, manager?: EntityManager): Promise<void> {
    const boss = await this.open();
    await boss.complete(this.waiting, jobId, {}, manager ? { db: within(manager) } : {});
  }

  async settleGivenUp({ jobId }: Taken<T>): Promise<void> {
    await (await this.open()).complete(this.lost, jobId);
  }

  /** Another try, or none when there were enough. */
  async giveBack({ jobId }: Taken<T>, why: string): Promise<void> {
    await (await this.open()).fail(this.waiting, jobId, { message: why });
  }

  private async takeFrom(name: string): Promise<Taken<T> | undefined> {
    const [job] = await (await this.open()).fetch<T>(name);
    return job && { ...job.data, jobId: job.id };
  }

  private open(): Promise<PgBoss> {
    this.made ??= this.make().catch((fault: unknown) => {
      this.made = null;
      throw fault;
    });
    return this.made;
  }

  private async make(): Promise<PgBoss> {
    const boss = await this.jobs.open();
    const options = {
      retryLimit: RETRIES,
      expireInSeconds: this.jobs.timeoutSeconds,
      deadLetter: this.lost,
    };
    await this.jobs.settingUp(async () => {
      await boss.createQueue(this.lost);
      await boss.createQueue(this.waiting, { name: this.waiting, ...options });
    });
    return boss;
  }
}

const within = (manager: EntityManager) => ({
  executeSql: async (text: string, values: unknown[]) => ({
    rows: await manager.query<object[]>(text, values),
  }),
});
