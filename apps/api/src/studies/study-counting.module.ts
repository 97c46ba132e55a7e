import { Module } from '@nestjs/common';
import { JobsModule } from '../jobs/jobs.module';
import { StudyBlocks } from './study-blocks.service';
import { StudyCounter } from './study-counter';
import { StudyQueue } from './study-queue';

/** What the API and the workers share. */
@Module({
  imports: [JobsModule],
  providers: [StudyQueue, StudyBlocks, StudyCounter],
  exports: [JobsModule, StudyQueue, StudyBlocks, StudyCounter],
})
export class StudyCountingModule {}
