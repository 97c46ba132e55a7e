import { Column, Entity, Index } from 'typeorm';
import { OfOrder } from '../entities/of-order';

export const PAYMENT_KINDS = ['deposit', 'refund'] as const;
export type PaymentKind = (typeof PAYMENT_KINDS)[number];

export const PAYMENT_STATES = ['begun', 'paid', 'lapsed'] as const;
export type PaymentState = (typeof PAYMENT_STATES)[number];

/** Money that went, or was begun to go, from the workshop to the upholsterer, or came back. */
@Entity('order_payments')
@Index(['orderId', 'at'])
export class OrderPayment extends OfOrder {
  @Column('text')
  kind: PaymentKind;

  /** What a person recorded happened elsewhere; the rest went through the payment provider. */
  @Column('boolean')
  byHand: boolean;

  @Column('integer')
  amountMinor: number;

  @Column('text')
  currency: string;

  @Column('text')
  state: PaymentState;

  @Column('text')
  note: string;

  /** The upholsterer's account at the provider, as it was then. */
  @Column({ type: 'text', nullable: true })
  accountId: string | null;

  /** The provider's names for the payment page, the payment and the refund. */
  @Column({ type: 'text', nullable: true })
  sessionId: string | null;

  @Column({ type: 'text', nullable: true })
  paymentId: string | null;

  @Column({ type: 'text', nullable: true, unique: true })
  refundId: string | null;

  @Column({ type: 'timestamptz', nullable: true })
  settledAt: Date | null;
}
