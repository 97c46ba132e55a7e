import {
  Column,
  CreateDateColumn,
  JoinColumn,
  ManyToOne,
  PrimaryGeneratedColumn,
  type Relation,
} from 'typeorm';
import { DesignedSet } from '../../sets/entities/designed-set.entity';
import { User } from '../../users/entities/user.entity';
import type { JobState } from '../job-states';

/** What a member starts and workers do about one document of a set, as every kind of it is kept. */
export abstract class DocumentJob {
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

  @Column({ type: 'double precision', nullable: true })
  womenPercent: number | null;

  @Column('text')
  ruleVersion: string;

  @Column('text')
  state: JobState;

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
