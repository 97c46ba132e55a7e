import {
  Column,
  CreateDateColumn,
  Entity,
  Index,
  JoinColumn,
  ManyToOne,
  PrimaryColumn,
  type Relation,
} from 'typeorm';
import type { Role } from '../../common/access.decorator';
import { User } from '../../users/entities/user.entity';
import { Workshop } from './workshop.entity';

@Entity('memberships')
@Index(['userId'])
export class Membership {
  @PrimaryColumn('uuid')
  workshopId: string;

  @PrimaryColumn('uuid')
  userId: string;

  @ManyToOne(() => Workshop, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'workshop_id' })
  workshop: Relation<Workshop>;

  @ManyToOne(() => User, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'user_id' })
  user: Relation<User>;

  @Column('text')
  role: Role;

  @CreateDateColumn({ type: 'timestamptz' })
  createdAt: Date;
}
