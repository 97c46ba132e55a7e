import { Module } from '@nestjs/common';
import { FitCheckService } from './fit-check.service';

@Module({ providers: [FitCheckService], exports: [FitCheckService] })
export class FitChecksModule {}
