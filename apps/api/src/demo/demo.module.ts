import { Module } from '@nestjs/common';
import { AuthModule } from '../auth/auth.module';
import { CastModule } from '../cast/cast.module';
import { CushionOrdersModule } from '../cushion-orders/cushion-orders.module';
import { ProductionsModule } from '../productions/productions.module';
import { SetsModule } from '../sets/sets.module';
import { UpholsterersModule } from '../upholsterers/upholsterers.module';
import { UsersModule } from '../users/users.module';
import { WorkshopsModule } from '../workshops/workshops.module';
import { DemoLoader } from './demo-loader.service';

@Module({
  imports: [
    AuthModule,
    CastModule,
    CushionOrdersModule,
    ProductionsModule,
    SetsModule,
    UpholsterersModule,
    UsersModule,
    WorkshopsModule,
  ],
  providers: [DemoLoader],
})
export class DemoModule {}
