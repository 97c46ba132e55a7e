import type Stripe from 'stripe';

/** The part of the provider's events that is of use here. */
export type Told =
  | { kind: 'paid'; ownId: string; sessionId: string; paymentId: string }
  | { kind: 'lapsed'; ownId: string; paymentId: null }
  | { kind: 'refunded'; paymentId: string; refundId: string; amountMinor: number };

/** null: an event that changes nothing here. */
export function readTold(event: Stripe.Event): Told | null {
  switch (event.type) {
    case 'checkout.session.completed':
    case 'checkout.session.async_payment_succeeded': {
      const { id: sessionId, client_reference_id: ownId, payment_intent, payment_status } = event.data.object;
      const paymentId = idOf(payment_intent);
      // Completed and not yet paid: a slow way of paying, of which is told later.
      if (payment_status !== 'paid' || !isId(ownId) || paymentId === null) return null;
      return { kind: 'paid', ownId, sessionId, paymentId };
    }
    case 'checkout.session.expired':
    case 'checkout.session.async_payment_failed': {
      const { client_reference_id: ownId } = event.data.object;
      return isId(ownId) ? { kind: 'lapsed', ownId, paymentId: null } : null;
    }
    case 'refund.created':
    case 'refund.updated': {
      const { id: refundId, amount: amountMinor, payment_intent, status } = event.data.object;
      const paymentId = idOf(payment_intent);
      if (status !== 'succeeded' || paymentId === null) return null;
      return { kind: 'refunded', paymentId, refundId, amountMinor };
    }
    default:
      return null;
  }
}

const idOf = (given: string | { id: string } | null): string | null =>
  typeof given === 'string' ? given : (given?.id ?? null);

/** Whoever else uses the same account there gives its pages other names. */
const isId = (text: string | null): text is string =>
  text !== null && /^[0-9a-f]{8}(-[0-9a-f]{4}){3}-[0-9a-f]{12}$/.test(text);
