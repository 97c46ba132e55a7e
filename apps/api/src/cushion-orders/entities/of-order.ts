import {
  Column,
  CreateDateColumn,
  JoinColumn,
  ManyToOne,
  PrimaryGeneratedColumn,
  type Relation,
} from 'typeorm';
import { CushionOrder } from './cushion-order.entity';
import type { Side } from './order-message.entity';

/** What one side put to an order, for the upholsterer who had it then. */
export abstract class OfOrder {
  @PrimaryGeneratedColumn('uuid')
  id: string;

  @Column('uuid')
  orderId: string;

  @ManyToOne(() => CushionOrder, { nullable: false, onDelete: 'CASCADE' })
  @JoinColumn({ name: 'order_id' })
  order?: Relation<CushionOrder>;

  @Column('uuid')
  upholstererId: string;

  @Column('text')
  side: Side;

  /** null on the upholsterer's side: nobody there signs in. */
  @Column({ type: 'uuid', nullable: true })
  byId: string | null;

  @Column('text')
  byName: string;

  @CreateDateColumn({ type: 'timestamptz' })
  at: Date;
}
