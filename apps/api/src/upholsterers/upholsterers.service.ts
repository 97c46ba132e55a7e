import { Injectable } from '@nestjs/common';
import { InjectRepository } from '@nestjs/typeorm';
import { type EntityManager, IsNull, QueryFailedError, type Repository } from 'typeorm';
import { AuditService } from '../audit/audit.service';
import type { MemberInfo } from '../common/access.decorator';
import type { Page, PageQuery } from '../common/page.dto';
import { Problem } from '../common/problem';
import { readPage } from '../common/read-page';
import type { CreateUpholstererDto, UpdateUpholstererDto } from './dto/upholsterer.dto';
import { Upholsterer } from './entities/upholsterer.entity';

const FOREIGN_KEY_VIOLATION = '23503';

@Injectable()
export class UpholsterersService {
  constructor(
    @InjectRepository(Upholsterer) private readonly upholsterers: Repository<Upholsterer>,
    private readonly audit: AuditService,
  ) {}

  list(workshopId: string, page: PageQuery): Promise<Page<Upholsterer>> {
    const query = this.upholsterers
      .createQueryBuilder('upholsterer')
      .where('upholsterer.workshopId = :workshopId AND upholsterer.removedAt IS NULL', { workshopId });
    return readPage(query, page, {
      sortable: { name: 'upholsterer.name', createdAt: 'upholsterer.createdAt' },
      defaultSort: 'name',
      tieBreak: 'upholsterer.id',
      searchIn: ['upholsterer.name', 'upholsterer.contactName', 'upholsterer.email'],
    });
  }

  /** One that is still in the book. */
  async get(workshopId: string, id: string, manager?: EntityManager): Promise<Upholsterer> {
    const repository = manager?.getRepository(Upholsterer) ?? this.upholsterers;
    const found = await repository.findOneBy({ id, workshopId, removedAt: IsNull() });
    if (!found) throw Problem.notFound('upholsterer');
    return found;
  }

  /** The names of those that orders cite, also of removed ones. */
  async named(workshopId: string, ids: readonly string[]): Promise<Map<string, Upholsterer>> {
    if (ids.length === 0) return new Map();
    const found = await this.upholsterers
      .createQueryBuilder('upholsterer')
      .where('upholsterer.workshopId = :workshopId AND upholsterer.id IN (:...ids)', { workshopId, ids })
      .getMany();
    return new Map(found.map((upholsterer) => [upholsterer.id, upholsterer]));
  }

  async create(member: MemberInfo, values: CreateUpholstererDto): Promise<Upholsterer> {
    return this.upholsterers.manager.transaction(async (manager) => {
      const made = await manager.save(
        manager.create(Upholsterer, {
          name: values.name,
          contactName: values.contactName ?? '',
          email: values.email,
          telephone: values.telephone ?? '',
          notes: values.notes ?? '',
          leadDays: values.leadDays ?? null,
          clothNotes: values.clothNotes ?? '',
          units: values.units ?? null,
          paper: values.paper ?? null,
          currency: values.currency ?? null,
          accountId: values.accountId ?? null,
          workshopId: member.workshopId,
          removedAt: null,
        }),
      );
      await this.record(manager, member, 'upholsterer.added', made.id);
      return made;
    });
  }

  async update(member: MemberInfo, id: string, values: UpdateUpholstererDto): Promise<Upholsterer> {
    return this.upholsterers.manager.transaction(async (manager) => {
      const found = await this.get(member.workshopId, id, manager);
      const changed = await manager.save(Object.assign(found, given(values)));
      await this.record(manager, member, 'upholsterer.changed', id);
      return changed;
    });
  }

  async remove(member: MemberInfo, id: string): Promise<void> {
    await this.upholsterers.manager.transaction(async (manager) => {
      const found = await this.get(member.workshopId, id, manager);
      if (!(await deleteUncited(manager, id))) {
        const nothing = {
          contactName: '',
          email: '',
          telephone: '',
          notes: '',
          clothNotes: '',
          accountId: null,
        };
        await manager.save(Object.assign(found, nothing, { removedAt: new Date() }));
      }
      await this.record(manager, member, 'upholsterer.removed', id);
    });
  }

  private record(manager: EntityManager, member: MemberInfo, action: string, id: string): Promise<void> {
    const { workshopId, userId } = member;
    return this.audit.record(manager, {
      workshopId,
      userId,
      action,
      subjectType: 'upholsterer',
      subjectId: id,
    });
  }
}

/** What has no value in a book that is empty there; null empties it. */
const MAY_BE_EMPTY = new Set(['leadDays', 'units', 'paper', 'currency', 'accountId']);

/** Absent leaves a field as it is; null does so too where a field always holds something. */
function given(values: UpdateUpholstererDto): UpdateUpholstererDto {
  return Object.fromEntries(
    Object.entries(values).filter(
      ([name, value]) => value !== undefined && (value !== null || MAY_BE_EMPTY.has(name)),
    ),
  );
}

/** False when an order cites it; the surrounding transaction goes on. */
async function deleteUncited(manager: EntityManager, id: string): Promise<boolean> {
  try {
    await manager.transaction((inner) => inner.delete(Upholsterer, { id }));
    return true;
  } catch (fault) {
    const code =
      fault instanceof QueryFailedError ? (fault.driverError as { code?: string }).code : undefined;
    if (code === FOREIGN_KEY_VIOLATION) return false;
    throw fault;
  }
}
