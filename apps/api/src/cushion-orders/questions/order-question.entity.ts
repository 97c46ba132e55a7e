import { Column, Entity, Index } from 'typeorm';
import { OfOrder } from '../entities/of-order';

/** A question pinned to a cushion or to the order; open until it is answered. */
@Entity('order_questions')
@Index(['orderId', 'at'])
export class OrderQuestion extends OfOrder {
  @Column({ type: 'text', nullable: true })
  cushionMark: string | null;

  @Column('text')
  text: string;

  @Column('text', { default: '' })
  answer: string;

  @Column('text', { default: '' })
  answeredByName: string;

  /** null for an answer from the upholsterer */
  @Column({ type: 'uuid', nullable: true })
  answeredById: string | null;

  @Column({ type: 'timestamptz', nullable: true })
  answeredAt: Date | null;
}
