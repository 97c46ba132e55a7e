import { Injectable } from '@nestjs/common';
import { InjectDataSource } from '@nestjs/typeorm';
import { DataSource } from 'typeorm';
import type { MemberInfo } from '../common/access.decorator';
import { MailService } from '../mail/mail.service';
import { ProductionsService } from '../productions/productions.service';
import { WorkshopsService } from '../workshops/workshops.service';
import type {
  OrderDto,
  OrderEventDto,
  OrderMessageDto,
  OrderSummaryDto,
  OrderUpholstererDto,
} from './dto/order.dto';
import type { PublicOrderDto } from './dto/public-order.dto';
import type { CushionOrder } from './entities/cushion-order.entity';
import { OrderEvent } from './entities/order-event.entity';
import { OrderMessage } from './entities/order-message.entity';
import { IssuedSets } from './issued-sets.service';
import type { LinkedOrder } from './link.service';
import { ofItsUpholsterer } from './order-access';
import { acknowledgementOf } from './order-agreement';
import { contactOf } from './order-contact';
import { coversOf, sameContent, unpriced } from './order-content';
import { linkState } from './order-links';
import { OUTGOING_KINDS } from './order-mail';
import { mayChange, maySend, recordableAfter } from './order-states';
import { packStyle } from './pack-style';

const UNANSWERED = `
  SELECT open.order_id AS "orderId", count(*)::int AS count
    FROM (
      SELECT message.order_id, message.upholsterer_id
        FROM order_messages message
       WHERE message.order_id = ANY($1) AND message.side = 'upholsterer'
         AND message.at > coalesce(
           (SELECT max(answer.at) FROM order_messages answer
             WHERE answer.order_id = message.order_id AND answer.upholsterer_id = message.upholsterer_id
               AND answer.side = 'workshop'), '-infinity')
      UNION ALL
      SELECT question.order_id, question.upholsterer_id
        FROM order_questions question
       WHERE question.order_id = ANY($1) AND question.answered_at IS NULL
    ) open
    JOIN cushion_orders ordered ON ordered.id = open.order_id AND ordered.upholsterer_id = open.upholsterer_id
   GROUP BY open.order_id`;

/** What members and link holders read about an order. */
@Injectable()
export class OrderViews {
  constructor(
    @InjectDataSource() private readonly dataSource: DataSource,
    private readonly issued: IssuedSets,
    private readonly productions: ProductionsService,
    private readonly workshops: WorkshopsService,
    private readonly mail: MailService,
  ) {}

  async summaries(orders: readonly CushionOrder[]): Promise<OrderSummaryDto[]> {
    const open = await this.unanswered(orders.map((order) => order.id));
    return orders.map((order) => summaryOf(order, open.get(order.id) ?? 0));
  }

  async full(member: MemberInfo, order: CushionOrder): Promise<OrderDto> {
    const { manager } = this.dataSource;
    const { setId, productionId, revisionLetter: letter } = order;
    const issued = await this.issued.read({ member, productionId, setId, letter });
    const cushions = this.issued.select(issued, order.cushionMarks);
    const [[summary], link, acknowledged, events, mail] = await Promise.all([
      this.summaries([order]),
      linkState(manager, order.id, new Date()),
      acknowledgementOf(manager, order),
      manager.find(OrderEvent, {
        where: { orderId: order.id },
        relations: { upholsterer: true },
        order: { at: 'ASC', id: 'ASC' },
      }),
      this.mail.latestAbout(manager, order.id, OUTGOING_KINDS),
    ]);
    return {
      ...(summary ?? summaryOf(order, 0)),
      revisionIssuedAt: issued.issuedAt.toISOString(),
      cushionMarks: order.cushionMarks,
      spec: order.spec,
      toleranceMm: order.toleranceMm,
      covers: order.covers,
      cushionRules: issued.cushionRules,
      cushions: cushions,
      sent: order.sent && {
        revisionLetter: order.sent.revisionLetter,
        at: order.sent.at,
        byName: order.sent.byName,
        changedSince: !sameContent(order.sent, order),
      },
      acknowledgement: acknowledged && acknowledgement(acknowledged),
      link: { state: link.state, expiresAt: link.expiresAt?.toISOString() ?? null },
      lastMail: mail && { id: mail.id, state: mail.state, at: mail.queuedAt.toISOString() },
      nextStates: recordableAfter(order.state),
      maySend: maySend(order.state),
      mayChange: mayChange(order.state),
      events: events.map(eventDto),
      createdAt: order.createdAt.toISOString(),
    };
  }

  /** As it was sent, not as it stands: what the workshop changes is seen when it is sent again. */
  async public({ order, sent, link }: LinkedOrder): Promise<PublicOrderDto> {
    const { manager } = this.dataSource;
    const member = { workshopId: order.workshopId, userId: sent.byUserId, role: 'designer' as const };
    const place = {
      member,
      productionId: order.productionId,
      setId: order.setId,
      letter: sent.revisionLetter,
    };
    const [issued, production, workshop, contact, messages, acknowledged] = await Promise.all([
      this.issued.read(place),
      this.productions.forReading(member, order.productionId),
      this.workshops.get(order.workshopId),
      contactOf(manager, order, sent),
      manager.find(OrderMessage, {
        where: { orderId: order.id, ...ofItsUpholsterer(order) },
        order: { at: 'ASC', id: 'ASC' },
      }),
      acknowledgementOf(manager, order),
    ]);
    const style = packStyle(order, production, workshop);
    return {
      workshop: { name: workshop.name, telephone: workshop.telephone, contactName: contact.name },
      number: order.number,
      title: sent.title,
      productionName: production.name,
      setName: order.set?.name ?? '',
      upholstererName: order.upholsterer?.name ?? '',
      state: order.state,
      revisionLetter: sent.revisionLetter,
      revisionIssuedAt: issued.issuedAt.toISOString(),
      neededBy: sent.neededBy,
      units: style.units.system,
      roundTo: style.units.roundTo,
      paper: style.paper,
      sentAt: sent.at,
      spec: sent.spec,
      cushions: this.issued.select(issued, sent.cushionMarks),
      covers: unpriced(coversOf(sent)),
      messages: messages.map((message) => ({
        side: message.side,
        // Of the workshop's people the other side knows only the contact.
        authorName:
          message.side === 'workshop' && message.authorId !== contact.id ? workshop.name : message.authorName,
        text: message.text,
        at: message.at.toISOString(),
      })),
      acknowledgement: acknowledged && acknowledgement(acknowledged),
      linkExpiresAt: link.expiresAt.toISOString(),
    };
  }

  private async unanswered(orderIds: readonly string[]): Promise<Map<string, number>> {
    if (orderIds.length === 0) return new Map();
    const rows = await this.dataSource.query<{ orderId: string; count: number }[]>(UNANSWERED, [orderIds]);
    return new Map(rows.map(({ orderId, count }) => [orderId, count]));
  }
}

export function messageDto(message: OrderMessage): OrderMessageDto {
  const { id, side, authorName, text, at } = message;
  return { id, side, authorName, upholstererName: message.upholsterer?.name, text, at: at.toISOString() };
}

function summaryOf(order: CushionOrder, openQuestions: number): OrderSummaryDto {
  return {
    id: order.id,
    number: order.number,
    title: order.title,
    state: order.state,
    setId: order.setId,
    setName: order.set?.name ?? '',
    revisionLetter: order.revisionLetter,
    neededBy: order.neededBy,
    cushionCount: order.cushionCount,
    upholsterer: order.upholsterer ? upholstererDto(order.upholsterer) : null,
    openQuestions,
    updatedAt: order.updatedAt.toISOString(),
  };
}

function upholstererDto(upholsterer: NonNullable<CushionOrder['upholsterer']>): OrderUpholstererDto {
  const { id, name, contactName, removedAt } = upholsterer;
  return { id, name, contactName, removed: removedAt !== null };
}

function eventDto(event: OrderEvent): OrderEventDto {
  const { kind, at, side, byName, fromState, toState, revisionLetter, note } = event;
  const upholstererName = event.upholsterer?.name;
  return {
    kind,
    at: at.toISOString(),
    side,
    byName,
    upholstererName,
    fromState,
    toState,
    revisionLetter,
    note,
  };
}

function acknowledgement(event: OrderEvent) {
  return { name: event.byName, at: event.at.toISOString(), revisionLetter: event.revisionLetter };
}
