import { ApiProperty, ApiPropertyOptional, PartialType } from '@nestjs/swagger';
import { IsEmail, IsOptional } from 'class-validator';
import { TextField } from '../../common/text-field';
import type { Upholsterer } from '../entities/upholsterer.entity';

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
  @ApiProperty({ format: 'date-time' })
  createdAt: string;

  static of(entity: Upholsterer): UpholstererDto {
    const { id, name, contactName, email, telephone, notes, createdAt } = entity;
    return { id, name, contactName, email, telephone, notes, createdAt: createdAt.toISOString() };
  }
}
