import { Column, Entity, JoinColumn, OneToOne, PrimaryColumn, type Relation } from 'typeorm';
import { OwnPopulation } from './own-population.entity';

/** The measured people themselves, one line each. There only when the owner said to keep them. */
@Entity('population_rows')
export class PopulationRows {
  @PrimaryColumn('uuid')
  populationId: string;

  @OneToOne(() => OwnPopulation, { nullable: false, onDelete: 'CASCADE' })
  @JoinColumn({ name: 'population_id' })
  population?: Relation<OwnPopulation>;

  /** The columns that were used, as they stood in the file; names and other columns are not kept. */
  @Column('text')
  csv: string;
}
