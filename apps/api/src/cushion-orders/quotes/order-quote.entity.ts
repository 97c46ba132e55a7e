import { Column, Entity, Index } from 'typeorm';
import { OfOrder } from '../entities/of-order';

export interface QuoteLine {
  text: string;
  quantity: number;
  /** of one, in the smallest unit of the currency */
  unitMinor: number;
}

export const QUOTE_STATES = ['offered', 'accepted', 'declined', 'replaced'] as const;
export type QuoteState = (typeof QUOTE_STATES)[number];

/** A price for the order as it was sent at one time; for what is sent later it says nothing. */
@Entity('order_quotes')
@Index(['orderId', 'at'])
export class OrderQuote extends OfOrder {
  @Column('text')
  revisionLetter: string;

  /** `sent.at` of the order that it answers. */
  @Column('timestamptz')
  sentAt: Date;

  @Column('jsonb')
  lines: QuoteLine[];

  @Column('text')
  currency: string;

  @Column('text')
  taxText: string;

  @Column('integer')
  taxMinor: number;

  @Column('integer')
  totalMinor: number;

  @Column('date')
  validUntil: string;

  @Column({ type: 'date', nullable: true })
  deliveryOn: string | null;

  @Column('text')
  note: string;

  @Column('text', { default: 'offered' })
  state: QuoteState;

  @Column({ type: 'timestamptz', nullable: true })
  answeredAt: Date | null;

  @Column('text', { default: '' })
  answeredByName: string;

  /** Why it was declined, or how the answer is known. */
  @Column('text', { default: '' })
  answer: string;
}
