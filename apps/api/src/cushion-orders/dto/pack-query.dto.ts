import { ApiPropertyOptional } from '@nestjs/swagger';
import { Type } from 'class-transformer';
import { IsIn, IsOptional } from 'class-validator';
import {
  type Rounding,
  ROUNDINGS,
  UNIT_SYSTEMS,
  type UnitSystem,
} from '../../productions/entities/production.entity';
import { type Paper, PAPERS } from '../../workshops/entities/workshop.entity';

/** How a drawing pack is wanted; what is left out is as the upholsterer prefers it, or the workshop. */
export class PackQuery {
  @ApiPropertyOptional({ enum: PAPERS })
  @IsOptional()
  @IsIn(PAPERS)
  paper?: Paper;

  @ApiPropertyOptional({ enum: UNIT_SYSTEMS })
  @IsOptional()
  @IsIn(UNIT_SYSTEMS)
  units?: UnitSystem;

  @ApiPropertyOptional({ enum: ROUNDINGS })
  @IsOptional()
  @Type(() => Number)
  @IsIn(ROUNDINGS)
  roundTo?: Rounding;
}
