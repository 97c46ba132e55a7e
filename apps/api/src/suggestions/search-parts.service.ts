import type { Tried } from '@settlewright/geometry';
import { Injectable } from '@nestjs/common';
import { InjectDataSource } from '@nestjs/typeorm';
import { DataSource } from 'typeorm';
import { ABANDONED, abandonedIds } from '../jobs/abandoned';
import type { Taken } from '../jobs/job-queue';
import { UNFINISHED } from '../jobs/job-states';
import { WorkVersion } from '../jobs/work-version';
import { DimensionSearch } from './entities/dimension-search.entity';
import { SearchTries } from './entities/search-tries.entity';
import type { SearchPart } from './searcher';
import type { SearchQuestion } from './search-question';
import { type PartJob, SearchQueue } from './search-queue';
import { endSearch, locked } from './search-rows';

/** Before searches that have not begun, so that the people of one need not be drawn again in between. */
const GOES_ON = 1;

/** Keeps what was tried, each part once, and puts the next part in the queue. */
@Injectable()
export class SearchParts {
  constructor(
    @InjectDataSource() private readonly dataSource: DataSource,
    private readonly queue: SearchQueue,
    private readonly version: WorkVersion,
  ) {}

  /** What is to be searched and what was tried; nothing when the search is gone, ended, or past this part. */
  async open({ searchId, part }: PartJob): Promise<{ question: SearchQuestion; known: Tried[] } | undefined> {
    const { manager } = this.dataSource;
    const search = await manager.findOneBy(DimensionSearch, { id: searchId });
    if (!search?.question || !UNFINISHED.includes(search.state) || search.part !== part) return undefined;
    const tries = await manager.find(SearchTries, { where: { searchId }, order: { part: 'ASC' } });
    return { question: search.question, known: tries.flatMap(({ tried }) => tried) };
  }

  /** In one transaction: the part is kept, its job is over, and the next one waits. */
  async keep(job: Taken<PartJob>, { tried, done, of, found, ended }: SearchPart): Promise<void> {
    const { searchId, part } = job;
    await this.dataSource.transaction(async (manager) => {
      const search = await locked(manager, searchId);
      const isOver = !search || !UNFINISHED.includes(search.state);
      // Another worker did this part while this one was taken for lost: the job is no longer this one's.
      if (!isOver && search.part !== part) return;
      await this.queue.settle(job, manager);
      if (isOver) return;
      const progress = { done, most: of, found };
      if (ended) {
        await endSearch(manager, searchId, { ...progress, state: 'done' });
        return;
      }
      await manager.insert(SearchTries, { searchId, part, tried });
      await manager.save(DimensionSearch, { id: searchId, ...progress, state: 'running', part: part + 1 });
      await this.queue.add(manager, [{ searchId, part: part + 1 }], GOES_ON);
    });
  }

  async fail(searchId: string, fault: string): Promise<void> {
    await this.dataSource.transaction(async (manager) => {
      const search = await locked(manager, searchId);
      if (search && UNFINISHED.includes(search.state)) {
        await endSearch(manager, searchId, { state: 'failed', fault });
      }
    });
  }

  /** Searches that no worker of their version came for. */
  async failAbandoned(): Promise<void> {
    for (const id of await abandonedIds(this.dataSource.manager, DimensionSearch, this.version.own)) {
      await this.fail(id, ABANDONED);
    }
  }
}
