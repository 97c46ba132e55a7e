import type { CushionDatum, CushionSpec, EdgeMeets } from '@settlewright/geometry';
import { ApiProperty, ApiPropertyOptional } from '@nestjs/swagger';

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

export class CushionFaceDto {
  @ApiProperty()
  widthMm: number;
  @ApiProperty()
  depthMm: number;
}

export class CushionPlatesDto extends CushionFaceDto {
  @ApiProperty({ type: Number, enum: [2] })
  count: 2;
}

export class CushionZipDto {
  @ApiProperty()
  edgeMm: number;
  @ApiProperty()
  wrapMm: number;
  @ApiProperty()
  lengthMm: number;
}

export class CushionZipPanelDto {
  @ApiProperty({ type: Number, enum: [2] })
  count: 2;
  @ApiProperty()
  halfWidthMm: number;
  @ApiProperty()
  lengthMm: number;
}

export class CushionBoxingDto {
  @ApiProperty()
  finishedLengthMm: number;
  @ApiProperty()
  cutLengthMm: number;
  @ApiProperty()
  cutHeightMm: number;
}

export class CushionWeltDto {
  @ApiProperty({ type: Number, enum: [2] })
  seams: 2;
  @ApiProperty()
  alongSeamsMm: number;
  @ApiProperty()
  joinsMm: number;
  @ApiProperty()
  lengthMm: number;
}

export class CushionCutDto {
  @ApiProperty({ type: CushionSizeDto })
  foamMm: CushionSizeDto;
  @ApiProperty()
  foamVolumeM3: number;
  @ApiProperty()
  foamMassKg: number;
  @ApiProperty({ type: CushionFaceDto })
  boardMm: CushionFaceDto;
  @ApiProperty({ type: CushionPlatesDto })
  plates: CushionPlatesDto;
  @ApiProperty()
  perimeterMm: number;
  @ApiProperty({ type: CushionZipDto })
  zip: CushionZipDto;
  @ApiProperty({ type: CushionZipPanelDto })
  zipPanel: CushionZipPanelDto;
  @ApiProperty({ type: CushionBoxingDto })
  boxing: CushionBoxingDto;
  @ApiProperty({ type: CushionWeltDto })
  welt: CushionWeltDto;
}

export class CushionFoamDto {
  @ApiProperty()
  grade: string;
  @ApiProperty()
  densityKgM3: number;
  @ApiProperty()
  ifd25N: number;
  @ApiProperty()
  supportFactor: number;
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

export class ButtonTableDto {
  @ApiProperty({ type: [ButtonColumnDto] })
  columns: ButtonColumnDto[];
  @ApiProperty({ type: [Number] })
  rowsMm: number[];
  @ApiProperty()
  count: number;
  @ApiProperty({ enum: ['joints', 'board-centres'] })
  alignedTo: 'joints' | 'board-centres';
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
  @ApiProperty({ type: CushionCutDto })
  cut: CushionCutDto;
  @ApiProperty({ enum: ['back', 'bottom'] })
  zipEdge: 'back' | 'bottom';
  @ApiProperty({ type: CushionFoamDto })
  foam: CushionFoamDto;
  @ApiProperty({ type: ButtonTableDto })
  buttons: ButtonTableDto;
  @ApiProperty({ type: [Number] })
  boardLinesMm: number[];
  @ApiProperty({ type: CushionDatumDto })
  datum: CushionDatumDto;
}
