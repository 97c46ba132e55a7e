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
import { SetRevision } from './set-revision.entity';

export const DECISIONS = ['approved', 'changes-wanted'] as const;
export type Decision = (typeof DECISIONS)[number];

/** What a reviewer said of a revision. Said again, the newer word counts and the older one stays. */
@Entity('revision_approvals')
@Index(['revisionId', 'decidedAt'])
export class RevisionApproval {
  @PrimaryGeneratedColumn('uuid')
  id: string;

  @Column('uuid')
  revisionId: string;

  @ManyToOne(() => SetRevision, { nullable: false, onDelete: 'CASCADE' })
  @JoinColumn({ name: 'revision_id' })
  revision?: Relation<SetRevision>;

  @Column('text')
  decision: Decision;

  @Column('text')
  comment: string;

  @Column('uuid')
  decidedById: string;

  @ManyToOne(() => User, { nullable: false })
  @JoinColumn({ name: 'decided_by_id' })
  decidedBy?: Relation<User>;

  @CreateDateColumn({ type: 'timestamptz' })
  decidedAt: Date;
}
