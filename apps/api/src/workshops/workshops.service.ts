import { Injectable } from '@nestjs/common';
import { InjectDataSource } from '@nestjs/typeorm';
import { DataSource, type EntityManager } from 'typeorm';
import { AuditService } from '../audit/audit.service';
import type { MemberInfo, Role } from '../common/access.decorator';
import { Problem } from '../common/problem';
import { Membership } from './entities/membership.entity';
import { Workshop } from './entities/workshop.entity';

export interface WorkshopOfUser {
  id: string;
  name: string;
  role: Role;
  isDemo: boolean;
}

export type WorkshopChanges = Partial<
  Pick<Workshop, 'name' | 'telephone' | 'paper' | 'timeZone' | 'confidence'>
>;

@Injectable()
export class WorkshopsService {
  constructor(
    @InjectDataSource() private readonly dataSource: DataSource,
    private readonly audit: AuditService,
  ) {}

  async get(workshopId: string, manager: EntityManager = this.dataSource.manager): Promise<Workshop> {
    const workshop = await manager.findOneBy(Workshop, { id: workshopId });
    if (!workshop) throw Problem.notFound('workshop');
    return workshop;
  }

  /** Held until the transaction ends: who belongs to the workshop does not change meanwhile. */
  async lock(manager: EntityManager, workshopId: string): Promise<Workshop> {
    const lock = { mode: 'pessimistic_write' } as const;
    const workshop = await manager.findOne(Workshop, { where: { id: workshopId }, lock });
    if (!workshop) throw Problem.notFound('workshop');
    return workshop;
  }

  async findRole(
    workshopId: string,
    userId: string,
    manager: EntityManager = this.dataSource.manager,
  ): Promise<Role | null> {
    const membership = await manager.findOneBy(Membership, { workshopId, userId });
    return membership?.role ?? null;
  }

  async ofUser(userId: string): Promise<WorkshopOfUser[]> {
    const memberships = await this.dataSource.manager.find(Membership, {
      where: { userId },
      relations: { workshop: true },
      order: { createdAt: 'ASC' },
    });
    return memberships.map(({ role, workshop }) => ({
      id: workshop.id,
      name: workshop.name,
      role,
      isDemo: workshop.isDemo,
    }));
  }

  /** A new workshop with its first owner. */
  async create(
    manager: EntityManager,
    ownerId: string,
    workshop: WorkshopChanges & { name: string; isDemo?: boolean },
  ): Promise<Workshop> {
    const created = await manager.save(Workshop, manager.create(Workshop, workshop));
    await this.addMember(manager, created.id, ownerId, 'owner');
    return created;
  }

  async change({ workshopId, userId }: MemberInfo, changes: WorkshopChanges): Promise<Workshop> {
    const given = Object.fromEntries(Object.entries(changes).filter(([, value]) => value !== undefined));
    return this.dataSource.transaction(async (manager) => {
      const workshop = await this.lock(manager, workshopId);
      const from = workshop.confidence;
      Object.assign(workshop, given);
      if (workshop.confidence !== from) {
        workshop.confidenceSetAt = new Date();
        await this.audit.record(manager, {
          workshopId,
          userId,
          action: 'workshop.confidence-changed',
          subjectType: 'workshop',
          subjectId: workshopId,
          detail: { from, to: workshop.confidence },
        });
      }
      return manager.save(workshop);
    });
  }

  async addMember(manager: EntityManager, workshopId: string, userId: string, role: Role): Promise<void> {
    await manager.insert(Membership, { workshopId, userId, role });
  }
}
