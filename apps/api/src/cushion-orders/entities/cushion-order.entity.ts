import type { OrderCover } from '@settlewright/geometry';
import {
  Column,
  CreateDateColumn,
  Entity,
  Index,
  JoinColumn,
  ManyToOne,
  PrimaryGeneratedColumn,
  type Relation,
  Unique,
  UpdateDateColumn,
} from 'typeorm';
import { Production } from '../../productions/entities/production.entity';
import { DesignedSet } from '../../sets/entities/designed-set.entity';
import { SetRevision } from '../../sets/entities/set-revision.entity';
import { Upholsterer } from '../../upholsterers/entities/upholsterer.entity';
import { DEFAULT_TOLERANCE_MM, type OrderContent, type OrderSpec, type SentContent } from '../order-content';
import type { OrderState } from '../order-states';

@Entity('cushion_orders')
@Unique(['workshopId', 'number'])
@Index(['productionId'])
export class CushionOrder implements OrderContent {
  @PrimaryGeneratedColumn('uuid')
  id: string;

  @Column('uuid')
  workshopId: string;

  @Column('uuid')
  productionId: string;

  @ManyToOne(() => Production, { nullable: false, onDelete: 'CASCADE' })
  @JoinColumn({ name: 'production_id' })
  production?: Relation<Production>;

  @Column('uuid')
  setId: string;

  @ManyToOne(() => DesignedSet, { nullable: false, onDelete: 'CASCADE' })
  @JoinColumn({ name: 'set_id' })
  set?: Relation<DesignedSet>;

  /** Counts through the workshop, so that a firm can say "order 14". */
  @Column('integer')
  number: number;

  @Column('text')
  revisionLetter: string;

  /** An order cites an issued revision and nothing else. */
  @ManyToOne(() => SetRevision, { nullable: false, onDelete: 'CASCADE' })
  @JoinColumn([
    { name: 'set_id', referencedColumnName: 'setId' },
    { name: 'revision_letter', referencedColumnName: 'letter' },
  ])
  revision?: Relation<SetRevision>;

  @Column('text')
  title: string;

  @Column({ type: 'date', nullable: true })
  neededBy: string | null;

  @Column('integer')
  cushionCount: number;

  @Column({ type: 'text', array: true, nullable: true })
  cushionMarks: string[] | null;

  @Column('jsonb')
  spec: OrderSpec;

  /** How far a finished size may be off, either way. */
  @Column('double precision', { default: DEFAULT_TOLERANCE_MM })
  toleranceMm: number;

  /** Its cloths; none as long as nobody said them. */
  @Column({ type: 'jsonb', default: [] })
  covers: OrderCover[];

  @Column('text', { default: 'draft' })
  state: OrderState;

  @Column({ type: 'uuid', nullable: true })
  upholstererId: string | null;

  @ManyToOne(() => Upholsterer, { nullable: true, onDelete: 'RESTRICT' })
  @JoinColumn({ name: 'upholsterer_id' })
  upholsterer?: Relation<Upholsterer> | null;

  @Column({ type: 'jsonb', nullable: true })
  sent: SentContent | null;

  /** What the same upholsterer had before that, to say what changed. */
  @Column({ type: 'jsonb', nullable: true })
  sentBefore: SentContent | null;

  @Column('uuid')
  createdById: string;

  @CreateDateColumn({ type: 'timestamptz' })
  createdAt: Date;

  @UpdateDateColumn({ type: 'timestamptz' })
  updatedAt: Date;
}
