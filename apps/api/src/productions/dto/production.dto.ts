import { ApiProperty, ApiPropertyOptional, PartialType } from '@nestjs/swagger';
import { IsIn, IsOptional } from 'class-validator';
import { PageQuery } from '../../common/page.dto';
import { TextField } from '../../common/text-field';
import {
  type Production,
  type Rounding,
  ROUNDINGS,
  UNIT_SYSTEMS,
  type UnitSystem,
} from '../entities/production.entity';

const PRODUCTION_STATUSES = ['active', 'archived'] as const;
export type ProductionStatus = (typeof PRODUCTION_STATUSES)[number];

export class ProductionQuery extends PageQuery {
  @ApiPropertyOptional({ enum: PRODUCTION_STATUSES, default: 'active' })
  @IsOptional()
  @IsIn(PRODUCTION_STATUSES)
  status: ProductionStatus = 'active';
}

export class CreateProductionDto {
  @ApiProperty({ maxLength: 120 })
  @TextField({ min: 1, max: 120 })
  name: string;

  @ApiPropertyOptional({ maxLength: 2000 })
  @IsOptional()
  @TextField({ max: 2000, lines: true })
  summary?: string;

  @ApiPropertyOptional({ enum: UNIT_SYSTEMS, default: 'feet-inches' })
  @IsOptional()
  @IsIn(UNIT_SYSTEMS)
  units?: UnitSystem;

  @ApiPropertyOptional({
    enum: ROUNDINGS,
    default: 16,
    description: 'n of the 1/n inch that shown lengths are rounded to',
  })
  @IsOptional()
  @IsIn(ROUNDINGS)
  roundTo?: Rounding;
}

export class PatchProductionDto extends PartialType(CreateProductionDto) {}

export class ProductionDto {
  @ApiProperty({ format: 'uuid' })
  id: string;
  @ApiProperty()
  name: string;
  @ApiProperty()
  summary: string;
  @ApiProperty({ enum: UNIT_SYSTEMS })
  units: UnitSystem;
  @ApiProperty({ enum: ROUNDINGS })
  roundTo: Rounding;
  @ApiProperty({ enum: PRODUCTION_STATUSES })
  status: ProductionStatus;
  @ApiProperty({ format: 'date-time' })
  createdAt: string;
  @ApiProperty({ format: 'date-time' })
  updatedAt: string;

  static of(production: Production): ProductionDto {
    const { id, name, summary, units, roundTo } = production;
    return {
      id,
      name,
      summary,
      units,
      roundTo,
      status: production.archivedAt ? 'archived' : 'active',
      createdAt: production.createdAt.toISOString(),
      updatedAt: production.updatedAt.toISOString(),
    };
  }
}
