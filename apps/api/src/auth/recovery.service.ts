import { Injectable } from '@nestjs/common';
import { InjectDataSource } from '@nestjs/typeorm';
import { DataSource } from 'typeorm';
import { AuditService } from '../audit/audit.service';
import { Problem } from '../common/problem';
import { hashToken } from '../common/secret-token';
import { InjectSettings, type Settings } from '../config/settings';
import { MailService } from '../mail/mail.service';
import { RateLimits } from '../rate-limits/rate-limits.service';
import { comparableEmail, UsersService } from '../users/users.service';
import {
  addressChangedMail,
  addressKnownMail,
  changeAddressMail,
  confirmAddressMail,
  passwordChangedMail,
  resetPasswordMail,
} from './account-mails';
import { MailedTokensService } from './mailed-tokens.service';
import { PasswordsService } from './passwords.service';
import { SessionsService } from './sessions.service';

/** Everything that is proved by a mailed link. */
@Injectable()
export class RecoveryService {
  constructor(
    @InjectDataSource() private readonly dataSource: DataSource,
    @InjectSettings() private readonly config: Settings,
    private readonly users: UsersService,
    private readonly sessions: SessionsService,
    private readonly passwords: PasswordsService,
    private readonly tokens: MailedTokensService,
    private readonly mails: MailService,
    private readonly limits: RateLimits,
    private readonly audit: AuditService,
  ) {}

  /** Says nothing about whether the address is known. */
  async askPasswordReset(email: string, ip: string): Promise<void> {
    await this.countMail(email, ip);
    const user = (await this.users.findConfirmed(email)) ?? (await this.users.findUnconfirmed(email));
    if (!user) return;
    await this.dataSource.transaction(async (manager) => {
      const token = await this.tokens.issue(manager, user.id, 'password-reset', user.email);
      await this.mails.enqueue(manager, resetPasswordMail(user.email, this.config.publicUrl, token));
    });
  }

  /** The link proves the address as well; every session of the account ends. */
  async resetPassword(token: string, password: string, ip: string): Promise<void> {
    await this.limits.take('token-ip', ip);
    const passwordHash = await this.passwords.hash(password);
    await this.dataSource.transaction(async (manager) => {
      const { userId, email } = await this.tokens.redeem(manager, token, ['password-reset']);
      await this.users.setPassword(manager, userId, passwordHash);
      const user = await this.users.get(userId, manager);
      if (user.email === email) await this.users.confirmEmail(manager, userId, email);
      await this.sessions.endAll(manager, userId, 'password-changed');
      await this.tokens.revoke(manager, userId, 'email-change');
      await this.mails.enqueue(manager, passwordChangedMail(user.email, this.config.publicUrl));
      await this.audit.record(manager, {
        workshopId: null,
        userId,
        action: 'password-reset',
        subjectType: 'user',
        subjectId: userId,
      });
    });
  }

  async resendConfirmation(userId: string, ip: string): Promise<void> {
    const user = await this.users.get(userId);
    if (user.emailConfirmedAt) return;
    await this.countMail(user.email, ip);
    await this.dataSource.transaction(async (manager) => {
      const known = await this.users.findConfirmed(user.email, manager);
      const token = await this.tokens.issue(manager, userId, 'email-confirm', user.email);
      const mail = known
        ? addressKnownMail(user.email, this.config.publicUrl)
        : confirmAddressMail(user.email, this.config.publicUrl, token);
      await this.mails.enqueue(manager, mail);
    });
  }

  async askEmailChange(userId: string, newEmail: string, password: string, ip: string): Promise<void> {
    const user = await this.users.get(userId);
    await this.limits.take('sign-in-address-and-ip', hashToken(`${user.email} ${ip}`));
    if (!(await this.passwords.matches(user.passwordHash, password))) {
      throw Problem.invalid([{ path: 'password', code: 'wrong', message: 'This is not your password.' }]);
    }
    await this.countMail(newEmail, ip);
    await this.dataSource.transaction(async (manager) => {
      const holder = await this.users.findConfirmed(newEmail, manager);
      const email = comparableEmail(newEmail);
      const token = await this.tokens.issue(manager, userId, 'email-change', email);
      const mail =
        holder && holder.id !== userId
          ? addressKnownMail(email, this.config.publicUrl)
          : changeAddressMail(email, this.config.publicUrl, token);
      await this.mails.enqueue(manager, mail);
    });
  }

  async confirmEmail(token: string, ip: string): Promise<string> {
    await this.limits.take('token-ip', ip);
    return this.dataSource.transaction(async (manager) => {
      const redeemed = await this.tokens.redeem(manager, token, ['email-confirm', 'email-change']);
      const { userId, email, purpose } = redeemed;
      const before = await this.users.get(userId, manager);
      if (purpose === 'email-confirm' && before.email !== email) {
        throw new Problem(400, 'link-not-valid', 'Your account uses another address by now.');
      }
      await this.users.confirmEmail(manager, userId, email);
      if (purpose === 'email-change' && before.emailConfirmedAt && before.email !== email) {
        await this.tokens.revoke(manager, userId, 'password-reset');
        const notice = addressChangedMail(before.email, email, this.config.publicUrl);
        await this.mails.enqueue(manager, notice);
      }
      return email;
    });
  }

  private async countMail(email: string, ip: string): Promise<void> {
    await this.limits.take('mail-ip', ip);
    await this.limits.take('mail-address', hashToken(comparableEmail(email)));
  }
}
