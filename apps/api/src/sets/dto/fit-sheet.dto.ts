import type { FitSheet, Verdict } from '@settlewright/anthropometry';
import { ApiProperty, ApiPropertyOptional } from '@nestjs/swagger';
import type { VerdictSheet } from '../../fit-checks/verdicts-only';

export class CountsDto implements Record<Verdict, number> {
  @ApiProperty()
  fits: number;
  @ApiProperty()
  tight: number;
  @ApiProperty()
  wontFit: number;
  @ApiProperty()
  notKnown: number;
}

export class RoundedBodyDto {
  @ApiProperty({ description: '`pieceId:place`' })
  placeId: string;
  @ApiProperty({
    type: 'object',
    additionalProperties: { type: 'number' },
    description: 'millimetres rounded to 20, by body measure: what shapes a drawing, without weight',
  })
  means: Record<string, number>;
  @ApiProperty({ description: 'millimetres rounded to 20' })
  shoeMm: number;
  @ApiProperty({ enum: ['light', 'medium', 'heavy'] })
  clothing: string;
}

const cells = { type: 'array' as const, items: { type: 'object' as const, additionalProperties: true } };

/**
 * A fit sheet as its reader may see it. `full` is the FitSheet of the anthropometry library; `verdicts`
 * has the same rows and cells with outcomes of verdict and margin only, and coarse bodies to draw.
 */
export class FitSheetDto {
  @ApiProperty({ enum: ['full', 'verdicts'] })
  detail: 'full' | 'verdicts';
  @ApiProperty({ ...cells, description: 'SitterRow[] of the anthropometry library' })
  rows: FitSheet['rows'] | VerdictSheet['rows'];
  @ApiProperty({
    type: 'object',
    additionalProperties: true,
    description: 'PublicRow of the anthropometry library',
  })
  publicRow: FitSheet['publicRow'] | VerdictSheet['publicRow'];
  @ApiProperty({ ...cells, description: 'FitCell[] of the anthropometry library' })
  piecesAndWays: FitSheet['piecesAndWays'] | VerdictSheet['piecesAndWays'];
  @ApiProperty({ type: [String] })
  emptyPlaceIds: string[];
  @ApiProperty({ type: CountsDto })
  counts: CountsDto;
  @ApiProperty({ description: 'probability from which its verdicts were given' })
  confidence: number;
  @ApiProperty()
  ruleVersion: string;
  @ApiPropertyOptional({ type: [RoundedBodyDto], description: 'only with `verdicts`' })
  bodies?: RoundedBodyDto[];
}
