import type { BodyData, Clothing } from '@settlewright/anthropometry';
import { ApiProperty, ApiPropertyOptional, PartialType } from '@nestjs/swagger';
import { SITTER_COLOURS } from '@settlewright/geometry';
import { IsIn, IsInt, IsObject, IsOptional, Max, Min } from 'class-validator';
import { TextField } from '../../common/text-field';
import { BODY_DATA, CLOTHING, STATURE_SOURCES, type StatureSource } from '../entities/cast-member.entity';
import { WithinLimit } from '../limit.decorator';
import {
  AGE_LIMIT,
  NAME_MAX,
  NOTES_MAX,
  ROLE_MAX,
  SHOE_LIMIT,
  STATURE_LIMIT,
  USUAL_SHOE_MM,
  WEIGHT_LIMIT,
} from '../limits';
import { measuredSchema } from './measured.schema';

export class CreateCastMemberDto {
  @ApiProperty({ maxLength: NAME_MAX })
  @TextField({ min: 1, max: NAME_MAX })
  name: string;

  @ApiPropertyOptional({ maxLength: ROLE_MAX, description: 'the part: "the conductor"' })
  @IsOptional()
  @TextField({ max: ROLE_MAX })
  role?: string;

  @ApiPropertyOptional({ enum: BODY_DATA, default: 'mixed' })
  @IsOptional()
  @IsIn(BODY_DATA)
  bodyData?: BodyData;

  @ApiPropertyOptional({
    type: Number,
    nullable: true,
    minimum: STATURE_LIMIT.min,
    maximum: STATURE_LIMIT.max,
  })
  @IsOptional()
  @WithinLimit(STATURE_LIMIT)
  statureMm?: number | null;

  @ApiPropertyOptional({ enum: STATURE_SOURCES, default: 'told' })
  @IsOptional()
  @IsIn(STATURE_SOURCES)
  statureSource?: StatureSource;

  @ApiPropertyOptional({ type: Number, nullable: true, minimum: WEIGHT_LIMIT.min, maximum: WEIGHT_LIMIT.max })
  @IsOptional()
  @WithinLimit(WEIGHT_LIMIT)
  weightKg?: number | null;

  @ApiPropertyOptional({
    type: 'integer',
    nullable: true,
    minimum: AGE_LIMIT.min,
    maximum: AGE_LIMIT.max,
    description: 'whole years',
  })
  @IsOptional()
  @IsInt()
  @WithinLimit(AGE_LIMIT)
  age?: number | null;

  @ApiPropertyOptional({
    ...measuredSchema,
    description: 'all that was taken with a tape; replaces what was there',
  })
  @IsOptional()
  @IsObject()
  measured?: Record<string, unknown>;

  @ApiPropertyOptional({ minimum: SHOE_LIMIT.min, maximum: SHOE_LIMIT.max, default: USUAL_SHOE_MM })
  @IsOptional()
  @WithinLimit(SHOE_LIMIT)
  shoeMm?: number;

  @ApiPropertyOptional({ enum: CLOTHING, default: 'light' })
  @IsOptional()
  @IsIn(CLOTHING)
  clothing?: Clothing;

  @ApiPropertyOptional({ maxLength: NOTES_MAX })
  @IsOptional()
  @TextField({ max: NOTES_MAX, lines: true })
  notes?: string;

  @ApiPropertyOptional({ minimum: 1, maximum: SITTER_COLOURS.length, description: 'chosen when absent' })
  @IsOptional()
  @IsInt()
  @Min(1)
  @Max(SITTER_COLOURS.length)
  colour?: number;
}

export class PatchCastMemberDto extends PartialType(CreateCastMemberDto) {}
