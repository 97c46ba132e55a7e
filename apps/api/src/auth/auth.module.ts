import { Module } from '@nestjs/common';
import type { ConfigType } from '@nestjs/config';
import { APP_GUARD, DiscoveryModule } from '@nestjs/core';
import { JwtModule } from '@nestjs/jwt';
import { PassportModule } from '@nestjs/passport';
import { settings } from '../config/settings';
import { UsersModule } from '../users/users.module';
import { WorkshopsModule } from '../workshops/workshops.module';
import { AccessGuard } from './access.guard';
import { AccessRulesCheck } from './access-rules-check';
import { JwtStrategy } from './jwt.strategy';
import { SessionsService } from './sessions.service';

@Module({
  imports: [
    DiscoveryModule,
    PassportModule,
    UsersModule,
    WorkshopsModule,
    JwtModule.registerAsync({
      inject: [settings.KEY],
      useFactory: (config: ConfigType<typeof settings>) => ({
        secret: config.jwtSecret,
        signOptions: { algorithm: 'HS256' },
      }),
    }),
  ],
  providers: [JwtStrategy, SessionsService, AccessRulesCheck, { provide: APP_GUARD, useClass: AccessGuard }],
  exports: [SessionsService],
})
export class AuthModule {}
