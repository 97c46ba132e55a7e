import { Module } from '@nestjs/common';
import { CastModule } from '../cast/cast.module';
import { FitChecksModule } from '../fit-checks/fit-checks.module';
import { PopulationsModule } from '../populations/populations.module';
import { ProductionsModule } from '../productions/productions.module';
import { SetsModule } from '../sets/sets.module';
import { WorkshopsModule } from '../workshops/workshops.module';
import { CrowdShares } from './crowd-shares.service';
import { ComparisonsController } from './comparisons.controller';
import { ComparisonsService } from './comparisons.service';
import { DimensionMaps } from './dimension-maps.service';
import { DimensionMapsController } from './dimension-maps.controller';
import { StandInsController } from './stand-ins.controller';
import { StandInsService } from './stand-ins.service';
import { StickPapers } from './stick-papers.service';
import { StorySticks } from './story-sticks.service';
import { StorySticksController } from './story-sticks.controller';
import { VersionsService } from './versions.service';

/** What a number of a set does to its sitters: tried on the server by the functions that the browser uses. */
@Module({
  imports: [CastModule, SetsModule, FitChecksModule, PopulationsModule, ProductionsModule, WorkshopsModule],
  controllers: [StorySticksController, DimensionMapsController, ComparisonsController, StandInsController],
  providers: [
    VersionsService,
    CrowdShares,
    StorySticks,
    StickPapers,
    DimensionMaps,
    ComparisonsService,
    StandInsService,
  ],
})
export class ChoicesModule {}
