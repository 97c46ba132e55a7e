import { Module } from '@nestjs/common';
import { TypeOrmModule } from '@nestjs/typeorm';
import { CastModule } from '../cast/cast.module';
import { FitChecksModule } from '../fit-checks/fit-checks.module';
import { PopulationsModule } from '../populations/populations.module';
import { ProductionsModule } from '../productions/productions.module';
import { SetsModule } from '../sets/sets.module';
import { DimensionSearch } from './entities/dimension-search.entity';
import { SearchingModule } from './searching.module';
import { SuggestionsController } from './suggestions.controller';
import { SuggestionsService } from './suggestions.service';

@Module({
  imports: [
    TypeOrmModule.forFeature([DimensionSearch]),
    SearchingModule,
    SetsModule,
    CastModule,
    FitChecksModule,
    PopulationsModule,
    ProductionsModule,
  ],
  controllers: [SuggestionsController],
  providers: [SuggestionsService],
})
export class SuggestionsModule {}
