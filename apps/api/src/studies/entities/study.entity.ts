import type { ShareOutcome } from '@settlewright/anthropometry';
import { Column, Entity, Index } from 'typeorm';
import { DocumentJob } from '../../jobs/entities/document-job.entity';
import type { StudyQuestion, StudyResult } from '../study-question';
import type { ToldPopulation } from '../told-population';

/** How many people of a population one document of a set fits. */
@Entity('studies')
@Index(['setId', 'startedAt'])
export class Study extends DocumentJob {
  @Column('jsonb')
  population: ToldPopulation;

  @Column('integer')
  people: number;

  @Column('integer')
  seed: number;

  /** Ticked rules and places; null: all. */
  @Column({ type: 'text', array: true, nullable: true })
  ruleIds: string[] | null;

  @Column({ type: 'text', array: true, nullable: true })
  placeIds: string[] | null;

  @Column('integer')
  blocks: number;

  @Column('integer')
  blocksDone: number;

  /** Gone once nothing is left to be counted. */
  @Column({ type: 'jsonb', nullable: true })
  question: StudyQuestion | null;

  @Column({ type: 'jsonb', nullable: true })
  result: StudyResult | null;

  /** The share of all ticked rules at once, for lists. */
  @Column({ type: 'jsonb', nullable: true })
  outcome: ShareOutcome | null;
}
