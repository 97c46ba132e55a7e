import { Injectable } from '@nestjs/common';
import { InjectDataSource } from '@nestjs/typeorm';
import { DataSource, type EntityManager } from 'typeorm';
import { AuditService } from '../audit/audit.service';
import type { MemberInfo } from '../common/access.decorator';
import { Problem } from '../common/problem';
import { MailService } from '../mail/mail.service';
import { UsersService } from '../users/users.service';
import { WorkshopsService } from '../workshops/workshops.service';
import type { CushionOrder } from './entities/cushion-order.entity';
import { acknowledgementOf } from './link.service';
import { findOrder, lockOrder, type OrderPlace } from './order-access';
import { sameContent } from './order-content';
import { cancelledMail, lastLetter } from './order-mail';
import { recordEvent } from './order-record';
import { mayFollow, type RecordedState, recordableAfter, STATE_WORDS } from './order-states';

/** States that the workshop records by hand: its own, and those it heard of from the upholsterer. */
@Injectable()
export class OrderProgress {
  constructor(
    @InjectDataSource() private readonly dataSource: DataSource,
    private readonly users: UsersService,
    private readonly workshops: WorkshopsService,
    private readonly mail: MailService,
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
      const from = order.state;
      order.state = to;
      await manager.save(order);
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
      const told = order.upholsterer;
      if (to === 'cancelled' && from !== 'draft' && order.sent && told && told.removedAt === null) {
        const workshop = await this.workshops.get(order.workshopId, manager);
        const mail = cancelledMail(lastLetter(workshop, author, told, { ...order, title: order.sent.title }));
        await this.mail.enqueue(manager, { ...mail, workshopId: order.workshopId, relatedId: order.id });
      }
      return findOrder(manager, place);
    });
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
  if (order.sent && !sameContent(order.sent, order)) {
    throw Problem.conflict(
      'changed-since-sent',
      'The order was changed after it was sent. Send it again: both sides agree to the same revision.',
    );
  }
  if (note.trim() === '' && !(await acknowledgementOf(manager, order))) {
    throw Problem.conflict(
      'not-acknowledged',
      'The upholsterer has not yet said through the link that they can make the order as last sent. ' +
        'Wait for that, or write in the note how and with whom it was agreed.',
    );
  }
}
