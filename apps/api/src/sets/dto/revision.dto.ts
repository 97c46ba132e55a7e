import type { SetDocument } from '@settlewright/geometry';
import { ApiProperty, ApiPropertyOptional } from '@nestjs/swagger';
import { IsIn, IsInt, IsOptional, Min } from 'class-validator';
import { TextField } from '../../common/text-field';
import { DECISIONS, type Decision, type RevisionApproval } from '../entities/revision-approval.entity';
import type { SetRevision } from '../entities/set-revision.entity';
import { documentSchema } from './document.schema';
import { CountsDto, FitSheetDto } from './fit-sheet.dto';
import { PersonDto } from './person.dto';

export class IssueRevisionDto {
  @ApiProperty({ minimum: 1, description: 'number of the draft that is to be issued' })
  @IsInt()
  @Min(1)
  baseNumber: number;

  @ApiPropertyOptional({ maxLength: 2000 })
  @IsOptional()
  @TextField({ max: 2000, lines: true })
  note?: string;
}

export class ApproveRevisionDto {
  @ApiProperty({ enum: DECISIONS })
  @IsIn(DECISIONS)
  decision: Decision;

  @ApiPropertyOptional({ maxLength: 4000 })
  @IsOptional()
  @TextField({ max: 4000, lines: true })
  comment?: string;
}

export class ApprovalDto {
  @ApiProperty({ enum: DECISIONS })
  decision: Decision;
  @ApiProperty()
  comment: string;
  @ApiProperty({ format: 'date-time' })
  decidedAt: string;
  @ApiProperty({ type: PersonDto })
  decidedBy: PersonDto;

  static of(approval: RevisionApproval): ApprovalDto {
    return {
      decision: approval.decision,
      comment: approval.comment,
      decidedAt: approval.decidedAt.toISOString(),
      decidedBy: PersonDto.of(approval.decidedById, approval.decidedBy),
    };
  }
}

export class RevisionDto {
  @ApiProperty({ format: 'uuid' })
  id: string;
  @ApiProperty({ description: 'A to Z, then AA' })
  letter: string;
  @ApiProperty({ description: 'number of the draft it was issued from' })
  number: number;
  @ApiProperty({ format: 'date-time' })
  issuedAt: string;
  @ApiProperty({ type: PersonDto })
  issuedBy: PersonDto;
  @ApiProperty()
  note: string;
  @ApiProperty({ type: CountsDto })
  counts: CountsDto;
  @ApiPropertyOptional({ type: ApprovalDto, description: 'the latest word on it' })
  approval?: ApprovalDto;

  static of(revision: SetRevision, approval: RevisionApproval | undefined): RevisionDto {
    return {
      id: revision.id,
      letter: revision.letter,
      number: revision.draftNumber,
      issuedAt: revision.issuedAt.toISOString(),
      issuedBy: PersonDto.of(revision.issuedById, revision.issuedBy),
      note: revision.note,
      counts: revision.counts,
      ...(approval ? { approval: ApprovalDto.of(approval) } : {}),
    };
  }
}

export class RevisionDetailDto extends RevisionDto {
  @ApiProperty(documentSchema)
  document: SetDocument;
  @ApiProperty({ type: FitSheetDto })
  fitSheet: FitSheetDto;
  @ApiProperty({ type: [ApprovalDto], description: 'newest first' })
  approvals: ApprovalDto[];
}
