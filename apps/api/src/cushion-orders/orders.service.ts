import { Injectable } from '@nestjs/common';
import { InjectRepository } from '@nestjs/typeorm';
import type { EntityManager, Repository } from 'typeorm';
import { AuditService } from '../audit/audit.service';
import type { MemberInfo } from '../common/access.decorator';
import type { Page, PageQuery } from '../common/page.dto';
import { Problem } from '../common/problem';
import { readPage } from '../common/read-page';
import { ProductionsService } from '../productions/productions.service';
import { UsersService } from '../users/users.service';
import type { CreateOrderDto, UpdateOrderDto } from './dto/write-order.dto';
import { CushionOrder } from './entities/cushion-order.entity';
import { IssuedSets } from './issued-sets.service';
import { findOrder, lockOrder, type OrderPlace } from './order-access';
import { DEFAULT_TOLERANCE_MM, type OrderSpec, SPEC_KEYS } from './order-content';
import { recordEvent } from './order-record';
import { mayChange, STATE_WORDS } from './order-states';
import { saidCovers } from './said-covers';

const EMPTY_SPEC = Object.fromEntries(SPEC_KEYS.map((key) => [key, ''])) as Record<keyof OrderSpec, string>;

@Injectable()
export class OrdersService {
  constructor(
    @InjectRepository(CushionOrder) private readonly orders: Repository<CushionOrder>,
    private readonly productions: ProductionsService,
    private readonly issued: IssuedSets,
    private readonly users: UsersService,
    private readonly audit: AuditService,
  ) {}

  async list(member: MemberInfo, productionId: string, query: PageQuery): Promise<Page<CushionOrder>> {
    await this.productions.forReading(member, productionId);
    const select = this.orders
      .createQueryBuilder('cushionOrder')
      .leftJoinAndSelect('cushionOrder.set', 'set')
      .leftJoinAndSelect('cushionOrder.upholsterer', 'upholsterer')
      .where('cushionOrder.workshopId = :workshopId AND cushionOrder.productionId = :productionId', {
        workshopId: member.workshopId,
        productionId,
      });
    return readPage(select, query, {
      sortable: {
        number: 'cushionOrder.number',
        title: 'cushionOrder.title',
        neededBy: 'cushionOrder.neededBy',
        updatedAt: 'cushionOrder.updatedAt',
      },
      defaultSort: 'number',
      tieBreak: 'cushionOrder.id',
      searchIn: ['cushionOrder.title', 'set.name', 'upholsterer.name'],
    });
  }

  find(place: OrderPlace): Promise<CushionOrder> {
    return findOrder(this.orders.manager, place);
  }

  async create(member: MemberInfo, productionId: string, dto: CreateOrderDto): Promise<CushionOrder> {
    await this.productions.forChanging(member, productionId);
    const cushionMarks = dto.cushionMarks ?? null;
    const set = { member, productionId, setId: dto.setId, letter: dto.revisionLetter };
    const cushions = await this.issued.cushions(set, cushionMarks);
    const author = await this.users.get(member.userId);
    return this.orders.manager.transaction(async (manager) => {
      const order = await manager.save(
        manager.create(CushionOrder, {
          workshopId: member.workshopId,
          productionId,
          setId: dto.setId,
          number: await nextNumber(manager, member.workshopId),
          revisionLetter: dto.revisionLetter,
          title: dto.title,
          neededBy: dto.neededBy ?? null,
          cushionMarks,
          cushionCount: cushions.length,
          toleranceMm: dto.toleranceMm ?? DEFAULT_TOLERANCE_MM,
          covers: saidCovers(dto.covers ?? [], cushions),
          spec: { ...EMPTY_SPEC, ...given(dto.spec) },
          state: 'draft' as const,
          upholstererId: null,
          sent: null,
          sentBefore: null,
          createdById: member.userId,
        }),
      );
      await recordEvent(manager, order, { kind: 'created', byId: author.id, byName: author.name });
      await this.record(manager, member, 'cushion-order.created', order.id);
      return findOrder(manager, { ...member, productionId, orderId: order.id });
    });
  }

  async update(member: MemberInfo, place: OrderPlace, dto: UpdateOrderDto): Promise<CushionOrder> {
    await this.productions.forChanging(member, place.productionId);
    return this.orders.manager.transaction(async (manager) => {
      const order = await lockOrder(manager, place);
      if (!mayChange(order.state)) {
        throw Problem.conflict(
          'order-fixed',
          `An order that is ${STATE_WORDS[order.state]} is no longer changed. Cancel it or write to the upholsterer.`,
        );
      }
      order.revisionLetter = dto.revisionLetter ?? order.revisionLetter;
      order.title = dto.title ?? order.title;
      if (dto.neededBy !== undefined) order.neededBy = dto.neededBy;
      if (dto.cushionMarks !== undefined) order.cushionMarks = dto.cushionMarks;
      order.toleranceMm = dto.toleranceMm ?? order.toleranceMm;
      order.spec = { ...order.spec, ...given(dto.spec) };
      const set = {
        member,
        productionId: place.productionId,
        setId: order.setId,
        letter: order.revisionLetter,
      };
      const cushions = await this.issued.cushions(set, order.cushionMarks);
      order.cushionCount = cushions.length;
      if (dto.covers !== undefined) order.covers = saidCovers(dto.covers, cushions);
      await manager.save(order);
      await this.record(manager, member, 'cushion-order.changed', order.id);
      return findOrder(manager, place);
    });
  }

  private record(manager: EntityManager, member: MemberInfo, action: string, orderId: string): Promise<void> {
    const { workshopId, userId } = member;
    return this.audit.record(manager, {
      workshopId,
      userId,
      action,
      subjectType: 'cushion-order',
      subjectId: orderId,
    });
  }
}

function given(spec: Partial<OrderSpec> | null | undefined): Partial<OrderSpec> {
  return Object.fromEntries(
    SPEC_KEYS.flatMap((key) => {
      const words = spec?.[key];
      return typeof words === 'string' ? [[key, words]] : [];
    }),
  );
}

/** The next number of the workshop; two orders made at once wait for each other here. */
async function nextNumber(manager: EntityManager, workshopId: string): Promise<number> {
  await manager.query('SELECT pg_advisory_xact_lock(hashtextextended($1, 0))', [
    `cushion-order-number:${workshopId}`,
  ]);
  const highest = await manager.maximum(CushionOrder, 'number', { workshopId });
  return (highest ?? 0) + 1;
}
