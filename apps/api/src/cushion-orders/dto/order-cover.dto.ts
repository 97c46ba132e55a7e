import {
  COVER_PARTS,
  type CoverPart,
  DIRECTION_WORDS,
  NAP_WORDS,
  type OrderCover,
} from '@settlewright/geometry';
import { ApiProperty, ApiPropertyOptional } from '@nestjs/swagger';

export class ClothRepeatDto {
  @ApiProperty()
  acrossMm: number;
  @ApiProperty()
  alongMm: number;
}

export class OwnClothDto implements NonNullable<OrderCover['com']> {
  @ApiProperty({ description: 'a sample was kept to compare with' })
  sampleKept: boolean;
  @ApiProperty({ maxLength: 60 })
  dyeLot: string;
  @ApiPropertyOptional({ description: 'goes before the width that was said' })
  measuredWidthMm?: number;
  @ApiPropertyOptional({ description: 'length that came' })
  receivedMm?: number;
  @ApiPropertyOptional({ format: 'date' })
  receivedOn?: string;
  @ApiProperty({ maxLength: 1000 })
  flaws: string;
}

/** One cloth of an order; what it may hold is refused by the same schema that the browser reads it with. */
export class OrderCoverDto implements OrderCover {
  @ApiProperty({ minLength: 1, maxLength: 120 })
  name: string;
  @ApiProperty()
  widthMm: number;
  @ApiProperty({ description: 'lost at each edge' })
  selvedgeMm: number;
  @ApiProperty({ enum: Object.keys(DIRECTION_WORDS) })
  direction: OrderCover['direction'];
  @ApiProperty({ enum: Object.keys(NAP_WORDS) })
  nap: OrderCover['nap'];
  @ApiProperty({ type: ClothRepeatDto })
  repeatMm: ClothRepeatDto;
  @ApiProperty({ enum: ['cushion', 'run'], description: 'on what the pattern is centered' })
  controlLine: OrderCover['controlLine'];
  @ApiProperty({ description: 'left out at the start of the roll for flaws and for centering' })
  startMm: number;
  @ApiProperty({ description: 'bought in whole steps of this' })
  stepMm: number;
  @ApiPropertyOptional({ description: 'in the smallest unit of the currency' })
  pricePerMetreMinor?: number;
  @ApiPropertyOptional({ description: 'ISO 4217' })
  currency?: string;
  @ApiPropertyOptional({ type: OwnClothDto, description: 'when the workshop sends the cloth in' })
  com?: OwnClothDto;
  @ApiPropertyOptional({ type: [String], description: 'absent: every cushion of the order' })
  cushionMarks?: string[];
  @ApiPropertyOptional({ enum: COVER_PARTS, isArray: true, description: 'absent: all of the cover' })
  parts?: CoverPart[];
}
