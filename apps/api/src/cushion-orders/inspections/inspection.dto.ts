import { ApiProperty, ApiPropertyOptional } from '@nestjs/swagger';
import { Type } from 'class-transformer';
import {
  ArrayMaxSize,
  ArrayMinSize,
  ArrayUnique,
  IsArray,
  IsIn,
  IsNumber,
  IsOptional,
  IsUUID,
  Max,
  Min,
  ValidateNested,
} from 'class-validator';
import { TextField } from '../../common/text-field';
import { CushionMark } from '../cushion-mark';
import { OfOrderDto } from '../life/of-order.dto';
import {
  INSPECTION_KINDS,
  INSPECTION_OUTCOMES,
  type InspectionKind,
  type InspectionOutcome,
  type MeasuredSize,
} from './order-inspection.entity';
import { SIZE_VERDICTS, type SizeVerdict } from './size-verdict';

const measured = { type: Number, nullable: true, minimum: 1, maximum: 10_000 } as const;
const Measured = (): PropertyDecorator => (target, key) => {
  for (const rule of [IsOptional(), IsNumber(), Min(1), Max(10_000)]) rule(target, key);
};

export class InspectCushionDto implements Partial<Record<MeasuredSize, number | null>> {
  @ApiProperty({ description: 'as C1' })
  @CushionMark()
  mark: string;

  @ApiPropertyOptional(measured)
  @Measured()
  widthMm?: number | null;

  @ApiPropertyOptional(measured)
  @Measured()
  depthMm?: number | null;

  @ApiPropertyOptional(measured)
  @Measured()
  thicknessMm?: number | null;

  @ApiPropertyOptional({ maxLength: 500 })
  @IsOptional()
  @TextField({ max: 500, lines: true })
  note?: string;
}

export class InspectDto {
  @ApiProperty({ enum: INSPECTION_KINDS, enumName: 'InspectionKind' })
  @IsIn(INSPECTION_KINDS)
  kind: InspectionKind;

  @ApiProperty({ type: [InspectCushionDto] })
  @IsArray()
  @ArrayMinSize(1)
  @ArrayMaxSize(300)
  @ArrayUnique((row: InspectCushionDto) => row.mark)
  @ValidateNested({ each: true })
  @Type(() => InspectCushionDto)
  cushions: InspectCushionDto[];

  @ApiProperty({ enum: INSPECTION_OUTCOMES, enumName: 'InspectionOutcome' })
  @IsIn(INSPECTION_OUTCOMES)
  outcome: InspectionOutcome;

  @ApiPropertyOptional({
    maxLength: 2000,
    description: 'asked for on rejecting, and on accepting what is out or was not measured',
  })
  @IsOptional()
  @TextField({ max: 2000, lines: true })
  note?: string;

  @ApiPropertyOptional({ type: [String], description: 'files of the order' })
  @IsOptional()
  @IsArray()
  @ArrayMaxSize(40)
  @ArrayUnique()
  @IsUUID(undefined, { each: true })
  photoIds?: string[];
}

const verdict = { enum: SIZE_VERDICTS, enumName: 'SizeVerdict' } as const;

export class InspectedSizeDto {
  @ApiProperty({ enum: ['widthMm', 'depthMm', 'thicknessMm'] })
  size: MeasuredSize;
  @ApiProperty()
  askedMm: number;
  @ApiProperty({ type: Number, nullable: true })
  measuredMm: number | null;
  @ApiProperty(verdict)
  verdict: SizeVerdict;
}

export class InspectedCushionDto {
  @ApiProperty()
  mark: string;
  @ApiProperty({ type: [InspectedSizeDto] })
  sizes: InspectedSizeDto[];
  @ApiProperty({ ...verdict, description: 'of the whole cushion: out when one size is' })
  verdict: SizeVerdict;
  @ApiProperty()
  note: string;
}

export class InspectionDto extends OfOrderDto {
  @ApiProperty({ enum: INSPECTION_KINDS, enumName: 'InspectionKind' })
  kind: InspectionKind;
  @ApiProperty()
  revisionLetter: string;
  @ApiProperty()
  toleranceMm: number;
  @ApiProperty({ type: [InspectedCushionDto] })
  cushions: InspectedCushionDto[];
  @ApiProperty({ enum: INSPECTION_OUTCOMES, enumName: 'InspectionOutcome' })
  outcome: InspectionOutcome;
  @ApiProperty()
  note: string;
  @ApiProperty({ type: [String] })
  photoIds: string[];
}
