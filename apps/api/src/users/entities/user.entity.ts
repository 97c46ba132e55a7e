import { Column, CreateDateColumn, Entity, PrimaryGeneratedColumn } from 'typeorm';

@Entity('users')
export class User {
  @PrimaryGeneratedColumn('uuid')
  id: string;

  @Column('text')
  name: string;

  /** in lower case, as it is compared */
  @Column('text', { unique: true })
  email: string;

  @Column({ type: 'timestamptz', nullable: true })
  emailConfirmedAt: Date | null;

  @Column('text')
  passwordHash: string;

  @CreateDateColumn({ type: 'timestamptz' })
  createdAt: Date;
}
