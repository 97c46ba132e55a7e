import type { CushionSpec } from '@settlewright/geometry';
import { ApiProperty, ApiPropertyOptional } from '@nestjs/swagger';
import { FoamBuildDto, FoamMakeDto } from '../../common/foam-build.dto';

type Foam = CushionSpec['foam'];

class TestedFoamDto {
  @ApiProperty({ description: 'by what the estimate of the drop is multiplied' })
  factor: number;
  @ApiProperty({ description: 'half the 90 % range, of the drop' })
  error: number;
  @ApiProperty()
  sits: number;
  @ApiProperty({ format: 'date', description: 'day of the last sit' })
  on: string;
  @ApiProperty({ type: FoamBuildDto, description: 'what was sat on' })
  of: FoamBuildDto;
}

/** Foam of a cushion; what test sits say of it names nobody. */
export class CushionFoamDto extends FoamMakeDto implements Foam {
  @ApiProperty()
  grade: string;
  @ApiProperty()
  densityKgM3: number;
  @ApiPropertyOptional({ type: TestedFoamDto })
  tested?: TestedFoamDto;
}
