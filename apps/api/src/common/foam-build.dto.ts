import type { FoamBuild } from '@settlewright/geometry';
import { ApiProperty } from '@nestjs/swagger';
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
