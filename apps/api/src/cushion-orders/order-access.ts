import { type EntityManager, IsNull } from 'typeorm';
import { Problem } from '../common/problem';
import { CushionOrder } from './entities/cushion-order.entity';

/** Where an order stands in the address of a request. */
export interface OrderPlace {
  workshopId: string;
  productionId: string;
  orderId: string;
}

/** The order, if it belongs to the workshop and production in the path. */
export async function findOrder(manager: EntityManager, place: OrderPlace): Promise<CushionOrder> {
  const order = await manager.findOne(CushionOrder, {
    where: { id: place.orderId, workshopId: place.workshopId, productionId: place.productionId },
    relations: { set: true, upholsterer: true },
  });
  if (!order) throw Problem.notFound('cushion order');
  return order;
}

/** As `findOrder`, and nobody else changes it until the transaction ends. */
export async function lockOrder(manager: EntityManager, place: OrderPlace): Promise<CushionOrder> {
  await manager.query('SELECT 1 FROM cushion_orders WHERE id = $1 FOR UPDATE', [place.orderId]);
  return findOrder(manager, place);
}

/** Picks what was exchanged with the upholsterer who has the order now, and with nobody before. */
export function ofItsUpholsterer({ upholstererId }: Pick<CushionOrder, 'upholstererId'>) {
  return { upholstererId: upholstererId ?? IsNull() };
}
