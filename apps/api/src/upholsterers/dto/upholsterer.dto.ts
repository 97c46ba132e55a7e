import { ApiProperty, ApiPropertyOptional, PartialType } from '@nestjs/swagger';
import { IsEmail, IsIn, IsInt, IsOptional, Matches, Max, Min } from 'class-validator';
import { Currency } from '../../common/currency';
import { TextField } from '../../common/text-field';
import { UNIT_SYSTEMS, type UnitSystem } from '../../productions/entities/production.entity';
import { type Paper, PAPERS } from '../../workshops/entities/workshop.entity';
import type { Upholsterer } from '../entities/upholsterer.entity';

const units = { enum: UNIT_SYSTEMS, type: String } as const;
const paper = { enum: PAPERS, type: String } as const;

export class CreateUpholstererDto {
  @ApiProperty({ minLength: 1, maxLength: 120 })
  @TextField({ min: 1, max: 120 })
  name: string;

  @ApiPropertyOptional({ maxLength: 120 })
  @IsOptional()
  @TextField({ max: 120 })
  contactName?: string;

  @ApiProperty({ format: 'email', maxLength: 254 })
  @TextField({ max: 254 })
  @IsEmail()
  email: string;

  @ApiPropertyOptional({ maxLength: 40 })
  @IsOptional()
  @TextField({ max: 40 })
  telephone?: string;

  @ApiPropertyOptional({ maxLength: 2000 })
  @IsOptional()
  @TextField({ max: 2000, lines: true })
  notes?: string;

  @ApiPropertyOptional({
    type: Number,
    nullable: true,
    minimum: 1,
    maximum: 365,
    description: 'working days',
  })
  @IsOptional()
  @IsInt()
  @Min(1)
  @Max(365)
  leadDays?: number | null;

  @ApiPropertyOptional({
    maxLength: 1000,
    description: 'cloth they like to work with, and which they do not',
  })
  @IsOptional()
  @TextField({ max: 1000, lines: true })
  clothNotes?: string;

  @ApiPropertyOptional({ ...units, nullable: true })
  @IsOptional()
  @IsIn(UNIT_SYSTEMS)
  units?: UnitSystem | null;

  @ApiPropertyOptional({ ...paper, nullable: true })
  @IsOptional()
  @IsIn(PAPERS)
  paper?: Paper | null;

  @ApiPropertyOptional({ type: String, nullable: true, description: 'ISO 4217, as USD' })
  @IsOptional()
  @Currency()
  currency?: string | null;

  @ApiPropertyOptional({
    type: String,
    nullable: true,
    description:
      'their connected account at the payment provider, as acct_…; without one deposits are recorded by hand',
  })
  @IsOptional()
  @Matches(/^acct_[A-Za-z0-9]{1,64}$/, { message: 'accountId accepts the name of an account, as acct_1AbC' })
  accountId?: string | null;
}

export class UpdateUpholstererDto extends PartialType(CreateUpholstererDto, { skipNullProperties: false }) {}

export class UpholstererDto {
  @ApiProperty({ format: 'uuid' })
  id: string;
  @ApiProperty()
  name: string;
  @ApiProperty()
  contactName: string;
  @ApiProperty()
  email: string;
  @ApiProperty()
  telephone: string;
  @ApiProperty()
  notes: string;
  @ApiProperty({ type: Number, nullable: true, description: 'working days' })
  leadDays: number | null;
  @ApiProperty()
  clothNotes: string;
  @ApiProperty({ ...units, nullable: true })
  units: UnitSystem | null;
  @ApiProperty({ ...paper, nullable: true })
  paper: Paper | null;
  @ApiProperty({ type: String, nullable: true })
  currency: string | null;
  @ApiProperty({ type: String, nullable: true })
  accountId: string | null;
  @ApiProperty({ format: 'date-time' })
  createdAt: string;

  static of(entity: Upholsterer): UpholstererDto {
    const { id, name, contactName, email, telephone, notes, createdAt } = entity;
    const { leadDays, clothNotes, units: own, paper: sheet, currency, accountId } = entity;
    return {
      ...{ id, name, contactName, email, telephone, notes },
      ...{ leadDays, clothNotes, units: own, paper: sheet, currency, accountId },
      createdAt: createdAt.toISOString(),
    };
  }
}
