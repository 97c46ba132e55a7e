import { Injectable } from '@nestjs/common';
import type { EntityManager } from 'typeorm';
import type { KeptRow, KeptText } from '../common/kept-text';
import { MailService } from '../mail/mail.service';
import { CushionOrder } from './entities/cushion-order.entity';
import { OrderEvent } from './entities/order-event.entity';
import { OrderMessage } from './entities/order-message.entity';
import { lifeTexts } from './life/life-texts';
import { coversOf, type OrderContent, type OrderSpec, SPEC_KEYS } from './order-content';

type Change = (text: string) => string;

/** What people typed into the orders of a production, and what was exchanged about them. */
@Injectable()
export class OrderTexts {
  constructor(private readonly mail: MailService) {}

  async *of(manager: EntityManager, productionId: string): AsyncGenerator<KeptRow> {
    const orders = await manager.find(CushionOrder, { where: { productionId }, order: { number: 'ASC' } });
    for (const order of orders) {
      const where = `Order ${order.number}`;
      yield ofOrder(manager, order, where);
      for (const { id, note } of await manager.findBy(OrderEvent, { orderId: order.id })) {
        yield {
          texts: [{ where: `${where}, what happened`, text: note }],
          rewrite: (change) => manager.update(OrderEvent, { id }, { note: change(note) }),
        };
      }
      for (const { id, side, text } of await manager.findBy(OrderMessage, { orderId: order.id })) {
        const by = side === 'workshop' ? 'to' : 'from';
        yield {
          texts: [{ where: `${where}, letter ${by} the upholsterer`, text, alreadySent: true }],
          rewrite: (change) => manager.update(OrderMessage, { id }, { text: change(text) }),
        };
      }
      yield* lifeTexts(manager, order.id, where);
      yield* await this.mail.textsAbout(manager, order.id, where);
    }
  }
}

function ofOrder(manager: EntityManager, order: CushionOrder, where: string): KeptRow {
  const { id, sent, sentBefore } = order;
  return {
    texts: [
      ...contentTexts(order, where, {}),
      ...(sent ? contentTexts(sent, `${where}, as it was sent`, { alreadySent: true }) : []),
      ...(sentBefore
        ? contentTexts(sentBefore, `${where}, as it was sent before`, { alreadySent: true })
        : []),
    ],
    rewrite: (change) =>
      manager.update(
        CushionOrder,
        { id },
        {
          ...changedWords(order, change),
          sent: sent && { ...sent, ...changedWords(sent, change) },
          sentBefore: sentBefore && { ...sentBefore, ...changedWords(sentBefore, change) },
        },
      ),
  };
}

function contentTexts(content: OrderContent, where: string, sent: Pick<KeptText, 'alreadySent'>): KeptText[] {
  const { title, spec } = content;
  return [
    { where: `${where}, title`, text: title, ...sent },
    ...SPEC_KEYS.map((key) => ({ where: `${where}, ${key}`, text: spec[key], ...sent })),
    ...coversOf(content).flatMap(({ name, com }) => [
      { where: `${where}, cloth`, text: name, ...sent },
      ...(com
        ? [
            { where: `${where}, dye lot`, text: com.dyeLot, ...sent },
            { where: `${where}, flaws of a cloth`, text: com.flaws, ...sent },
          ]
        : []),
    ]),
  ];
}

function changedWords(
  content: OrderContent,
  change: Change,
): Pick<OrderContent, 'title' | 'spec' | 'covers'> {
  const { title, spec } = content;
  const words = Object.fromEntries(SPEC_KEYS.map((key) => [key, change(spec[key])])) as Record<
    keyof OrderSpec,
    string
  >;
  const covers = coversOf(content).map(({ name, com, ...rest }) => ({
    ...rest,
    name: change(name),
    ...(com && { com: { ...com, dyeLot: change(com.dyeLot), flaws: change(com.flaws) } }),
  }));
  return { title: change(title), spec: words, covers };
}
