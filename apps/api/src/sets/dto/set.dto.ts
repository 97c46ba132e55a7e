import type { SetDocument } from '@settlewright/geometry';
import { ApiProperty, ApiPropertyOptional } from '@nestjs/swagger';
import { IsIn, IsOptional } from 'class-validator';
import { PageQuery } from '../../common/page.dto';
import { TextField } from '../../common/text-field';
import { Verbatim } from '../../common/validation';
import { documentSchema } from './document.schema';
import { CountsDto } from './fit-sheet.dto';
import { PersonDto } from './person.dto';
import { RevisionDto } from './revision.dto';

const SET_STATUSES = ['active', 'archived'] as const;
export type SetStatus = (typeof SET_STATUSES)[number];

export class SetQuery extends PageQuery {
  @ApiPropertyOptional({ enum: SET_STATUSES, default: 'active' })
  @IsOptional()
  @IsIn(SET_STATUSES)
  status: SetStatus = 'active';
}

export class CreateSetDto {
  @ApiProperty({ maxLength: 120 })
  @TextField({ min: 1, max: 120 })
  name: string;

  @ApiPropertyOptional({
    description: 'id of a ready arrangement, as `facing-benches`; `empty` when nothing is given',
  })
  @IsOptional()
  @TextField({ max: 60 })
  arrangement?: string;

  @ApiPropertyOptional({
    ...documentSchema,
    description: 'a set document to begin with, instead of an arrangement',
  })
  @IsOptional()
  @Verbatim()
  document?: Record<string, unknown>;
}

export class RenameSetDto {
  @ApiProperty({ maxLength: 120 })
  @TextField({ min: 1, max: 120 })
  name: string;
}

export class SetDto {
  @ApiProperty({ format: 'uuid' })
  id: string;
  @ApiProperty()
  name: string;
  @ApiProperty({ enum: SET_STATUSES })
  status: SetStatus;
  @ApiProperty()
  draftNumber: number;
  @ApiProperty({ format: 'date-time' })
  savedAt: string;
  @ApiProperty({ type: PersonDto })
  savedBy: PersonDto;
  @ApiPropertyOptional({ type: RevisionDto })
  lastRevision?: RevisionDto;
  @ApiProperty()
  pieceCount: number;
  @ApiProperty()
  seatedCount: number;
  @ApiPropertyOptional({
    type: CountsDto,
    description: 'verdicts of the draft; absent when they could not be made',
  })
  counts?: CountsDto;
  @ApiProperty(documentSchema)
  document: SetDocument;
}
