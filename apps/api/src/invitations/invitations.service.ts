import { Injectable } from '@nestjs/common';
import { InjectDataSource } from '@nestjs/typeorm';
import { DataSource, IsNull } from 'typeorm';
import { AuditService } from '../audit/audit.service';
import type { MemberInfo } from '../common/access.decorator';
import type { Page, PageQuery } from '../common/page.dto';
import { Problem } from '../common/problem';
import { readPage } from '../common/read-page';
import { hashToken, newToken } from '../common/secret-token';
import { InjectSettings, type Settings } from '../config/settings';
import { MailService } from '../mail/mail.service';
import { RateLimits } from '../rate-limits/rate-limits.service';
import { comparableEmail, UsersService } from '../users/users.service';
import { WorkshopsService } from '../workshops/workshops.service';
import type { InvitationDto, InviteDto } from './dto/invitation.dto';
import { Invitation } from './entities/invitation.entity';
import { invitationMail } from './invitation-mail';

const VALID_MS = 7 * 86_400_000;

@Injectable()
export class InvitationsService {
  constructor(
    @InjectDataSource() private readonly dataSource: DataSource,
    @InjectSettings() private readonly config: Settings,
    private readonly users: UsersService,
    private readonly workshops: WorkshopsService,
    private readonly mails: MailService,
    private readonly limits: RateLimits,
    private readonly audit: AuditService,
  ) {}

  async list(workshopId: string, page: PageQuery): Promise<Page<InvitationDto>> {
    const query = this.dataSource
      .createQueryBuilder(Invitation, 'invitation')
      .innerJoinAndSelect('invitation.invitedBy', 'invitedBy')
      .where('invitation.workshopId = :workshopId', { workshopId })
      .andWhere('invitation.acceptedAt IS NULL AND invitation.withdrawnAt IS NULL');
    const found = await readPage(query, page, {
      sortable: { email: 'invitation.email', createdAt: 'invitation.createdAt', role: 'invitation.role' },
      defaultSort: 'email',
      tieBreak: 'invitation.id',
      searchIn: ['invitation.email'],
    });
    return { ...found, items: found.items.map(present) };
  }

  /** A second invitation to the same address takes the place of the first. */
  async invite(member: MemberInfo, { email, role }: InviteDto): Promise<InvitationDto> {
    const invitedBy = await this.users.requireConfirmedEmail(member.userId);
    await this.limits.take('invitation', member.userId);
    const { workshopId } = member;
    const address = comparableEmail(email);
    await this.refuseMember(workshopId, address);
    return this.dataSource.transaction(async (manager) => {
      const workshop = await this.workshops.lock(manager, workshopId);
      const pending = { workshopId, email: address, acceptedAt: IsNull(), withdrawnAt: IsNull() };
      await manager.update(Invitation, pending, { withdrawnAt: new Date() });
      const token = newToken();
      const made = manager.create(Invitation, {
        workshopId,
        email: address,
        role,
        tokenHash: hashToken(token),
        invitedById: invitedBy.id,
        expiresAt: new Date(Date.now() + VALID_MS),
      });
      const invitation = await manager.save(Invitation, made);
      await this.mails.enqueue(
        manager,
        invitationMail({
          to: address,
          workshopId,
          workshopName: workshop.name,
          invitedByName: invitedBy.name,
          role,
          expiresAt: invitation.expiresAt,
          link: `${this.config.publicUrl}/invitation/${token}`,
        }),
      );
      await this.audit.record(manager, {
        workshopId,
        userId: member.userId,
        action: 'invited',
        subjectType: 'invitation',
        subjectId: invitation.id,
        detail: { role },
      });
      return present({ ...invitation, invitedBy });
    });
  }

  async withdraw(member: MemberInfo, invitationId: string): Promise<void> {
    const { workshopId } = member;
    const pending = { id: invitationId, workshopId, acceptedAt: IsNull(), withdrawnAt: IsNull() };
    const changed = await this.dataSource.manager.update(Invitation, pending, { withdrawnAt: new Date() });
    if (changed.affected !== 1) throw Problem.notFound('invitation');
  }

  private async refuseMember(workshopId: string, email: string): Promise<void> {
    const holder = await this.users.findConfirmed(email);
    if (holder && (await this.workshops.findRole(workshopId, holder.id))) {
      throw Problem.conflict('already-member', 'This person is a member already.');
    }
  }
}

function present(invitation: Invitation): InvitationDto {
  const { id, email, role, invitedBy, createdAt, expiresAt } = invitation;
  return { id, email, role, invitedBy: { id: invitedBy.id, name: invitedBy.name }, createdAt, expiresAt };
}
