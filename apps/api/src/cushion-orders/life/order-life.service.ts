import { Injectable } from '@nestjs/common';
import { InjectDataSource } from '@nestjs/typeorm';
import { DataSource } from 'typeorm';
import { MailService } from '../../mail/mail.service';
import { PaymentProvider } from '../../payments/payment-provider.service';
import { WorkshopsService } from '../../workshops/workshops.service';
import { OrderPayment } from '../deposits/order-payment.entity';
import type { CushionOrder } from '../entities/cushion-order.entity';
import { OrderFile } from '../files/order-file.entity';
import { OrderInspection } from '../inspections/order-inspection.entity';
import { LinkService } from '../link.service';
import { findOrder, type OrderPlace } from '../order-access';
import { acceptedQuote, acknowledgementOf, deliveryOf, firstArticleOf } from '../order-agreement';
import { contactOf } from '../order-contact';
import { toleranceOf } from '../order-content';
import { OUTGOING_KINDS } from '../order-mail';
import { marksAfter } from '../order-marks.service';
import { mayQuote } from '../order-states';
import { OrderQuestion } from '../questions/order-question.entity';
import { OrderQuote } from '../quotes/order-quote.entity';
import { SentCushions } from '../sent-cushions.service';
import { orderChanges } from './order-changes';
import type { OrderLifeDto } from './order-life.dto';
import {
  fileDto,
  inspectionDto,
  mailDto,
  type NameOf,
  paymentDto,
  questionDto,
  quoteDto,
} from './order-rows';

interface Reader {
  nameOf: NameOf;
  /** What was exchanged with an earlier upholsterer is the workshop's own. */
  only: { upholstererId?: string };
  forShop: boolean;
}

/** What has passed between the two sides of an order, as either of them may read it. */
@Injectable()
export class OrderLife {
  constructor(
    @InjectDataSource() private readonly dataSource: DataSource,
    private readonly links: LinkService,
    private readonly workshops: WorkshopsService,
    private readonly cushions: SentCushions,
    private readonly mail: MailService,
    private readonly provider: PaymentProvider,
  ) {}

  async forMember(place: OrderPlace): Promise<OrderLifeDto> {
    const order = await findOrder(this.dataSource.manager, place);
    return this.read(order, { nameOf: (_side, _id, name) => name, only: {}, forShop: true });
  }

  async forLink(token: string): Promise<OrderLifeDto> {
    const { order, sent } = await this.links.open(token);
    const workshop = await this.workshops.get(order.workshopId);
    const contact = await contactOf(this.dataSource.manager, order, sent);
    const nameOf: NameOf = (side, byId, name) =>
      side === 'workshop' && byId !== contact.id ? workshop.name : name;
    const only = { upholstererId: order.upholstererId ?? undefined };
    return this.read(order, { nameOf, only, forShop: false });
  }

  private async read(order: CushionOrder, { nameOf, only, forShop }: Reader): Promise<OrderLifeDto> {
    const { manager } = this.dataSource;
    const where = { orderId: order.id, ...only };
    const newest = { at: 'DESC', id: 'ASC' } as const;
    const oldest = { at: 'ASC', id: 'ASC' } as const;
    const settled = forShop ? {} : { state: 'paid' as const };
    const [files, payments, mails] = await Promise.all([
      manager.find(OrderFile, { where: { ...where, state: 'kept' }, order: oldest }),
      manager.find(OrderPayment, { where: { ...where, ...settled }, order: oldest }),
      forShop ? this.mail.allAbout(manager, order.id, OUTGOING_KINDS) : [],
    ]);
    const [quotes, questions, inspections, acknowledged, accepted, { timeZone }] = await Promise.all([
      manager.find(OrderQuote, { where, order: newest }),
      manager.find(OrderQuestion, { where, order: oldest }),
      manager.find(OrderInspection, { where, order: newest }),
      acknowledgementOf(manager, order),
      acceptedQuote(manager, order),
      this.workshops.get(order.workshopId),
    ]);
    const started = order.state === 'first-article' || order.state === 'in-work';
    const arrived = order.state === 'shipped' || order.state === 'received' || order.state === 'closed';
    return {
      toleranceMm: toleranceOf(order.sent ?? order),
      ...(await this.changes(order)),
      agreement: {
        upholsterer: acknowledged && { name: acknowledged.byName, at: acknowledged.at.toISOString() },
        workshop: accepted && {
          name: nameOf('workshop', null, accepted.answeredByName),
          at: (accepted.answeredAt ?? accepted.at).toISOString(),
        },
      },
      firstArticle: started ? await firstArticleOf(manager, order) : 'none',
      delivery: arrived ? await deliveryOf(manager, order) : 'none',
      upholstererMayMark: order.sent === null ? [] : await marksAfter(manager, order),
      upholstererMayQuote: order.sent !== null && mayQuote(order.state),
      quotes: quotes.map((quote) => quoteDto(quote, order, { nameOf, timeZone })),
      questions: questions.map((question) => questionDto(question, order, nameOf)),
      inspections: inspections.map((inspection) => inspectionDto(inspection, order, nameOf)),
      files: files.map((file) => fileDto(file, order, nameOf)),
      payments: payments.map((payment) => paymentDto(payment, order, nameOf)),
      depositOnline: this.provider.isSetUp && typeof order.upholsterer?.accountId === 'string',
      mails: mails.map(mailDto),
    };
  }

  private async changes(order: CushionOrder): Promise<Pick<OrderLifeDto, 'earlierRevision' | 'changes'>> {
    const { sent, sentBefore } = order;
    if (sent === null || sentBefore === null) return { earlierRevision: null, changes: [] };
    const [before, after] = await Promise.all([
      this.cushions.of(order, sentBefore),
      this.cushions.of(order, sent),
    ]);
    return {
      earlierRevision: sentBefore.revisionLetter,
      changes: orderChanges({ content: sentBefore, cushions: before }, { content: sent, cushions: after }),
    };
  }
}
