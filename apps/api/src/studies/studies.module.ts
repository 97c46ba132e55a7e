import { Module } from '@nestjs/common';
import { TypeOrmModule } from '@nestjs/typeorm';
import { PopulationsModule } from '../populations/populations.module';
import { SetsModule } from '../sets/sets.module';
import { Study } from './entities/study.entity';
import { StudiesController } from './studies.controller';
import { StudiesService } from './studies.service';
import { StudyCountingModule } from './study-counting.module';

@Module({
  imports: [TypeOrmModule.forFeature([Study]), StudyCountingModule, PopulationsModule, SetsModule],
  controllers: [StudiesController],
  providers: [StudiesService],
})
export class StudiesModule {}
