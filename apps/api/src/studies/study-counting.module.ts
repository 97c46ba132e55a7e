import { Module } from '@nestjs/common';
import { StudyBlocks } from './study-blocks.service';
import { StudyCounter } from './study-counter';
import { StudyQueue } from './study-queue';

/** What the API and the workers share. */
@Module({
  providers: [StudyQueue, StudyBlocks, StudyCounter],
  exports: [StudyQueue, StudyBlocks, StudyCounter],
})
export class StudyCountingModule {}
