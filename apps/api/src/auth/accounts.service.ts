import { Injectable } from '@nestjs/common';
import { InjectDataSource } from '@nestjs/typeorm';
import { DataSource } from 'typeorm';
import { Problem } from '../common/problem';
import { hashToken } from '../common/secret-token';
import { InjectSettings, type Settings } from '../config/settings';
import { MailService } from '../mail/mail.service';
import { RateLimits } from '../rate-limits/rate-limits.service';
import type { User } from '../users/entities/user.entity';
import { comparableEmail, UsersService } from '../users/users.service';
import { WorkshopsService } from '../workshops/workshops.service';
import { addressKnownMail, confirmAddressMail } from './account-mails';
import type { SignInDto, SignUpDto } from './dto/account.dto';
import type { MeDto } from './dto/session.dto';
import { MailedTokensService } from './mailed-tokens.service';
import { PasswordsService } from './passwords.service';
import { type IssuedTokens, SessionsService } from './sessions.service';

@Injectable()
export class AccountsService {
  constructor(
    @InjectDataSource() private readonly dataSource: DataSource,
    @InjectSettings() private readonly config: Settings,
    private readonly users: UsersService,
    private readonly workshops: WorkshopsService,
    private readonly sessions: SessionsService,
    private readonly passwords: PasswordsService,
    private readonly tokens: MailedTokensService,
    private readonly mails: MailService,
    private readonly limits: RateLimits,
  ) {}

  /**
   * The same answer whether or not the address is known: a second account that can never confirm it, and a
   * word to the address itself.
   */
  async signUp(wanted: SignUpDto, ip: string): Promise<IssuedTokens> {
    await this.limits.take('sign-up-ip', ip);
    await this.limits.take('mail-address', hashToken(comparableEmail(wanted.email)));
    const passwordHash = await this.passwords.hash(wanted.password);
    return this.dataSource.transaction(async (manager) => {
      const known = await this.users.findConfirmed(wanted.email, manager);
      const user = await this.users.create(manager, { ...wanted, passwordHash, emailConfirmed: false });
      await this.workshops.create(manager, user.id, { name: wanted.workshopName });
      const token = await this.tokens.issue(manager, user.id, 'email-confirm', user.email);
      const mail = known
        ? addressKnownMail(user.email, this.config.publicUrl)
        : confirmAddressMail(user.email, this.config.publicUrl, token);
      await this.mails.enqueue(manager, mail);
      return this.sessions.open(manager, user.id);
    });
  }

  async signIn(given: SignInDto, ip: string): Promise<IssuedTokens> {
    const user = await this.prove(given.email, given.password, ip);
    return this.sessions.open(this.dataSource.manager, user.id);
  }

  /** The account of this address and password; one answer for every way of being wrong. */
  async prove(email: string, password: string, ip: string): Promise<User> {
    const pair = hashToken(`${comparableEmail(email)} ${ip}`);
    await this.limits.take('sign-in-ip', ip);
    await this.limits.take('sign-in-address-and-ip', pair);
    const confirmed = await this.users.findConfirmed(email);
    const unconfirmed = await this.users.findUnconfirmed(email);
    const isConfirmed = await this.passwords.matches(confirmed?.passwordHash ?? null, password);
    const isUnconfirmed = await this.passwords.matches(unconfirmed?.passwordHash ?? null, password);
    const user = isConfirmed ? confirmed : isUnconfirmed ? unconfirmed : null;
    if (!user) throw new Problem(401, 'wrong-credentials', 'Address and password do not go together.');
    await this.limits.forget('sign-in-address-and-ip', pair);
    return user;
  }

  async me(userId: string): Promise<MeDto> {
    const { id, name, email, emailConfirmedAt } = await this.users.get(userId);
    return {
      user: { id, name, email, emailConfirmed: emailConfirmedAt !== null },
      workshops: await this.workshops.ofUser(userId),
    };
  }

  async rename(userId: string, name: string): Promise<MeDto> {
    await this.users.rename(userId, name);
    return this.me(userId);
  }
}
