import { Injectable } from '@nestjs/common';
import type { EntityManager } from 'typeorm';
import { InjectSettings, type Settings } from '../config/settings';
import { MailService, type MailToSend } from '../mail/mail.service';
import { WorkshopsService } from '../workshops/workshops.service';
import { dayInWords } from './day-in-words';
import type { CushionOrder } from './entities/cushion-order.entity';
import { contactOf } from './order-contact';
import { makeLink } from './order-links';
import {
  type News,
  type OrderLetter,
  newsForUpholsterer,
  newsForWorkshop,
  type UpholstererNews,
} from './order-mail';

export interface Sender {
  id: string;
  name: string;
  email: string;
}

/** Writes to either side of an order, in the transaction in which something happens. */
@Injectable()
export class OrderLetters {
  constructor(
    @InjectSettings() private readonly config: Settings,
    private readonly workshops: WorkshopsService,
    private readonly mail: MailService,
  ) {}

  /** What a letter to the upholsterer says, with a new private link in it. */
  async letter(
    manager: EntityManager,
    order: CushionOrder,
    sender: Sender,
    message: string,
  ): Promise<OrderLetter> {
    const workshop = await this.workshops.get(order.workshopId, manager);
    const { token, expiresAt } = await makeLink(manager, order.id);
    const content = order.sent ?? order;
    return {
      workshopName: workshop.name,
      workshopTelephone: workshop.telephone,
      senderName: sender.name,
      senderEmail: sender.email,
      upholstererName: order.upholsterer?.name ?? '',
      upholstererEmail: order.upholsterer?.email ?? '',
      contactName: order.upholsterer?.contactName ?? '',
      number: order.number,
      title: content.title,
      revisionLetter: content.revisionLetter,
      neededBy: content.neededBy === null ? null : dayInWords(content.neededBy),
      cushionCount: order.cushionCount,
      linkUrl: `${this.config.publicUrl}/order/${token}`,
      linkExpires: dayInWords(expiresAt.toISOString().slice(0, 10)),
      message,
    };
  }

  async post(manager: EntityManager, order: CushionOrder, mail: MailToSend): Promise<void> {
    await this.mail.enqueue(manager, { ...mail, workshopId: order.workshopId, relatedId: order.id });
  }

  /** Tells the upholsterer who has the order; nobody, when it was not sent or the address was removed. */
  async toUpholsterer(
    manager: EntityManager,
    order: CushionOrder,
    sender: Sender,
    news: News,
  ): Promise<void> {
    if (!order.sent || !order.upholsterer || order.upholsterer.removedAt !== null) return;
    const letter = await this.letter(manager, order, sender, '');
    await this.post(manager, order, newsForUpholsterer(letter, news));
  }

  /** Tells whoever speaks for the workshop about the order. */
  async toWorkshop(manager: EntityManager, order: CushionOrder, news: News): Promise<void> {
    await this.post(manager, order, newsForWorkshop(await this.addressed(manager, order), news));
  }

  async addressed(manager: EntityManager, order: CushionOrder): Promise<UpholstererNews> {
    const contact = await contactOf(manager, order, { byUserId: order.sent?.byUserId ?? order.createdById });
    return {
      to: contact.email,
      recipientName: contact.name,
      upholstererName: order.upholsterer?.name ?? 'The upholsterer',
      number: order.number,
      title: order.sent?.title ?? order.title,
      orderUrl: `${this.config.publicUrl}/w/${order.workshopId}/p/${order.productionId}/orders/${order.id}`,
    };
  }
}
