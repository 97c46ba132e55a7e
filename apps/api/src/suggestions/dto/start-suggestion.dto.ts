import { MOST_FREE } from '@settlewright/geometry';
import { ApiProperty, ApiPropertyOptional } from '@nestjs/swagger';
import { Type } from 'class-transformer';
import {
  ArrayMaxSize,
  ArrayMinSize,
  IsArray,
  IsNumber,
  IsOptional,
  IsString,
  Max,
  MaxLength,
  Min,
  ValidateNested,
} from 'class-validator';
import { AskedDocumentDto } from '../../studies/dto/asked-document.dto';

const ID_MAX = 200;
const SITTERS_MAX = 100;
const STEP_MIN = 0.1;
const STEP_MAX = 100;

/** A dimension that may move: from `min` to `max`, or as it is now give or take `tolerance`. */
export class StartFreeDto {
  @ApiProperty({
    description: 'of a dimension of the set, as `seat-height`, `seat-depth|b1`, `table-height`',
  })
  @IsString()
  @MaxLength(ID_MAX)
  dimensionId: string;

  @ApiPropertyOptional({ description: 'in the dimension’s unit: millimetres, degrees or newtons' })
  @IsOptional()
  @IsNumber()
  min?: number;

  @ApiPropertyOptional({ description: 'in the dimension’s unit' })
  @IsOptional()
  @IsNumber()
  max?: number;

  @ApiPropertyOptional({ minimum: 0, description: 'in the dimension’s unit; instead of `min` and `max`' })
  @IsOptional()
  @IsNumber()
  @Min(0)
  tolerance?: number;

  @ApiPropertyOptional({
    minimum: STEP_MIN,
    maximum: STEP_MAX,
    description: 'rounding step in the dimension’s unit; as the production rounds when absent',
  })
  @IsOptional()
  @IsNumber()
  @Min(STEP_MIN)
  @Max(STEP_MAX)
  step?: number;
}

export class StartSuggestionDto extends AskedDocumentDto {
  @ApiProperty({ type: [StartFreeDto], minItems: 1, maxItems: MOST_FREE })
  @IsArray()
  @ArrayMinSize(1)
  @ArrayMaxSize(MOST_FREE)
  @ValidateNested({ each: true })
  @Type(() => StartFreeDto)
  free: StartFreeDto[];

  @ApiPropertyOptional({
    type: [String],
    description:
      'who must be served: ids of cast members who sit in the set, and `mannequin:pieceId:place`; everybody who sits when absent',
  })
  @IsOptional()
  @IsArray()
  @ArrayMaxSize(SITTERS_MAX)
  @IsString({ each: true })
  @MaxLength(ID_MAX, { each: true })
  sitterIds?: string[];

  @ApiPropertyOptional({
    description: 'then as many as can be of these people; nobody else is asked about when absent',
  })
  @IsOptional()
  @IsString()
  @MaxLength(ID_MAX)
  populationId?: string;

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
}
