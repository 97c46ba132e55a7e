import type { BodyData, Clothing } from '@settlewright/anthropometry';
import { SITTER_COLOURS } from '@settlewright/geometry';
import { ApiExtraModels, ApiProperty, ApiPropertyOptional, getSchemaPath } from '@nestjs/swagger';
import type { Page } from '../../common/page.dto';
import {
  BODY_DATA,
  type CastMember,
  CLOTHING,
  STATURE_SOURCES,
  type StatureSource,
  type TapeMeasures,
} from '../entities/cast-member.entity';
import { measuredSchema } from './measured.schema';

/** What a carpenter or reviewer may see of a person. */
export class CastNameDto {
  @ApiProperty({ format: 'uuid' })
  id: string;
  @ApiProperty()
  name: string;
  @ApiProperty()
  role: string;
  @ApiProperty({ minimum: 1, maximum: SITTER_COLOURS.length })
  colour: number;

  static of(person: CastMember): CastNameDto {
    const { id, name, role, colour } = person;
    return { id, name, role, colour };
  }
}

/** What owner and designer see. */
export class CastMemberDto extends CastNameDto {
  @ApiProperty({ enum: BODY_DATA })
  bodyData: BodyData;
  @ApiPropertyOptional()
  statureMm?: number;
  @ApiProperty({ enum: STATURE_SOURCES })
  statureSource: StatureSource;
  @ApiPropertyOptional()
  weightKg?: number;
  @ApiPropertyOptional()
  age?: number;
  @ApiProperty(measuredSchema)
  measured: TapeMeasures;
  @ApiProperty()
  shoeMm: number;
  @ApiProperty({ enum: CLOTHING })
  clothing: Clothing;
  @ApiProperty()
  notes: string;
  @ApiProperty({ format: 'date-time' })
  createdAt: string;
  @ApiProperty({ description: 'the person was erased and still holds a place in a draft' })
  removed: boolean;

  static override of(person: CastMember): CastMemberDto {
    return {
      ...CastNameDto.of(person),
      bodyData: person.bodyData,
      ...(person.statureMm === null ? {} : { statureMm: person.statureMm }),
      statureSource: person.statureSource,
      ...(person.weightKg === null ? {} : { weightKg: person.weightKg }),
      ...(person.age === null ? {} : { age: person.age }),
      measured: person.measured,
      shoeMm: person.shoeMm,
      clothing: person.clothing,
      notes: person.notes,
      createdAt: person.createdAt.toISOString(),
      removed: Boolean(person.removedAt),
    };
  }
}

@ApiExtraModels(CastMemberDto, CastNameDto)
export class CastPageDto implements Page<CastMemberDto | CastNameDto> {
  @ApiProperty({
    type: 'array',
    items: { oneOf: [{ $ref: getSchemaPath(CastMemberDto) }, { $ref: getSchemaPath(CastNameDto) }] },
    description: 'owner and designer get CastMemberDto, carpenter and reviewer CastNameDto',
  })
  items: (CastMemberDto | CastNameDto)[];
  @ApiProperty()
  total: number;
  @ApiProperty()
  page: number;
  @ApiProperty()
  pageSize: number;
}
