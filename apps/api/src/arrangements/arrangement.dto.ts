import type { SetDocument } from '@settlewright/geometry';
import { ApiProperty } from '@nestjs/swagger';
import { TextField } from '../common/text-field';
import { Verbatim } from '../common/validation';
import { documentSchema } from '../sets/dto/document.schema';
import type { KeptArrangement } from './kept-arrangement.entity';

export class KeepArrangementDto {
  @ApiProperty({ maxLength: 80 })
  @TextField({ min: 1, max: 80 })
  name: string;

  @ApiProperty({
    ...documentSchema,
    description: 'a set document; its pieces and cushions are kept, and nobody who sits in it',
  })
  @Verbatim()
  document: Record<string, unknown>;
}

export class ArrangementDto {
  @ApiProperty({ format: 'uuid' })
  id: string;
  @ApiProperty()
  name: string;
  @ApiProperty(documentSchema)
  document: SetDocument;
  @ApiProperty({ format: 'date-time' })
  keptAt: string;

  static of({ id, name, document, keptAt }: KeptArrangement): ArrangementDto {
    return { id, name, document, keptAt: keptAt.toISOString() };
  }
}
