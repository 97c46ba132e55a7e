import { ApiProperty, ApiPropertyOptional, OmitType, PartialType } from '@nestjs/swagger';
import { Type } from 'class-transformer';
import {
  ArrayMaxSize,
  ArrayMinSize,
  ArrayUnique,
  IsArray,
  IsIn,
  IsISO8601,
  IsObject,
  IsOptional,
  IsUUID,
  Matches,
  ValidateNested,
} from 'class-validator';
import { TextField } from '../../common/text-field';
import { RECORDED_STATES, type RecordedState } from '../order-states';
import { OrderSpecInput } from './order-spec.dto';

const LETTER = /^[A-Z]{1,3}$/;
const DAY = /^\d{4}-\d{2}-\d{2}$/;
const CUSHION_MARK = /^C[1-9]\d{0,3}$/;

export class CreateOrderDto {
  @ApiProperty({ format: 'uuid' })
  @IsUUID()
  setId: string;

  @ApiProperty({ description: 'an issued revision, as "C"' })
  @Matches(LETTER, { message: 'revisionLetter accepts the letter of an issued revision, as C' })
  revisionLetter: string;

  @ApiProperty({ minLength: 1, maxLength: 160 })
  @TextField({ min: 1, max: 160 })
  title: string;

  @ApiPropertyOptional({ type: String, format: 'date', nullable: true })
  @IsOptional()
  @Matches(DAY, { message: 'neededBy accepts a day as 2027-02-26' })
  @IsISO8601({ strict: true }, { message: 'neededBy accepts a day that is in the calendar' })
  neededBy?: string | null;

  @ApiPropertyOptional({ type: [String], nullable: true, description: 'marks as C1; null: every cushion' })
  @IsOptional()
  @IsArray()
  @ArrayMinSize(1)
  @ArrayMaxSize(300)
  @ArrayUnique()
  @Matches(CUSHION_MARK, { each: true, message: 'cushionMarks accepts marks as C1' })
  cushionMarks?: string[] | null;

  @ApiPropertyOptional({ type: OrderSpecInput })
  @IsOptional()
  @IsObject()
  @ValidateNested()
  @Type(() => OrderSpecInput)
  spec?: OrderSpecInput;
}

export class UpdateOrderDto extends PartialType(OmitType(CreateOrderDto, ['setId']), {
  skipNullProperties: false,
}) {}

export class SendOrderDto {
  @ApiProperty({ format: 'uuid' })
  @IsUUID()
  upholstererId: string;

  @ApiPropertyOptional({ maxLength: 4000 })
  @IsOptional()
  @TextField({ max: 4000, lines: true })
  message?: string;
}

export class RecordStateDto {
  @ApiProperty({ enum: RECORDED_STATES, enumName: 'RecordedOrderState' })
  @IsIn(RECORDED_STATES)
  to: RecordedState;

  @ApiPropertyOptional({
    maxLength: 1000,
    description:
      'how it is known: "by telephone, 2 February"; "agreed" asks for it when the upholsterer has not acknowledged',
  })
  @IsOptional()
  @TextField({ max: 1000, lines: true })
  note?: string;
}

export class CancelOrderDto {
  @ApiPropertyOptional({ maxLength: 1000 })
  @IsOptional()
  @TextField({ max: 1000, lines: true })
  note?: string;
}

export class WriteMessageDto {
  @ApiProperty({ minLength: 1, maxLength: 4000 })
  @TextField({ min: 1, max: 4000, lines: true })
  text: string;
}

export class AcknowledgeDto {
  @ApiProperty({ minLength: 1, maxLength: 120, description: 'the name of whoever agrees, typed' })
  @TextField({ min: 1, max: 120 })
  name: string;

  @ApiPropertyOptional({
    format: 'date-time',
    description: '`sentAt` of the order that was read; refused when another was sent meanwhile',
  })
  @IsOptional()
  @IsISO8601({ strict: true })
  sentAt?: string;
}
