import { ApiProperty, ApiPropertyOptional } from '@nestjs/swagger';
import type {
  Construction,
  CushionEdge,
  CushionMake,
  CushionPanels,
  CushionSpec,
  CutPanel,
  OutlineCorner,
  TuftLinesOf,
} from '@settlewright/geometry';
import { CONSTRUCTIONS, CUSHION_EDGES } from '@settlewright/geometry';

export class OutlineCornerDto implements OutlineCorner {
  @ApiProperty({ type: [Number], minItems: 2, maxItems: 2 })
  at: OutlineCorner['at'];
  @ApiProperty()
  radiusMm: number;
  @ApiProperty()
  edge: string;
}

export class CushionMakeDto implements CushionMake {
  @ApiProperty({ enum: CONSTRUCTIONS })
  construction: Construction;
  @ApiProperty({ enum: ['zip', 'hook-and-loop', 'hand-sewn', 'stapled'] })
  closure: CushionMake['closure'];
  @ApiProperty({ enum: CUSHION_EDGES })
  closureEdge: CushionEdge;
  @ApiProperty({ enum: ['none', 'straight', 'bias'] })
  welt: CushionMake['welt'];
}

export class CutPanelDto implements CutPanel {
  @ApiProperty()
  name: string;
  @ApiProperty()
  count: number;
  @ApiProperty({ type: [OutlineCornerDto] })
  finished: OutlineCornerDto[];
  @ApiProperty({ type: [OutlineCornerDto] })
  cut: OutlineCornerDto[];
  @ApiProperty({ type: [Number] })
  marksMm: number[];
}

export class CutSlabDto {
  @ApiProperty({ type: [OutlineCornerDto] })
  outline: OutlineCornerDto[];
  @ApiProperty()
  thicknessMm: number;
}

export class CushionClosureDto {
  @ApiProperty()
  edgeMm: number;
  @ApiProperty()
  wrapMm: number;
  @ApiProperty()
  lengthMm: number;
}

export class CushionWeltDto {
  @ApiProperty()
  seams: number;
  @ApiProperty()
  alongSeamsMm: number;
  @ApiProperty()
  joinsMm: number;
  @ApiProperty()
  lengthMm: number;
}

export class CushionPanelsDto implements CushionPanels {
  @ApiProperty({ type: [CutPanelDto] })
  panels: CutPanelDto[];
  @ApiProperty({ type: CutSlabDto })
  foam: CutSlabDto;
  @ApiPropertyOptional({ type: CutSlabDto })
  board?: CutSlabDto;
  @ApiProperty()
  perimeterMm: number;
  @ApiProperty()
  edgeHeightMm: number;
  @ApiProperty()
  crownMm: number;
  @ApiProperty({ type: CushionClosureDto })
  closure: CushionClosureDto;
  @ApiProperty({ type: CushionWeltDto })
  welt: CushionWeltDto;
}

export class TuftFieldDto {
  @ApiProperty()
  across: number;
  @ApiProperty()
  high: number;
  @ApiProperty()
  widthMm: number;
  @ApiProperty()
  heightMm: number;
  @ApiProperty()
  borderMm: number;
  @ApiPropertyOptional({ enum: ['joints', 'board-centres'] })
  columnsOn?: TuftLinesOf;
}

export class CushionTuftingDto {
  @ApiProperty({ enum: ['none', 'pull-in', 'biscuit', 'diamond'] })
  kind: CushionSpec['tufting']['kind'];
  @ApiProperty()
  pullMm: number;
  @ApiPropertyOptional({ type: TuftFieldDto })
  field?: TuftFieldDto;
  @ApiPropertyOptional({ enum: ['foam-thickness', 'half-again'] })
  fullness?: 'foam-thickness' | 'half-again';
}

/** Something to look at before a cushion is made; which numbers it has follows from its code. */
export class CushionWarningDto {
  @ApiProperty({
    enum: ['off-joint', 'buttons-outside', 'beyond-place', 'board-beyond', 'closure-on-camera-side'],
  })
  code: CushionSpec['warnings'][number]['code'];
  @ApiPropertyOptional()
  columns?: number;
  @ApiPropertyOptional()
  furthestMm?: number;
  @ApiPropertyOptional({ enum: ['seat', 'back'] })
  kind?: 'seat' | 'back';
  @ApiPropertyOptional()
  boardMm?: number;
  @ApiPropertyOptional()
  count?: number;
  @ApiPropertyOptional({ enum: CUSHION_EDGES })
  edge?: CushionEdge;
  @ApiPropertyOptional({ enum: CUSHION_EDGES, isArray: true })
  edges?: CushionEdge[];
}
