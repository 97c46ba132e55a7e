import { Module } from '@nestjs/common';
import { JobsModule } from '../jobs/jobs.module';
import { SearchParts } from './search-parts.service';
import { SearchQueue } from './search-queue';

/** What the API and the workers share. */
@Module({
  imports: [JobsModule],
  providers: [SearchQueue, SearchParts],
  exports: [JobsModule, SearchQueue, SearchParts],
})
export class SearchingModule {}
