import { Module } from '@nestjs/common';
import { TypeOrmModule } from '@nestjs/typeorm';
import { CastModule } from '../cast/cast.module';
import { SetsModule } from '../sets/sets.module';
import { TestSitRow } from './test-sit.entity';
import { TestSitsController } from './test-sits.controller';
import { TestSitsService } from './test-sits.service';

@Module({
  imports: [TypeOrmModule.forFeature([TestSitRow]), SetsModule, CastModule],
  controllers: [TestSitsController],
  providers: [TestSitsService],
})
export class TestSitsModule {}
