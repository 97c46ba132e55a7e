import { Module } from '@nestjs/common';
import { CushionOrdersModule } from '../../cushion-orders/cushion-orders.module';
import { SetsModule } from '../../sets/sets.module';
import { CastModule } from '../cast.module';
import { CastErasureController } from './cast-erasure.controller';
import { CastErasureService } from './cast-erasure.service';
import { ErasedNames } from './erased-names.service';

/** Stands above cast, sets and orders, as it changes all of them. */
@Module({
  imports: [CastModule, SetsModule, CushionOrdersModule],
  controllers: [CastErasureController],
  providers: [CastErasureService, ErasedNames],
})
export class CastErasureModule {}
