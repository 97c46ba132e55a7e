import { HttpStatus, Injectable } from '@nestjs/common';
import { InjectDataSource } from '@nestjs/typeorm';
import { DataSource, type EntityManager, In } from 'typeorm';
import { AuditService } from '../audit/audit.service';
import { Problem } from '../common/problem';
import { hashToken } from '../common/secret-token';
import { InjectSettings, type Settings } from '../config/settings';
import { MailService, type MailToSend } from '../mail/mail.service';
import type { CushionOrder } from './entities/cushion-order.entity';
import { OrderEvent } from './entities/order-event.entity';
import { OrderLink } from './entities/order-link.entity';
import { OrderMessage } from './entities/order-message.entity';
import { isLinkToken } from './link-token';
import { lockOrder, ofItsUpholsterer } from './order-access';
import { contactOf } from './order-contact';
import type { SentContent } from './order-content';
import { acknowledgedMail, replyMail, type UpholstererNews } from './order-mail';
import { recordEvent } from './order-record';
import { isOver, STATE_WORDS } from './order-states';

/** An order as the holder of a private link may see it. */
export interface LinkedOrder {
  order: CushionOrder;
  sent: SentContent;
  link: OrderLink;
}

@Injectable()
export class LinkService {
  constructor(
    @InjectDataSource() private readonly dataSource: DataSource,
    @InjectSettings() private readonly config: Settings,
    private readonly mail: MailService,
    private readonly audit: AuditService,
  ) {}

  /** The order behind a token. Reads only: mail scanners open links before people do. */
  async open(token: string, manager: EntityManager = this.dataSource.manager): Promise<LinkedOrder> {
    const unknown = Problem.notFound('order link');
    if (!isLinkToken(token)) throw unknown;
    const link = await manager.findOne(OrderLink, {
      where: { tokenHash: hashToken(token) },
      relations: { order: { set: true, upholsterer: true, production: true } },
    });
    const order = link?.order;
    if (!link || !order?.sent) throw unknown;
    if (link.revokedAt !== null) {
      throw new Problem(
        HttpStatus.GONE,
        'link-revoked',
        'This link was ended by the workshop. Ask it for a new one.',
      );
    }
    if (link.expiresAt <= new Date()) {
      throw new Problem(
        HttpStatus.GONE,
        'link-expired',
        'This link has expired. Ask the workshop for a new one.',
      );
    }
    return { order, sent: order.sent, link };
  }

  /** "I can make this as drawn": keeps the typed name, the time and the revision. A second time changes nothing. */
  async acknowledge(token: string, name: string, sentAt?: string): Promise<void> {
    await this.dataSource.transaction(async (manager) => {
      const order = await this.lock(token, manager);
      if (sentAt !== undefined && Date.parse(sentAt) !== Date.parse(order.sent.at)) {
        throw Problem.conflict(
          'order-sent-again',
          'The workshop sent this order again meanwhile. Read it anew first.',
        );
      }
      if (await acknowledgementOf(manager, order)) return;
      await recordEvent(
        manager,
        { ...order, revisionLetter: order.sent.revisionLetter },
        { kind: 'acknowledged', side: 'upholsterer', byId: null, byName: name },
      );
      await this.record(manager, order, 'cushion-order.acknowledged');
      const news = await this.news(manager, order);
      await this.post(manager, order, acknowledgedMail(news, name, order.sent.revisionLetter));
    });
  }

  async reply(token: string, text: string): Promise<void> {
    await this.dataSource.transaction(async (manager) => {
      const order = await this.lock(token, manager);
      await manager.save(
        manager.create(OrderMessage, {
          orderId: order.id,
          upholstererId: order.upholstererId,
          side: 'upholsterer',
          authorId: null,
          authorName: order.upholsterer?.contactName || order.upholsterer?.name || 'Upholsterer',
          text,
        }),
      );
      await this.record(manager, order, 'cushion-order.replied');
      await this.post(manager, order, replyMail(await this.news(manager, order), text));
    });
  }

  private async lock(token: string, manager: EntityManager): Promise<CushionOrder & { sent: SentContent }> {
    const { order: opened } = await this.open(token, manager);
    const { workshopId, productionId, id: orderId } = opened;
    const order = await lockOrder(manager, { workshopId, productionId, orderId });
    // Whoever held the order while this waited may have ended the link or sent the order to another.
    await this.open(token, manager);
    const sent = order.sent ?? opened.sent;
    if (isOver(order.state) || sent === null) {
      throw Problem.conflict(
        'order-over',
        `This order is ${STATE_WORDS[order.state]}. Telephone the workshop.`,
      );
    }
    return { ...order, sent };
  }

  private async news(
    manager: EntityManager,
    order: CushionOrder & { sent: SentContent },
  ): Promise<UpholstererNews> {
    const contact = await contactOf(manager, order, order.sent);
    return {
      to: contact.email,
      recipientName: contact.name,
      upholstererName: order.upholsterer?.name ?? 'The upholsterer',
      number: order.number,
      title: order.sent.title,
      orderUrl: `${this.config.publicUrl}/w/${order.workshopId}/p/${order.productionId}/orders/${order.id}`,
    };
  }

  private async post(manager: EntityManager, order: CushionOrder, mail: MailToSend): Promise<void> {
    await this.mail.enqueue(manager, { ...mail, workshopId: order.workshopId, relatedId: order.id });
  }

  private record(manager: EntityManager, order: CushionOrder, action: string): Promise<void> {
    const { workshopId, id: subjectId } = order;
    return this.audit.record(manager, {
      workshopId,
      userId: null,
      action,
      subjectType: 'cushion-order',
      subjectId,
    });
  }
}

/** The word of the upholsterer who has the order on what was last sent, if it was given. */
export async function acknowledgementOf(
  manager: EntityManager,
  order: CushionOrder,
): Promise<OrderEvent | null> {
  const last = await manager.findOne(OrderEvent, {
    where: { orderId: order.id, ...ofItsUpholsterer(order), kind: In(['sent', 'acknowledged']) },
    order: { at: 'DESC' },
  });
  return last?.kind === 'acknowledged' ? last : null;
}
