import { Injectable } from '@nestjs/common';
import { InjectDataSource } from '@nestjs/typeorm';
import { DataSource, type EntityManager } from 'typeorm';
import { AuditService } from '../audit/audit.service';
import type { MemberInfo } from '../common/access.decorator';
import type { Page, PageQuery } from '../common/page.dto';
import { Problem } from '../common/problem';
import { readPage } from '../common/read-page';
import { MailService } from '../mail/mail.service';
import { ProductionsService } from '../productions/productions.service';
import { UpholsterersService } from '../upholsterers/upholsterers.service';
import { UsersService } from '../users/users.service';
import { WorkshopsService } from '../workshops/workshops.service';
import type { SendOrderDto } from './dto/write-order.dto';
import { CushionOrder } from './entities/cushion-order.entity';
import { OrderMessage } from './entities/order-message.entity';
import { findOrder, lockOrder, type OrderPlace } from './order-access';
import { contentOf } from './order-content';
import { OrderLetters } from './order-letters.service';
import { revokeLinks } from './order-links';
import {
  lastLetter,
  orderMail,
  OUTGOING_KINDS,
  renewedLinkMail,
  withdrawnMail,
  workshopMessageMail,
} from './order-mail';
import { OrderPaper } from './order-paper.service';
import { recordEvent } from './order-record';
import { isOver, maySend, STATE_WORDS } from './order-states';

/** What goes to the upholsterer: the order, messages, links. Each mail is queued with what it tells of. */
@Injectable()
export class OrderCorrespondence {
  constructor(
    @InjectDataSource() private readonly dataSource: DataSource,
    private readonly letters: OrderLetters,
    private readonly paper: OrderPaper,
    private readonly productions: ProductionsService,
    private readonly upholsterers: UpholsterersService,
    private readonly users: UsersService,
    private readonly workshops: WorkshopsService,
    private readonly mail: MailService,
    private readonly audit: AuditService,
  ) {}

  async send(member: MemberInfo, place: OrderPlace, dto: SendOrderDto): Promise<CushionOrder> {
    const sender = await this.users.requireConfirmedEmail(member.userId);
    await this.productions.forChanging(member, place.productionId);
    return this.dataSource.transaction(async (manager) => {
      const order = await lockOrder(manager, place);
      if (!maySend(order.state)) {
        throw Problem.conflict(
          'order-not-sendable',
          `An order that is ${STATE_WORDS[order.state]} is not sent again.`,
        );
      }
      const upholsterer = await this.upholsterers.get(member.workshopId, dto.upholstererId, manager);
      if (order.upholstererId !== null && order.upholstererId !== upholsterer.id) {
        await revokeLinks(manager, order.id);
        await this.withdraw(manager, order, sender);
      }
      const before = order.state;
      order.sentBefore = order.upholstererId === upholsterer.id ? order.sent : null;
      order.state = 'sent';
      order.upholstererId = upholsterer.id;
      order.upholsterer = upholsterer;
      order.sent = {
        ...contentOf(order),
        at: new Date().toISOString(),
        byUserId: sender.id,
        byName: sender.name,
      };
      await manager.save(order);
      const message = dto.message ?? '';
      if (message !== '') await this.keepMessage(manager, order, sender, message);
      await recordEvent(manager, order, {
        kind: 'sent',
        byId: sender.id,
        byName: sender.name,
        fromState: before,
      });
      await this.record(manager, member, 'cushion-order.sent', order.id);
      const letter = await this.letters.letter(manager, order, sender, message);
      const pack = {
        filename: `cushion-order-${order.number}-${order.revisionLetter}.pdf`,
        content: await this.paper.pack(order, order.sent),
      };
      await this.letters.post(manager, order, orderMail(letter, pack));
      return findOrder(manager, place);
    });
  }

  async messages(place: OrderPlace, page: PageQuery): Promise<Page<OrderMessage>> {
    const order = await findOrder(this.dataSource.manager, place);
    const select = this.dataSource.manager
      .createQueryBuilder(OrderMessage, 'message')
      .leftJoinAndSelect('message.upholsterer', 'upholsterer')
      .where('message.orderId = :orderId', { orderId: order.id });
    return readPage(select, page, {
      sortable: { at: 'message.at' },
      defaultSort: 'at',
      tieBreak: 'message.id',
      searchIn: ['message.text'],
    });
  }

  async write(member: MemberInfo, place: OrderPlace, text: string): Promise<OrderMessage> {
    const author = await this.users.requireConfirmedEmail(member.userId);
    return this.dataSource.transaction(async (manager) => {
      const order = await lockOrder(manager, place);
      requireCorrespondent(order);
      const message = await this.keepMessage(manager, order, author, text);
      message.upholsterer = order.upholsterer;
      await this.letters.post(
        manager,
        order,
        workshopMessageMail(await this.letters.letter(manager, order, author, text)),
      );
      return message;
    });
  }

  async renewLink(member: MemberInfo, place: OrderPlace): Promise<CushionOrder> {
    const author = await this.users.requireConfirmedEmail(member.userId);
    return this.dataSource.transaction(async (manager) => {
      const order = await lockOrder(manager, place);
      requireCorrespondent(order);
      await revokeLinks(manager, order.id);
      await recordEvent(manager, order, { kind: 'link-renewed', byId: author.id, byName: author.name });
      await this.record(manager, member, 'cushion-order.link-renewed', order.id);
      await this.letters.post(
        manager,
        order,
        renewedLinkMail(await this.letters.letter(manager, order, author, '')),
      );
      return findOrder(manager, place);
    });
  }

  async revokeLink(member: MemberInfo, place: OrderPlace): Promise<CushionOrder> {
    const author = await this.users.get(member.userId);
    return this.dataSource.transaction(async (manager) => {
      const order = await lockOrder(manager, place);
      const ended = await revokeLinks(manager, order.id);
      if (ended > 0) {
        await recordEvent(manager, order, { kind: 'link-revoked', byId: author.id, byName: author.name });
        await this.record(manager, member, 'cushion-order.link-revoked', order.id);
      }
      return findOrder(manager, place);
    });
  }

  /**
   * A mail that failed, or that nobody knows to have gone out, is sent once more because a person says so; without an id, the
   * last one.
   */
  async sendMailAgain(member: MemberInfo, place: OrderPlace, mailId?: string): Promise<CushionOrder> {
    await this.users.requireConfirmedEmail(member.userId);
    return this.dataSource.transaction(async (manager) => {
      const order = await lockOrder(manager, place);
      const mail = await this.mailAbout(manager, order, mailId);
      if (!mail && mailId !== undefined) throw Problem.notFound('mail');
      if (!mail || !(await this.mail.sendAgain(manager, mail.id))) {
        throw Problem.conflict('mail-not-stuck', 'This mail about the order needs no second sending.');
      }
      await this.record(manager, member, 'cushion-order.mail-sent-again', order.id);
      return findOrder(manager, place);
    });
  }

  /** Somebody saw a mail come back. */
  async mailBounced(member: MemberInfo, place: OrderPlace, mailId: string, note: string): Promise<void> {
    const author = await this.users.get(member.userId);
    await this.dataSource.transaction(async (manager) => {
      const order = await lockOrder(manager, place);
      const mail = await this.mailAbout(manager, order, mailId);
      if (!mail) throw Problem.notFound('mail');
      if (!(await this.mail.bounced(manager, mail.id, note))) {
        throw Problem.conflict('mail-not-out', 'This mail has not gone out, so it cannot have come back.');
      }
      await recordEvent(manager, order, {
        kind: 'mail-bounced',
        byId: author.id,
        byName: author.name,
        note,
      });
      await this.record(manager, member, 'cushion-order.mail-bounced', order.id);
    });
  }

  private async mailAbout(manager: EntityManager, order: CushionOrder, mailId?: string) {
    const mails = await this.mail.allAbout(manager, order.id, OUTGOING_KINDS);
    return mailId === undefined ? mails[0] : mails.find(({ id }) => id === mailId);
  }

  /** The earlier upholsterer must not work on for nobody. */
  private async withdraw(
    manager: EntityManager,
    order: CushionOrder,
    sender: { name: string; email: string },
  ): Promise<void> {
    const { sent, upholsterer: earlier } = order;
    if (!sent || !earlier || earlier.removedAt !== null) return;
    const workshop = await this.workshops.get(order.workshopId, manager);
    const mail = withdrawnMail(lastLetter(workshop, sender, earlier, { ...order, title: sent.title }));
    await this.letters.post(manager, order, mail);
  }

  private keepMessage(
    manager: EntityManager,
    order: CushionOrder,
    author: { id: string; name: string },
    text: string,
  ): Promise<OrderMessage> {
    const { id: authorId, name: authorName } = author;
    return manager.save(
      manager.create(OrderMessage, {
        orderId: order.id,
        upholstererId: order.upholstererId,
        side: 'workshop',
        authorId,
        authorName,
        text,
      }),
    );
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

function requireCorrespondent(order: CushionOrder): void {
  if (order.sent === null || !order.upholsterer) {
    throw Problem.conflict('order-not-sent', 'Nobody has this order yet. Send it first.');
  }
  if (order.upholsterer.removedAt !== null) {
    throw Problem.conflict(
      'upholsterer-removed',
      'The upholsterer is no longer in the address book. Send the order to another.',
    );
  }
  if (isOver(order.state)) {
    throw Problem.conflict(
      'order-over',
      `The order is ${STATE_WORDS[order.state]}; nothing more goes out about it.`,
    );
  }
}
