import { type EntityManager, IsNull } from 'typeorm';
import { hashToken, newToken } from '../common/secret-token';
import type { LinkState } from './dto/order.dto';
import { OrderLink } from './entities/order-link.entity';
import { linkExpiry } from './link-token';

/** Makes a link; the token is known to nobody but the caller, who mails it. */
export async function makeLink(
  manager: EntityManager,
  orderId: string,
): Promise<{ token: string; expiresAt: Date }> {
  const token = newToken();
  const expiresAt = linkExpiry(new Date());
  await manager.insert(OrderLink, { orderId, tokenHash: hashToken(token), expiresAt, revokedAt: null });
  return { token, expiresAt };
}

/** Ends every link of the order; returns how many still worked. */
export async function revokeLinks(manager: EntityManager, orderId: string): Promise<number> {
  const result = await manager.update(OrderLink, { orderId, revokedAt: IsNull() }, { revokedAt: new Date() });
  return result.affected ?? 0;
}

/** What can be said of an order's links: the one that works longest, else why none does. */
export async function linkState(
  manager: EntityManager,
  orderId: string,
  now: Date,
): Promise<{ state: LinkState; expiresAt: Date | null }> {
  const links = await manager.find(OrderLink, { where: { orderId }, order: { expiresAt: 'DESC' } });
  const live = links.find((link) => link.revokedAt === null);
  if (live) return { state: live.expiresAt > now ? 'valid' : 'expired', expiresAt: live.expiresAt };
  return links.length > 0 ? { state: 'revoked', expiresAt: null } : { state: 'none', expiresAt: null };
}
