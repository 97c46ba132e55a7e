import { Injectable } from '@nestjs/common';
import { InjectDataSource } from '@nestjs/typeorm';
import { DataSource, type EntityManager } from 'typeorm';
import { AuditService } from '../audit/audit.service';
import { AccountsService } from '../auth/accounts.service';
import { PasswordsService } from '../auth/passwords.service';
import { type IssuedTokens, SessionsService } from '../auth/sessions.service';
import { Problem } from '../common/problem';
import { hashToken } from '../common/secret-token';
import { RateLimits } from '../rate-limits/rate-limits.service';
import { UsersService } from '../users/users.service';
import { WorkshopsService } from '../workshops/workshops.service';
import type { AcceptInvitationDto, OpenInvitationDto } from './dto/invitation.dto';
import { Invitation } from './entities/invitation.entity';

const LEAST_PASSWORD = 10;

/** The side of whoever got the mail. Holding the link proves the address, not the account. */
@Injectable()
export class AcceptanceService {
  constructor(
    @InjectDataSource() private readonly dataSource: DataSource,
    private readonly users: UsersService,
    private readonly workshops: WorkshopsService,
    private readonly accounts: AccountsService,
    private readonly passwords: PasswordsService,
    private readonly sessions: SessionsService,
    private readonly limits: RateLimits,
    private readonly audit: AuditService,
  ) {}

  async read(token: string): Promise<OpenInvitationDto> {
    const invitation = await this.open(this.dataSource.manager, token);
    const holder = await this.users.findConfirmed(invitation.email);
    return {
      workshopName: invitation.workshop.name,
      invitedByName: invitation.invitedBy.name,
      email: invitation.email,
      role: invitation.role,
      expiresAt: invitation.expiresAt,
      accountExists: holder !== null,
    };
  }

  async accept(
    token: string,
    given: AcceptInvitationDto,
    signedInId: string | null,
    ip: string,
  ): Promise<IssuedTokens> {
    await this.limits.take('token-ip', ip);
    const { email } = await this.open(this.dataSource.manager, token);
    const existingId = await this.existingAccount(email, given, signedInId, ip);
    const passwordHash = existingId ? null : await this.hashForNew(given);
    return this.dataSource.transaction(async (manager) => {
      const invitation = await this.open(manager, token);
      const userId = existingId ?? (await this.createAccount(manager, email, given, passwordHash));
      await this.users.confirmEmail(manager, userId, email);
      await manager.update(Invitation, { id: invitation.id }, { acceptedAt: new Date() });
      await this.join(manager, invitation, userId);
      return this.sessions.open(manager, userId);
    });
  }

  private async existingAccount(
    email: string,
    given: AcceptInvitationDto,
    signedInId: string | null,
    ip: string,
  ): Promise<string | null> {
    if (signedInId) {
      const user = await this.users.get(signedInId);
      if (user.email === email) return user.id;
      throw Problem.conflict(
        'other-account',
        `This invitation is for ${email}; you are signed in as ${user.email}. Sign out first.`,
      );
    }
    if (!(await this.users.findConfirmed(email))) return null;
    if (!given.password) {
      throw Problem.invalid([
        { path: 'password', code: 'required', message: 'Give the password of your account.' },
      ]);
    }
    return (await this.accounts.prove(email, given.password, ip)).id;
  }

  private async hashForNew({ name, password }: AcceptInvitationDto): Promise<string> {
    const fields = [];
    if (!name) fields.push({ path: 'name', code: 'required', message: 'Give your name.' });
    if (!password || password.length < LEAST_PASSWORD) {
      const message = `Choose a password of at least ${LEAST_PASSWORD} characters.`;
      fields.push({ path: 'password', code: 'length', message });
    }
    if (fields.length > 0 || !password) throw Problem.invalid(fields);
    return this.passwords.hash(password);
  }

  private async createAccount(
    manager: EntityManager,
    email: string,
    given: AcceptInvitationDto,
    passwordHash: string | null,
  ): Promise<string> {
    if (!given.name || !passwordHash)
      throw new Error('a new account was not asked for its name and password');
    const wanted = { name: given.name, email, passwordHash, emailConfirmed: false };
    return (await this.users.create(manager, wanted)).id;
  }

  private async join(manager: EntityManager, invitation: Invitation, userId: string): Promise<void> {
    const { workshopId, role, id } = invitation;
    if (await this.workshops.findRole(workshopId, userId, manager)) {
      throw Problem.conflict('already-member', 'You are a member of this workshop already.');
    }
    await this.workshops.addMember(manager, workshopId, userId, role);
    await this.audit.record(manager, {
      workshopId,
      userId,
      action: 'invitation-accepted',
      subjectType: 'invitation',
      subjectId: id,
      detail: { role },
    });
  }

  /** The row is locked inside a transaction, so that one link brings in one person. */
  private async open(manager: EntityManager, token: string): Promise<Invitation> {
    const query = manager
      .createQueryBuilder(Invitation, 'invitation')
      .innerJoinAndSelect('invitation.workshop', 'workshop')
      .innerJoinAndSelect('invitation.invitedBy', 'invitedBy')
      .where('invitation.tokenHash = :hash', { hash: hashToken(token) });
    if (manager.queryRunner?.isTransactionActive)
      query.setLock('pessimistic_write', undefined, ['invitation']);
    const invitation = await query.getOne();
    if (!invitation) throw Problem.notFound('invitation');
    if (invitation.acceptedAt || invitation.withdrawnAt || invitation.expiresAt <= new Date()) {
      throw new Problem(
        410,
        'invitation-over',
        'This invitation was used, withdrawn or is too old. Ask for a new one.',
      );
    }
    return invitation;
  }
}
