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
import { CushionOrder } from './cushion-order.entity';

/** A private link to one order. The link itself is known only to who received it. */
@Entity('order_links')
@Index(['orderId'])
export class OrderLink {
  @PrimaryGeneratedColumn('uuid')
  id: string;

  @Column('uuid')
  orderId: string;

  @ManyToOne(() => CushionOrder, { nullable: false, onDelete: 'CASCADE' })
  @JoinColumn({ name: 'order_id' })
  order?: Relation<CushionOrder>;

  /** SHA-256 of the token, hexadecimal. */
  @Column('text', { unique: true })
  tokenHash: string;

  @Column('timestamptz')
  expiresAt: Date;

  @Column({ type: 'timestamptz', nullable: true })
  revokedAt: Date | null;

  @CreateDateColumn({ type: 'timestamptz' })
  createdAt: Date;
}
