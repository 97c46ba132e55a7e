import { ApiProperty, ApiPropertyOptional } from '@nestjs/swagger';
import { Type } from 'class-transformer';
import {
  ArrayMaxSize,
  ArrayMinSize,
  IsArray,
  IsIn,
  IsInt,
  IsISO8601,
  IsOptional,
  Max,
  Min,
  ValidateNested,
} from 'class-validator';
import { CalendarDay } from '../../common/calendar-day';
import { Currency } from '../../common/currency';
import { TextField } from '../../common/text-field';
import { OfOrderDto } from '../life/of-order.dto';
import { QUOTE_STATES, type QuoteLine, type QuoteState } from './order-quote.entity';

/** In the smallest unit; far beyond any order, and safe to add up. */
const MOST_MINOR = 100_000_000;

export class QuoteLineDto implements QuoteLine {
  @ApiProperty({ minLength: 1, maxLength: 200 })
  @TextField({ min: 1, max: 200 })
  text: string;

  @ApiProperty({ minimum: 1, maximum: 9999 })
  @IsInt()
  @Min(1)
  @Max(9999)
  quantity: number;

  @ApiProperty({ minimum: 0, maximum: MOST_MINOR, description: 'of one, in the smallest unit: cents' })
  @IsInt()
  @Min(0)
  @Max(MOST_MINOR)
  unitMinor: number;
}

class QuoteInput {
  @ApiProperty({ type: [QuoteLineDto] })
  @IsArray()
  @ArrayMinSize(1)
  @ArrayMaxSize(40)
  @ValidateNested({ each: true })
  @Type(() => QuoteLineDto)
  lines: QuoteLineDto[];

  @ApiProperty({ description: 'ISO 4217, as USD' })
  @Currency()
  currency: string;

  @ApiPropertyOptional({ maxLength: 80, description: 'as "Sales tax 8.25 %"' })
  @IsOptional()
  @TextField({ max: 80 })
  taxText?: string;

  @ApiPropertyOptional({ minimum: 0, maximum: MOST_MINOR })
  @IsOptional()
  @IsInt()
  @Min(0)
  @Max(MOST_MINOR)
  taxMinor?: number;

  @ApiProperty({ format: 'date' })
  @CalendarDay()
  validUntil: string;

  @ApiPropertyOptional({ type: String, format: 'date', nullable: true })
  @IsOptional()
  @CalendarDay()
  deliveryOn?: string | null;

  @ApiPropertyOptional({ maxLength: 2000 })
  @IsOptional()
  @TextField({ max: 2000, lines: true })
  note?: string;
}

export class GiveQuoteDto extends QuoteInput {
  @ApiProperty({ minLength: 1, maxLength: 120, description: 'who quotes, typed' })
  @TextField({ min: 1, max: 120 })
  name: string;

  @ApiProperty({ format: 'date-time', description: '`sentAt` of the order that was read' })
  @IsISO8601({ strict: true })
  sentAt: string;
}

export class RecordQuoteDto extends QuoteInput {
  @ApiProperty({ minLength: 1, maxLength: 1000, description: 'how it is known: "by telephone, 2 February"' })
  @TextField({ min: 1, max: 1000, lines: true })
  heard: string;
}

export class DeclineQuoteDto {
  @ApiProperty({ minLength: 1, maxLength: 1000, description: 'goes to the upholsterer' })
  @TextField({ min: 1, max: 1000, lines: true })
  reason: string;
}

export class QuoteDto extends OfOrderDto {
  @ApiProperty()
  revisionLetter: string;
  @ApiProperty({ type: [QuoteLineDto] })
  lines: QuoteLineDto[];
  @ApiProperty()
  currency: string;
  @ApiProperty()
  taxText: string;
  @ApiProperty()
  taxMinor: number;
  @ApiProperty()
  totalMinor: number;
  @ApiProperty({ format: 'date' })
  validUntil: string;
  @ApiProperty({ type: String, format: 'date', nullable: true })
  deliveryOn: string | null;
  @ApiProperty()
  note: string;
  @ApiProperty({ enum: QUOTE_STATES, enumName: 'QuoteState' })
  @IsIn(QUOTE_STATES)
  state: QuoteState;
  @ApiProperty({ description: 'it is for the order as it was last sent, and its validity has not passed' })
  inForce: boolean;
  @ApiProperty({ type: String, format: 'date-time', nullable: true })
  answeredAt: string | null;
  @ApiProperty()
  answeredByName: string;
  @ApiProperty()
  answer: string;
}
