import type { EntityManager } from 'typeorm';
import type { KeptRow, KeptText } from '../../common/kept-text';
import { OrderPayment } from '../deposits/order-payment.entity';
import { OrderFile } from '../files/order-file.entity';
import { OrderInspection } from '../inspections/order-inspection.entity';
import { OrderQuestion } from '../questions/order-question.entity';
import { OrderQuote } from '../quotes/order-quote.entity';

/** What people typed into quotes, questions, inspections, payments and names of files of one order. */
export async function* lifeTexts(
  manager: EntityManager,
  orderId: string,
  where: string,
): AsyncGenerator<KeptRow> {
  const texts = (part: string, ...written: string[]): KeptText[] =>
    written.map((text) => ({ where: `${where}, ${part}`, text, alreadySent: true }));
  for (const row of await manager.findBy(OrderQuote, { orderId })) {
    const { id, lines, taxText, note, answer } = row;
    yield {
      texts: texts('quote', ...lines.map(({ text }) => text), taxText, note, answer),
      rewrite: (change) =>
        manager.update(
          OrderQuote,
          { id },
          {
            lines: lines.map((line) => ({ ...line, text: change(line.text) })),
            ...{ taxText: change(taxText), note: change(note), answer: change(answer) },
          },
        ),
    };
  }
  for (const { id, text, answer } of await manager.findBy(OrderQuestion, { orderId })) {
    yield {
      texts: texts('question', text, answer),
      rewrite: (change) =>
        manager.update(OrderQuestion, { id }, { text: change(text), answer: change(answer) }),
    };
  }
  for (const { id, note, cushions } of await manager.findBy(OrderInspection, { orderId })) {
    yield {
      texts: texts('inspection', note, ...cushions.map((cushion) => cushion.note)),
      rewrite: (change) =>
        manager.update(
          OrderInspection,
          { id },
          {
            note: change(note),
            cushions: cushions.map((cushion) => ({ ...cushion, note: change(cushion.note) })),
          },
        ),
    };
  }
  for (const { id, note } of await manager.findBy(OrderPayment, { orderId })) {
    yield {
      texts: texts('payment', note),
      rewrite: (change) => manager.update(OrderPayment, { id }, { note: change(note) }),
    };
  }
  for (const { id, name } of await manager.findBy(OrderFile, { orderId })) {
    yield {
      texts: texts('name of a file', name),
      rewrite: (change) => manager.update(OrderFile, { id }, { name: change(name) }),
    };
  }
}
