import { Module } from '@nestjs/common';
import { PaymentProvider } from './payment-provider.service';

@Module({ providers: [PaymentProvider], exports: [PaymentProvider] })
export class PaymentsModule {}
