import { type EntityManager, In } from 'typeorm';
import { Problem } from '../common/problem';
import type { User } from '../users/entities/user.entity';
import { Membership } from '../workshops/entities/membership.entity';
import type { CushionOrder } from './entities/cushion-order.entity';
import type { SentContent } from './order-content';

/** Who speaks for the workshop about an order: its sender, or the first owner once the sender no longer may. */
export async function contactOf(
  manager: EntityManager,
  { workshopId }: Pick<CushionOrder, 'workshopId'>,
  { byUserId }: Pick<SentContent, 'byUserId'>,
): Promise<User> {
  const sender = await manager.findOne(Membership, {
    where: { workshopId, userId: byUserId, role: In(['owner', 'designer']) },
    relations: { user: true },
  });
  const contact =
    sender ??
    (await manager.findOne(Membership, {
      where: { workshopId, role: 'owner' },
      relations: { user: true },
      order: { createdAt: 'ASC', userId: 'ASC' },
    }));
  if (!contact) throw Problem.notFound('person');
  return contact.user;
}
