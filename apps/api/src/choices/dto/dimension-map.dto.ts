import type { BestPair, MapRegion } from '@settlewright/geometry';
import { ApiProperty, ApiPropertyOptional } from '@nestjs/swagger';
import { ChoiceAnswerDto } from './choice-answer.dto';
import { CrowdDto, DimensionDto } from './story-stick.dto';

const grid = (items: Record<string, unknown>) => ({
  type: 'array' as const,
  items: { type: 'array' as const, items },
});

export class MapRegionDto implements Omit<MapRegion, 'rooms'>, Partial<MapRegion> {
  @ApiProperty()
  sitterId: string;
  @ApiProperty({ description: '`pieceId:place`' })
  placeId: string;
  @ApiProperty()
  name: string;
  @ApiProperty({
    ...grid({ type: 'string', enum: ['served', 'notKnown', 'lost'] }),
    description: 'served where at least tight by every check asked; a row for each value that goes up',
  })
  states: MapRegion['states'];
  @ApiPropertyOptional({
    ...grid({ type: 'number' }),
    description: 'only with `full`: room to the nearest fail line, at most 300 either way',
  })
  rooms?: number[][];
  @ApiPropertyOptional({ description: 'the check that keeps the sitter from fitting anywhere on the map' })
  blockedBy?: string;
}

export class MapSharesDto {
  @ApiProperty({ type: CrowdDto })
  population: CrowdDto;
  @ApiProperty({
    ...grid({ type: 'number', nullable: true }),
    description: 'share who fit every check asked at once, 0 to 1; null where not known; rows as `states`',
  })
  fits: (number | null)[][];
}

export class BestPairDto implements Omit<BestPair, 'share'> {
  @ApiProperty()
  across: number;
  @ApiProperty()
  up: number;
  @ApiProperty({ description: 'sitters that are at least tight' })
  served: number;
  @ApiPropertyOptional()
  share?: number;
}

/** Two numbers of a set against each other, as far as the reader may see it. */
export class DimensionMapDto extends ChoiceAnswerDto {
  @ApiProperty({ enum: ['full', 'verdicts'] })
  detail: 'full' | 'verdicts';
  @ApiProperty({ type: DimensionDto })
  across: DimensionDto;
  @ApiProperty({ type: DimensionDto })
  up: DimensionDto;
  @ApiProperty({ type: [Number] })
  acrossValues: number[];
  @ApiProperty({ type: [Number] })
  upValues: number[];
  @ApiProperty({ type: [String], description: 'rules of a person that were looked at' })
  ruleIds: string[];
  @ApiProperty({ type: [MapRegionDto] })
  regions: MapRegionDto[];
  @ApiPropertyOptional({ type: MapSharesDto })
  shares?: MapSharesDto;
  @ApiProperty({
    type: [BestPairDto],
    description: 'pairs that serve most sitters, then most of the people, then lie nearest to the present',
  })
  best: BestPairDto[];
  @ApiProperty()
  confidence: number;
}
