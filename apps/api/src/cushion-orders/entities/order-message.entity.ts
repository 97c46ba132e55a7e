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
import { CushionOrder } from './cushion-order.entity';

export const SIDES = ['workshop', 'upholsterer'] as const;
export type Side = (typeof SIDES)[number];

@Entity('order_messages')
@Index(['orderId', 'at'])
export class OrderMessage {
  @PrimaryGeneratedColumn('uuid')
  id: string;

  @Column('uuid')
  orderId: string;

  @ManyToOne(() => CushionOrder, { nullable: false, onDelete: 'CASCADE' })
  @JoinColumn({ name: 'order_id' })
  order?: Relation<CushionOrder>;

  /** The other side at that time; an order may go to another upholsterer later. */
  @Column({ type: 'uuid', nullable: true })
  upholstererId: string | null;

  @ManyToOne(() => Upholsterer, { nullable: true, onDelete: 'RESTRICT' })
  @JoinColumn({ name: 'upholsterer_id' })
  upholsterer?: Relation<Upholsterer> | null;

  @Column('text')
  side: Side;

  /** null on the upholsterer's side: nobody there signs in. */
  @Column({ type: 'uuid', nullable: true })
  authorId: string | null;

  @Column('text')
  authorName: string;

  @Column('text')
  text: string;

  @CreateDateColumn({ type: 'timestamptz' })
  at: Date;
}
