import type { FitSheet } from '@settlewright/anthropometry';
import type { CushionRules, SetDocument } from '@settlewright/geometry';
import {
  Column,
  CreateDateColumn,
  Entity,
  JoinColumn,
  ManyToOne,
  PrimaryGeneratedColumn,
  type Relation,
  Unique,
} from 'typeorm';
import { User } from '../../users/entities/user.entity';
import { DesignedSet } from './designed-set.entity';
import type { Counts } from './set-draft.entity';

/**
 * A frozen issue of a set with the fit sheet of that day. The database refuses every change but one:
 * taking an erased person out of the sheet and out of what people typed.
 */
@Entity('set_revisions')
@Unique(['setId', 'letter'])
@Unique(['setId', 'ordinal'])
export class SetRevision {
  @PrimaryGeneratedColumn('uuid')
  id: string;

  @Column('uuid')
  setId: string;

  @ManyToOne(() => DesignedSet, { nullable: false, onDelete: 'CASCADE' })
  @JoinColumn({ name: 'set_id' })
  set?: Relation<DesignedSet>;

  /** 1 for A, 27 for AA. */
  @Column('integer')
  ordinal: number;

  @Column('text')
  letter: string;

  @Column('integer')
  draftNumber: number;

  @Column('jsonb')
  document: SetDocument;

  @Column('jsonb')
  fitSheet: FitSheet;

  @Column('jsonb')
  counts: Counts;

  /** What its cushions are made with; null: issued before workshops had rules of their own, so the usual way. */
  @Column({ type: 'jsonb', nullable: true })
  cushionRules: CushionRules | null;

  @Column('text')
  note: string;

  @Column('uuid')
  issuedById: string;

  @ManyToOne(() => User, { nullable: false })
  @JoinColumn({ name: 'issued_by_id' })
  issuedBy?: Relation<User>;

  @CreateDateColumn({ type: 'timestamptz' })
  issuedAt: Date;
}
