import type {
  CushionDatum,
  CushionEdge,
  CushionSpec,
  EdgeMeets,
  HoldDown,
  WearArea,
} from '@settlewright/geometry';
import { CUSHION_EDGES, HOLD_DOWNS } from '@settlewright/geometry';
import { ApiProperty, ApiPropertyOptional } from '@nestjs/swagger';
import { CushionFoamDto } from './cushion-foam.dto';
import {
  CushionMakeDto,
  CushionPanelsDto,
  CushionTuftingDto,
  CushionWarningDto,
  OutlineCornerDto,
} from './cushion-make.dto';
import { WearAreaDto } from './wear.dto';

const EDGES = [
  'wall',
  'end-wall',
  'arm',
  'neighbour',
  'corner-cushion',
  'free',
  'back-pad',
  'front',
  'seat-cushion',
  'top',
] as const satisfies readonly EdgeMeets[];
const edge = { enum: EDGES, enumName: 'CushionEdgeMeets' } as const;
const hand = { enum: ['left', 'right', 'either'], enumName: 'CushionHand' } as const;
const datumMeets = { enum: ['wall', 'end-wall', 'arm', 'bench-end'], enumName: 'CushionDatumMeets' } as const;

export class CushionSizeDto {
  @ApiProperty()
  widthMm: number;
  @ApiProperty()
  depthMm: number;
  @ApiProperty()
  thicknessMm: number;
}

export class CushionPlaceDto {
  @ApiProperty()
  number: number;
  @ApiProperty()
  of: number;
}

export class CushionEdgesDto {
  @ApiProperty(edge)
  back: EdgeMeets;
  @ApiProperty(edge)
  front: EdgeMeets;
  @ApiProperty(edge)
  left: EdgeMeets;
  @ApiProperty(edge)
  right: EdgeMeets;
}

export class CushionGapsDto {
  @ApiProperty()
  back: number;
  @ApiProperty()
  front: number;
  @ApiProperty()
  left: number;
  @ApiProperty()
  right: number;
}

export class ButtonColumnDto {
  @ApiProperty()
  fromSeamMm: number;
  @ApiProperty()
  fromDatumMm: number;
  @ApiProperty()
  offJointMm: number;
}

export class RowsOverSeatDto {
  @ApiProperty({ type: [Number] })
  overMm: number[];
  @ApiProperty()
  sinkMm: number;
  @ApiProperty()
  goesDown: boolean;
}

export class ButtonTableDto {
  @ApiProperty({ type: [ButtonColumnDto] })
  columns: ButtonColumnDto[];
  @ApiProperty({ type: [Number] })
  rowsMm: number[];
  @ApiProperty()
  count: number;
  @ApiProperty({ enum: ['grid', 'staggered'] })
  pattern: 'grid' | 'staggered';
  @ApiProperty({ enum: ['joints', 'board-centres', 'field'] })
  alignedTo: 'joints' | 'board-centres' | 'field';
  @ApiPropertyOptional({ type: RowsOverSeatDto })
  rowsOverSeat?: RowsOverSeatDto;
}

export class CushionDatumDto {
  @ApiProperty({ enum: ['left', 'right'] })
  side: 'left' | 'right';
  @ApiProperty(datumMeets)
  meets: CushionDatum['meets'];
  @ApiPropertyOptional()
  wallMark?: string;
  @ApiProperty()
  toSeamMm: number;
}

/** A cushion to be made, as it follows from the revision; the finished size governs. */
export class CushionDto implements CushionSpec {
  @ApiProperty()
  mark: string;
  @ApiProperty()
  key: string;
  @ApiProperty()
  benchId: string;
  @ApiProperty()
  benchMark: string;
  @ApiProperty({ enum: ['seat', 'back'] })
  kind: 'seat' | 'back';
  @ApiProperty({ type: CushionPlaceDto })
  place: CushionPlaceDto;
  @ApiProperty(hand)
  hand: CushionSpec['hand'];
  @ApiProperty({ type: CushionEdgesDto })
  edges: CushionEdgesDto;
  @ApiProperty({ type: CushionSizeDto })
  placeMm: CushionSizeDto;
  @ApiProperty({ type: CushionGapsDto })
  gapsMm: CushionGapsDto;
  @ApiProperty({ type: CushionSizeDto, description: 'seam to seam' })
  finishedMm: CushionSizeDto;
  @ApiProperty({ type: CushionMakeDto })
  make: CushionMakeDto;
  @ApiProperty({ type: [OutlineCornerDto] })
  outline: OutlineCornerDto[];
  @ApiPropertyOptional({ type: CushionPanelsDto, description: 'absent where it cannot be made as asked' })
  making?: CushionPanelsDto;
  @ApiProperty({ type: [String] })
  faults: string[];
  @ApiProperty({ type: [CushionWarningDto] })
  warnings: CushionSpec['warnings'];
  @ApiProperty({ type: CushionFoamDto })
  foam: CushionFoamDto;
  @ApiProperty({ type: CushionTuftingDto })
  tufting: CushionTuftingDto;
  @ApiProperty({ type: ButtonTableDto })
  buttons: ButtonTableDto;
  @ApiProperty({ type: [Number] })
  boardLinesMm: number[];
  @ApiProperty({ type: CushionDatumDto })
  datum: CushionDatumDto;
  @ApiProperty({ enum: CUSHION_EDGES, isArray: true })
  cameraSides: CushionEdge[];
  @ApiPropertyOptional({ enum: HOLD_DOWNS })
  holdDown?: HoldDown;
  @ApiPropertyOptional({ type: [WearAreaDto], description: 'areas that are to look used' })
  wear?: WearArea[];
  @ApiPropertyOptional()
  notes?: string;
}
