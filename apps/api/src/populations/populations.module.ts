import { Module } from '@nestjs/common';
import { TypeOrmModule } from '@nestjs/typeorm';
import { OwnPopulation } from './entities/own-population.entity';
import { PopulationsController } from './populations.controller';
import { PopulationsService } from './populations.service';

@Module({
  imports: [TypeOrmModule.forFeature([OwnPopulation])],
  controllers: [PopulationsController],
  providers: [PopulationsService],
  exports: [PopulationsService],
})
export class PopulationsModule {}
