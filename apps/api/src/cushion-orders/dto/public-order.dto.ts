import { ApiProperty } from '@nestjs/swagger';
import { type Paper, PAPERS } from '../../workshops/entities/workshop.entity';
import { SIDES, type Side } from '../entities/order-message.entity';
import { ORDER_STATES, type OrderState } from '../order-states';
import { CushionDto } from './cushion.dto';
import { OrderCoverDto } from './order-cover.dto';
import { AcknowledgementDto } from './order.dto';
import { OrderSpecDto } from './order-spec.dto';

export class PublicWorkshopDto {
  @ApiProperty()
  name: string;
  @ApiProperty()
  telephone: string;
  @ApiProperty({ description: 'who sent the order' })
  contactName: string;
}

export class PublicMessageDto {
  @ApiProperty({ enum: SIDES, enumName: 'OrderSide' })
  side: Side;
  @ApiProperty()
  authorName: string;
  @ApiProperty()
  text: string;
  @ApiProperty({ format: 'date-time' })
  at: string;
}

/** What the holder of a private link sees: one order as it was sent, and nothing about anybody who sits. */
export class PublicOrderDto {
  @ApiProperty({ type: PublicWorkshopDto })
  workshop: PublicWorkshopDto;
  @ApiProperty()
  number: number;
  @ApiProperty()
  title: string;
  @ApiProperty()
  productionName: string;
  @ApiProperty()
  setName: string;
  @ApiProperty({ description: 'the upholsterer the order is for' })
  upholstererName: string;
  @ApiProperty({ enum: ORDER_STATES, enumName: 'OrderState' })
  state: OrderState;
  @ApiProperty()
  revisionLetter: string;
  @ApiProperty({ format: 'date-time' })
  revisionIssuedAt: string;
  @ApiProperty({ type: String, format: 'date', nullable: true })
  neededBy: string | null;
  @ApiProperty({ enum: ['feet-inches', 'decimal-inches', 'millimetres'] })
  units: 'feet-inches' | 'decimal-inches' | 'millimetres';
  @ApiProperty({ enum: [16, 8] })
  roundTo: 16 | 8;
  @ApiProperty({ enum: PAPERS, description: 'of the drawing pack, unless another is asked for' })
  paper: Paper;
  @ApiProperty({ format: 'date-time' })
  sentAt: string;
  @ApiProperty({ type: OrderSpecDto })
  spec: OrderSpecDto;
  @ApiProperty({ type: [CushionDto] })
  cushions: CushionDto[];
  @ApiProperty({ type: [OrderCoverDto], description: 'its cloths, without what the workshop pays for them' })
  covers: OrderCoverDto[];
  @ApiProperty({ type: [PublicMessageDto] })
  messages: PublicMessageDto[];
  @ApiProperty({ type: AcknowledgementDto, nullable: true })
  acknowledgement: AcknowledgementDto | null;
  @ApiProperty({ format: 'date-time', description: 'when this link stops working' })
  linkExpiresAt: string;
}
