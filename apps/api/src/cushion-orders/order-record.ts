import type { EntityManager } from 'typeorm';
import type { CushionOrder } from './entities/cushion-order.entity';
import { type EventKind, OrderEvent } from './entities/order-event.entity';
import type { Side } from './entities/order-message.entity';
import type { OrderState } from './order-states';

export interface Happened {
  kind: EventKind;
  side?: Side;
  byId: string | null;
  byName: string;
  fromState?: OrderState;
  note?: string;
}

/** Writes down what happened, in the transaction in which it happens. */
export async function recordEvent(
  manager: EntityManager,
  order: CushionOrder,
  happened: Happened,
): Promise<OrderEvent> {
  return manager.save(
    manager.create(OrderEvent, {
      orderId: order.id,
      upholstererId: order.upholstererId,
      kind: happened.kind,
      side: happened.side ?? 'workshop',
      byId: happened.byId,
      byName: happened.byName,
      fromState: happened.fromState ?? null,
      toState: happened.fromState === undefined ? null : order.state,
      revisionLetter: order.revisionLetter,
      note: happened.note ?? '',
    }),
  );
}
