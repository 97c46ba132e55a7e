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
import type { ToldPopulation } from '../../studies/told-population';
import { User } from '../../users/entities/user.entity';
import type { Found, SearchQuestion, ToldDimension, ToldSitter } from '../search-question';

/** A search for the dimensions that serve everybody named, and then most of a population, in one document of a set. */
@Entity('dimension_searches')
@Index(['setId', 'startedAt'])
export class DimensionSearch {
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
  free: ToldDimension[];

  @Column('jsonb')
  served: ToldSitter[];

  /** Null: nobody besides those who are named. */
  @Column({ type: 'jsonb', nullable: true })
  population: ToldPopulation | null;

  @Column({ type: 'double precision', nullable: true })
  womenPercent: number | null;

  @Column('text')
  ruleVersion: string;

  @Column('text')
  state: JobState;

  /** Choices tried, of at most how many. */
  @Column('integer')
  done: number;

  @Column('integer')
  most: number;

  /** The part that is to be done next, from 0: what two workers did is kept once. */
  @Column('integer')
  part: number;

  /** Gone once nothing is left to be tried. As text, so that measures keep their order. */
  @Column({ type: 'json', nullable: true })
  question: SearchQuestion | null;

  /** Names the question while it is there: it is not asked twice at once. */
  @Column({ type: 'text', nullable: true })
  digest: string | null;

  @Column({ type: 'json', nullable: true })
  found: Found | null;

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
