import { Column, Entity, Index } from 'typeorm';
import { DocumentJob } from '../../jobs/entities/document-job.entity';
import type { ToldPopulation } from '../../studies/told-population';
import type { Found, SearchQuestion, ToldDimension, ToldSitter } from '../search-question';

/** A search for the dimensions that serve everybody named, and then most of a population, in one document of a set. */
@Entity('dimension_searches')
@Index(['setId', 'startedAt'])
export class DimensionSearch extends DocumentJob {
  @Column('jsonb')
  free: ToldDimension[];

  @Column('jsonb')
  served: ToldSitter[];

  /** Null: nobody besides those who are named. */
  @Column({ type: 'jsonb', nullable: true })
  population: ToldPopulation | null;

  /** Choices tried, of at most how many. */
  @Column('integer')
  done: number;

  @Column('integer')
  most: number;

  /** The part that is to be done next, from 0: what two workers did is kept once. */
  @Column('integer')
  part: number;

  /** Gone once nothing is left to be tried. As text, so that measures keep their order. */
  @Column({ type: 'json', nullable: true })
  question: SearchQuestion | null;

  /** Names the question while it is there: it is not asked twice at once. */
  @Column({ type: 'text', nullable: true })
  digest: string | null;

  @Column({ type: 'json', nullable: true })
  found: Found | null;
}
