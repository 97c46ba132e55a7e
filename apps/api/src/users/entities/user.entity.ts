import { Column, CreateDateColumn, Entity, Index, PrimaryGeneratedColumn } from 'typeorm';

/**
 * An address belongs to the one account that confirmed it. Unconfirmed accounts may share it, so that signing
 * up never tells whether an address is known here.
 */
@Entity('users')
@Index(['email'], { unique: true, where: 'email_confirmed_at IS NOT NULL' })
@Index(['email', 'createdAt'])
export class User {
  @PrimaryGeneratedColumn('uuid')
  id: string;

  @Column('text')
  name: string;

  /** in lower case, as it is compared */
  @Column('text')
  email: string;

  @Column({ type: 'timestamptz', nullable: true })
  emailConfirmedAt: Date | null;

  @Column('text')
  passwordHash: string;

  @CreateDateColumn({ type: 'timestamptz' })
  createdAt: Date;
}
