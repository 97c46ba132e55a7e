import { ApiProperty, ApiPropertyOptional } from '@nestjs/swagger';
import { IsOptional } from 'class-validator';
import { TextField } from '../../common/text-field';
import type { OrderSpec } from '../order-content';

const LINE = { max: 300 };
const LINES = { max: 2000, lines: true };

/** Words that go with the sizes. A part that is left out keeps what it was. */
export class OrderSpecInput implements Partial<OrderSpec> {
  @ApiPropertyOptional({ maxLength: 300 })
  @IsOptional()
  @TextField(LINE)
  cover?: string;

  @ApiPropertyOptional({
    maxLength: 300,
    description: 'beyond grade, density and firmness, which the set holds',
  })
  @IsOptional()
  @TextField(LINE)
  foam?: string;

  @ApiPropertyOptional({ maxLength: 300 })
  @IsOptional()
  @TextField(LINE)
  welt?: string;

  @ApiPropertyOptional({ maxLength: 300 })
  @IsOptional()
  @TextField(LINE)
  closure?: string;

  @ApiPropertyOptional({ maxLength: 300 })
  @IsOptional()
  @TextField(LINE)
  fixing?: string;

  @ApiPropertyOptional({ maxLength: 300 })
  @IsOptional()
  @TextField(LINE)
  buttons?: string;

  @ApiPropertyOptional({ maxLength: 2000 })
  @IsOptional()
  @TextField(LINES)
  notes?: string;

  @ApiPropertyOptional({
    maxLength: 300,
    description: 'a requirement and its evidence: recorded, not certified',
  })
  @IsOptional()
  @TextField(LINE)
  flammability?: string;
}

export class OrderSpecDto implements OrderSpec {
  @ApiProperty()
  cover: string;
  @ApiProperty()
  foam: string;
  @ApiProperty()
  welt: string;
  @ApiProperty()
  closure: string;
  @ApiProperty()
  fixing: string;
  @ApiProperty()
  buttons: string;
  @ApiProperty()
  notes: string;
  @ApiProperty()
  flammability: string;
}
