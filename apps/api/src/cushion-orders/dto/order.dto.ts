import type { CushionRules } from '@settlewright/geometry';
import { ApiProperty, ApiPropertyOptional } from '@nestjs/swagger';
import { MAIL_STATES, type MailState } from '../../mail/entities/outbox-mail.entity';
import { EVENT_KINDS, type EventKind } from '../entities/order-event.entity';
import { SIDES, type Side } from '../entities/order-message.entity';
import { ORDER_STATES, type OrderState, RECORDED_STATES, type RecordedState } from '../order-states';
import { CushionDto } from './cushion.dto';
import { OrderCoverDto } from './order-cover.dto';
import { OrderSpecDto } from './order-spec.dto';

const LINK_STATES = ['none', 'valid', 'expired', 'revoked'] as const;
export type LinkState = (typeof LINK_STATES)[number];

export class OrderEventDto {
  @ApiProperty({ enum: EVENT_KINDS, enumName: 'OrderEventKind' })
  kind: EventKind;
  @ApiProperty({ format: 'date-time' })
  at: string;
  @ApiProperty({ enum: SIDES, enumName: 'OrderSide' })
  side: Side;
  @ApiProperty()
  byName: string;
  @ApiPropertyOptional({ description: 'who had the order then, if anybody had' })
  upholstererName?: string;
  @ApiProperty({ enum: ORDER_STATES, enumName: 'OrderState', nullable: true, type: String })
  fromState: OrderState | null;
  @ApiProperty({ enum: ORDER_STATES, enumName: 'OrderState', nullable: true, type: String })
  toState: OrderState | null;
  @ApiProperty()
  revisionLetter: string;
  @ApiProperty()
  note: string;
}

export class OrderUpholstererDto {
  @ApiProperty({ format: 'uuid' })
  id: string;
  @ApiProperty()
  name: string;
  @ApiProperty()
  contactName: string;
  @ApiProperty({ description: 'no longer in the address book' })
  removed: boolean;
}

export class OrderLinkDto {
  @ApiProperty({ enum: LINK_STATES, enumName: 'OrderLinkState' })
  state: LinkState;
  @ApiProperty({ type: String, format: 'date-time', nullable: true })
  expiresAt: string | null;
}

export class OrderMailDto {
  @ApiProperty({ format: 'uuid' })
  id: string;
  @ApiProperty({ enum: MAIL_STATES, enumName: 'MailState' })
  state: MailState;
  @ApiProperty({ format: 'date-time' })
  at: string;
}

export class SentDto {
  @ApiProperty()
  revisionLetter: string;
  @ApiProperty({ format: 'date-time' })
  at: string;
  @ApiProperty()
  byName: string;
  @ApiProperty({ description: 'the order says something else now than what was sent' })
  changedSince: boolean;
}

export class AcknowledgementDto {
  @ApiProperty()
  name: string;
  @ApiProperty({ format: 'date-time' })
  at: string;
  @ApiProperty()
  revisionLetter: string;
}

export class OrderSummaryDto {
  @ApiProperty({ format: 'uuid' })
  id: string;
  @ApiProperty({ description: 'counts through the workshop' })
  number: number;
  @ApiProperty()
  title: string;
  @ApiProperty({ enum: ORDER_STATES, enumName: 'OrderState' })
  state: OrderState;
  @ApiProperty({ format: 'uuid' })
  setId: string;
  @ApiProperty()
  setName: string;
  @ApiProperty()
  revisionLetter: string;
  @ApiProperty({ type: String, format: 'date', nullable: true })
  neededBy: string | null;
  @ApiProperty()
  cushionCount: number;
  @ApiProperty({ type: OrderUpholstererDto, nullable: true })
  upholsterer: OrderUpholstererDto | null;
  @ApiProperty({
    description: 'messages of the upholsterer that nobody has answered, and questions of either side',
  })
  openQuestions: number;
  @ApiProperty({ format: 'date-time' })
  updatedAt: string;
}

export class OrderDto extends OrderSummaryDto {
  @ApiProperty({ format: 'date-time' })
  revisionIssuedAt: string;
  @ApiProperty({ type: [String], nullable: true, description: 'null: every cushion of the revision' })
  cushionMarks: string[] | null;
  @ApiProperty({ type: OrderSpecDto })
  spec: OrderSpecDto;
  @ApiProperty({ description: 'how far a finished size may be off' })
  toleranceMm: number;
  @ApiProperty({ type: [OrderCoverDto], description: 'its cloths; none as long as nobody said them' })
  covers: OrderCoverDto[];
  @ApiProperty({
    type: 'object',
    additionalProperties: true,
    description: 'allowances and foams that were in force when its revision was issued',
  })
  cushionRules: CushionRules;
  @ApiProperty({ type: [CushionDto] })
  cushions: CushionDto[];
  @ApiProperty({ type: SentDto, nullable: true })
  sent: SentDto | null;
  @ApiProperty({ type: AcknowledgementDto, nullable: true, description: 'of what was last sent' })
  acknowledgement: AcknowledgementDto | null;
  @ApiProperty({ type: OrderLinkDto })
  link: OrderLinkDto;
  @ApiProperty({
    type: OrderMailDto,
    nullable: true,
    description: 'the last mail about this order to the upholsterer',
  })
  lastMail: OrderMailDto | null;
  @ApiProperty({ enum: RECORDED_STATES, enumName: 'RecordedOrderState', isArray: true })
  nextStates: RecordedState[];
  @ApiProperty()
  maySend: boolean;
  @ApiProperty()
  mayChange: boolean;
  @ApiProperty({ type: [OrderEventDto] })
  events: OrderEventDto[];
  @ApiProperty({ format: 'date-time' })
  createdAt: string;
}

export class OrderMessageDto {
  @ApiProperty({ format: 'uuid' })
  id: string;
  @ApiProperty({ enum: SIDES, enumName: 'OrderSide' })
  side: Side;
  @ApiProperty()
  authorName: string;
  @ApiPropertyOptional({ description: 'with whom: an order may go to several, one after another' })
  upholstererName?: string;
  @ApiProperty()
  text: string;
  @ApiProperty({ format: 'date-time' })
  at: string;
}
