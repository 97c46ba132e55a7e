import { Module } from '@nestjs/common';
import { ConfigModule, type ConfigType } from '@nestjs/config';
import { LoggerModule } from 'nestjs-pino';
import { logParameters } from './common/request-log';
import { settings, workerSettings } from './config/settings';
import { DatabaseModule } from './database/database.module';
import { StudyCountingModule } from './studies/study-counting.module';
import { StudyWork } from './studies/study-work';
import { JobWorker, type Work } from './jobs/job-worker';
import { Jobs } from './jobs/jobs.service';
import { SearchWork } from './suggestions/search-work';
import { Searcher } from './suggestions/searcher';
import { SearchingModule } from './suggestions/searching.module';

/** A process that counts studies and searches for dimensions, and answers no requests. */
@Module({
  imports: [
    ConfigModule.forRoot({ isGlobal: true, ignoreEnvFile: true, load: [workerSettings] }),
    LoggerModule.forRootAsync({
      inject: [settings.KEY],
      useFactory: (config: ConfigType<typeof settings>) => logParameters(config.logLevel),
    }),
    DatabaseModule,
    StudyCountingModule,
    SearchingModule,
  ],
  providers: [
    StudyWork,
    Searcher,
    SearchWork,
    {
      provide: JobWorker,
      inject: [Jobs, StudyWork, SearchWork],
      useFactory: (jobs: Jobs, ...kinds: Work[]) => new JobWorker(jobs, kinds),
    },
  ],
})
export class WorkerModule {}
