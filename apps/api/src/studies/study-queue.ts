import { Injectable } from '@nestjs/common';
import { JobQueue } from '../jobs/job-queue';
import { Jobs } from '../jobs/jobs.service';
import { WorkVersion } from '../jobs/work-version';

/** A block of a study that waits to be counted. */
export interface BlockJob {
  studyId: string;
  block: number;
}

/** Blocks to be counted. */
@Injectable()
export class StudyQueue extends JobQueue<BlockJob> {
  constructor(jobs: Jobs, version: WorkVersion) {
    super(jobs, version, 'study-blocks');
  }
}
