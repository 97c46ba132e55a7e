import type { FoamBuild } from '@settlewright/geometry';
import { ApiProperty, ApiPropertyOptional } from '@nestjs/swagger';
import { IsNumber, Max, Min } from 'class-validator';

type Layer = NonNullable<FoamBuild['layers']>[number];
type Wrap = NonNullable<FoamBuild['wrap']>;

/** One layer of a laminated foam, as in the set document. */
export class CushionFoamLayerDto implements Layer {
  @ApiProperty({ minimum: 0.003, maximum: 1, description: 'of the foam' })
  @IsNumber()
  @Min(0.003)
  @Max(1)
  share: number;

  @ApiProperty({ minimum: 0.03, maximum: 30, description: 'firmness over that of the whole' })
  @IsNumber()
  @Min(0.03)
  @Max(30)
  times: number;
}

/** Polyester round a foam, as in the set document. */
export class CushionWrapDto implements Wrap {
  @ApiProperty({ minimum: 1, maximum: 60, description: 'both faces together' })
  @IsNumber()
  @Min(1)
  @Max(60)
  thicknessMm: number;

  @ApiProperty({ minimum: 0, maximum: 60, description: 'lost under a sitter' })
  @IsNumber()
  @Min(0)
  @Max(60)
  lostMm: number;
}

/** What a foam goes down by, as it is read. */
export class FoamMakeDto implements Omit<FoamBuild, 'thicknessMm'> {
  @ApiProperty({ description: '25 % indentation force deflection, newtons' })
  ifd25N: number;
  @ApiProperty()
  supportFactor: number;
  @ApiPropertyOptional({ type: [CushionFoamLayerDto], description: 'from the top down' })
  layers?: CushionFoamLayerDto[];
  @ApiPropertyOptional({ type: CushionWrapDto })
  wrap?: CushionWrapDto;
}

/** The same with its thickness. */
export class FoamBuildDto extends FoamMakeDto implements FoamBuild {
  @ApiProperty()
  thicknessMm: number;
}
