import { Module } from '@nestjs/common';
import { SetsModule } from '../../sets/sets.module';
import { CastModule } from '../cast.module';
import { CastErasureController } from './cast-erasure.controller';
import { CastErasureService } from './cast-erasure.service';

/** Stands above cast and sets, as it changes both. */
@Module({
  imports: [CastModule, SetsModule],
  controllers: [CastErasureController],
  providers: [CastErasureService],
})
export class CastErasureModule {}
