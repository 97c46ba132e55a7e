import {
  Column,
  CreateDateColumn,
  Entity,
  Index,
  JoinColumn,
  ManyToOne,
  PrimaryGeneratedColumn,
  type Relation,
} from 'typeorm';
import { Upholsterer } from '../../upholsterers/entities/upholsterer.entity';
import type { OrderState } from '../order-states';
import { CushionOrder } from './cushion-order.entity';
import type { Side } from './order-message.entity';

export const EVENT_KINDS = [
  'created',
  'sent',
  'acknowledged',
  'state',
  'link-renewed',
  'link-revoked',
  'quote-given',
  'quote-accepted',
  'quote-declined',
  'first-article-accepted',
  'first-article-rejected',
  'delivery-accepted',
  'delivery-rejected',
  'deposit-paid',
  'deposit-recorded',
  'refund-recorded',
  'mail-bounced',
] as const;
export type EventKind = (typeof EVENT_KINDS)[number];

/** What happened to an order, and who says so. Only ever added to. */
@Entity('order_events')
@Index(['orderId', 'at'])
export class OrderEvent {
  @PrimaryGeneratedColumn('uuid')
  id: string;

  @Column('uuid')
  orderId: string;

  @ManyToOne(() => CushionOrder, { nullable: false, onDelete: 'CASCADE' })
  @JoinColumn({ name: 'order_id' })
  order?: Relation<CushionOrder>;

  /** Whoever had the order then, or null before anybody had it. */
  @Column({ type: 'uuid', nullable: true })
  upholstererId: string | null;

  @ManyToOne(() => Upholsterer, { nullable: true, onDelete: 'RESTRICT' })
  @JoinColumn({ name: 'upholsterer_id' })
  upholsterer?: Relation<Upholsterer> | null;

  @Column('text')
  kind: EventKind;

  @Column('text')
  side: Side;

  @Column({ type: 'uuid', nullable: true })
  byId: string | null;

  @Column('text')
  byName: string;

  @Column({ type: 'text', nullable: true })
  fromState: OrderState | null;

  @Column({ type: 'text', nullable: true })
  toState: OrderState | null;

  @Column('text')
  revisionLetter: string;

  @Column('text')
  note: string;

  @CreateDateColumn({ type: 'timestamptz' })
  at: Date;
}
