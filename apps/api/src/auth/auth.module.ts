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
import { AccountsService } from './accounts.service';
import { AuthController } from './auth.controller';
import { CleanUp } from './clean-up';
import { JwtStrategy } from './jwt.strategy';
import { MailedTokensService } from './mailed-tokens.service';
import { PasswordsService } from './passwords.service';
import { RecoveryController } from './recovery.controller';
import { RecoveryService } from './recovery.service';
import { SessionAnswers } from './session-answers';
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
  controllers: [AuthController, RecoveryController],
  providers: [
    AccessRulesCheck,
    AccountsService,
    CleanUp,
    JwtStrategy,
    MailedTokensService,
    PasswordsService,
    RecoveryService,
    SessionAnswers,
    SessionsService,
    { provide: APP_GUARD, useClass: AccessGuard },
  ],
  exports: [AccountsService, PasswordsService, SessionAnswers, SessionsService],
})
export class AuthModule {}
