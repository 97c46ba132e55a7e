import { Module } from '@nestjs/common';
import { TypeOrmModule } from '@nestjs/typeorm';
import { ObjectStoreModule } from '../object-store/object-store.module';
import { PaymentsModule } from '../payments/payments.module';
import { SpecPress } from '../paper/spec-press';
import { ProductionsModule } from '../productions/productions.module';
import { SetsModule } from '../sets/sets.module';
import { UpholsterersModule } from '../upholsterers/upholsterers.module';
import { UsersModule } from '../users/users.module';
import { WorkshopsModule } from '../workshops/workshops.module';
import { DepositsController } from './deposits/deposits.controller';
import { DepositsService } from './deposits/deposits.service';
import { PaymentNewsController } from './deposits/payment-news.controller';
import { PaymentNews } from './deposits/payment-news.service';
import { CushionOrder } from './entities/cushion-order.entity';
import { FilesController } from './files/files.controller';
import { OrderFiles } from './files/files.service';
import { LinkFilesController } from './files/link-files.controller';
import { HeldPapers } from './held-papers.service';
import { InspectionsService } from './inspections/inspections.service';
import { IssuedSets } from './issued-sets.service';
import { LinkLifeController } from './life/link-life.controller';
import { OrderLifeController } from './life/order-life.controller';
import { OrderLife } from './life/order-life.service';
import { LinkLimits } from './link-limits';
import { LinkController } from './link.controller';
import { LinkService } from './link.service';
import { OrderActs } from './order-acts.service';
import { OrderCorrespondence } from './order-correspondence.service';
import { OrderLetters } from './order-letters.service';
import { LinkListsController, OrderListsController } from './order-lists.controller';
import { OrderMarks } from './order-marks.service';
import { OrderPaper } from './order-paper.service';
import { OrderProgress } from './order-progress.service';
import { OrderTexts } from './order-texts.service';
import { OrderViews } from './order-views.service';
import { OrdersController } from './orders.controller';
import { OrdersService } from './orders.service';
import { QuestionsService } from './questions/questions.service';
import { QuotesService } from './quotes/quotes.service';
import { SentCushions } from './sent-cushions.service';

@Module({
  imports: [
    TypeOrmModule.forFeature([CushionOrder]),
    ObjectStoreModule,
    PaymentsModule,
    ProductionsModule,
    SetsModule,
    UpholsterersModule,
    UsersModule,
    WorkshopsModule,
  ],
  controllers: [
    OrdersController,
    OrderLifeController,
    OrderListsController,
    DepositsController,
    PaymentNewsController,
    FilesController,
    LinkController,
    LinkLifeController,
    LinkListsController,
    LinkFilesController,
  ],
  providers: [
    IssuedSets,
    OrdersService,
    OrderCorrespondence,
    OrderProgress,
    OrderViews,
    OrderPaper,
    SpecPress,
    LinkService,
    OrderTexts,
    HeldPapers,
    SentCushions,
    LinkLimits,
    OrderLetters,
    OrderActs,
    OrderMarks,
    OrderLife,
    QuotesService,
    QuestionsService,
    InspectionsService,
    DepositsService,
    PaymentNews,
    OrderFiles,
  ],
  exports: [OrdersService, OrderCorrespondence, LinkService, OrderTexts, HeldPapers],
})
export class CushionOrdersModule {}
