import { Module } from '@nestjs/common';
import { TypeOrmModule } from '@nestjs/typeorm';
import { ProductionsModule } from '../productions/productions.module';
import { SetsModule } from '../sets/sets.module';
import { UpholsterersModule } from '../upholsterers/upholsterers.module';
import { UsersModule } from '../users/users.module';
import { WorkshopsModule } from '../workshops/workshops.module';
import { CushionOrder } from './entities/cushion-order.entity';
import { HeldPapers } from './held-papers.service';
import { IssuedSets } from './issued-sets.service';
import { LinkController } from './link.controller';
import { LinkService } from './link.service';
import { OrderCorrespondence } from './order-correspondence.service';
import { OrderPaper } from './order-paper.service';
import { OrderProgress } from './order-progress.service';
import { OrderTexts } from './order-texts.service';
import { OrderViews } from './order-views.service';
import { OrdersController } from './orders.controller';
import { OrdersService } from './orders.service';

@Module({
  imports: [
    TypeOrmModule.forFeature([CushionOrder]),
    ProductionsModule,
    SetsModule,
    UpholsterersModule,
    UsersModule,
    WorkshopsModule,
  ],
  controllers: [OrdersController, LinkController],
  providers: [
    IssuedSets,
    OrdersService,
    OrderCorrespondence,
    OrderProgress,
    OrderViews,
    OrderPaper,
    LinkService,
    OrderTexts,
    HeldPapers,
  ],
  exports: [OrdersService, OrderCorrespondence, LinkService, OrderTexts, HeldPapers],
})
export class CushionOrdersModule {}
