import { Column, CreateDateColumn, Entity, Index, PrimaryGeneratedColumn } from 'typeorm';

/** Who did what. Holds ids only, never names or measures, so that an erased person stays erased. */
@Entity('audit_entries')
@Index(['workshopId', 'at'])
export class AuditEntry {
  @PrimaryGeneratedColumn('uuid')
  id: string;

  @CreateDateColumn({ type: 'timestamptz' })
  at: Date;

  @Column({ type: 'uuid', nullable: true })
  workshopId: string | null;

  @Column({ type: 'uuid', nullable: true })
  userId: string | null;

  @Column('text')
  action: string;

  @Column('text')
  subjectType: string;

  @Column({ type: 'uuid', nullable: true })
  subjectId: string | null;

  @Column({ type: 'jsonb', nullable: true })
  detail: Record<string, unknown> | null;
}
