import { Module } from '@nestjs/common';
import { ConfigModule, type ConfigType } from '@nestjs/config';
import { ScheduleModule } from '@nestjs/schedule';
import { LoggerModule } from 'nestjs-pino';
import { ArrangementsModule } from './arrangements/arrangements.module';
import { AuditModule } from './audit/audit.module';
import { AuthModule } from './auth/auth.module';
import { CastModule } from './cast/cast.module';
import { CastErasureModule } from './cast/erasure/cast-erasure.module';
import { MeasuringModule } from './cast/measuring/measuring.module';
import { ChoicesModule } from './choices/choices.module';
import { logParameters } from './common/request-log';
import { settings } from './config/settings';
import { CushionOrdersModule } from './cushion-orders/cushion-orders.module';
import { CushionSettingsModule } from './cushion-settings/cushion-settings.module';
import { DatabaseModule } from './database/database.module';
import { DemoModule } from './demo/demo.module';
import { HealthModule } from './health/health.module';
import { InvitationsModule } from './invitations/invitations.module';
import { MailModule } from './mail/mail.module';
import { PopulationsModule } from './populations/populations.module';
import { ProductionDuplicationModule } from './productions/duplication/production-duplication.module';
import { ProductionsModule } from './productions/productions.module';
import { RateLimitsModule } from './rate-limits/rate-limits.module';
import { SetsModule } from './sets/sets.module';
import { StudiesModule } from './studies/studies.module';
import { SuggestionsModule } from './suggestions/suggestions.module';
import { TestSitsModule } from './test-sits/test-sits.module';
import { UpholsterersModule } from './upholsterers/upholsterers.module';
import { UsersModule } from './users/users.module';
import { WorkshopsModule } from './workshops/workshops.module';

@Module({
  imports: [
    ConfigModule.forRoot({ isGlobal: true, ignoreEnvFile: true, load: [settings] }),
    LoggerModule.forRootAsync({
      inject: [settings.KEY],
      useFactory: (config: ConfigType<typeof settings>) => logParameters(config.logLevel),
    }),
    ScheduleModule.forRoot(),
    DatabaseModule,
    RateLimitsModule,
    MailModule,
    AuditModule,
    HealthModule,
    UsersModule,
    WorkshopsModule,
    AuthModule,
    InvitationsModule,
    ProductionsModule,
    CastModule,
    SetsModule,
    TestSitsModule,
    PopulationsModule,
    StudiesModule,
    SuggestionsModule,
    ChoicesModule,
    UpholsterersModule,
    CushionSettingsModule,
    ArrangementsModule,
    CushionOrdersModule,
    DemoModule,
    CastErasureModule,
    MeasuringModule,
    ProductionDuplicationModule,
  ],
})
export class AppModule {}
