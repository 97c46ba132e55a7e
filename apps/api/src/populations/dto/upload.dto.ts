import { MEASURE_KEYS, type MeasureKey } from '@settlewright/anthropometry';
import { ApiProperty, ApiPropertyOptional } from '@nestjs/swagger';
import { Type } from 'class-transformer';
import { IsBoolean, IsObject, IsOptional, IsString, ValidateNested } from 'class-validator';
import { ProblemField } from '../../common/problem';
import { TextField } from '../../common/text-field';
import { SURVEY_MAX_ROWS } from '../survey/survey-file';
import { MappingDto, OpenMappingDto, SuggestedMappingDto } from './mapping.dto';

const CSV = `the text of the file, up to 2 MB and ${SURVEY_MAX_ROWS} rows`;

export class PreviewPopulationDto {
  @ApiProperty({ description: CSV })
  @IsString()
  csv: string;

  @ApiPropertyOptional({ type: OpenMappingDto, description: 'the suggested one when absent' })
  @IsOptional()
  @IsObject()
  @ValidateNested()
  @Type(() => OpenMappingDto)
  mapping?: OpenMappingDto;
}

export class CreatePopulationDto {
  @ApiProperty({ minLength: 1, maxLength: 120 })
  @TextField({ min: 1, max: 120 })
  name: string;

  @ApiProperty({ minLength: 1, maxLength: 500, description: 'who was measured, by whom and when' })
  @TextField({ min: 1, max: 500 })
  source: string;

  @ApiProperty({ description: CSV })
  @IsString()
  csv: string;

  @ApiProperty({ type: MappingDto })
  @IsObject()
  @ValidateNested()
  @Type(() => MappingDto)
  mapping: MappingDto;

  @ApiPropertyOptional({
    default: false,
    description: 'keep the used columns of the rows themselves; only an owner may say so',
  })
  @IsOptional()
  @IsBoolean()
  keepRows?: boolean;
}

export class SurveyColumnDto {
  @ApiProperty({ description: 'its heading' })
  name: string;
  @ApiProperty({ type: [String], description: 'the first values' })
  examples: string[];
}

export class RowFaultDto {
  @ApiProperty({ description: 'line of the file; the headings stand on line 1' })
  line: number;
  @ApiProperty({ description: 'counted from 1, the headings not counted' })
  row: number;
  @ApiProperty({ description: 'heading of the column' })
  field: string;
  @ApiProperty()
  read: string;
  @ApiProperty()
  accepted: string;
}

export class PopulationPreviewDto {
  @ApiProperty({ type: [SurveyColumnDto] })
  columns: SurveyColumnDto[];
  @ApiProperty()
  rows: number;
  @ApiProperty({ type: SuggestedMappingDto, description: 'as sent, or as guessed from headings and values' })
  mapping: SuggestedMappingDto;
  @ApiProperty({ type: [ProblemField], description: 'why these people cannot be added as they are' })
  problems: ProblemField[];
  @ApiProperty({ description: 'people who can be read; 0 while the mapping has problems' })
  women: number;
  @ApiProperty()
  men: number;
  @ApiProperty({ description: 'rows with a fault; they would be left out' })
  leftOut: number;
  @ApiProperty({ type: [RowFaultDto], description: 'the first 200' })
  faults: RowFaultDto[];
  @ApiProperty()
  faultCount: number;
  @ApiProperty({ enum: MEASURE_KEYS, enumName: 'MeasureKey', isArray: true })
  read: MeasureKey[];
  @ApiProperty({
    enum: MEASURE_KEYS,
    enumName: 'MeasureKey',
    isArray: true,
    description: 'would be estimated from the others, as they hang together in US soldiers of 2012',
  })
  estimated: MeasureKey[];
}
