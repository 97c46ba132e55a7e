import type { ShareOutcome } from '@settlewright/anthropometry';
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
import type { JobState } from '../../jobs/job-states';
import { DesignedSet } from '../../sets/entities/designed-set.entity';
import { User } from '../../users/entities/user.entity';
import type { StudyQuestion, StudyResult } from '../study-question';
import type { ToldPopulation } from '../told-population';

/** How many people of a population one document of a set fits. */
@Entity('studies')
@Index(['setId', 'startedAt'])
export class Study {
  @PrimaryGeneratedColumn('uuid')
  id: string;

  @Column('uuid')
  setId: string;

  @ManyToOne(() => DesignedSet, { nullable: false, onDelete: 'CASCADE' })
  @JoinColumn({ name: 'set_id' })
  set?: Relation<DesignedSet>;

  /** The document: a draft or a revision. */
  @Column({ type: 'integer', nullable: true })
  draftNumber: number | null;

  @Column({ type: 'text', nullable: true })
  revisionLetter: string | null;

  @Column('jsonb')
  population: ToldPopulation;

  @Column({ type: 'double precision', nullable: true })
  womenPercent: number | null;

  @Column('integer')
  people: number;

  @Column('integer')
  seed: number;

  /** Ticked rules and places; null: all. */
  @Column({ type: 'text', array: true, nullable: true })
  ruleIds: string[] | null;

  @Column({ type: 'text', array: true, nullable: true })
  placeIds: string[] | null;

  @Column('text')
  ruleVersion: string;

  @Column('text')
  state: JobState;

  @Column('integer')
  blocks: number;

  @Column('integer')
  blocksDone: number;

  /** Gone once nothing is left to be counted. */
  @Column({ type: 'jsonb', nullable: true })
  question: StudyQuestion | null;

  @Column({ type: 'jsonb', nullable: true })
  result: StudyResult | null;

  /** The share of all ticked rules at once, for lists. */
  @Column({ type: 'jsonb', nullable: true })
  outcome: ShareOutcome | null;

  /** Why it failed, in words. */
  @Column({ type: 'text', nullable: true })
  fault: string | null;

  @Column('uuid')
  startedById: string;

  @ManyToOne(() => User, { nullable: false })
  @JoinColumn({ name: 'started_by_id' })
  startedBy?: Relation<User>;

  @CreateDateColumn({ type: 'timestamptz' })
  startedAt: Date;

  @Column({ type: 'timestamptz', nullable: true })
  endedAt: Date | null;
}
