import { Module } from '@nestjs/common';
import { FitChecksModule } from '../../fit-checks/fit-checks.module';
import { ProductionsModule } from '../../productions/productions.module';
import { SetsModule } from '../../sets/sets.module';
import { WorkshopsModule } from '../../workshops/workshops.module';
import { CastModule } from '../cast.module';
import { MeasureNextService } from './measure-next.service';
import { MeasuringController } from './measuring.controller';
import { MeasuringSheetService } from './measuring-sheet.service';

/** Stands above cast and sets: what to measure follows from where people sit. */
@Module({
  imports: [CastModule, SetsModule, FitChecksModule, ProductionsModule, WorkshopsModule],
  controllers: [MeasuringController],
  providers: [MeasureNextService, MeasuringSheetService],
})
export class MeasuringModule {}
