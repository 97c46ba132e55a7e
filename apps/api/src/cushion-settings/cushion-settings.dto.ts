import {
  ALLOWANCE_KEYS,
  allowanceLimits,
  CUSHION_SETTINGS,
  type FoamGrade,
  type WorkshopCushions,
} from '@settlewright/geometry';
import { ApiProperty } from '@nestjs/swagger';
import { IsInt, Min } from 'class-validator';
import { Verbatim } from '../common/validation';
import type { KeptCushionSettings } from './cushion-settings.service';

const allowances = {
  type: 'object' as const,
  description: 'millimetres by the name of the allowance; what is absent is as usual',
  additionalProperties: false,
  properties: Object.fromEntries(
    ALLOWANCE_KEYS.map((key) => {
      const { minMm, maxMm } = allowanceLimits(key);
      const { label, valueMm } = CUSHION_SETTINGS[key];
      const description = `${label}; ${valueMm} mm as usual`;
      return [key, { type: 'number' as const, minimum: minMm, maximum: maxMm, description }];
    }),
  ),
};

export class FoamLayerDto {
  @ApiProperty()
  name: string;
  @ApiProperty()
  thicknessMm: number;
  @ApiProperty()
  densityKgM3: number;
  @ApiProperty()
  ifd25N: number;
}

export class FoamGradeDto implements FoamGrade {
  @ApiProperty()
  name: string;
  @ApiProperty({ enum: ['seat', 'back', 'either'] })
  use: FoamGrade['use'];
  @ApiProperty()
  densityKgM3: number;
  @ApiProperty({ description: '25 % indentation force deflection, newtons' })
  ifd25N: number;
  @ApiProperty()
  supportFactor: number;
  @ApiProperty()
  thicknessMm: number;
  @ApiProperty({ type: [FoamLayerDto], description: 'from the top down' })
  layers: FoamLayerDto[];
  @ApiProperty({ description: 'bonded polyester, both faces together' })
  wrapMm: number;
}

export class WorkshopCushionsDto implements WorkshopCushions {
  @ApiProperty(allowances)
  allowancesMm: WorkshopCushions['allowancesMm'];
  @ApiProperty({ type: [FoamGradeDto] })
  foams: FoamGradeDto[];
}

export class SaveCushionSettingsDto {
  @ApiProperty({ minimum: 0, description: 'number of the settings that the change began from' })
  @IsInt()
  @Min(0)
  baseNumber: number;

  @ApiProperty({ type: WorkshopCushionsDto })
  @Verbatim()
  settings: Record<string, unknown>;
}

export class CushionSettingsDto {
  @ApiProperty({ description: '0 until something is set' })
  number: number;
  @ApiProperty({ type: WorkshopCushionsDto })
  settings: WorkshopCushionsDto;
  @ApiProperty({ type: String, format: 'date-time', nullable: true })
  changedAt: string | null;
  @ApiProperty({ type: String, nullable: true })
  changedByName: string | null;

  static of({ number, settings, changedAt, changedByName }: KeptCushionSettings): CushionSettingsDto {
    return { number, settings, changedAt: changedAt?.toISOString() ?? null, changedByName };
  }
}
