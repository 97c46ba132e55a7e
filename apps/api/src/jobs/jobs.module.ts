import { Module } from '@nestjs/common';
import { Jobs } from './jobs.service';
import { WorkVersion } from './work-version';

@Module({ providers: [Jobs, WorkVersion], exports: [Jobs, WorkVersion] })
export class JobsModule {}
