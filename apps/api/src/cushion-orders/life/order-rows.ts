import { todayIn } from '../../common/calendar-day';
import type { OutboxMail } from '../../mail/entities/outbox-mail.entity';
import type { PaymentDto } from '../deposits/deposit.dto';
import type { OrderPayment } from '../deposits/order-payment.entity';
import type { CushionOrder } from '../entities/cushion-order.entity';
import type { OfOrder } from '../entities/of-order';
import type { FileDto } from '../files/file.dto';
import type { OrderFile } from '../files/order-file.entity';
import type { InspectionDto } from '../inspections/inspection.dto';
import type { OrderInspection } from '../inspections/order-inspection.entity';
import { judgeCushion, judgeSizes } from '../inspections/size-verdict';
import { isForWhatWasSent } from '../order-agreement';
import type { OrderQuestion } from '../questions/order-question.entity';
import type { QuestionDto } from '../questions/question.dto';
import type { OrderQuote } from '../quotes/order-quote.entity';
import type { QuoteDto } from '../quotes/quote.dto';
import type { OfOrderDto } from './of-order.dto';
import type { OrderMailAboutDto } from './order-life.dto';

/** Who may be named to whoever reads: of the workshop's people the other side knows only the contact. */
export type NameOf = (side: OfOrder['side'], byId: string | null, byName: string) => string;

export function ofOrder(row: OfOrder, order: CushionOrder, nameOf: NameOf): OfOrderDto {
  const { id, side, byId, byName, at, upholstererId } = row;
  return {
    id,
    side,
    byName: nameOf(side, byId, byName),
    at: at.toISOString(),
    current: upholstererId === order.upholstererId,
  };
}

export function quoteDto(
  quote: OrderQuote,
  order: CushionOrder,
  { nameOf, timeZone }: { nameOf: NameOf; timeZone: string },
): QuoteDto {
  const { revisionLetter, lines, currency, taxText, taxMinor, totalMinor, validUntil, deliveryOn } = quote;
  const { note, state, answeredAt, answeredByName, answer } = quote;
  return {
    ...ofOrder(quote, order, nameOf),
    ...{ revisionLetter, lines, currency, taxText, taxMinor, totalMinor, validUntil, deliveryOn },
    ...{ note, state, answer },
    inForce: isForWhatWasSent(quote, order) && validUntil >= todayIn(timeZone),
    answeredAt: answeredAt?.toISOString() ?? null,
    answeredByName: answeredAt === null ? '' : nameOf('workshop', null, answeredByName),
  };
}

export function questionDto(question: OrderQuestion, order: CushionOrder, nameOf: NameOf): QuestionDto {
  const { cushionMark, text, answer, side, answeredById, answeredByName, answeredAt } = question;
  const answering = side === 'workshop' ? 'upholsterer' : 'workshop';
  return {
    ...ofOrder(question, order, nameOf),
    ...{ cushionMark, text, answer },
    answeredByName: answeredAt === null ? '' : nameOf(answering, answeredById, answeredByName),
    answeredAt: answeredAt?.toISOString() ?? null,
  };
}

export function inspectionDto(
  inspection: OrderInspection,
  order: CushionOrder,
  nameOf: NameOf,
): InspectionDto {
  const { kind, revisionLetter, toleranceMm, outcome, note, photoIds } = inspection;
  return {
    ...ofOrder(inspection, order, nameOf),
    ...{ kind, revisionLetter, toleranceMm, outcome, note, photoIds },
    cushions: inspection.cushions.map((row) => {
      const sizes = judgeSizes(row, toleranceMm);
      return { mark: row.mark, sizes, verdict: judgeCushion(sizes), note: row.note };
    }),
  };
}

export function fileDto(file: OrderFile, order: CushionOrder, nameOf: NameOf): FileDto {
  const { name, type, bytes, widthPx, heightPx, cushionMark } = file;
  return { ...ofOrder(file, order, nameOf), ...{ name, type, bytes, widthPx, heightPx, cushionMark } };
}

export function paymentDto(payment: OrderPayment, order: CushionOrder, nameOf: NameOf): PaymentDto {
  const { kind, byHand, amountMinor, currency, state, note, settledAt } = payment;
  return {
    ...ofOrder(payment, order, nameOf),
    ...{ kind, byHand, amountMinor, currency, state, note },
    settledAt: settledAt?.toISOString() ?? null,
  };
}

export function mailDto({ id, subject, state, queuedAt }: OutboxMail): OrderMailAboutDto {
  return { id, subject, state, at: queuedAt.toISOString() };
}
