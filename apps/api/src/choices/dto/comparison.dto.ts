import type { ComparedSitter, DocumentDifference } from '@settlewright/geometry';
import { ApiProperty, ApiPropertyOptional } from '@nestjs/swagger';
import { Type } from 'class-transformer';
import {
  IsDefined,
  IsInt,
  IsObject,
  IsString,
  IsUUID,
  MaxLength,
  Min,
  ValidateNested,
} from 'class-validator';
import { MayBeLeftOut } from '../../common/may-be-left-out';
import { CELL_STATES } from '../../fit-checks/cell-states';
import { CountsDto } from '../../sets/dto/fit-sheet.dto';
import { VersionStateDto } from './choice-answer.dto';

const LETTER_MAX = 12;

export class AskedVersionDto {
  @ApiPropertyOptional({
    format: 'uuid',
    description: 'another set of the production; the one of the path when absent',
  })
  @MayBeLeftOut()
  @IsUUID()
  setId?: string;

  @ApiPropertyOptional({ description: 'an issued revision; the draft when absent' })
  @MayBeLeftOut()
  @IsString()
  @MaxLength(LETTER_MAX)
  revisionLetter?: string;

  @ApiPropertyOptional({ minimum: 1, description: 'the draft that was seen; any when absent' })
  @MayBeLeftOut()
  @IsInt()
  @Min(1)
  draftNumber?: number;
}

export class AskComparisonDto {
  @ApiProperty({ type: AskedVersionDto })
  @IsDefined()
  @IsObject()
  @ValidateNested()
  @Type(() => AskedVersionDto)
  from: AskedVersionDto;

  @ApiProperty({ type: AskedVersionDto })
  @IsDefined()
  @IsObject()
  @ValidateNested()
  @Type(() => AskedVersionDto)
  to: AskedVersionDto;
}

export class ComparedVersionDto extends VersionStateDto {
  @ApiProperty({ format: 'uuid' })
  setId: string;
  @ApiProperty()
  setName: string;
  @ApiProperty({ type: CountsDto })
  counts: CountsDto;
  @ApiProperty({ description: 'probability from which its verdicts were given' })
  confidence: number;
  @ApiProperty()
  ruleVersion: string;
}

export class DocumentChangeDto {
  @ApiProperty({
    enum: [
      'parameter',
      'piece',
      'seating',
      'asked',
      'known-difference',
      'group',
      'view',
      'dimension',
      'cushion',
    ],
  })
  kind: DocumentDifference['kind'];
  @ApiPropertyOptional()
  pieceId?: string;
  @ApiPropertyOptional()
  mark?: string;
  @ApiPropertyOptional({ description: 'path of the parameter in its piece' })
  key?: string;
  @ApiProperty()
  label: string;
  @ApiPropertyOptional({
    nullable: true,
    description: 'as the set document holds it; absent where it holds none',
  })
  from?: unknown;
  @ApiPropertyOptional({ nullable: true })
  to?: unknown;
}

export class TurnedCheckDto {
  @ApiProperty()
  ruleId: string;
  @ApiProperty()
  name: string;
  @ApiProperty({ type: [String] })
  marks: string[];
  @ApiProperty({ enum: CELL_STATES })
  from: string;
  @ApiProperty({ enum: CELL_STATES, description: '`gone` where the second version no longer answers' })
  to: string;
  @ApiPropertyOptional({
    type: Number,
    nullable: true,
    description: 'as the fit sheet shows it to the same reader',
  })
  marginBefore?: number | null;
  @ApiPropertyOptional({ type: Number, nullable: true })
  marginAfter?: number | null;
}

export class ComparedChecksDto {
  @ApiProperty({ type: [TurnedCheckDto] })
  gains: TurnedCheckDto[];
  @ApiProperty({ type: [TurnedCheckDto] })
  losses: TurnedCheckDto[];
  @ApiProperty({ description: 'checks that keep their verdict' })
  kept: number;
}

export class ComparedSitterDto
  extends ComparedChecksDto
  implements Pick<ComparedSitter, 'sitterId' | 'name'>
{
  @ApiProperty()
  sitterId: string;
  @ApiProperty()
  name: string;
}

/** Two versions side by side, as far as the reader may see their sheets. */
export class ComparisonDto {
  @ApiProperty({ enum: ['full', 'verdicts'] })
  detail: 'full' | 'verdicts';
  @ApiProperty({ type: ComparedVersionDto })
  from: ComparedVersionDto;
  @ApiProperty({ type: ComparedVersionDto })
  to: ComparedVersionDto;
  @ApiProperty({ type: [DocumentChangeDto] })
  changes: DocumentChangeDto[];
  @ApiProperty({ type: [ComparedSitterDto], description: 'who sits in both' })
  sitters: ComparedSitterDto[];
  @ApiProperty({ type: ComparedChecksDto, description: 'pieces and ways' })
  pieces: ComparedChecksDto;
  @ApiProperty({ type: [String], description: 'names of who sits in the second only' })
  joined: string[];
  @ApiProperty({ type: [String], description: 'names of who sits in the first only' })
  left: string[];
  @ApiProperty()
  caution: string;
}
