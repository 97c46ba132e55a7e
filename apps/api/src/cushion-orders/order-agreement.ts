import { type EntityManager, In } from 'typeorm';
import { Problem } from '../common/problem';
import type { CushionOrder } from './entities/cushion-order.entity';
import { OrderEvent } from './entities/order-event.entity';
import { ofItsUpholsterer } from './order-access';
import { sameContent } from './order-content';
import { OrderQuote } from './quotes/order-quote.entity';

/** The word of the upholsterer who has the order on what was last sent, if it was given. */
export async function acknowledgementOf(
  manager: EntityManager,
  order: CushionOrder,
): Promise<OrderEvent | null> {
  const last = await manager.findOne(OrderEvent, {
    where: { orderId: order.id, ...ofItsUpholsterer(order), kind: In(['sent', 'acknowledged']) },
    order: { at: 'DESC' },
  });
  return last?.kind === 'acknowledged' ? last : null;
}

/** Whether a quote is for what the upholsterer has now, and not for an earlier sending or another's. */
export function isForWhatWasSent(quote: OrderQuote, order: CushionOrder): boolean {
  return (
    order.sent !== null &&
    quote.upholstererId === order.upholstererId &&
    quote.sentAt.getTime() === Date.parse(order.sent.at)
  );
}

/** The workshop's word: the quote it accepted for what was last sent. */
export async function acceptedQuote(manager: EntityManager, order: CushionOrder): Promise<OrderQuote | null> {
  const accepted = await manager.find(OrderQuote, {
    where: { orderId: order.id, state: 'accepted' },
    order: { at: 'DESC' },
  });
  return accepted.find((quote) => isForWhatWasSent(quote, order)) ?? null;
}

/** Refuses a word on a paper that the order no longer asks for. */
export function requireUnchanged(order: CushionOrder): void {
  if (order.sent && !sameContent(order.sent, order)) {
    throw Problem.conflict(
      'changed-since-sent',
      'The order was changed after it was sent. Send it again: both sides agree to the same revision.',
    );
  }
}

/** Refuses an answer of the upholsterer to another sending than the one that is in force. */
export function requireSameSending(order: CushionOrder, sentAt: string | undefined): void {
  if (sentAt !== undefined && Date.parse(sentAt) !== Date.parse(order.sent?.at ?? '')) {
    throw Problem.conflict(
      'order-sent-again',
      'The workshop sent this order again meanwhile. Read it anew first.',
    );
  }
}

export type Inspected = 'waiting' | 'accepted' | 'rejected';

/** How the first article stands that was last shown; `waiting` as long as nobody has said. */
export function firstArticleOf(manager: EntityManager, order: CushionOrder): Promise<Inspected> {
  return lastWord(manager, order, ['first-article-accepted', 'first-article-rejected'], 'first-article');
}

/** How the batch was received; `waiting` as long as nobody has said. */
export function deliveryOf(manager: EntityManager, order: CushionOrder): Promise<Inspected> {
  return lastWord(manager, order, ['delivery-accepted', 'delivery-rejected'], 'shipped');
}

/** The last of two words since the order was last brought to a state. */
async function lastWord(
  manager: EntityManager,
  order: CushionOrder,
  [accepted, rejected]: [OrderEvent['kind'], OrderEvent['kind']],
  since: OrderEvent['toState'],
): Promise<Inspected> {
  const own = { orderId: order.id, ...ofItsUpholsterer(order) };
  const last = await manager.findOne(OrderEvent, {
    where: [
      { ...own, kind: In([accepted, rejected]) },
      { ...own, kind: 'state', toState: since ?? undefined },
    ],
    order: { at: 'DESC' },
  });
  if (last?.kind === accepted) return 'accepted';
  return last?.kind === rejected ? 'rejected' : 'waiting';
}
