import { setTimeout as sleep } from 'node:timers/promises';
import { Injectable, Logger, type OnApplicationBootstrap, type OnModuleDestroy } from '@nestjs/common';
import { StudyBlocks } from './study-blocks.service';
import { StudyCounter } from './study-counter';
import { StudyQueue } from './study-queue';

const POLL_MS = 500;

/** Counts blocks of studies, one after the other. Any number of processes may run it. */
@Injectable()
export class StudyWorker implements OnApplicationBootstrap, OnModuleDestroy {
  private readonly logger = new Logger(StudyWorker.name);
  private readonly stop = new AbortController();
  private running: Promise<void> | null = null;

  constructor(
    private readonly queue: StudyQueue,
    private readonly blocks: StudyBlocks,
    private readonly counter: StudyCounter,
  ) {
    queue.mindLostBlocks();
  }

  onApplicationBootstrap(): void {
    this.logger.log('ready to count studies');
    this.running = this.run();
  }

  async onModuleDestroy(): Promise<void> {
    this.stop.abort();
    await this.running;
  }

  private async run(): Promise<void> {
    const { signal } = this.stop;
    while (!signal.aborted) {
      const worked = await this.once().catch((fault: unknown) => {
        this.logger.error(wordsOf(fault));
        return false;
      });
      if (!worked) await sleep(POLL_MS, undefined, { signal }).catch(() => undefined);
    }
  }

  /** Takes and counts one block; false when there is nothing to do. */
  private async once(): Promise<boolean> {
    const job = await this.queue.take();
    if (!job) return this.giveUpOne();
    const { studyId, block } = job;
    try {
      const question = await this.blocks.question(studyId, block);
      if (question) {
        await this.blocks.keep(studyId, block, this.counter.count(question, block));
        this.logger.log(`block ${block} of study ${studyId} counted`);
      }
    } catch (fault) {
      this.logger.error(`block ${block} of study ${studyId}: ${wordsOf(fault)}`);
      await this.queue.giveBack(job, wordsOf(fault));
      return true;
    }
    await this.queue.settle(job);
    return true;
  }

  private async giveUpOne(): Promise<boolean> {
    const job = await this.queue.takeGivenUp();
    if (!job) return false;
    const { studyId, block } = job;
    this.logger.error(`block ${block} of study ${studyId} given up`);
    const question = await this.blocks.question(studyId, block);
    const otherRules = question && this.counter.otherRules(question);
    const tried = `Block ${block + 1} could not be counted, though it was tried several times.`;
    await this.blocks.fail(studyId, otherRules ?? tried);
    await this.queue.settleGivenUp(job);
    return true;
  }
}

const wordsOf = (fault: unknown): string => (fault instanceof Error ? fault.message : String(fault));
