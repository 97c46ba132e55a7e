import { Injectable } from '@nestjs/common';
import { InjectDataSource } from '@nestjs/typeorm';
import { DataSource } from 'typeorm';
import type { MemberInfo } from '../../common/access.decorator';
import { moneyWords } from '../../common/currency';
import { Problem } from '../../common/problem';
import { InjectSettings, type Settings } from '../../config/settings';
import { PaymentProvider } from '../../payments/payment-provider.service';
import type { OrderPlace } from '../order-access';
import { OrderActs, type OrderAct, ownedBy } from '../order-acts.service';
import { acceptedQuote } from '../order-agreement';
import type { RecordPaymentDto } from './deposit.dto';
import { OrderPayment } from './order-payment.entity';

/** Deposits to the upholsterer's own account, begun here and settled by what the provider tells; or put down by hand. */
@Injectable()
export class DepositsService {
  constructor(
    @InjectDataSource() private readonly dataSource: DataSource,
    @InjectSettings() private readonly config: Settings,
    private readonly acts: OrderActs,
    private readonly provider: PaymentProvider,
  ) {}

  /**
   * The row is kept before the provider is asked, and its id keeps the provider from making two pages of one deposit: whoever
   * was cut short in between begins again and comes to the same page.
   */
  async begin(member: MemberInfo, place: OrderPlace, amountMinor: number): Promise<{ url: string }> {
    const { payment, what } = await this.acts.byMember(member, place, async (act) => ({
      payment: await this.begun(act, amountMinor),
      what: `Deposit for cushion order ${act.order.number}: ${act.order.sent.title}`,
    }));
    const { workshopId, productionId, orderId } = place;
    const { sessionId, url } = await this.provider.beginCheckout({
      paymentId: payment.id,
      accountId: payment.accountId ?? '',
      amountMinor: payment.amountMinor,
      currency: payment.currency,
      what,
      returnUrl: `${this.config.publicUrl}/w/${workshopId}/p/${productionId}/orders/${orderId}`,
    });
    await this.dataSource.manager.update(OrderPayment, { id: payment.id }, { sessionId });
    return { url };
  }

  /** Ends a deposit that was begun and not paid. */
  async end(member: MemberInfo, place: OrderPlace, paymentId: string): Promise<void> {
    await this.acts.byMember(
      member,
      place,
      async (act) => {
        const payment = await lockPayment(act, paymentId);
        if (payment.state !== 'begun') throw alreadySettled();
        const { sessionId, accountId } = payment;
        if (sessionId !== null && !(await this.provider.endCheckout(sessionId, accountId ?? ''))) {
          throw alreadySettled();
        }
        await act.manager.update(OrderPayment, { id: payment.id }, { state: 'lapsed' });
        await act.audit('deposit-ended');
      },
      { evenOver: true },
    );
  }

  /** What was paid or given back elsewhere. */
  record(member: MemberInfo, place: OrderPlace, dto: RecordPaymentDto): Promise<void> {
    return this.acts.byMember(
      member,
      place,
      async (act) => {
        const { kind, amountMinor, currency, note } = dto;
        if (kind === 'refund') await requirePaid(act, amountMinor, currency);
        await act.manager.save(
          act.manager.create(OrderPayment, {
            ...ownedBy(act),
            ...{ kind, amountMinor, currency, note, byHand: true, state: 'paid', settledAt: new Date() },
          }),
        );
        const money = moneyWords(amountMinor, currency);
        await act.happened(`${kind}-recorded`, { note: `${money}, ${note}` });
        await act.tell({
          about: `a ${kind} was put down`,
          words: [`We have put down a ${kind} of ${money}: ${note}`],
        });
      },
      { evenOver: true },
    );
  }

  private async begun(act: OrderAct, amountMinor: number): Promise<OrderPayment> {
    const { manager, order } = act;
    const accountId = order.upholsterer?.accountId ?? null;
    if (!this.provider.isSetUp || accountId === null) {
      throw Problem.conflict(
        'deposit-by-hand-only',
        accountId === null
          ? 'The address book has no account of this upholsterer. Pay as you always do and record it by hand.'
          : 'No payment provider is set up here. Pay as you always do and record it by hand.',
      );
    }
    const quote = await acceptedQuote(manager, order);
    if (!quote) {
      throw Problem.conflict('no-accepted-quote', 'Accept the quote first: the deposit is a part of it.');
    }
    const { currency } = quote;
    const waiting = await manager.findOneBy(OrderPayment, { orderId: order.id, state: 'begun' });
    if (waiting) {
      if (waiting.amountMinor === amountMinor && waiting.currency === currency) return waiting;
      throw Problem.conflict(
        'deposit-begun',
        `A deposit of ${moneyWords(waiting.amountMinor, waiting.currency)} was begun and waits to be paid. End it first.`,
      );
    }
    const left = quote.totalMinor - (await paidMinor(act, currency));
    if (amountMinor > left) {
      throw Problem.invalid([
        {
          path: 'amountMinor',
          code: 'too-much',
          message: `${moneyWords(Math.max(0, left), currency)} of the quote is left to pay`,
        },
      ]);
    }
    await act.audit('deposit-begun');
    return manager.save(
      manager.create(OrderPayment, {
        ...ownedBy(act),
        ...{ kind: 'deposit', byHand: false, amountMinor, currency, state: 'begun', note: '', accountId },
      }),
    );
  }
}

async function lockPayment({ manager, order }: OrderAct, id: string): Promise<OrderPayment> {
  const lock = { mode: 'pessimistic_write' } as const;
  const payment = await manager.findOne(OrderPayment, { where: { id, orderId: order.id }, lock });
  if (!payment) throw Problem.notFound('deposit');
  return payment;
}

const alreadySettled = () =>
  Problem.conflict('deposit-settled', 'This deposit was paid or had ended meanwhile. Read the order anew.');

/** Deposits less refunds, with the upholsterer who has the order. */
async function paidMinor({ manager, order }: OrderAct, currency: string): Promise<number> {
  const { upholstererId } = order;
  const paid = await manager.findBy(OrderPayment, {
    ...{ orderId: order.id, upholstererId, currency, state: 'paid' as const },
  });
  return paid.reduce((sum, { kind, amountMinor }) => sum + (kind === 'refund' ? -1 : 1) * amountMinor, 0);
}

async function requirePaid(act: OrderAct, amountMinor: number, currency: string): Promise<void> {
  const paid = await paidMinor(act, currency);
  if (amountMinor > paid) {
    throw Problem.conflict(
      'refund-too-much',
      `No more than ${moneyWords(Math.max(0, paid), currency)} was paid, so no more can come back.`,
    );
  }
}
