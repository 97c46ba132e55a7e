import { Module } from '@nestjs/common';
import { TypeOrmModule } from '@nestjs/typeorm';
import { WorkshopsModule } from '../workshops/workshops.module';
import { ArrangementsController } from './arrangements.controller';
import { ArrangementsService } from './arrangements.service';
import { KeptArrangement } from './kept-arrangement.entity';

@Module({
  imports: [TypeOrmModule.forFeature([KeptArrangement]), WorkshopsModule],
  controllers: [ArrangementsController],
  providers: [ArrangementsService],
})
export class ArrangementsModule {}
