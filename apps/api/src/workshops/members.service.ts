import { Injectable } from '@nestjs/common';
import { InjectDataSource } from '@nestjs/typeorm';
import { DataSource, type EntityManager } from 'typeorm';
import { AuditService } from '../audit/audit.service';
import type { MemberInfo, Role } from '../common/access.decorator';
import type { Page, PageQuery } from '../common/page.dto';
import { Problem } from '../common/problem';
import { readPage } from '../common/read-page';
import type { MemberDto } from './dto/workshop.dto';
import { Membership } from './entities/membership.entity';
import { WorkshopsService } from './workshops.service';

@Injectable()
export class MembersService {
  constructor(
    @InjectDataSource() private readonly dataSource: DataSource,
    private readonly workshops: WorkshopsService,
    private readonly audit: AuditService,
  ) {}

  async list(asking: MemberInfo, page: PageQuery): Promise<Page<MemberDto>> {
    const query = this.dataSource
      .createQueryBuilder(Membership, 'membership')
      .innerJoinAndSelect('membership.user', 'user')
      .where('membership.workshopId = :workshopId', { workshopId: asking.workshopId });
    const found = await readPage(query, page, {
      sortable: { name: 'user.name', role: 'membership.role', joinedAt: 'membership.createdAt' },
      defaultSort: 'name',
      tieBreak: 'membership.userId',
      searchIn: ['user.name'],
    });
    return { ...found, items: found.items.map((membership) => present(membership, asking.role)) };
  }

  async changeRole(asking: MemberInfo, userId: string, role: Role): Promise<MemberDto> {
    return this.dataSource.transaction(async (manager) => {
      const membership = await this.lockedMembership(manager, asking.workshopId, userId);
      if (role !== 'owner') await this.keepAnOwner(manager, membership);
      await manager.update(Membership, { workshopId: asking.workshopId, userId }, { role });
      await this.audit.record(manager, {
        workshopId: asking.workshopId,
        userId: asking.userId,
        action: 'member-role-changed',
        subjectType: 'user',
        subjectId: userId,
        detail: { from: membership.role, to: role },
      });
      return present({ ...membership, role }, asking.role);
    });
  }

  /** The owner removes others; anybody may leave. */
  async remove(asking: MemberInfo, userId: string): Promise<void> {
    if (asking.role !== 'owner' && asking.userId !== userId) {
      throw Problem.forbidden('role-not-allowed', 'Only an owner removes somebody else.');
    }
    await this.dataSource.transaction(async (manager) => {
      const membership = await this.lockedMembership(manager, asking.workshopId, userId);
      await this.keepAnOwner(manager, membership);
      await manager.delete(Membership, { workshopId: asking.workshopId, userId });
      await this.audit.record(manager, {
        workshopId: asking.workshopId,
        userId: asking.userId,
        action: asking.userId === userId ? 'member-left' : 'member-removed',
        subjectType: 'user',
        subjectId: userId,
      });
    });
  }

  /** The workshop's row is locked, so that two owners cannot both step down at once. */
  private async lockedMembership(
    manager: EntityManager,
    workshopId: string,
    userId: string,
  ): Promise<Membership> {
    await this.workshops.lock(manager, workshopId);
    const membership = await manager.findOne(Membership, {
      where: { workshopId, userId },
      relations: { user: true },
    });
    if (!membership) throw Problem.notFound('member');
    return membership;
  }

  private async keepAnOwner(manager: EntityManager, membership: Membership): Promise<void> {
    if (membership.role !== 'owner') return;
    const owners = await manager.countBy(Membership, { workshopId: membership.workshopId, role: 'owner' });
    if (owners === 1) {
      throw Problem.conflict(
        'last-owner',
        'A workshop keeps at least one owner. Make somebody else owner first.',
      );
    }
  }
}

function present(membership: Membership, seenBy: Role): MemberDto {
  return {
    userId: membership.userId,
    name: membership.user.name,
    ...(seenBy === 'owner' ? { email: membership.user.email } : {}),
    role: membership.role,
    joinedAt: membership.createdAt,
  };
}
