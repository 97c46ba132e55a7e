import { Injectable } from '@nestjs/common';
import { InjectDataSource } from '@nestjs/typeorm';
import { DataSource, type EntityManager, IsNull } from 'typeorm';
import { AuditService } from '../../audit/audit.service';
import { moneyWords } from '../../common/currency';
import { PaymentProvider } from '../../payments/payment-provider.service';
import { CushionOrder } from '../entities/cushion-order.entity';
import { contactOf } from '../order-contact';
import { OrderLetters } from '../order-letters.service';
import { recordEvent } from '../order-record';
import { OrderPayment } from './order-payment.entity';
import { PaymentEvent } from './payment-event.entity';
import { readTold, type Told } from './told';

/**
 * What the payment provider tells, applied once whatever is repeated, late or out of order. An event is kept and applied in
 * one transaction before the provider hears that it arrived; cut short anywhere, the provider tells it again.
 */
@Injectable()
export class PaymentNews {
  constructor(
    @InjectDataSource() private readonly dataSource: DataSource,
    private readonly provider: PaymentProvider,
    private readonly letters: OrderLetters,
    private readonly audit: AuditService,
  ) {}

  async receive(body: Buffer, signature: string): Promise<void> {
    const event = this.provider.readEvent(body, signature);
    const told = readTold(event);
    if (told === null) return;
    const accountId = event.account ?? null;
    await this.dataSource.transaction(async (manager) => {
      // A refund and the payment it belongs to may arrive at once: one waits for the other.
      await manager.query('SELECT pg_advisory_xact_lock(hashtextextended($1, 0))', [
        `payment-events:${accountId}`,
      ]);
      const kept: unknown[] = await manager.query(
        `INSERT INTO payment_events (event_id, type, account_id, payment_id, told) VALUES ($1, $2, $3, $4, $5)
         ON CONFLICT (event_id) DO NOTHING RETURNING event_id`,
        [event.id, event.type, accountId, told.paymentId, JSON.stringify(told)],
      );
      if (kept.length > 0) await this.apply(manager, event.id, accountId, told);
    });
  }

  private async apply(
    manager: EntityManager,
    eventId: string,
    accountId: string | null,
    told: Told,
  ): Promise<void> {
    const done =
      told.kind === 'refunded'
        ? await this.refunded(manager, accountId, told)
        : await this.checkedOut(manager, accountId, told);
    if (done) await manager.update(PaymentEvent, { eventId }, { appliedAt: new Date() });
  }

  private async checkedOut(
    manager: EntityManager,
    accountId: string | null,
    told: Extract<Told, { ownId: string }>,
  ): Promise<boolean> {
    const lock = { mode: 'pessimistic_write' } as const;
    const payment = await manager.findOne(OrderPayment, { where: { id: told.ownId }, lock });
    if (!payment || payment.accountId !== accountId || payment.kind !== 'deposit') return false;
    if (told.kind === 'lapsed') {
      await manager.update(OrderPayment, { id: payment.id, state: 'begun' }, { state: 'lapsed' });
      return true;
    }
    if (payment.state === 'paid') return true;
    // Also one that was ended here a moment before: the money did go.
    const { paymentId, sessionId } = told;
    const settled = { state: 'paid' as const, paymentId, sessionId, settledAt: new Date() };
    await manager.update(OrderPayment, { id: payment.id }, settled);
    await this.say(manager, payment, 'deposit-paid', 'a deposit was paid');
    await this.applyWaiting(manager, accountId, paymentId);
    return true;
  }

  /** Refunds that were told before the payment they give back. */
  private async applyWaiting(
    manager: EntityManager,
    accountId: string | null,
    paymentId: string,
  ): Promise<void> {
    const waiting = await manager.find(PaymentEvent, {
      where: { paymentId, accountId: accountId ?? IsNull(), appliedAt: IsNull() },
      order: { receivedAt: 'ASC' },
    });
    for (const event of waiting) {
      const told = event.told as unknown as Told;
      if (told.kind === 'refunded') await this.apply(manager, event.eventId, accountId, told);
    }
  }

  private async refunded(
    manager: EntityManager,
    accountId: string | null,
    { paymentId, refundId, amountMinor }: Extract<Told, { kind: 'refunded' }>,
  ): Promise<boolean> {
    const deposit = await manager.findOneBy(OrderPayment, { paymentId, kind: 'deposit' });
    if (!deposit || deposit.accountId !== accountId) return false;
    if (await manager.existsBy(OrderPayment, { refundId })) return true;
    const { orderId, upholstererId, side, byId, byName, currency } = deposit;
    const refund = await manager.save(
      manager.create(OrderPayment, {
        ...{ orderId, upholstererId, side, byId, byName, currency, accountId, refundId, amountMinor },
        ...{ kind: 'refund', byHand: false, state: 'paid', note: '', settledAt: new Date() },
      }),
    );
    await this.say(manager, refund, 'refund-recorded', 'a deposit was given back');
    return true;
  }

  private async say(
    manager: EntityManager,
    payment: OrderPayment,
    kind: 'deposit-paid' | 'refund-recorded',
    about: string,
  ): Promise<void> {
    const { orderId, side, byId, byName, amountMinor, currency } = payment;
    const order = await manager.findOneOrFail(CushionOrder, {
      where: { id: orderId },
      relations: { set: true, upholsterer: true },
    });
    const note = moneyWords(amountMinor, currency);
    await recordEvent(manager, order, { kind, side, byId, byName, note });
    const { workshopId } = order;
    const subject = { subjectType: 'cushion-order', subjectId: orderId };
    await this.audit.record(manager, {
      workshopId,
      userId: null,
      action: `cushion-order.${kind}`,
      ...subject,
    });
    const words = [`The payment provider says: ${about}, ${note}.`];
    await this.letters.toWorkshop(manager, order, { about, words });
    if (order.upholstererId !== payment.upholstererId) return;
    const contact = await contactOf(manager, order, { byUserId: order.sent?.byUserId ?? order.createdById });
    await this.letters.toUpholsterer(manager, order, contact, { about, words });
  }
}
