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

export const UNIT_SYSTEMS = ['feet-inches', 'decimal-inches', 'millimetres'] as const;
export type UnitSystem = (typeof UNIT_SYSTEMS)[number];

/** Fractions of an inch that shown lengths are rounded to. */
export const ROUNDINGS = [16, 8] as const;
export type Rounding = (typeof ROUNDINGS)[number];

/** One job for a client. */
@Entity('productions')
@Index(['workshopId', 'name'])
export class Production {
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
  summary: string;

  @Column('text')
  units: UnitSystem;

  @Column('smallint')
  roundTo: Rounding;

  @Column({ type: 'timestamptz', nullable: true })
  archivedAt: Date | null;

  @CreateDateColumn({ type: 'timestamptz' })
  createdAt: Date;

  @UpdateDateColumn({ type: 'timestamptz' })
  updatedAt: Date;
}
