import { Injectable } from '@nestjs/common';
import { JobQueue } from '../jobs/job-queue';
import { Jobs } from '../jobs/jobs.service';
import { WorkVersion } from '../jobs/work-version';

/** A part of a search that waits to be done. */
export interface PartJob {
  searchId: string;
  part: number;
}

/** Parts of searches; of each search one at a time. */
@Injectable()
export class SearchQueue extends JobQueue<PartJob> {
  constructor(jobs: Jobs, version: WorkVersion) {
    super(jobs, version, 'search-parts');
  }
}
