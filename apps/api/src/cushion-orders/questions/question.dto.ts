import { ApiProperty, ApiPropertyOptional } from '@nestjs/swagger';
import { IsOptional } from 'class-validator';
import { TextField } from '../../common/text-field';
import { CushionMark } from '../cushion-mark';
import { OfOrderDto } from '../life/of-order.dto';

export class AskQuestionDto {
  @ApiPropertyOptional({ type: String, nullable: true, description: 'a mark as C1; null: the whole order' })
  @IsOptional()
  @CushionMark()
  cushionMark?: string | null;

  @ApiProperty({ minLength: 1, maxLength: 2000 })
  @TextField({ min: 1, max: 2000, lines: true })
  text: string;
}

export class AnswerQuestionDto {
  @ApiProperty({ minLength: 1, maxLength: 2000 })
  @TextField({ min: 1, max: 2000, lines: true })
  answer: string;
}

export class QuestionDto extends OfOrderDto {
  @ApiProperty({ type: String, nullable: true })
  cushionMark: string | null;
  @ApiProperty()
  text: string;
  @ApiProperty({ description: 'empty while it is open' })
  answer: string;
  @ApiProperty()
  answeredByName: string;
  @ApiProperty({ type: String, format: 'date-time', nullable: true })
  answeredAt: string | null;
}
