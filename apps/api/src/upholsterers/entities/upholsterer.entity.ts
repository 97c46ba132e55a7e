import {
  Column,
  CreateDateColumn,
  Entity,
  Index,
  JoinColumn,
  ManyToOne,
  PrimaryGeneratedColumn,
  type Relation,
  UpdateDateColumn,
} from 'typeorm';
import type { UnitSystem } from '../../productions/entities/production.entity';
import { type Paper, Workshop } from '../../workshops/entities/workshop.entity';

/** An address in the workshop's book. One that orders cite is never deleted: it loses its contact and is hidden. */
@Entity('upholsterers')
@Index(['workshopId', 'name'])
export class Upholsterer {
  @PrimaryGeneratedColumn('uuid')
  id: string;

  @Column('uuid')
  workshopId: string;

  @ManyToOne(() => Workshop, { nullable: false, onDelete: 'CASCADE' })
  @JoinColumn({ name: 'workshop_id' })
  workshop?: Relation<Workshop>;

  @Column('text')
  name: string;

  @Column('text')
  contactName: string;

  @Column('text')
  email: string;

  @Column('text')
  telephone: string;

  @Column('text')
  notes: string;

  /** Working days from cloth and agreement to shipping, as they usually say. */
  @Column({ type: 'integer', nullable: true })
  leadDays: number | null;

  @Column('text', { default: '' })
  clothNotes: string;

  @Column({ type: 'text', nullable: true })
  units: UnitSystem | null;

  @Column({ type: 'text', nullable: true })
  paper: Paper | null;

  /** ISO 4217 */
  @Column({ type: 'text', nullable: true })
  currency: string | null;

  /** Their account at the payment provider; without one, money is only recorded by hand. */
  @Column({ type: 'text', nullable: true })
  accountId: string | null;

  @Column({ type: 'timestamptz', nullable: true })
  removedAt: Date | null;

  @CreateDateColumn({ type: 'timestamptz' })
  createdAt: Date;

  @UpdateDateColumn({ type: 'timestamptz' })
  updatedAt: Date;
}
