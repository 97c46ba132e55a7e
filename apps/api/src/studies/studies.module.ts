import { Module } from '@nestjs/common';
import { TypeOrmModule } from '@nestjs/typeorm';
import { PopulationsModule } from '../populations/populations.module';
import { SetsModule } from '../sets/sets.module';
import { Study } from './entities/study.entity';
import { PopulationUsesController } from './population-uses.controller';
import { PopulationUses } from './population-uses.service';
import { StudiesController } from './studies.controller';
import { StudiesService } from './studies.service';
import { StudyCountingModule } from './study-counting.module';

@Module({
  imports: [TypeOrmModule.forFeature([Study]), StudyCountingModule, PopulationsModule, SetsModule],
  controllers: [StudiesController, PopulationUsesController],
  providers: [StudiesService, PopulationUses],
})
export class StudiesModule {}
