import { Injectable } from '@nestjs/common';
import { InjectDataSource } from '@nestjs/typeorm';
import { DataSource, type EntityManager } from 'typeorm';
import { AuditService } from '../audit/audit.service';
import type { MemberInfo } from '../common/access.decorator';
import { Problem } from '../common/problem';
import { UsersService } from '../users/users.service';
import type { CushionOrder } from './entities/cushion-order.entity';
import type { EventKind } from './entities/order-event.entity';
import type { Side } from './entities/order-message.entity';
import { LinkService } from './link.service';
import { lockOrder, type OrderPlace } from './order-access';
import type { SentContent } from './order-content';
import { OrderLetters } from './order-letters.service';
import type { News } from './order-mail';
import { recordEvent } from './order-record';
import { isOver, type OrderState, STATE_WORDS } from './order-states';

export type SentOrder = CushionOrder & { sent: SentContent; upholstererId: string };

/** One side doing something to an order that was sent: the order is locked, and the other side is told. */
export interface OrderAct {
  manager: EntityManager;
  order: SentOrder;
  side: Side;
  byId: string | null;
  byName: string;
  /** Writes an event; with `fromState`, the order came from there to the state it has now. */
  happened(kind: EventKind, more?: { fromState?: OrderState; note?: string }): Promise<void>;
  audit(action: string): Promise<void>;
  tell(news: News): Promise<void>;
}

/** The columns that say whose a row of an order is. */
export const ownedBy = ({ order, side, byId, byName }: OrderAct) => ({
  orderId: order.id,
  upholstererId: order.upholstererId,
  side,
  byId,
  byName,
});

@Injectable()
export class OrderActs {
  constructor(
    @InjectDataSource() private readonly dataSource: DataSource,
    private readonly links: LinkService,
    private readonly users: UsersService,
    private readonly letters: OrderLetters,
    private readonly audit: AuditService,
  ) {}

  /** `evenOver`: also on an order that is closed or cancelled. */
  async byMember<T>(
    member: MemberInfo,
    place: OrderPlace,
    work: (act: OrderAct) => Promise<T>,
    { evenOver = false } = {},
  ): Promise<T> {
    const sender = await this.users.requireConfirmedEmail(member.userId);
    return this.dataSource.transaction(async (manager) => {
      const order = requireSent(await lockOrder(manager, place));
      if (!evenOver && isOver(order.state)) {
        throw Problem.conflict('order-over', `The order is ${STATE_WORDS[order.state]}.`);
      }
      return work({
        ...this.act(manager, order, 'workshop', sender.id, sender.name),
        tell: (news) => this.letters.toUpholsterer(manager, order, sender, news),
      });
    });
  }

  /** `typedName` is who says so; without it the contact in the address book is taken. */
  async byUpholsterer<T>(
    token: string,
    typedName: string | null,
    work: (act: OrderAct) => Promise<T>,
  ): Promise<T> {
    return this.dataSource.transaction(async (manager) => {
      const order = requireSent(await this.links.lock(token, manager));
      const { contactName, name } = order.upholsterer ?? { contactName: '', name: 'Upholsterer' };
      return work({
        ...this.act(manager, order, 'upholsterer', null, typedName ?? (contactName || name)),
        tell: (news) => this.letters.toWorkshop(manager, order, news),
      });
    });
  }

  private act(
    manager: EntityManager,
    order: SentOrder,
    side: Side,
    byId: string | null,
    byName: string,
  ): Omit<OrderAct, 'tell'> {
    const audit = (action: string) =>
      this.audit.record(manager, {
        workshopId: order.workshopId,
        userId: byId,
        action: `cushion-order.${action}`,
        subjectType: 'cushion-order',
        subjectId: order.id,
      });
    return {
      ...{ manager, order, side, byId, byName, audit },
      happened: async (kind, more = {}) => {
        const revisionLetter = order.sent.revisionLetter;
        await recordEvent(manager, { ...order, revisionLetter }, { kind, side, byId, byName, ...more });
        await audit(kind);
      },
    };
  }
}

function requireSent(order: CushionOrder): SentOrder {
  const { sent, upholstererId } = order;
  if (sent === null || upholstererId === null) {
    throw Problem.conflict('order-not-sent', 'Nobody has this order yet. Send it first.');
  }
  return Object.assign(order, { sent, upholstererId });
}
