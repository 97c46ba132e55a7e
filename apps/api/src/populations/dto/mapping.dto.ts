import { MEASURE_KEYS, type MeasureKey } from '@settlewright/anthropometry';
import { ApiProperty, ApiPropertyOptional } from '@nestjs/swagger';
import { Type } from 'class-transformer';
import {
  ArrayMaxSize,
  IsArray,
  IsBoolean,
  IsIn,
  IsObject,
  IsOptional,
  IsString,
  MaxLength,
  ValidateNested,
} from 'class-validator';
import { ALL_UNITS, type Mapping, type OpenMapping, type SurveyUnit } from '../survey/mapping';

const HEADING_MAX = 400;
const WORDS_MAX = 20;

export class SexColumnDto {
  @ApiProperty({ maxLength: HEADING_MAX, description: 'heading of the column' })
  @IsString()
  @MaxLength(HEADING_MAX)
  column: string;

  @ApiPropertyOptional({
    type: [String],
    description: 'what stands for a woman; else f, w, female, woman, women',
  })
  @IsOptional()
  @IsArray()
  @ArrayMaxSize(WORDS_MAX)
  @IsString({ each: true })
  @MaxLength(HEADING_MAX, { each: true })
  women?: string[];

  @ApiPropertyOptional({ type: [String], description: 'what stands for a man; else m, male, man, men' })
  @IsOptional()
  @IsArray()
  @ArrayMaxSize(WORDS_MAX)
  @IsString({ each: true })
  @MaxLength(HEADING_MAX, { each: true })
  men?: string[];
}

class MeasureColumnBase {
  @ApiProperty({ enum: MEASURE_KEYS, enumName: 'MeasureKey' })
  @IsIn(MEASURE_KEYS)
  key: MeasureKey;

  @ApiProperty({ maxLength: HEADING_MAX, description: 'heading of the column' })
  @IsString()
  @MaxLength(HEADING_MAX)
  column: string;
}

export class MeasureColumnDto extends MeasureColumnBase {
  @ApiProperty({
    enum: ALL_UNITS,
    description: '`kg`, `0.1kg` and `lb` for the weight, the others for lengths',
  })
  @IsIn(ALL_UNITS)
  unit: SurveyUnit;
}

export class OpenMeasureColumnDto extends MeasureColumnBase {
  @ApiPropertyOptional({ enum: ALL_UNITS, description: 'guessed from the values when absent' })
  @IsOptional()
  @IsIn(ALL_UNITS)
  unit?: SurveyUnit;
}

class MappingBase {
  @ApiPropertyOptional({ maxLength: HEADING_MAX, description: 'heading of the column with years of age' })
  @IsOptional()
  @IsString()
  @MaxLength(HEADING_MAX)
  age?: string;

  @ApiProperty({ description: 'a comma stands before the decimals' })
  @IsBoolean()
  decimalComma: boolean;
}

/** Which column holds what. */
export class MappingDto extends MappingBase implements Mapping {
  // Its absence is told with the other problems of the mapping.
  @ApiProperty({ type: SexColumnDto })
  @IsOptional()
  @IsObject()
  @ValidateNested()
  @Type(() => SexColumnDto)
  sex: SexColumnDto;

  @ApiProperty({ type: [MeasureColumnDto], description: 'stature and weight_kg among them' })
  @IsArray()
  @ArrayMaxSize(MEASURE_KEYS.length)
  @IsObject({ each: true })
  @ValidateNested({ each: true })
  @Type(() => MeasureColumnDto)
  measures: MeasureColumnDto[];
}

/** The same while it is being made. */
export class OpenMappingDto extends MappingBase implements OpenMapping {
  @ApiPropertyOptional({ type: SexColumnDto })
  @IsOptional()
  @IsObject()
  @ValidateNested()
  @Type(() => SexColumnDto)
  sex?: SexColumnDto;

  @ApiProperty({ type: [OpenMeasureColumnDto] })
  @IsArray()
  @ArrayMaxSize(MEASURE_KEYS.length)
  @IsObject({ each: true })
  @ValidateNested({ each: true })
  @Type(() => OpenMeasureColumnDto)
  measures: OpenMeasureColumnDto[];
}

/** What the columns seem to hold; what could not be guessed is absent. */
export class SuggestedMappingDto {
  @ApiPropertyOptional({ type: SexColumnDto })
  sex?: SexColumnDto;
  @ApiPropertyOptional()
  age?: string;
  @ApiProperty({ type: [MeasureColumnDto] })
  measures: MeasureColumnDto[];
  @ApiProperty()
  decimalComma: boolean;
}
