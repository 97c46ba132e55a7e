import { ApiProperty } from '@nestjs/swagger';
import { IsBoolean } from 'class-validator';
import { TextField } from '../../common/text-field';
import type { BuiltPart } from '../entities/built-part.entity';
import { PersonDto } from './person.dto';

export class SetBuiltDto {
  @ApiProperty({ description: 'id of a part of the draft or of the latest revision' })
  @TextField({ min: 1, max: 120 })
  partId: string;

  @ApiProperty()
  @IsBoolean()
  built: boolean;
}

export class BuiltPartDto {
  @ApiProperty()
  partId: string;
  @ApiProperty({ format: 'date-time' })
  builtAt: string;
  @ApiProperty({ type: PersonDto })
  builtBy: PersonDto;

  static of(part: BuiltPart): BuiltPartDto {
    return {
      partId: part.partId,
      builtAt: part.builtAt.toISOString(),
      builtBy: PersonDto.of(part.builtById, part.builtBy),
    };
  }
}

export class BuiltPartsDto {
  @ApiProperty({ type: [BuiltPartDto] })
  items: BuiltPartDto[];
}
