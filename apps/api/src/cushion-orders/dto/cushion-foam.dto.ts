import type { CushionSpec } from '@settlewright/geometry';
import { ApiProperty, ApiPropertyOptional } from '@nestjs/swagger';
import { CushionFoamLayerDto, CushionWrapDto } from '../../common/foam-build.dto';

type Foam = CushionSpec['foam'];

class TestedCushionDto {
  @ApiProperty()
  thicknessMm: number;
  @ApiProperty()
  ifd25N: number;
  @ApiProperty()
  supportFactor: number;
  @ApiPropertyOptional({ type: [CushionFoamLayerDto] })
  layers?: CushionFoamLayerDto[];
  @ApiPropertyOptional({ type: CushionWrapDto })
  wrap?: CushionWrapDto;
}

class TestedFoamDto {
  @ApiProperty({ description: 'by what the estimate of the drop is multiplied' })
  factor: number;
  @ApiProperty({ description: 'half the 90 % range, of the drop' })
  error: number;
  @ApiProperty()
  sits: number;
  @ApiProperty({ format: 'date', description: 'day of the last sit' })
  on: string;
  @ApiProperty({ type: TestedCushionDto, description: 'what was sat on' })
  of: TestedCushionDto;
}

/** Foam of a cushion; what test sits say of it names nobody. */
export class CushionFoamDto implements Foam {
  @ApiProperty()
  grade: string;
  @ApiProperty()
  densityKgM3: number;
  @ApiProperty()
  ifd25N: number;
  @ApiProperty()
  supportFactor: number;
  @ApiPropertyOptional({ type: [CushionFoamLayerDto], description: 'from the top down' })
  layers?: CushionFoamLayerDto[];
  @ApiPropertyOptional({ type: CushionWrapDto })
  wrap?: CushionWrapDto;
  @ApiPropertyOptional({ type: TestedFoamDto })
  tested?: TestedFoamDto;
}
