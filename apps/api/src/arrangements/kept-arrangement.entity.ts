import type { SetDocument } from '@settlewright/geometry';
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
import { User } from '../users/entities/user.entity';
import { Workshop } from '../workshops/entities/workshop.entity';

/** Pieces that a workshop keeps to begin other sets with. Nobody sits in them: people belong to one production. */
@Entity('arrangements')
@Index(['workshopId', 'name'])
export class KeptArrangement {
  @PrimaryGeneratedColumn('uuid')
  id: string;

  @Column('uuid')
  workshopId: string;

  @ManyToOne(() => Workshop, { nullable: false, onDelete: 'CASCADE' })
  @JoinColumn({ name: 'workshop_id' })
  workshop?: Relation<Workshop>;

  @Column('text')
  name: string;

  @Column('jsonb')
  document: SetDocument;

  @CreateDateColumn({ type: 'timestamptz' })
  keptAt: Date;

  @Column('uuid')
  keptById: string;

  @ManyToOne(() => User, { nullable: false })
  @JoinColumn({ name: 'kept_by_id' })
  keptBy?: Relation<User>;
}
