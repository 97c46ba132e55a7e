import { ApiProperty, ApiPropertyOptional } from '@nestjs/swagger';
import {
  ArrayMaxSize,
  ArrayMinSize,
  IsArray,
  IsInt,
  IsNumber,
  IsOptional,
  IsString,
  Max,
  MaxLength,
  Min,
} from 'class-validator';
import { AskedDocumentDto } from './asked-document.dto';

const MOST_PEOPLE = 1_000_000;
const FEWEST_PEOPLE = 100;
const SEED_MAX = 2_147_483_647;
const ID_MAX = 80;
const RULES_MAX = 100;
const PLACES_MAX = 1000;

export class StartStudyDto extends AskedDocumentDto {
  @ApiProperty({
    description: 'one that comes with the product, as `us-civilians-2015`, or one of the workshop’s own',
  })
  @IsString()
  @MaxLength(ID_MAX)
  populationId: string;

  @ApiPropertyOptional({
    minimum: 0,
    maximum: 100,
    description: 'women of 100 people; 50 when absent, or all or none in a population of one sex',
  })
  @IsOptional()
  @IsNumber()
  @Min(0)
  @Max(100)
  womenPercent?: number;

  @ApiProperty({ minimum: FEWEST_PEOPLE, maximum: MOST_PEOPLE })
  @IsInt()
  @Min(FEWEST_PEOPLE)
  @Max(MOST_PEOPLE)
  people: number;

  @ApiPropertyOptional({ default: 1, description: 'another seed draws other people' })
  @IsOptional()
  @IsInt()
  @Min(0)
  @Max(SEED_MAX)
  seed?: number;

  @ApiPropertyOptional({ type: [String], description: 'rules that count for "all at once"; all when absent' })
  @IsOptional()
  @IsArray()
  @ArrayMinSize(1)
  @ArrayMaxSize(RULES_MAX)
  @IsString({ each: true })
  @MaxLength(ID_MAX, { each: true })
  ruleIds?: string[];

  @ApiPropertyOptional({
    type: [String],
    description: '`pieceId:place` of places that count; all when absent',
  })
  @IsOptional()
  @IsArray()
  @ArrayMinSize(1)
  @ArrayMaxSize(PLACES_MAX)
  @IsString({ each: true })
  @MaxLength(ID_MAX, { each: true })
  placeIds?: string[];
}
