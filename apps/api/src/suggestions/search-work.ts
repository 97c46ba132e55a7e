import { Injectable, Logger } from '@nestjs/common';
import { InjectSettings, type Settings } from '../config/settings';
import { type Work, wordsOf } from '../jobs/job-worker';
import { Searcher } from './searcher';
import { SearchParts } from './search-parts.service';
import { SearchQueue } from './search-queue';

/** Searches for dimensions part by part, so that a worker can be told to stop, and studies get their turn. */
@Injectable()
export class SearchWork implements Work {
  private readonly logger = new Logger(SearchWork.name);

  constructor(
    private readonly queue: SearchQueue,
    private readonly parts: SearchParts,
    private readonly searcher: Searcher,
    @InjectSettings() private readonly config: Settings,
  ) {}

  async once(): Promise<boolean> {
    const job = await this.queue.take();
    if (!job) return this.giveUpOne();
    const { searchId, part } = job;
    try {
      const opened = await this.parts.open(job);
      if (opened) {
        const { question, known } = opened;
        const done = this.searcher.searchOn(searchId, question, known, this.config.searchPartMs);
        await this.parts.keep(job, done);
        this.logger.log(`part ${part} of search ${searchId} done, from choice ${known.length}`);
      } else await this.queue.settle(job);
    } catch (fault) {
      this.logger.error(`part ${part} of search ${searchId}: ${wordsOf(fault)}`);
      await this.queue.giveBack(job, wordsOf(fault));
    }
    return true;
  }

  failAbandoned(): Promise<void> {
    return this.parts.failAbandoned();
  }

  private async giveUpOne(): Promise<boolean> {
    const job = await this.queue.takeGivenUp();
    if (!job) return false;
    this.logger.error(`part ${job.part} of search ${job.searchId} given up`);
    await this.parts.fail(job.searchId, 'It could not be worked out, though it was tried several times.');
    await this.queue.settleGivenUp(job);
    return true;
  }
}
