import { ApiProperty, ApiPropertyOptional } from '@nestjs/swagger';
import { IsString } from 'class-validator';
import type { ReadCsv, ReadRow } from '../csv/read-cast-csv';
import { measuredSchema } from './measured.schema';

export class ImportCastDto {
  @ApiProperty({ description: 'the text of the file, up to 2 MB and 2,000 rows' })
  @IsString()
  csv: string;
}

export class CastColumnDto {
  @ApiProperty({ description: 'as the file says it' })
  header: string;
  @ApiProperty({ description: 'what it stands for, as `stature` or `popliteal_height`' })
  key: string;
  @ApiPropertyOptional({ description: 'unit named in the header' })
  unit?: string;
}

export class CellProblemDto {
  @ApiProperty()
  column: string;
  @ApiProperty()
  read: string;
  @ApiProperty()
  accepted: string;
  @ApiProperty()
  message: string;
}

export class CastRowDto {
  @ApiProperty()
  name: string;
  @ApiProperty()
  role: string;
  @ApiProperty({ enum: ['women', 'men', 'mixed'] })
  bodyData: string;
  @ApiPropertyOptional()
  statureMm?: number;
  @ApiProperty({ enum: ['measured', 'told'] })
  statureSource: string;
  @ApiPropertyOptional()
  weightKg?: number;
  @ApiPropertyOptional()
  age?: number;
  @ApiProperty(measuredSchema)
  measured: object;
  @ApiPropertyOptional()
  shoeMm?: number;
  @ApiProperty({ enum: ['light', 'medium', 'heavy'] })
  clothing: string;
  @ApiProperty()
  notes: string;
}

export class CastImportRowDto {
  @ApiProperty({ description: 'line of the file; the header stands on line 1' })
  line: number;
  @ApiPropertyOptional({ type: CastRowDto, description: 'absent when the row cannot be taken' })
  value?: CastRowDto;
  @ApiProperty({ type: [CellProblemDto] })
  problems: CellProblemDto[];
  @ApiProperty({ type: [CellProblemDto], description: 'worth a look; the row is taken all the same' })
  warnings: CellProblemDto[];
}

export class CastImportPreviewDto {
  @ApiProperty({ type: [CastColumnDto] })
  columns: CastColumnDto[];
  @ApiProperty({ type: [CastImportRowDto] })
  rows: CastImportRowDto[];
  @ApiProperty({ type: [String] })
  ignoredColumns: string[];

  static of({ columns, rows, ignoredColumns }: ReadCsv): CastImportPreviewDto {
    const shown = columns.map(({ header, key, unit }) => ({ header, key, ...(unit ? { unit } : {}) }));
    return { columns: shown, rows, ignoredColumns };
  }
}

export class CastImportDto {
  @ApiProperty()
  added: number;
  @ApiProperty()
  refused: number;
  @ApiProperty({ type: [CastImportRowDto], description: 'the refused rows' })
  refusedRows: CastImportRowDto[];

  static of({ rows }: ReadCsv): CastImportDto {
    const refusedRows: ReadRow[] = rows.filter(({ value }) => !value);
    return { added: rows.length - refusedRows.length, refused: refusedRows.length, refusedRows };
  }
}
