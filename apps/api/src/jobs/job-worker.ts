import { setTimeout as sleep } from 'node:timers/promises';
import { Logger, type OnApplicationBootstrap, type OnModuleDestroy } from '@nestjs/common';
import type { Jobs } from './jobs.service';

const POLL_MS = 500;
const ABANDONED_EVERY_MS = 10_000;

/** One kind of work that a worker does. */
export interface Work {
  /** Takes one job and does it, or settles one that was given up; false when there is nothing to do. */
  once(): Promise<boolean>;
  /** Ends in words what waits for workers of another version that do not come. */
  failAbandoned(): Promise<void>;
}

/** Does one job of each kind after the other. Any number of processes may run it. */
export class JobWorker implements OnApplicationBootstrap, OnModuleDestroy {
  private readonly logger = new Logger(JobWorker.name);
  private readonly stop = new AbortController();
  private running: Promise<void> | null = null;
  private lookedAt = -Infinity;

  constructor(
    jobs: Jobs,
    private readonly kinds: readonly Work[],
  ) {
    jobs.mindLostJobs();
  }

  onApplicationBootstrap(): void {
    this.logger.log('ready to work');
    this.running = this.run();
  }

  async onModuleDestroy(): Promise<void> {
    this.stop.abort();
    await this.running;
  }

  private async run(): Promise<void> {
    const { signal } = this.stop;
    while (!signal.aborted) {
      let worked = false;
      for (const kind of this.kinds) {
        if (!signal.aborted && (await this.tried(() => kind.once()))) worked = true;
      }
      if (worked) continue;
      await this.tried(() => this.lookForAbandoned());
      await sleep(POLL_MS, undefined, { signal }).catch(() => undefined);
    }
  }

  private async lookForAbandoned(): Promise<boolean> {
    if (performance.now() - this.lookedAt < ABANDONED_EVERY_MS) return false;
    this.lookedAt = performance.now();
    for (const kind of this.kinds) await kind.failAbandoned();
    return false;
  }

  private async tried(work: () => Promise<boolean>): Promise<boolean> {
    try {
      return await work();
    } catch (fault) {
      this.logger.error(wordsOf(fault));
      return false;
    }
  }
}

/** What went wrong, in words. */
export const wordsOf = (fault: unknown): string => (fault instanceof Error ? fault.message : String(fault));
