import type { BodyData, Clothing, TapeMeasureKey } from '@settlewright/anthropometry';
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
import { Production } from '../../productions/entities/production.entity';

export const BODY_DATA = ['women', 'men', 'mixed'] as const satisfies readonly BodyData[];
export const CLOTHING = ['light', 'medium', 'heavy'] as const satisfies readonly Clothing[];
export const STATURE_SOURCES = ['measured', 'told'] as const;
export type StatureSource = (typeof STATURE_SOURCES)[number];

/** A value taken with a tape, and by whom and when if that was written down. */
export interface TapeMeasure {
  mm: number;
  takenBy?: string;
  /** Calendar day, `2026-11-03`. */
  takenOn?: string;
}

export type TapeMeasures = Partial<Record<TapeMeasureKey, TapeMeasure>>;

/** A named person who will sit. The measures are personal: `removedAt` means that they are gone for good. */
@Entity('cast_members')
@Index(['productionId', 'name'])
export class CastMember {
  @PrimaryGeneratedColumn('uuid')
  id: string;

  @Column('uuid')
  productionId: string;

  @ManyToOne(() => Production, { nullable: false, onDelete: 'CASCADE' })
  @JoinColumn({ name: 'production_id' })
  production?: Relation<Production>;

  @Column('text')
  name: string;

  /** The part in the production: "the conductor". */
  @Column('text')
  role: string;

  @Column('text')
  bodyData: BodyData;

  @Column({ type: 'double precision', nullable: true })
  statureMm: number | null;

  @Column('text')
  statureSource: StatureSource;

  @Column({ type: 'double precision', nullable: true })
  weightKg: number | null;

  /** Whole years; moves a few measures where stature and weight are known. */
  @Column({ type: 'smallint', nullable: true })
  age: number | null;

  @Column('jsonb')
  measured: TapeMeasures;

  @Column('double precision')
  shoeMm: number;

  @Column('text')
  clothing: Clothing;

  @Column('text')
  notes: string;

  @Column('smallint')
  colour: number;

  @Column({ type: 'timestamptz', nullable: true })
  removedAt: Date | null;

  /** The n of "removed sitter n". */
  @Column({ type: 'integer', nullable: true })
  removedNumber: number | null;

  @CreateDateColumn({ type: 'timestamptz' })
  createdAt: Date;

  @UpdateDateColumn({ type: 'timestamptz' })
  updatedAt: Date;
}
