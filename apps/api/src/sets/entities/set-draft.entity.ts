import type { FitSheet } from '@settlewright/anthropometry';
import type { SetDocument } from '@settlewright/geometry';
import {
  Column,
  CreateDateColumn,
  Entity,
  JoinColumn,
  ManyToOne,
  PrimaryColumn,
  type Relation,
} from 'typeorm';
import { User } from '../../users/entities/user.entity';
import { DesignedSet } from './designed-set.entity';

export type Counts = FitSheet['counts'];

/** One saved draft. The latest ones are kept, so that a stale save can be shown what it began from. */
@Entity('set_drafts')
export class SetDraft {
  @PrimaryColumn('uuid')
  setId: string;

  @PrimaryColumn('integer')
  number: number;

  @ManyToOne(() => DesignedSet, { nullable: false, onDelete: 'CASCADE' })
  @JoinColumn({ name: 'set_id' })
  set?: Relation<DesignedSet>;

  @Column('jsonb')
  document: SetDocument;

  /** Verdicts of the fit sheet when the list last asked; null when not asked yet or not to be made. */
  @Column({ type: 'jsonb', nullable: true })
  counts: Counts | null;

  /** Counts older than the draft, or than what is known of its people, are made again. */
  @Column('timestamptz')
  countedAt: Date;

  @Column('uuid')
  savedById: string;

  @ManyToOne(() => User, { nullable: false })
  @JoinColumn({ name: 'saved_by_id' })
  savedBy?: Relation<User>;

  @CreateDateColumn({ type: 'timestamptz' })
  savedAt: Date;
}
