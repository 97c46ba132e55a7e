import { Injectable } from '@nestjs/common';
import { InjectDataSource } from '@nestjs/typeorm';
import { DataSource, type EntityManager } from 'typeorm';
import { AuditService } from '../audit/audit.service';
import type { MemberInfo } from '../common/access.decorator';
import { Problem } from '../common/problem';
import type { User } from '../users/entities/user.entity';
import { UsersService } from '../users/users.service';
import { WorkshopsService } from '../workshops/workshops.service';
import type { CushionOrder } from './entities/cushion-order.entity';
import { findOrder, lockOrder, type OrderPlace } from './order-access';
import { acknowledgementOf, deliveryOf, firstArticleOf, requireUnchanged } from './order-agreement';
import { OrderLetters } from './order-letters.service';
import { cancelledMail, lastLetter } from './order-mail';
import { recordEvent } from './order-record';
import { QuotesService } from './quotes/quotes.service';
import { mayFollow, type RecordedState, recordableAfter, STATE_WORDS } from './order-states';

/** States that the workshop records by hand: its own, and those it heard of from the upholsterer. */
@Injectable()
export class OrderProgress {
  constructor(
    @InjectDataSource() private readonly dataSource: DataSource,
    private readonly users: UsersService,
    private readonly workshops: WorkshopsService,
    private readonly letters: OrderLetters,
    private readonly quotes: QuotesService,
    private readonly audit: AuditService,
  ) {}

  async record(
    member: MemberInfo,
    place: OrderPlace,
    to: RecordedState,
    note: string,
  ): Promise<CushionOrder> {
    const author = await this.users.get(member.userId);
    return this.dataSource.transaction(async (manager) => {
      const order = await lockOrder(manager, place);
      requireStep(order, to);
      if (to === 'agreed') await requireAgreement(manager, order, note);
      await requireInspected(manager, order, to, note);
      const from = order.state;
      order.state = to;
      await manager.save(order);
      if (to === 'agreed') await this.quotes.settle(manager, order, author.name);
      await recordEvent(manager, order, {
        kind: 'state',
        byId: author.id,
        byName: author.name,
        fromState: from,
        note,
      });
      await this.audit.record(manager, {
        workshopId: member.workshopId,
        userId: member.userId,
        action: 'cushion-order.state-recorded',
        subjectType: 'cushion-order',
        subjectId: order.id,
        detail: { from, to },
      });
      if (from !== 'draft') await this.tell(manager, order, author, to);
      return findOrder(manager, place);
    });
  }

  private async tell(
    manager: EntityManager,
    order: CushionOrder,
    author: User,
    to: RecordedState,
  ): Promise<void> {
    if (!order.sent || !order.upholsterer || order.upholsterer.removedAt !== null) return;
    if (to !== 'cancelled') {
      await this.letters.toUpholsterer(manager, order, author, {
        about: STATE_WORDS[to],
        words: [
          `We have put down cushion order ${order.number}, “${order.sent.title}”, as ${STATE_WORDS[to]}.`,
        ],
      });
      return;
    }
    const workshop = await this.workshops.get(order.workshopId, manager);
    const told = lastLetter(workshop, author, order.upholsterer, { ...order, title: order.sent.title });
    await this.letters.post(manager, order, cancelledMail(told));
  }
}

function requireStep(order: CushionOrder, to: RecordedState): void {
  if (!mayFollow(order.state, to)) {
    const next = recordableAfter(order.state).map((state) => STATE_WORDS[state]);
    throw Problem.conflict(
      'state-not-reachable',
      `An order that is ${STATE_WORDS[order.state]} cannot become ${STATE_WORDS[to]}. ` +
        (next.length > 0 ? `It can become: ${next.join(', ')}.` : 'It stays as it is.'),
      { state: order.state, accepted: recordableAfter(order.state) },
    );
  }
}

/** Both sides on the same paper: the one last sent. */
async function requireAgreement(manager: EntityManager, order: CushionOrder, note: string): Promise<void> {
  requireUnchanged(order);
  if (note.trim() === '' && !(await acknowledgementOf(manager, order))) {
    throw Problem.conflict(
      'not-acknowledged',
      'The upholsterer has not yet said through the link that they can make the order as last sent. ' +
        'Wait for that, or write in the note how and with whom it was agreed.',
    );
  }
}

/** The batch waits for the first article, and the end for the delivery, unless a note says how it is known. */
async function requireInspected(
  manager: EntityManager,
  order: CushionOrder,
  to: RecordedState,
  note: string,
): Promise<void> {
  if (note.trim() !== '') return;
  if (to === 'in-work' && (await firstArticleOf(manager, order)) !== 'accepted') {
    throw Problem.conflict(
      'first-article-not-accepted',
      'The first article was not accepted yet. Inspect it, or write in the note how it is known to be right.',
    );
  }
  if (to === 'closed' && (await deliveryOf(manager, order)) !== 'accepted') {
    throw Problem.conflict(
      'delivery-not-accepted',
      'The delivery was not accepted yet. Inspect it, or write in the note why the order is closed.',
    );
  }
}
