import { MEASURE_KEYS, type MeasureKey } from '@settlewright/anthropometry';
import { ApiProperty, ApiPropertyOptional } from '@nestjs/swagger';
import { PersonDto } from '../../sets/dto/person.dto';
import type { OwnPopulation } from '../entities/own-population.entity';

/** A workshop's own population as everybody in it may see it. */
export class PopulationDto {
  @ApiProperty({ format: 'uuid' })
  id: string;
  @ApiProperty()
  name: string;
  @ApiProperty({ description: 'who was measured, by whom and when' })
  source: string;
  @ApiProperty({ description: 'people behind it' })
  women: number;
  @ApiProperty()
  men: number;
  @ApiProperty({ description: 'rows that had a fault' })
  leftOut: number;
  @ApiProperty({ enum: MEASURE_KEYS, enumName: 'MeasureKey', isArray: true })
  read: MeasureKey[];
  @ApiProperty({ enum: MEASURE_KEYS, enumName: 'MeasureKey', isArray: true })
  estimated: MeasureKey[];
  @ApiProperty({ description: 'the measured rows themselves are kept, too' })
  rowsKept: boolean;
  @ApiProperty({ type: PersonDto })
  addedBy: PersonDto;
  @ApiProperty({ format: 'date-time' })
  addedAt: string;

  static of(population: OwnPopulation, rowsKept: boolean): PopulationDto {
    const { id, name, source, women, men, leftOut, read, estimated } = population;
    return {
      id,
      name,
      source,
      women,
      men,
      leftOut,
      read,
      estimated,
      rowsKept,
      addedBy: PersonDto.of(population.addedById, population.addedBy),
      addedAt: population.addedAt.toISOString(),
    };
  }
}

export class PopulationDetailsDto extends PopulationDto {
  @ApiPropertyOptional({
    type: 'object',
    additionalProperties: true,
    description: 'WholeSummary of the anthropometry library; for owner and designer',
  })
  summary?: object;
}
