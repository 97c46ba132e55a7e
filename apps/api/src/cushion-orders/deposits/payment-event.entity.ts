import { Column, CreateDateColumn, Entity, Index, PrimaryColumn } from 'typeorm';

/** What the payment provider told, once each. One whose payment is not known yet waits for it. */
@Entity('payment_events')
@Index(['paymentId'])
export class PaymentEvent {
  /** the provider's id of the event */
  @PrimaryColumn('text')
  eventId: string;

  @Column('text')
  type: string;

  @Column({ type: 'text', nullable: true })
  accountId: string | null;

  /** the provider's name of the payment it is about */
  @Column({ type: 'text', nullable: true })
  paymentId: string | null;

  /** The part of the event that is used, never card data. */
  @Column('jsonb')
  told: Record<string, unknown>;

  @CreateDateColumn({ type: 'timestamptz' })
  receivedAt: Date;

  @Column({ type: 'timestamptz', nullable: true })
  appliedAt: Date | null;
}
