import type { SetDocument } from '@settlewright/geometry';
import { ApiProperty, OmitType } from '@nestjs/swagger';
import { IsInt, Min } from 'class-validator';
import { ProblemBody } from '../../common/problem';
import { Verbatim } from '../../common/validation';
import type { SetDraft } from '../entities/set-draft.entity';
import type { SavedDraft } from '../save-draft';
import { documentSchema } from './document.schema';
import { PersonDto } from './person.dto';

export class SaveDraftDto {
  @ApiProperty({ minimum: 1, description: 'number of the draft that the change began from' })
  @IsInt()
  @Min(1)
  baseNumber: number;

  @ApiProperty(documentSchema)
  @Verbatim()
  document: Record<string, unknown>;
}

export class DraftDto {
  @ApiProperty()
  number: number;
  @ApiProperty(documentSchema)
  document: SetDocument;
  @ApiProperty({ format: 'date-time' })
  savedAt: string;
  @ApiProperty({ type: PersonDto })
  savedBy: PersonDto;

  static of(draft: SetDraft): DraftDto {
    return {
      number: draft.number,
      document: draft.document,
      savedAt: draft.savedAt.toISOString(),
      savedBy: PersonDto.of(draft.savedById, draft.savedBy),
    };
  }
}

export class SavedDraftDto extends OmitType(DraftDto, ['document']) {
  static ofSaved({ number, savedAt, savedById, savedByName }: SavedDraft): SavedDraftDto {
    return { number, savedAt: savedAt.toISOString(), savedBy: { id: savedById, name: savedByName } };
  }
}

export class DraftBaseDto {
  @ApiProperty()
  number: number;
  @ApiProperty(documentSchema)
  document: SetDocument;
}

/** The 409 of a stale save, with both sides and what they began from. */
export class DraftConflictDto extends ProblemBody {
  @ApiProperty({ type: DraftDto })
  current: DraftDto;
  @ApiProperty({ type: DraftBaseDto, nullable: true, description: 'null when it is too long ago to be kept' })
  base: DraftBaseDto | null;
}
