import { ApiProperty } from '@nestjs/swagger';
import { IsIn, IsInt, Max, Min } from 'class-validator';
import { Currency } from '../../common/currency';
import { TextField } from '../../common/text-field';
import { OfOrderDto } from '../life/of-order.dto';
import { PAYMENT_KINDS, PAYMENT_STATES, type PaymentKind, type PaymentState } from './order-payment.entity';

const MOST_MINOR = 2_000_000_000;

export class BeginDepositDto {
  @ApiProperty({ minimum: 1, maximum: MOST_MINOR, description: 'in the currency of the accepted quote' })
  @IsInt()
  @Min(1)
  @Max(MOST_MINOR)
  amountMinor: number;
}

export class RecordPaymentDto extends BeginDepositDto {
  @ApiProperty({ enum: PAYMENT_KINDS, enumName: 'PaymentKind' })
  @IsIn(PAYMENT_KINDS)
  kind: PaymentKind;

  @ApiProperty({ description: 'ISO 4217, as USD' })
  @Currency()
  currency: string;

  @ApiProperty({ minLength: 1, maxLength: 500, description: 'how and when: "bank transfer, 2 February"' })
  @TextField({ min: 1, max: 500, lines: true })
  note: string;
}

export class CheckoutDto {
  @ApiProperty({ description: "the payment provider's page" })
  url: string;
}

export class PaymentDto extends OfOrderDto {
  @ApiProperty({ enum: PAYMENT_KINDS, enumName: 'PaymentKind' })
  kind: PaymentKind;
  @ApiProperty()
  byHand: boolean;
  @ApiProperty()
  amountMinor: number;
  @ApiProperty()
  currency: string;
  @ApiProperty({ enum: PAYMENT_STATES, enumName: 'PaymentState' })
  state: PaymentState;
  @ApiProperty()
  note: string;
  @ApiProperty({ type: String, format: 'date-time', nullable: true })
  settledAt: string | null;
}
