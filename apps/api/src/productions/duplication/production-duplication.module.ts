import { Module } from '@nestjs/common';
import { CastModule } from '../../cast/cast.module';
import { SetsModule } from '../../sets/sets.module';
import { ProductionsModule } from '../productions.module';
import { ProductionDuplicationController } from './production-duplication.controller';
import { ProductionDuplicationService } from './production-duplication.service';

/** Stands above cast and sets, as it copies both. */
@Module({
  imports: [ProductionsModule, CastModule, SetsModule],
  controllers: [ProductionDuplicationController],
  providers: [ProductionDuplicationService],
})
export class ProductionDuplicationModule {}
