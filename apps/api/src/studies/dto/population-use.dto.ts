import { ApiProperty } from '@nestjs/swagger';

/** A set whose studies drew from a population. */
export class PopulationUseDto {
  @ApiProperty({ format: 'uuid' })
  productionId: string;
  @ApiProperty()
  productionName: string;
  @ApiProperty({ format: 'uuid' })
  setId: string;
  @ApiProperty()
  setName: string;
  @ApiProperty({ description: 'studies that drew from it' })
  studies: number;
  @ApiProperty({ description: 'those of them that are still being counted' })
  unfinished: number;
}

export class PopulationUsesDto {
  @ApiProperty({ type: [PopulationUseDto], description: 'by production and set' })
  items: PopulationUseDto[];
}
