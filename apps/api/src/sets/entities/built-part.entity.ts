import {
  Column,
  CreateDateColumn,
  Entity,
  JoinColumn,
  ManyToOne,
  PrimaryColumn,
  type Relation,
} from 'typeorm';
import { User } from '../../users/entities/user.entity';
import { DesignedSet } from './designed-set.entity';

/** A part that the shop has ticked off as built. */
@Entity('built_parts')
export class BuiltPart {
  @PrimaryColumn('uuid')
  setId: string;

  @PrimaryColumn('text')
  partId: string;

  @ManyToOne(() => DesignedSet, { nullable: false, onDelete: 'CASCADE' })
  @JoinColumn({ name: 'set_id' })
  set?: Relation<DesignedSet>;

  @Column('uuid')
  builtById: string;

  @ManyToOne(() => User, { nullable: false })
  @JoinColumn({ name: 'built_by_id' })
  builtBy?: Relation<User>;

  @CreateDateColumn({ type: 'timestamptz' })
  builtAt: Date;
}
