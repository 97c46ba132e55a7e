import { Injectable } from '@nestjs/common';
import type { EntityManager } from 'typeorm';
import type { MemberInfo } from '../../common/access.decorator';
import { todayIn } from '../../common/calendar-day';
import { moneyWords } from '../../common/currency';
import { Problem } from '../../common/problem';
import { WorkshopsService } from '../../workshops/workshops.service';
import { dayInWords } from '../day-in-words';
import type { CushionOrder } from '../entities/cushion-order.entity';
import type { OrderPlace } from '../order-access';
import { OrderActs, type OrderAct, ownedBy } from '../order-acts.service';
import {
  acknowledgementOf,
  isForWhatWasSent,
  requireSameSending,
  requireUnchanged,
} from '../order-agreement';
import { mayQuote, STATE_WORDS } from '../order-states';
import { OrderQuote } from './order-quote.entity';
import type { GiveQuoteDto, RecordQuoteDto } from './quote.dto';

/** Adding up is done in whole smallest units; beyond this a column would not hold it. */
const MOST_TOTAL_MINOR = 2_000_000_000;

/** Prices for an order, and the workshop's answer to them. */
@Injectable()
export class QuotesService {
  constructor(
    private readonly acts: OrderActs,
    private readonly workshops: WorkshopsService,
  ) {}

  give(token: string, dto: GiveQuoteDto): Promise<void> {
    return this.acts.byUpholsterer(token, dto.name, async (act) => {
      requireSameSending(act.order, dto.sentAt);
      await this.keep(act, dto, '');
    });
  }

  /** What was quoted on the telephone or on paper. */
  record(member: MemberInfo, place: OrderPlace, dto: RecordQuoteDto): Promise<void> {
    return this.acts.byMember(member, place, (act) => this.keep(act, dto, dto.heard));
  }

  accept(member: MemberInfo, place: OrderPlace, quoteId: string): Promise<void> {
    return this.acts.byMember(member, place, async (act) => {
      const { manager, order } = act;
      const quote = await findOffered(act, quoteId);
      requireUnchanged(order);
      if (!isForWhatWasSent(quote, order)) {
        throw Problem.conflict(
          'quote-of-older-revision',
          `This quote is for revision ${quote.revisionLetter} as it was sent before. Ask for one for what was sent last.`,
        );
      }
      const { timeZone } = await this.workshops.get(order.workshopId, manager);
      if (quote.validUntil < todayIn(timeZone)) {
        throw Problem.conflict(
          'quote-expired',
          `This quote was good until ${dayInWords(quote.validUntil)}. Ask for it anew.`,
        );
      }
      await answer(act, quote, 'accepted', '');
      await act.happened('quote-accepted', { note: moneyWords(quote.totalMinor, quote.currency) });
      const agreed = await acknowledgementOf(manager, order);
      if (agreed) {
        const fromState = order.state;
        order.state = 'agreed';
        await manager.save(order);
        await act.happened('state', { fromState });
      }
      await act.tell({
        about: 'your quote is accepted',
        words: [
          `We accept your quote of ${moneyWords(quote.totalMinor, quote.currency)} for revision ${quote.revisionLetter}.`,
          agreed
            ? `With your word on the page, revision ${quote.revisionLetter} is agreed. Please make the first article.`
            : `Please say on the page that you can make revision ${quote.revisionLetter} as drawn: then it is agreed.`,
        ],
      });
    });
  }

  decline(member: MemberInfo, place: OrderPlace, quoteId: string, reason: string): Promise<void> {
    return this.acts.byMember(member, place, async (act) => {
      const quote = await findOffered(act, quoteId);
      await answer(act, quote, 'declined', reason);
      await act.happened('quote-declined', { note: reason });
      await act.tell({
        about: 'your quote is declined',
        words: [
          `We cannot take your quote of ${moneyWords(quote.totalMinor, quote.currency)}.`,
          reason,
          'You can quote anew on the page.',
        ],
      });
    });
  }

  /** An order that is put down as agreed takes the quote that stands for it, if one does. */
  async settle(manager: EntityManager, order: CushionOrder, byName: string): Promise<void> {
    const offered = await manager.findBy(OrderQuote, { orderId: order.id, state: 'offered' });
    const quote = offered.find((one) => isForWhatWasSent(one, order));
    if (!quote) return;
    const answered = { answeredAt: new Date(), answeredByName: byName };
    await manager.update(OrderQuote, { id: quote.id }, { state: 'accepted', ...answered });
  }

  private async keep(act: OrderAct, dto: GiveQuoteDto | RecordQuoteDto, heard: string): Promise<void> {
    const { manager, order } = act;
    if (!mayQuote(order.state)) {
      throw Problem.conflict(
        'quote-too-late',
        `An order that is ${STATE_WORDS[order.state]} takes no new price. Write about it instead.`,
      );
    }
    const taxMinor = dto.taxMinor ?? 0;
    const totalMinor = dto.lines.reduce((sum, line) => sum + line.quantity * line.unitMinor, taxMinor);
    if (totalMinor > MOST_TOTAL_MINOR) {
      throw Problem.invalid([
        { path: 'lines', code: 'too-much', message: 'the lines add up to more than an order can cost' },
      ]);
    }
    const { timeZone } = await this.workshops.get(order.workshopId, manager);
    if (dto.validUntil < todayIn(timeZone)) {
      throw Problem.invalid([
        {
          path: 'validUntil',
          code: 'past',
          message: `${dto.validUntil} has passed; accepted: today or later`,
        },
      ]);
    }
    const earlier = { orderId: order.id, state: 'offered' as const };
    await manager.update(OrderQuote, earlier, { state: 'replaced' });
    await manager.update(OrderQuote, { ...earlier, state: 'accepted' }, { state: 'replaced' });
    const { currency, lines, validUntil } = dto;
    await manager.save(
      manager.create(OrderQuote, {
        ...ownedBy(act),
        revisionLetter: order.sent.revisionLetter,
        sentAt: new Date(order.sent.at),
        lines: lines.map(({ text, quantity, unitMinor }) => ({ text, quantity, unitMinor })),
        ...{ currency, totalMinor, taxMinor, validUntil },
        taxText: dto.taxText ?? '',
        deliveryOn: dto.deliveryOn ?? null,
        note: [dto.note ?? '', heard].filter(Boolean).join('\n'),
        state: 'offered',
        answeredAt: null,
      }),
    );
    const fromState = order.state;
    order.state = 'quoted';
    await manager.save(order);
    const price = moneyWords(totalMinor, currency);
    await act.happened('quote-given', { fromState, note: [price, heard].filter(Boolean).join(', ') });
    const words = `${price} for revision ${order.sent.revisionLetter}, good until ${dayInWords(validUntil)}.`;
    await act.tell(
      act.side === 'upholsterer'
        ? { about: 'a quote', words: [`${act.byName} quotes ${words}`, dto.note ?? ''] }
        : { about: 'your quote, as we noted it', words: [`We noted your quote: ${words}`] },
    );
  }
}

async function findOffered({ manager, order }: OrderAct, id: string): Promise<OrderQuote> {
  const quote = await manager.findOneBy(OrderQuote, { id, orderId: order.id });
  if (!quote) throw Problem.notFound('quote');
  if (quote.state !== 'offered' || order.state !== 'quoted') {
    throw Problem.conflict('quote-not-open', `This quote is ${quote.state}; nothing is left to answer.`);
  }
  return quote;
}

async function answer(
  { manager, byName }: OrderAct,
  quote: OrderQuote,
  state: 'accepted' | 'declined',
  words: string,
): Promise<void> {
  const answered = { answeredAt: new Date(), answeredByName: byName, answer: words };
  await manager.update(OrderQuote, { id: quote.id }, { state, ...answered });
}
