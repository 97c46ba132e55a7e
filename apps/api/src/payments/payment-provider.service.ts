import { Injectable } from '@nestjs/common';
import Stripe from 'stripe';
import { Problem } from '../common/problem';
import { InjectSettings, type Settings } from '../config/settings';

export interface Checkout {
  /** our own id of the payment; also keeps one from being made twice */
  paymentId: string;
  accountId: string;
  amountMinor: number;
  currency: string;
  what: string;
  /** where the browser comes back to, paid or not */
  returnUrl: string;
}

const TIMEOUT_MS = 10_000;

/** The payment provider's page and what it tells afterwards; money goes straight to the upholsterer's account. */
@Injectable()
export class PaymentProvider {
  private readonly stripe: Stripe | null;

  constructor(@InjectSettings() private readonly config: Settings) {
    const { payments } = config;
    if (payments === null) {
      this.stripe = null;
      return;
    }
    const { protocol, hostname, port } = new URL(payments.apiUrl);
    const secure = protocol === 'https:';
    this.stripe = new Stripe(payments.secretKey, {
      protocol: secure ? 'https' : 'http',
      host: hostname,
      port: port === '' ? (secure ? 443 : 80) : Number(port),
      timeout: TIMEOUT_MS,
      maxNetworkRetries: 1,
      telemetry: false,
    });
  }

  get isSetUp(): boolean {
    return this.stripe !== null;
  }

  /** Asked again for the same payment, it answers with the same page. */
  async beginCheckout(asked: Checkout): Promise<{ sessionId: string; url: string }> {
    const { paymentId, accountId, amountMinor, currency, what, returnUrl } = asked;
    const back = (outcome: string) => `${returnUrl}?deposit=${outcome}`;
    const session = await this.asking((stripe) =>
      stripe.checkout.sessions.create(
        {
          mode: 'payment',
          client_reference_id: paymentId,
          line_items: [
            {
              quantity: 1,
              price_data: {
                currency: currency.toLowerCase(),
                unit_amount: amountMinor,
                product_data: { name: what },
              },
            },
          ],
          success_url: back('sent'),
          cancel_url: back('left'),
        },
        { stripeAccount: accountId, idempotencyKey: paymentId },
      ),
    );
    if (!session.url) throw unavailable();
    return { sessionId: session.id, url: session.url };
  }

  /** Closes a page that nobody has paid on; false when it was paid or had closed by itself. */
  async endCheckout(sessionId: string, accountId: string): Promise<boolean> {
    try {
      await this.needed().checkout.sessions.expire(sessionId, {}, { stripeAccount: accountId });
      return true;
    } catch (fault) {
      if (fault instanceof Stripe.errors.StripeInvalidRequestError) return false;
      throw unavailable();
    }
  }

  /** What the provider told, if it was the provider. */
  readEvent(body: Buffer, signature: string): Stripe.Event {
    const { payments } = this.config;
    if (payments === null) throw unavailable();
    try {
      return this.needed().webhooks.constructEvent(body, signature, payments.webhookSecret);
    } catch {
      throw new Problem(400, 'signature-wrong', 'This was not signed by the payment provider.');
    }
  }

  private async asking<T>(ask: (stripe: Stripe) => Promise<T>): Promise<T> {
    const stripe = this.needed();
    try {
      return await ask(stripe);
    } catch (fault) {
      if (fault instanceof Stripe.errors.StripeInvalidRequestError) {
        throw Problem.conflict('payment-refused', `The payment provider refuses: ${fault.message}`);
      }
      throw unavailable();
    }
  }

  private needed(): Stripe {
    if (this.stripe === null) throw unavailable();
    return this.stripe;
  }
}

function unavailable(): Problem {
  return new Problem(
    503,
    'payments-unavailable',
    'The payment provider does not answer. Nothing was paid; try again later, or record the deposit by hand.',
  );
}
