import type { FoamBuild } from '@settlewright/geometry';
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
import { CastMember } from '../cast/entities/cast-member.entity';
import { DesignedSet } from '../sets/entities/designed-set.entity';
import { User } from '../users/entities/user.entity';

/** Somebody sat on a piece of foam, and the drop was measured. Weights are personal: owner and designer alone see them. */
@Entity('test_sits')
@Index(['setId', 'satOn'])
@Index(['castId'])
export class TestSitRow {
  @PrimaryGeneratedColumn('uuid')
  id: string;

  @Column('uuid')
  setId: string;

  @ManyToOne(() => DesignedSet, { nullable: false, onDelete: 'CASCADE' })
  @JoinColumn({ name: 'set_id' })
  set?: Relation<DesignedSet>;

  /** Somebody of the cast; else `name` says who sat. */
  @Column({ type: 'uuid', nullable: true })
  castId: string | null;

  @ManyToOne(() => CastMember, { nullable: true, onDelete: 'CASCADE' })
  @JoinColumn({ name: 'cast_id' })
  cast?: Relation<CastMember> | null;

  @Column({ type: 'text', nullable: true })
  name: string | null;

  @Column('date')
  satOn: string;

  @Column('text')
  grade: string;

  @Column({ name: 'ifd25_newtons', type: 'double precision' })
  ifd25N: number;

  @Column('double precision')
  supportFactor: number;

  @Column('double precision')
  thicknessMm: number;

  /** As in the set document; null where the foam is in one piece. */
  @Column('jsonb', { nullable: true })
  layers: FoamBuild['layers'] | null;

  /** Null where there is none. */
  @Column('jsonb', { nullable: true })
  wrap: FoamBuild['wrap'] | null;

  @Column('double precision')
  weightKg: number;

  @Column('double precision')
  predictedMm: number;

  @Column('double precision')
  measuredMm: number;

  @Column('text')
  note: string;

  @Column('uuid')
  createdById: string;

  @ManyToOne(() => User, { nullable: false })
  @JoinColumn({ name: 'created_by_id' })
  createdBy?: Relation<User>;

  @CreateDateColumn({ type: 'timestamptz' })
  createdAt: Date;
}
