import { ApiPropertyOptional } from '@nestjs/swagger';
import { IsInt, IsOptional, IsString, MaxLength, Min } from 'class-validator';

const LETTER_MAX = 80;

/** Which document of a set is asked about. */
export class AskedDocumentDto {
  @ApiPropertyOptional({
    minimum: 1,
    description: 'the draft that was seen; either this or `revisionLetter`',
  })
  @IsOptional()
  @IsInt()
  @Min(1)
  draftNumber?: number;

  @ApiPropertyOptional({ description: 'an issued revision' })
  @IsOptional()
  @IsString()
  @MaxLength(LETTER_MAX)
  revisionLetter?: string;
}
