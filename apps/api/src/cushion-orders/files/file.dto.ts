import { ApiProperty, ApiPropertyOptional } from '@nestjs/swagger';
import { IsOptional } from 'class-validator';
import { CushionMark } from '../cushion-mark';
import { OfOrderDto } from '../life/of-order.dto';
import { FILE_TYPES, type FileType } from './order-file.entity';

export class UploadFileDto {
  @ApiProperty({ type: String, format: 'binary', description: 'JPEG, PNG, WebP or PDF, at most 15 MB' })
  @IsOptional()
  file?: unknown;

  @ApiPropertyOptional({ description: 'the cushion that it shows, as C1' })
  @IsOptional()
  @CushionMark()
  cushionMark?: string;
}

export class FileDto extends OfOrderDto {
  @ApiProperty()
  name: string;
  @ApiProperty({ enum: FILE_TYPES, enumName: 'OrderFileType' })
  type: FileType;
  @ApiProperty()
  bytes: number;
  @ApiProperty({ type: Number, nullable: true })
  widthPx: number | null;
  @ApiProperty({ type: Number, nullable: true })
  heightPx: number | null;
  @ApiProperty({ type: String, nullable: true })
  cushionMark: string | null;
}
