import { ApiProperty, ApiPropertyOptional } from '@nestjs/swagger';
import { Type } from 'class-transformer';
import {
  ArrayMaxSize,
  ArrayMinSize,
  IsArray,
  IsNumber,
  IsObject,
  IsOptional,
  IsUUID,
  Max,
  Min,
  ValidateBy,
  ValidateNested,
} from 'class-validator';
import { DAY_WORDS, isPastDay } from '../cast/day';
import { WithinLimit } from '../cast/limit.decorator';
import { NAME_MAX, WEIGHT_LIMIT } from '../cast/limits';
import { CushionFoamLayerDto, CushionWrapDto, FoamBuildDto } from '../common/foam-build.dto';
import { TextField } from '../common/text-field';
import type { TestSitRow } from './test-sit.entity';

export const NOTE_MAX = 1000;
/** As in the set document. */
export const GRADE_MAX = 60;

export class AddTestSitDto {
  @ApiPropertyOptional({ format: 'uuid', description: 'who of the cast sat; else name' })
  @IsOptional()
  @IsUUID()
  castId?: string;

  @ApiPropertyOptional({ maxLength: NAME_MAX, description: 'who sat, where it was nobody of the cast' })
  @IsOptional()
  @TextField({ min: 1, max: NAME_MAX })
  name?: string;

  @ApiProperty({ format: 'date' })
  @ValidateBy({
    name: 'pastDay',
    validator: {
      validate: (value: unknown) => typeof value === 'string' && isPastDay(value),
      defaultMessage: () => `satOn accepts ${DAY_WORDS}`,
    },
  })
  satOn: string;

  @ApiProperty({ maxLength: GRADE_MAX })
  @TextField({ min: 1, max: GRADE_MAX })
  grade: string;

  @ApiProperty({ description: '25 % indentation force deflection, newtons', minimum: 20, maximum: 600 })
  @IsNumber()
  @Min(20)
  @Max(600)
  ifd25N: number;

  @ApiProperty({ minimum: 1.2, maximum: 4 })
  @IsNumber()
  @Min(1.2)
  @Max(4)
  supportFactor: number;

  @ApiProperty({ minimum: 1, maximum: 250 })
  @IsNumber()
  @Min(1)
  @Max(250)
  thicknessMm: number;

  @ApiPropertyOptional({
    type: [CushionFoamLayerDto],
    minItems: 2,
    maxItems: 4,
    description: 'from the top down, where it is laminated',
  })
  @IsOptional()
  @IsArray()
  @ArrayMinSize(2)
  @ArrayMaxSize(4)
  @ValidateNested({ each: true })
  @Type(() => CushionFoamLayerDto)
  layers?: CushionFoamLayerDto[];

  @ApiPropertyOptional({ type: CushionWrapDto })
  @IsOptional()
  @IsObject()
  @ValidateNested()
  @Type(() => CushionWrapDto)
  wrap?: CushionWrapDto;

  @ApiPropertyOptional({
    minimum: WEIGHT_LIMIT.min,
    maximum: WEIGHT_LIMIT.max,
    description: 'as in the cast, where it is not said',
  })
  @IsOptional()
  @WithinLimit(WEIGHT_LIMIT)
  weightKg?: number;

  @ApiProperty({ minimum: 1, maximum: 250, description: 'how far the seat went down' })
  @IsNumber()
  @Min(1)
  @Max(250)
  measuredMm: number;

  @ApiPropertyOptional({ maxLength: NOTE_MAX })
  @IsOptional()
  @TextField({ max: NOTE_MAX, lines: true })
  note?: string;
}

export class TestSitDto extends FoamBuildDto {
  @ApiProperty({ format: 'uuid' })
  id: string;
  @ApiPropertyOptional({ format: 'uuid' })
  castId?: string;
  @ApiProperty({ description: 'of the cast member as it is now, or as it was typed' })
  name: string;
  @ApiProperty({ format: 'date' })
  satOn: string;
  @ApiProperty()
  grade: string;
  @ApiProperty()
  weightKg: number;
  @ApiProperty({ description: 'by the estimate alone, whatever other sits say' })
  predictedMm: number;
  @ApiProperty()
  measuredMm: number;
  @ApiProperty()
  note: string;

  static of(row: TestSitRow): TestSitDto {
    const { id, castId, satOn, grade, ifd25N, supportFactor, thicknessMm } = row;
    const { layers, wrap, weightKg, predictedMm, measuredMm, note } = row;
    return {
      id,
      ...(castId === null ? {} : { castId }),
      name: row.cast?.name ?? row.name ?? '',
      satOn,
      grade,
      ifd25N,
      supportFactor,
      thicknessMm,
      ...(layers && { layers }),
      ...(wrap && { wrap }),
      weightKg,
      predictedMm,
      measuredMm,
      note,
    };
  }
}
