import type { MeasureKey, WholeSummary } from '@settlewright/anthropometry';
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
import { User } from '../../users/entities/user.entity';
import { Workshop } from '../../workshops/entities/workshop.entity';

/** Statistics of people whom a workshop measured. The rows they were made of are not here. */
@Entity('populations')
@Index(['workshopId', 'name'])
export class OwnPopulation {
  @PrimaryGeneratedColumn('uuid')
  id: string;

  @Column('uuid')
  workshopId: string;

  @ManyToOne(() => Workshop, { nullable: false, onDelete: 'CASCADE' })
  @JoinColumn({ name: 'workshop_id' })
  workshop?: Relation<Workshop>;

  @Column('text')
  name: string;

  /** Who was measured, by whom, when, in the workshop's words. */
  @Column('text')
  source: string;

  /** People whose rows could be read. */
  @Column('integer')
  women: number;

  @Column('integer')
  men: number;

  /** Rows with a fault. */
  @Column('integer')
  leftOut: number;

  @Column('text', { array: true })
  read: MeasureKey[];

  @Column('text', { array: true })
  estimated: MeasureKey[];

  @Column('jsonb')
  summary: WholeSummary;

  @Column('uuid')
  addedById: string;

  @ManyToOne(() => User, { nullable: false })
  @JoinColumn({ name: 'added_by_id' })
  addedBy?: Relation<User>;

  @CreateDateColumn({ type: 'timestamptz' })
  addedAt: Date;
}
