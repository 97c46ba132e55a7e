import { Injectable, Logger } from '@nestjs/common';
import { type Work, wordsOf } from '../jobs/job-worker';
import { StudyBlocks } from './study-blocks.service';
import { StudyCounter } from './study-counter';
import { StudyQueue } from './study-queue';

/** Counts blocks of studies, one after the other. */
@Injectable()
export class StudyWork implements Work {
  private readonly logger = new Logger(StudyWork.name);

  constructor(
    private readonly queue: StudyQueue,
    private readonly blocks: StudyBlocks,
    private readonly counter: StudyCounter,
  ) {}

  async once(): Promise<boolean> {
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

  failAbandoned(): Promise<void> {
    return this.blocks.failAbandoned();
  }

  private async giveUpOne(): Promise<boolean> {
    const job = await this.queue.takeGivenUp();
    if (!job) return false;
    const { studyId, block } = job;
    this.logger.error(`block ${block} of study ${studyId} given up`);
    await this.blocks.fail(
      studyId,
      `Block ${block + 1} could not be counted, though it was tried several times.`,
    );
    await this.queue.settleGivenUp(job);
    return true;
  }
}
