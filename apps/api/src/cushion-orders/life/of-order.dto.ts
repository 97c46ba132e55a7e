import { ApiProperty } from '@nestjs/swagger';
import { SIDES, type Side } from '../entities/order-message.entity';

/** What every entry of an order says of where it comes from. */
export class OfOrderDto {
  @ApiProperty({ format: 'uuid' })
  id: string;
  @ApiProperty({ enum: SIDES, enumName: 'OrderSide' })
  side: Side;
  @ApiProperty()
  byName: string;
  @ApiProperty({ format: 'date-time' })
  at: string;
  @ApiProperty({ description: 'exchanged with the upholsterer who has the order now' })
  current: boolean;
}
