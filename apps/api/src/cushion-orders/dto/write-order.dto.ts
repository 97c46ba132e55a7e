import { MAX_COVERS } from '@settlewright/geometry';
import { ApiProperty, ApiPropertyOptional, OmitType, PartialType } from '@nestjs/swagger';
import { Type } from 'class-transformer';
import {
  ArrayMaxSize,
  ArrayMinSize,
  ArrayUnique,
  IsArray,
  IsIn,
  IsISO8601,
  IsNumber,
  IsObject,
  IsOptional,
  IsUUID,
  Matches,
  Max,
  Min,
  ValidateNested,
} from 'class-validator';
import { CalendarDay } from '../../common/calendar-day';
import { MayBeLeftOut } from '../../common/may-be-left-out';
import { TextField } from '../../common/text-field';
import { CushionMark } from '../cushion-mark';
import { MARKED_STATES, type MarkedState, RECORDED_STATES, type RecordedState } from '../order-states';
import { OrderCoverDto } from './order-cover.dto';
import { OrderSpecInput } from './order-spec.dto';

const LETTER = /^[A-Z]{1,3}$/;

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
  @CalendarDay()
  neededBy?: string | null;

  @ApiPropertyOptional({ type: [String], nullable: true, description: 'marks as C1; null: every cushion' })
  @IsOptional()
  @IsArray()
  @ArrayMinSize(1)
  @ArrayMaxSize(300)
  @ArrayUnique()
  @CushionMark({ each: true })
  cushionMarks?: string[] | null;

  @ApiPropertyOptional({ minimum: 0.5, maximum: 25.4, description: 'how far a finished size may be off' })
  @MayBeLeftOut()
  @IsNumber()
  @Min(0.5)
  @Max(25.4)
  toleranceMm?: number;

  @ApiPropertyOptional({ type: [OrderCoverDto], description: 'none: nobody said them yet' })
  @MayBeLeftOut()
  @IsArray()
  @ArrayMaxSize(MAX_COVERS)
  covers?: unknown[];

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

export class MarkStateDto {
  @ApiProperty({ enum: MARKED_STATES, enumName: 'MarkedOrderState' })
  @IsIn(MARKED_STATES)
  to: MarkedState;

  @ApiProperty({ minLength: 1, maxLength: 120, description: 'who says so, typed' })
  @TextField({ min: 1, max: 120 })
  name: string;

  @ApiPropertyOptional({ maxLength: 1000, description: 'as the carrier and its number' })
  @IsOptional()
  @TextField({ max: 1000, lines: true })
  note?: string;
}

export class MailBouncedDto {
  @ApiProperty({ minLength: 1, maxLength: 500, description: 'what came back' })
  @TextField({ min: 1, max: 500, lines: true })
  note: string;
}
