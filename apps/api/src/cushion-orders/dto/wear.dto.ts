import { WEAR_LOOKS, WEAR_PLACES, type WearArea } from '@settlewright/geometry';
import { ApiProperty, ApiPropertyOptional } from '@nestjs/swagger';

export class WearRectangleDto implements NonNullable<WearArea['areaMm']> {
  @ApiProperty({ enum: ['left', 'right'], description: 'as the sitter sees it' })
  fromEnd: 'left' | 'right';
  @ApiProperty()
  fromSideMm: number;
  @ApiProperty()
  fromFrontMm: number;
  @ApiProperty()
  widthMm: number;
  @ApiProperty()
  depthMm: number;
}

export class WearAreaDto implements WearArea {
  @ApiProperty({ enum: WEAR_PLACES, description: 'left and right as the sitter sees them' })
  place: WearArea['place'];
  @ApiPropertyOptional({ type: WearRectangleDto, description: 'of a place that is an area of its own' })
  areaMm?: WearRectangleDto;
  @ApiProperty({ enum: WEAR_LOOKS })
  look: WearArea['look'];
  @ApiPropertyOptional()
  note?: string;
}
