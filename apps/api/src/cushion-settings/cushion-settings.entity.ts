import type { FoamGrade, WorkshopCushions } from '@settlewright/geometry';
import { Column, Entity, JoinColumn, ManyToOne, OneToOne, PrimaryColumn, type Relation } from 'typeorm';
import { User } from '../users/entities/user.entity';
import { Workshop } from '../workshops/entities/workshop.entity';

/** How a workshop makes cushions, where it differs from the usual way. No row: it does not. */
@Entity('cushion_settings')
export class CushionSettingsRow {
  @PrimaryColumn('uuid')
  workshopId: string;

  @OneToOne(() => Workshop, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'workshop_id' })
  workshop?: Relation<Workshop>;

  @Column('jsonb')
  allowancesMm: WorkshopCushions['allowancesMm'];

  @Column('jsonb')
  foams: FoamGrade[];

  /** Raised by each change: two people who change at once do not write over each other. */
  @Column('integer')
  number: number;

  @Column('timestamptz')
  changedAt: Date;

  @Column('uuid')
  changedById: string;

  @ManyToOne(() => User, { nullable: false })
  @JoinColumn({ name: 'changed_by_id' })
  changedBy?: Relation<User>;
}
