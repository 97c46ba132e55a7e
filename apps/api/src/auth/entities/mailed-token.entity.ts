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

export type MailedTokenPurpose = 'password-reset' | 'email-confirm' | 'email-change';

/** Proof, sent by mail and good for one use, that whoever holds it reads that address. */
@Entity('mailed_tokens')
@Index(['userId', 'purpose'])
export class MailedToken {
  @PrimaryGeneratedColumn('uuid')
  id: string;

  @Column('uuid')
  userId: string;

  @ManyToOne(() => User, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'user_id' })
  user: Relation<User>;

  @Column('text')
  purpose: MailedTokenPurpose;

  @Column('text')
  email: string;

  @Column('text', { unique: true })
  tokenHash: string;

  @CreateDateColumn({ type: 'timestamptz' })
  createdAt: Date;

  @Column('timestamptz')
  expiresAt: Date;

  @Column({ type: 'timestamptz', nullable: true })
  usedAt: Date | null;
}
