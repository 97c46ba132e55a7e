import type { Tried } from '@settlewright/geometry';
import { Column, Entity, JoinColumn, ManyToOne, PrimaryColumn, type Relation } from 'typeorm';
import { DimensionSearch } from './dimension-search.entity';

/** What was tried in one part of a search, kept until it is over: whoever goes on need not try it again. */
@Entity('search_tries')
export class SearchTries {
  @PrimaryColumn('uuid')
  searchId: string;

  /** From 0, in the order in which they were done. */
  @PrimaryColumn('integer')
  part: number;

  @ManyToOne(() => DimensionSearch, { nullable: false, onDelete: 'CASCADE' })
  @JoinColumn({ name: 'search_id' })
  search?: Relation<DimensionSearch>;

  @Column('json')
  tried: Tried[];
}
