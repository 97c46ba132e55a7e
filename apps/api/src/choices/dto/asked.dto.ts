import { ApiProperty, ApiPropertyOptional } from '@nestjs/swagger';
import { IsBoolean, IsIn, IsInt, IsNumber, IsString, Max, MaxLength, Min } from 'class-validator';
import { MayBeLeftOut } from '../../common/may-be-left-out';
import {
  ROUNDINGS,
  type Rounding,
  UNIT_SYSTEMS,
  type UnitSystem,
} from '../../productions/entities/production.entity';

const ID_MAX = 120;

/** What every question about a choice may say besides its dimensions. */
export class AskedChoiceDto {
  @ApiPropertyOptional({
    description:
      'whose shares are counted: one that comes with the product, as `us-civilians-2015`, or one of the workshop’s own; no shares when absent',
  })
  @MayBeLeftOut()
  @IsString()
  @MaxLength(ID_MAX)
  populationId?: string;

  @ApiPropertyOptional({ minimum: 0, maximum: 100, description: 'women of 100 people; 50 when absent' })
  @MayBeLeftOut()
  @IsNumber()
  @Min(0)
  @Max(100)
  womenPercent?: number;

  @ApiPropertyOptional({
    enum: UNIT_SYSTEMS,
    description: 'decides the step of values, and the words of a paper; the production’s when absent',
  })
  @MayBeLeftOut()
  @IsIn(UNIT_SYSTEMS)
  units?: UnitSystem;

  @ApiPropertyOptional({ enum: ROUNDINGS, description: 'fractions of an inch; the production’s when absent' })
  @MayBeLeftOut()
  @IsIn(ROUNDINGS)
  roundTo?: Rounding;

  @ApiPropertyOptional({
    minimum: 1,
    description: 'for a draft: the one that was seen; another one is refused. Any when absent',
  })
  @MayBeLeftOut()
  @IsInt()
  @Min(1)
  draftNumber?: number;
}

export class AskMapDto extends AskedChoiceDto {
  @ApiProperty({ description: 'id of the number that goes across, as for a story stick' })
  @IsString()
  @MaxLength(ID_MAX)
  across: string;

  @ApiProperty({
    description: 'id of the number that goes up; for who sees no measures both are lengths',
  })
  @IsString()
  @MaxLength(ID_MAX)
  up: string;

  @ApiPropertyOptional({
    default: false,
    description: 'ask every check of a person that either number moves, not only the two numbers’ own',
  })
  @MayBeLeftOut()
  @IsBoolean()
  everyCheck?: boolean;
}

export class AskStickDto extends AskedChoiceDto {
  @ApiProperty({
    description:
      'id of a number of the set: its kind, as `seat-height` (for all pieces that have one), `seat-and-tables`, or `kind|pieceId` for one piece of several',
  })
  @IsString()
  @MaxLength(ID_MAX)
  dimension: string;

  @ApiPropertyOptional({ description: 'the kind’s number of this piece alone' })
  @MayBeLeftOut()
  @IsString()
  @MaxLength(ID_MAX)
  pieceId?: string;

  @ApiPropertyOptional({
    description:
      'value that is tried, in the unit of the number (mm, degrees or newtons); the present one when absent',
  })
  @MayBeLeftOut()
  @IsNumber()
  value?: number;

  @ApiPropertyOptional({
    description:
      'rule of a person whose stretches are wanted, or `all` for every one that the number moves; the number’s own when absent',
  })
  @MayBeLeftOut()
  @IsString()
  @MaxLength(ID_MAX)
  ruleId?: string;
}
