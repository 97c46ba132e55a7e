import type { PartialStudy } from '@settlewright/anthropometry';
import { Column, Entity, JoinColumn, ManyToOne, PrimaryColumn, type Relation } from 'typeorm';
import { Study } from './study.entity';

/** Counts of one block, kept until all blocks of the study are in. */
@Entity('study_blocks')
export class StudyBlock {
  @PrimaryColumn('uuid')
  studyId: string;

  /** From 0. A block that two workers counted is kept once. */
  @PrimaryColumn('integer')
  block: number;

  @ManyToOne(() => Study, { nullable: false, onDelete: 'CASCADE' })
  @JoinColumn({ name: 'study_id' })
  study?: Relation<Study>;

  /** As text, so that measures keep their order, and with it the words that are made of them. */
  @Column('json')
  counts: PartialStudy;
}
