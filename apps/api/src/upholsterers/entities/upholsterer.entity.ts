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
import { Workshop } from '../../workshops/entities/workshop.entity';

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

  @Column({ type: 'timestamptz', nullable: true })
  removedAt: Date | null;

  @CreateDateColumn({ type: 'timestamptz' })
  createdAt: Date;

  @UpdateDateColumn({ type: 'timestamptz' })
  updatedAt: Date;
}
