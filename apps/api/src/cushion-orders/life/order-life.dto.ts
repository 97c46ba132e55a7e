import type { PhrasePart } from '@settlewright/geometry';
import { ApiProperty, ApiPropertyOptional } from '@nestjs/swagger';
import { MAIL_STATES, type MailState } from '../../mail/entities/outbox-mail.entity';
import { PaymentDto } from '../deposits/deposit.dto';
import { OutlineCornerDto } from '../dto/cushion-make.dto';
import { FileDto } from '../files/file.dto';
import { InspectionDto } from '../inspections/inspection.dto';
import { MARKED_STATES, type MarkedState } from '../order-states';
import { QuestionDto } from '../questions/question.dto';
import { QuoteDto } from '../quotes/quote.dto';
import { CHANGED_FIELDS, type ChangedField, type OrderChange } from './order-changes';

/** A stretch of a phrase: words, or one quantity to show in the units of the page. */
export class PhrasePartDto implements PhrasePart {
  @ApiPropertyOptional()
  text?: string;
  @ApiPropertyOptional()
  mm?: number;
  @ApiPropertyOptional()
  densityKgM3?: number;
  @ApiPropertyOptional()
  firmnessN?: number;
}

export class ChangedOutlineDto {
  @ApiProperty({ type: [OutlineCornerDto] })
  before: OutlineCornerDto[];
  @ApiProperty({ type: [OutlineCornerDto] })
  after: OutlineCornerDto[];
}

export class OrderChangeDto implements OrderChange {
  @ApiProperty({ type: String, nullable: true, description: 'null: the order itself' })
  mark: string | null;
  @ApiProperty({ enum: CHANGED_FIELDS, enumName: 'OrderChangedField' })
  field: ChangedField;
  @ApiProperty({ type: [PhrasePartDto], description: 'empty: nothing was said' })
  before: PhrasePartDto[];
  @ApiProperty({ type: [PhrasePartDto], description: 'empty: nothing is said' })
  after: PhrasePartDto[];
  @ApiPropertyOptional({ type: ChangedOutlineDto, description: 'of an outline' })
  outlines?: ChangedOutlineDto;
}

export class OrderWordDto {
  @ApiProperty()
  name: string;
  @ApiProperty({ format: 'date-time' })
  at: string;
}

export class OrderAgreementDto {
  @ApiProperty({ type: OrderWordDto, nullable: true, description: 'can make it as drawn' })
  upholsterer: OrderWordDto | null;
  @ApiProperty({ type: OrderWordDto, nullable: true, description: 'accepted the quote for it' })
  workshop: OrderWordDto | null;
}

export class OrderMailAboutDto {
  @ApiProperty({ format: 'uuid' })
  id: string;
  @ApiProperty()
  subject: string;
  @ApiProperty({ enum: MAIL_STATES, enumName: 'MailState' })
  state: MailState;
  @ApiProperty({ format: 'date-time' })
  at: string;
}

const INSPECTED = ['none', 'waiting', 'accepted', 'rejected'] as const;

/** All that passes between the two sides of an order beside its sizes. */
export class OrderLifeDto {
  @ApiProperty()
  toleranceMm: number;
  @ApiProperty({ type: String, nullable: true, description: 'the revision that the present one replaced' })
  earlierRevision: string | null;
  @ApiProperty({ type: [OrderChangeDto], description: 'since the order was sent before' })
  changes: OrderChangeDto[];
  @ApiProperty({ type: OrderAgreementDto, description: 'the words of both sides on what was last sent' })
  agreement: OrderAgreementDto;
  @ApiProperty({ enum: INSPECTED, enumName: 'InspectedState' })
  firstArticle: (typeof INSPECTED)[number];
  @ApiProperty({ enum: INSPECTED, enumName: 'InspectedState' })
  delivery: (typeof INSPECTED)[number];
  @ApiProperty({ enum: MARKED_STATES, enumName: 'MarkedOrderState', isArray: true })
  upholstererMayMark: MarkedState[];
  @ApiProperty()
  upholstererMayQuote: boolean;
  @ApiProperty({ type: [QuoteDto], description: 'newest first' })
  quotes: QuoteDto[];
  @ApiProperty({ type: [QuestionDto], description: 'oldest first' })
  questions: QuestionDto[];
  @ApiProperty({ type: [InspectionDto], description: 'newest first' })
  inspections: InspectionDto[];
  @ApiProperty({ type: [FileDto], description: 'oldest first' })
  files: FileDto[];
  @ApiProperty({ type: [PaymentDto], description: 'oldest first; for the upholsterer only what was settled' })
  payments: PaymentDto[];
  @ApiProperty({ description: 'a deposit can be paid to their account; otherwise it is recorded by hand' })
  depositOnline: boolean;
  @ApiProperty({ type: [OrderMailAboutDto], description: 'newest first; for the workshop only' })
  mails: OrderMailAboutDto[];
}
