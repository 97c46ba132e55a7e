import { HttpStatus, Injectable } from '@nestjs/common';
import { InjectDataSource } from '@nestjs/typeorm';
import { DataSource, type EntityManager } from 'typeorm';
import { AuditService } from '../audit/audit.service';
import { Problem } from '../common/problem';
import { hashToken } from '../common/secret-token';
import type { CushionOrder } from './entities/cushion-order.entity';
import { OrderLink } from './entities/order-link.entity';
import { OrderMessage } from './entities/order-message.entity';
import { isLinkToken } from './link-token';
import { lockOrder } from './order-access';
import { acceptedQuote, acknowledgementOf, requireSameSending } from './order-agreement';
import { sameContent, type SentContent } from './order-content';
import { OrderLetters } from './order-letters.service';
import { acknowledgedMail, replyMail } from './order-mail';
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
    private readonly letters: OrderLetters,
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
      requireSameSending(order, sentAt);
      if (await acknowledgementOf(manager, order)) return;
      await recordEvent(
        manager,
        { ...order, revisionLetter: order.sent.revisionLetter },
        { kind: 'acknowledged', side: 'upholsterer', byId: null, byName: name },
      );
      await this.record(manager, order, 'cushion-order.acknowledged');
      const agreed = order.state === 'quoted' && (await this.agree(manager, order, name));
      const news = await this.letters.addressed(manager, order);
      const mail = acknowledgedMail(news, { name, revisionLetter: order.sent.revisionLetter, agreed });
      await this.letters.post(manager, order, mail);
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
      await this.letters.post(manager, order, replyMail(await this.letters.addressed(manager, order), text));
    });
  }

  /** The order behind a token; nobody else changes it until the transaction ends. */
  async lock(token: string, manager: EntityManager): Promise<CushionOrder & { sent: SentContent }> {
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
    return Object.assign(order, { sent });
  }

  /** Both sides have said yes to what was last sent, the workshop by accepting the quote for it. */
  private async agree(manager: EntityManager, order: CushionOrder, name: string): Promise<boolean> {
    if (!order.sent || !sameContent(order.sent, order)) return false;
    if (!(await acceptedQuote(manager, order))) return false;
    const fromState = order.state;
    order.state = 'agreed';
    await manager.save(order);
    await recordEvent(manager, order, {
      kind: 'state',
      side: 'upholsterer',
      byId: null,
      byName: name,
      fromState,
    });
    return true;
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
