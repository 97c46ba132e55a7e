import { ApiProperty, ApiPropertyOptional } from '@nestjs/swagger';
import { IsBoolean, IsIn, IsOptional } from 'class-validator';
import { TextField } from '../../common/text-field';
import { NOTE_KINDS, type NoteKind, type SetNote } from '../entities/set-note.entity';
import { PersonDto } from './person.dto';

export class CreateNoteDto {
  @ApiProperty({ maxLength: 4000 })
  @TextField({ min: 1, max: 4000, lines: true })
  text: string;

  @ApiPropertyOptional({ maxLength: 40, description: 'piece the note is about' })
  @IsOptional()
  @TextField({ min: 1, max: 40 })
  pieceId?: string;

  @ApiProperty({ enum: NOTE_KINDS })
  @IsIn(NOTE_KINDS)
  kind: NoteKind;
}

export class ResolveNoteDto {
  @ApiProperty()
  @IsBoolean()
  resolved: boolean;
}

export class NoteDto {
  @ApiProperty({ format: 'uuid' })
  id: string;
  @ApiProperty({ enum: NOTE_KINDS })
  kind: NoteKind;
  @ApiProperty()
  text: string;
  @ApiPropertyOptional()
  pieceId?: string;
  @ApiProperty({ format: 'date-time' })
  createdAt: string;
  @ApiProperty({ type: PersonDto })
  createdBy: PersonDto;
  @ApiProperty()
  resolved: boolean;
  @ApiPropertyOptional({ format: 'date-time' })
  resolvedAt?: string;
  @ApiPropertyOptional({ type: PersonDto })
  resolvedBy?: PersonDto;

  static of(note: SetNote): NoteDto {
    const { id, kind, text, pieceId, createdAt, createdById, createdBy, resolvedAt, resolvedById } = note;
    return {
      id,
      kind,
      text,
      ...(pieceId === null ? {} : { pieceId }),
      createdAt: createdAt.toISOString(),
      createdBy: PersonDto.of(createdById, createdBy),
      resolved: Boolean(resolvedAt),
      ...(resolvedAt ? { resolvedAt: resolvedAt.toISOString() } : {}),
      ...(resolvedById ? { resolvedBy: PersonDto.of(resolvedById, note.resolvedBy ?? undefined) } : {}),
    };
  }
}
