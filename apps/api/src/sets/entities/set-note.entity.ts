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
import { DesignedSet } from './designed-set.entity';

export const NOTE_KINDS = ['comment', 'mark'] as const;
export type NoteKind = (typeof NOTE_KINDS)[number];

/** A comment on the set, or a mark that the floor leaves on a piece. */
@Entity('set_notes')
@Index(['setId', 'createdAt'])
export class SetNote {
  @PrimaryGeneratedColumn('uuid')
  id: string;

  @Column('uuid')
  setId: string;

  @ManyToOne(() => DesignedSet, { nullable: false, onDelete: 'CASCADE' })
  @JoinColumn({ name: 'set_id' })
  set?: Relation<DesignedSet>;

  @Column('text')
  kind: NoteKind;

  @Column('text')
  text: string;

  /** The piece may be gone by now; the note stays. */
  @Column({ type: 'text', nullable: true })
  pieceId: string | null;

  @Column('uuid')
  createdById: string;

  @ManyToOne(() => User, { nullable: false })
  @JoinColumn({ name: 'created_by_id' })
  createdBy?: Relation<User>;

  @CreateDateColumn({ type: 'timestamptz' })
  createdAt: Date;

  @Column({ type: 'timestamptz', nullable: true })
  resolvedAt: Date | null;

  @Column({ type: 'uuid', nullable: true })
  resolvedById: string | null;

  @ManyToOne(() => User, { nullable: true })
  @JoinColumn({ name: 'resolved_by_id' })
  resolvedBy?: Relation<User> | null;
}
