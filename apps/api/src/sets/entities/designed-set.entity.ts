import {
  Column,
  CreateDateColumn,
  Entity,
  Index,
  JoinColumn,
  ManyToOne,
  PrimaryGeneratedColumn,
  type Relation,
  UpdateDateColumn,
} from 'typeorm';
import { Production } from '../../productions/entities/production.entity';

/** One buildable interior of a production. What is drawn stands in its drafts and revisions. */
@Entity('sets')
@Index(['productionId', 'name'])
export class DesignedSet {
  @PrimaryGeneratedColumn('uuid')
  id: string;

  @Column('uuid')
  productionId: string;

  @ManyToOne(() => Production, { nullable: false, onDelete: 'CASCADE' })
  @JoinColumn({ name: 'production_id' })
  production?: Relation<Production>;

  @Column('text')
  name: string;

  /** Number of the draft in force. */
  @Column('integer')
  draftNumber: number;

  @Column({ type: 'timestamptz', nullable: true })
  archivedAt: Date | null;

  @CreateDateColumn({ type: 'timestamptz' })
  createdAt: Date;

  @UpdateDateColumn({ type: 'timestamptz' })
  updatedAt: Date;
}
