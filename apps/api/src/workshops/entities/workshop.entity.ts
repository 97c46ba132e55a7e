import { Column, CreateDateColumn, Entity, PrimaryGeneratedColumn } from 'typeorm';

export const PAPERS = ['a4', 'letter'] as const;
export type Paper = (typeof PAPERS)[number];

@Entity('workshops')
export class Workshop {
  @PrimaryGeneratedColumn('uuid')
  id: string;

  @Column('text')
  name: string;

  @Column('text', { default: '' })
  telephone: string;

  @Column('text', { default: 'letter' })
  paper: Paper;

  @Column('text', { default: 'UTC' })
  timeZone: string;

  /** Probability that a verdict asks for; null: as the rule data has it. */
  @Column({ type: 'double precision', nullable: true })
  confidence: number | null;

  /** When that was last changed; null: never. Verdicts counted before are counted again. */
  @Column({ type: 'timestamptz', nullable: true })
  confidenceSetAt: Date | null;

  @Column('boolean', { default: false })
  isDemo: boolean;

  @CreateDateColumn({ type: 'timestamptz' })
  createdAt: Date;
}
